/** Headers of pages: a content policy whose nonce is new for every answer. It guards no page; pages do that themselves. */
import { type NextRequest, NextResponse } from 'next/server';
import { contentPolicy } from '@/lib/content-policy';
import { env } from '@/lib/env';

/** Hands the nonce to the page in `x-nonce` and the policy to the browser. */
export function proxy(request: NextRequest): NextResponse {
  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(16))).toString('base64');
  const policy = contentPolicy(nonce, { development: !env.isProduction });

  const headers = new Headers(request.headers);
  headers.set('x-nonce', nonce);
  headers.set('Content-Security-Policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('Content-Security-Policy', policy);
  return response;
}

/** Pages only. The API writes its own headers, and a body that passes here would be cut at 10 MB. */
export const config = {
  matcher: ['/((?!api/|_next/static/|_next/image|icon.svg|favicon.ico).*)'],
};
