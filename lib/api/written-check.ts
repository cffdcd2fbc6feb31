/** JSON that the engine has written itself, held against the schema of its reply. */
import type { z } from 'zod';
import type { JsonReply, LinesReply } from '@/openapi/contract';
import { sampling } from './check';
import { jsonWriter } from './writer';

/**
 * A function that lets JSON through which is, to the character, what `replyText` would make of its value: nothing that was
 * never promised leaves. Looks as often as the contract says, and throws on any other text.
 */
export function writtenCheck<S extends z.ZodType>(
  { schema, check }: JsonReply<S> | LinesReply<S>,
  production: boolean,
): (json: string) => string {
  const isDue = sampling(check, production);
  const write = jsonWriter(schema);
  return (json) => {
    if (isDue() && write(schema.parse(JSON.parse(json))) !== json)
      throw new Error('This JSON is not as its schema has it.');
    return json;
  };
}
