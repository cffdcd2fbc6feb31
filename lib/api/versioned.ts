/** Answers of things with a version: their ETag names it. */
import { Answer } from './answer';
import { versionTag } from './if-match';

/** A stored thing with its ETag; a new one with its address too. */
export function versioned<V extends { readonly version: number }>(value: V, location?: string): Answer<V> {
  return new Answer({
    value: () => value,
    etag: versionTag(value.version),
    headers: location === undefined ? {} : { Location: location },
  });
}

/** A page of a list with its Link header (RFC 8288). */
export function listed<V extends { readonly next: string | null }>(
  page: V,
  request: { readonly path: string; readonly query: Readonly<Record<string, unknown>> },
): Answer<V> {
  if (page.next === null) return new Answer({ value: () => page });
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(request.query)) if (value !== undefined) query.set(name, String(value));
  query.set('cursor', page.next);
  return new Answer({ value: () => page, headers: { Link: `<${request.path}?${query}>; rel="next"` } });
}
