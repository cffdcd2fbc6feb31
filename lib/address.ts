/**
 * From which address a request comes.
 *
 * A handler of the framework sees headers only, and whoever calls can write those. So the connection's own address is
 * put into a header of ours before any handler runs, over whatever the caller wrote there. Behind proxies of our own the
 * address that the outermost of them saw stands in X-Forwarded-For, counted from the right.
 */
import { subscribe } from 'node:diagnostics_channel';
import type { IncomingMessage } from 'node:http';

const HEADER = 'x-waypost-address';

/** Marks every request of this process's servers with its address. Call once, before the first request. */
export function markAddresses(proxies: number): void {
  subscribe('http.server.request.start', (message) => {
    const { request } = message as { readonly request: IncomingMessage };
    request.headers[HEADER] = addressIn(request, proxies);
  });
}

/** The connection's address; behind so many proxies, the one that the outermost saw. */
export function addressIn({ headers, socket }: Pick<IncomingMessage, 'headers' | 'socket'>, proxies: number): string {
  const direct = socket.remoteAddress ?? 'unknown';
  if (proxies === 0) return direct;
  const forwarded = String(headers['x-forwarded-for'] ?? '')
    .split(',')
    .map((part) => part.trim())
    .filter((part) => part !== '');
  return forwarded[Math.max(0, forwarded.length - proxies)] ?? direct;
}

/** The address of a marked request; undefined where no server marked it (a handler called in a test). */
export function addressOf(request: { readonly headers: Pick<Headers, 'get'> }): string | undefined {
  return request.headers.get(HEADER) ?? undefined;
}

/** Whether the address is this machine itself: whoever works there is not held to the allowance of strangers. */
export function isLoopback(address: string): boolean {
  return address === '::1' || /^(::ffff:)?127\./.test(address);
}
