/** ETags: made from what an answer depends on, compared as RFC 9110 says. */
import { createHash } from 'node:crypto';

/** A strong ETag from everything that the answer depends on; 22 letters hold 132 of the hash's bits. */
export function etagOf(...parts: readonly string[]): string {
  const hash = createHash('sha256');
  for (const part of parts) hash.update(`${part.length}:${part}`);
  return `"${hash.digest('base64url').slice(0, 22)}"`;
}

/** Whether If-None-Match names this ETag; weakly written ones count too (RFC 9110, 13.1.2). */
export function isUnchanged(ifNoneMatch: string | null, etag: string): boolean {
  if (ifNoneMatch === null) return false;
  if (ifNoneMatch.trim() === '*') return true;
  return ifNoneMatch.split(',').some((named) => named.trim().replace(/^W\//, '') === etag);
}
