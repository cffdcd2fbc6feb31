/** What a handler may give beside the bare value: an ETag, headers, and the value only when it is needed. */

export interface AnswerParts<V> {
  /** Made only if the caller's copy is not good any more. */
  readonly value: () => V | Promise<V>;
  /** A strong ETag with its quotes. */
  readonly etag?: string;
  readonly headers?: Readonly<Record<string, string>>;
}

/** A value on its way to the caller, with what HTTP needs to know of it. */
export class Answer<V> {
  readonly value: () => V | Promise<V>;
  readonly etag: string | undefined;
  readonly headers: Readonly<Record<string, string>>;

  constructor({ value, etag, headers = {} }: AnswerParts<V>) {
    this.value = value;
    this.etag = etag;
    this.headers = headers;
  }
}

/** Public copies stay fresh for an hour; after that one question with If-None-Match is enough. */
const PUBLIC_CACHE = 'public, max-age=3600';

/** An answer that anyone may keep a copy of. */
export function cacheable<V>({ value, etag, headers = {} }: AnswerParts<V> & { readonly etag: string }): Answer<V> {
  return new Answer({ value, etag, headers: { 'Cache-Control': PUBLIC_CACHE, ...headers } });
}
