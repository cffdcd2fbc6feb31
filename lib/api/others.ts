/** The methods that an address does not take, and what is at no address at all. */
import { isOpen } from '@/openapi/contract';
import { AppError } from '@/lib/errors';
import { log } from '@/lib/log';
import { commonHeaders, PREFLIGHT, requestIdOf } from './headers';
import { problemResponse } from './problem';
import type { Route } from './route';

type Method = 'GET' | 'HEAD' | 'OPTIONS' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
type RoutedMethod = Exclude<Method, 'HEAD' | 'OPTIONS'>;
type Handler = (request: Request, segments?: { readonly params: Promise<unknown> }) => Promise<Response>;

/** Handlers for every method that an address has no route for: OPTIONS and HEAD are answered, the others refused with Allow. */
export function others(routes: Readonly<Partial<Record<RoutedMethod, Route>>>): Readonly<Record<Method, Handler>> {
  const { GET } = routes;
  const allow = [
    ...(GET ? ['GET', 'HEAD'] : []),
    ...(['POST', 'PUT', 'PATCH', 'DELETE'] as const).filter((method) => routes[method]),
    'OPTIONS',
  ].join(', ');
  const open = Object.values(routes).every(({ contract }) => isOpen(contract));
  const refuse: Handler = (request) =>
    refused(
      request,
      new AppError('method-not-allowed', `This address takes ${allow}, not ${request.method}.`, {
        headers: { Allow: allow },
      }),
    );
  return {
    GET: GET ?? refuse,
    HEAD: GET ? headOf(GET) : refuse,
    OPTIONS: (request) => preflight(request, allow, open),
    POST: routes.POST ?? refuse,
    PUT: routes.PUT ?? refuse,
    PATCH: routes.PATCH ?? refuse,
    DELETE: routes.DELETE ?? refuse,
  };
}

/** The answer at an address of the API where nothing is. */
export const nothingHere: Handler = (request) =>
  refused(request, new AppError('not-found', `There is nothing at ${new URL(request.url).pathname}.`));

/** Every method of an address where nothing is. */
export const nothing: Readonly<Record<Method, Handler>> = {
  GET: nothingHere,
  HEAD: headOf(nothingHere),
  OPTIONS: nothingHere,
  POST: nothingHere,
  PUT: nothingHere,
  PATCH: nothingHere,
  DELETE: nothingHere,
};

/** HEAD is GET without the body (RFC 9110, 9.3.2). */
function headOf(get: Handler): Handler {
  return async (request, segments) => {
    const response = await get(request, segments);
    await response.body?.cancel();
    return new Response(null, { status: response.status, headers: response.headers });
  };
}

/** What is stored answers no preflight: without its headers a browser lets no other site call. */
async function preflight(request: Request, allow: string, open: boolean): Promise<Response> {
  const requestId = requestIdOf(request);
  const headers: Record<string, string> = open
    ? { ...commonHeaders(requestId), ...PREFLIGHT, Allow: allow, 'Access-Control-Allow-Methods': allow }
    : { 'X-Request-Id': requestId, Allow: allow };
  return new Response(null, { status: 204, headers });
}

async function refused(request: Request, error: AppError): Promise<Response> {
  const requestId = requestIdOf(request);
  log.info({ requestId, method: request.method, status: error.status }, 'refused');
  return problemResponse(error, { request, requestId, faultsIn: 'path' });
}
