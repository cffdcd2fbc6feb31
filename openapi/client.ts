/** The typed client of the API, for the application's pages and for users. */
import createClient, { type Client } from 'openapi-fetch';
import type { paths } from './types.gen';

export type ApiClient = Client<paths>;

/**
 * A client for the API at `baseUrl` ('' for the page's own site). Calls answer `{ data }` or `{ error }`, the error
 * being a problem of RFC 9457. `fetch` can be given, for tests.
 */
export function apiClient(baseUrl = '', fetch?: (request: Request) => Promise<Response>): ApiClient {
  return createClient<paths>({ baseUrl, ...(fetch && { fetch }) });
}
