/**
 * A call of the API, said once: parser, reply check, document, client and reference come from it.
 */
import type { z } from 'zod';
import type { ProblemCode } from './schemas/problem';

/** The methods that calls of the API use. */
export type Method = 'GET' | 'POST';

/** Who may call: `open` needs nothing; `compute` is open within an allowance. Both may be called from any site. */
export type Scope = 'open' | 'compute';

/** A reply of one JSON value. `sampled` replies are checked now and then in production, always elsewhere. */
export interface JsonReply<S extends z.ZodType = z.ZodType> {
  readonly form: 'json';
  readonly media: 'application/json';
  readonly schema: S;
  readonly check: 'always' | 'sampled';
}

/** A reply of JSON values, one a line, sent as they are computed. */
export interface LinesReply<S extends z.ZodType = z.ZodType> {
  readonly form: 'lines';
  readonly media: 'application/x-ndjson';
  readonly schema: S;
  readonly check: 'sampled';
}

/** A reply of text that is not JSON. */
export interface TextReply {
  readonly form: 'text';
  readonly media: 'image/svg+xml';
}

/** A reply of bytes. */
export interface BytesReply {
  readonly form: 'bytes';
  readonly media: 'image/png';
}

export type Reply = JsonReply | LinesReply | TextReply | BytesReply;

/** What a handler has to give for a reply. */
export type ReplyValue<R extends Reply> =
  R extends JsonReply<infer S>
    ? z.output<S>
    : R extends LinesReply<infer S>
      ? AsyncIterable<z.output<S>>
      : R extends TextReply
        ? string
        : Uint8Array;

/** A JSON body with its bound in bytes. */
export interface Body<S extends z.ZodType = z.ZodType> {
  readonly schema: S;
  readonly bytesMax: number;
}

export interface Contract<
  P extends z.ZodType = z.ZodType,
  Q extends z.ZodType = z.ZodType,
  B extends z.ZodType = z.ZodType,
  R extends Reply = Reply,
> {
  /** The operation's name in document, log and client. */
  readonly id: string;
  readonly method: Method;
  /** The whole path, parameters in braces. */
  readonly path: `/api/${string}`;
  readonly tag: string;
  readonly scope: Scope;
  readonly summary: string;
  readonly description: string;
  /** Path parameters, a strict object of strings. */
  readonly params?: P;
  /** Query parameters, a strict object; lists are written with commas. */
  readonly query?: Q;
  readonly body?: Body<B>;
  readonly reply: R;
  /** Whether the answer carries an ETag and may be answered 304. */
  readonly cached?: boolean;
  /** Problems of this call's own; those of its shape are added by `problemsOf`. */
  readonly errors: readonly ProblemCode[];
  /** A request that works, as document and tests use it. */
  readonly example: {
    readonly params?: Readonly<Record<string, string>>;
    readonly query?: Readonly<Record<string, string>>;
    readonly body?: unknown;
  };
}

/** States a call of the API, keeping the types of its schemas. */
export function contract<
  R extends Reply,
  P extends z.ZodType = z.ZodUndefined,
  Q extends z.ZodType = z.ZodUndefined,
  B extends z.ZodType = z.ZodUndefined,
>(spec: Contract<P, Q, B, R>): Contract<P, Q, B, R> {
  return spec;
}

/** A reply of one JSON value. */
export function json<S extends z.ZodType>(schema: S, check: 'always' | 'sampled' = 'always'): JsonReply<S> {
  return { form: 'json', media: 'application/json', schema, check };
}

/** A reply of JSON values, one a line. */
export function lines<S extends z.ZodType>(schema: S): LinesReply<S> {
  return { form: 'lines', media: 'application/x-ndjson', schema, check: 'sampled' };
}

/** Every problem a call can answer: its own, those that follow from its shape, and our own mistakes. */
export function problemsOf(call: Contract): readonly ProblemCode[] {
  const found = new Set<ProblemCode>();
  if (call.body) for (const code of ['not-json', 'body-too-large', 'unsupported-media-type'] as const) found.add(code);
  if (call.body || call.query || call.params) found.add('invalid-request');
  for (const code of call.errors) found.add(code);
  found.add('internal');
  return [...found];
}
