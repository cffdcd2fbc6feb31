/**
 * A call of the API, said once: parser, reply check, document, client and reference come from it.
 */
import type { z } from 'zod';
import type { ProblemCode } from './schemas/problem';

/** The methods that calls of the API use. */
export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

/** What a key may be allowed to do. */
export const KEY_SCOPES = ['compute', 'studies:read', 'studies:write', 'publish'] as const;
export type KeyScope = (typeof KEY_SCOPES)[number];

/**
 * Who may call. `open` needs nothing; `compute` is open within an allowance, and a key with that scope has a larger one; both may be
 * called from any site. The others need a key with the scope or a person whose role allows it; `workspace` is for its
 * owners and `person` for whoever is signed in, by the browser only: no key has them.
 */
export type Scope = 'open' | KeyScope | 'workspace' | 'person';

/** Whether a call answers any site and callers without a name. */
export function isOpen({ scope }: { readonly scope: Scope }): boolean {
  return scope === 'open' || scope === 'compute';
}

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
  readonly media: 'image/svg+xml' | 'application/vnd.chess-pgn' | 'text/csv';
}

/** Server-sent events, one JSON value an event. */
export interface EventsReply<S extends z.ZodType = z.ZodType> {
  readonly form: 'events';
  readonly media: 'text/event-stream';
  readonly schema: S;
  readonly check: 'always';
}

/** No body. */
export interface NoReply {
  readonly form: 'none';
}

/** A reply of bytes. */
export interface BytesReply {
  readonly form: 'bytes';
  readonly media: 'image/png';
}

export type Reply = JsonReply | LinesReply | EventsReply | TextReply | BytesReply | NoReply;

/** What a handler has to give for a reply. */
export type ReplyValue<R extends Reply> =
  R extends JsonReply<infer S>
    ? z.output<S>
    : R extends LinesReply<infer S>
      ? AsyncIterable<z.output<S>>
      : R extends EventsReply<infer S>
        ? AsyncIterable<z.output<S>>
        : R extends TextReply
          ? string
          : R extends NoReply
            ? undefined
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
  /** 200 unless said. */
  readonly status?: 200 | 201 | 202 | 204;
  /** A POST that stores: it takes an Idempotency-Key, and sent again answers the same. */
  readonly stores?: true;
  /** Changes what two people may change at once: it needs If-Match and answers 412 where the other was first. */
  readonly guarded?: true;
  /** A list by cursor: the answer has a Link header. */
  readonly listed?: true;
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

/** A reply of server-sent events. */
export function events<S extends z.ZodType>(schema: S): EventsReply<S> {
  return { form: 'events', media: 'text/event-stream', schema, check: 'always' };
}

/** A reply without a body. */
export const NOTHING: NoReply = { form: 'none' };

/** A reply of JSON values, one a line. */
export function lines<S extends z.ZodType>(schema: S): LinesReply<S> {
  return { form: 'lines', media: 'application/x-ndjson', schema, check: 'sampled' };
}

/** Every problem a call can answer: its own, those that follow from its shape, and our own mistakes. */
export function problemsOf(call: Contract): readonly ProblemCode[] {
  const found = new Set<ProblemCode>();
  if (call.body) for (const code of ['not-json', 'body-too-large', 'unsupported-media-type'] as const) found.add(code);
  if (call.body || call.query || call.params) found.add('invalid-request');
  if (call.stores) for (const code of ['idempotency-busy', 'idempotency-mismatch'] as const) found.add(code);
  if (call.guarded) for (const code of ['version-needed', 'version-lost'] as const) found.add(code);
  if (!isOpen(call)) for (const code of ['not-signed-in', 'not-allowed'] as const) found.add(code);
  if (call.scope !== 'open') found.add('too-many-requests');
  if (call.scope === 'compute') for (const code of ['not-signed-in', 'not-allowed'] as const) found.add(code);
  for (const code of call.errors) found.add(code);
  found.add('internal');
  return [...found];
}
