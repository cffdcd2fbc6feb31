/** Answers about the API itself: their ETag is that of their text, for they change with a release only. */
import { type Answer, cacheable } from './answer';
import { etagOf } from './etag';

/** A small value that anyone may keep a copy of. */
export function describedBy<V>(value: V): Answer<V> {
  return cacheable({ etag: etagOf(JSON.stringify(value)), value: () => value });
}
