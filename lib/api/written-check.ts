/** JSON that the engine has written itself, held against the schema of its reply. */
import type { z } from 'zod';
import type { JsonReply, LinesReply } from '@/openapi/contract';
import { sampling } from './check';
import { jsonWriter } from './writer';

const decoder = new TextDecoder();

/**
 * A function that lets JSON through which is, to the character, what `replyText` would make of its value: nothing that was
 * never promised leaves. Looks as often as the contract says, and throws on any other text.
 */
export function writtenCheck<S extends z.ZodType>(
  { schema, check }: JsonReply<S> | LinesReply<S>,
  production: boolean,
): (json: Uint8Array) => Uint8Array {
  const isDue = sampling(check, production);
  const write = jsonWriter(schema);
  return (json) => {
    if (isDue()) {
      const text = decoder.decode(json);
      if (write(schema.parse(JSON.parse(text))) !== text) throw new Error('This JSON is not as its schema has it.');
    }
    return json;
  };
}
