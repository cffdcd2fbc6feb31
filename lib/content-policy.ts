/** The Content-Security-Policy of pages. */

/**
 * The policy for one answer.
 *
 * Scripts run by nonce alone, and load what they themselves ask for. Styles may stand inline, because libraries put
 * some in. Nothing comes from another site and no site may frame a page.
 */
export function contentPolicy(nonce: string, { development }: { readonly development: boolean }): string {
  const scripts = ["'self'", `'nonce-${nonce}'`, "'strict-dynamic'", ...(development ? ["'unsafe-eval'"] : [])];
  return [
    "default-src 'self'",
    `script-src ${scripts.join(' ')}`,
    "style-src 'self' 'unsafe-inline'",
    "img-src 'self' data: blob:",
    "font-src 'self' data:",
    "connect-src 'self'",
    "worker-src 'self'",
    "object-src 'none'",
    "base-uri 'none'",
    "form-action 'self'",
    "frame-ancestors 'none'",
  ].join('; ');
}
