/** Values to the text of a reply: checked and written by their schema, here or in a thread that computed them. */
import type { z } from 'zod';
import type { EventsReply, JsonReply, LinesReply } from '@/openapi/contract';
import { replyCheck } from './check';
import { jsonWriter } from './writer';

/** JSON that `replyText` has made elsewhere: it goes out as it stands. */
export class Written {
  readonly bytes: Uint8Array;

  constructor(bytes: Uint8Array) {
    this.bytes = bytes;
  }
}

/** The function that turns a reply's values, or its lines, into JSON. Throws on a value that was never promised. */
export function replyText<S extends z.ZodType>(
  reply: JsonReply<S> | LinesReply<S> | EventsReply<S>,
  production: boolean,
): (value: z.output<S>) => string {
  const checked = replyCheck(reply.schema, reply.check, production);
  const write = jsonWriter(reply.schema);
  return (value) => write(checked(value)) ?? 'null';
}
