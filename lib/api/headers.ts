/** Headers that every answer of the API carries. */
import { randomUUID } from 'node:crypto';
import { isOpen, type Scope } from '@/openapi/contract';

/** The caller's own request id when it is harmless to log, else a new one. */
export function requestIdOf(request: Request): string {
  const given = request.headers.get('x-request-id');
  return given !== null && /^[\w.-]{1,64}$/.test(given) ? given : randomUUID();
}

/** Any site may call what computes: such calls know nobody, so no cookie is ever allowed along. */
export const OPEN_CORS = {
  'Access-Control-Allow-Origin': '*',
  'Access-Control-Expose-Headers':
    'ETag, X-Request-Id, Allow, Content-Disposition, RateLimit, RateLimit-Policy, Retry-After',
} as const;

/** What a browser may send after it has asked by OPTIONS; it may keep the answer for a day. */
export const PREFLIGHT = {
  'Access-Control-Allow-Headers': 'Authorization, Content-Type, If-None-Match, X-Request-Id',
  'Access-Control-Max-Age': '86400',
} as const;

/** The headers of an answer to this request, before its own. What is stored is nobody's business elsewhere: no site but ours may read it. */
export function commonHeaders(requestId: string, call?: { readonly scope: Scope }): Record<string, string> {
  const own = { 'X-Request-Id': requestId, 'X-Content-Type-Options': 'nosniff' };
  return call && !isOpen(call) ? { ...own, 'Cache-Control': 'private, no-cache' } : { ...own, ...OPEN_CORS };
}
