/** The typed client against the real handlers: what the types promise is what comes. */
import { describe, expect, it } from 'vitest';
import { apiClient } from '@/openapi/client';
import { contractList } from '@/openapi/contracts';
import { EXAMPLE_FEN } from '@/openapi/schemas/examples';
import { type AnyMethod, ORIGIN, routeFileOf, routeModule } from './caller';

/** Sends a request to the route file of its address, as the server would. */
async function served(request: Request): Promise<Response> {
  const { pathname } = new URL(request.url);
  const contract = contractList.find(({ path }) => new RegExp(`^${path.replace(/\{\w+\}/, '[^/]+')}$`).test(pathname));
  if (!contract) throw new Error(`No contract has the path ${pathname}.`);
  const handler = (await routeModule(routeFileOf(contract.path)))[request.method as AnyMethod];
  if (!handler) throw new Error(`${pathname} takes no ${request.method}.`);
  return handler(request, { params: Promise.resolve({ code: pathname.split('/').at(-1) }) });
}

describe('apiClient', () => {
  const client = apiClient(ORIGIN, served);

  it('reads a position', async () => {
    const { data, error } = await client.POST('/api/v1/readings', { body: { fen: EXAMPLE_FEN } });
    expect(error).toBeUndefined();
    expect(data?.squares).toHaveLength(64);
    expect(data?.statements?.[0]?.text).toEqual(expect.any(String));
  });

  it('writes lists of parts as the API reads them', async () => {
    const { data } = await client.GET('/api/v1/readings', {
      params: { query: { fen: EXAMPLE_FEN, include: ['lead', 'totals'] } },
    });
    expect(data?.totals?.white.safeMoves).toEqual(expect.any(Number));
    expect(data?.men).toBeUndefined();
  });

  it('gives a refusal as a problem', async () => {
    const { data, error } = await client.POST('/api/v1/readings', { body: { fen: 'nothing' } });
    expect(data).toBeUndefined();
    expect(error).toMatchObject({ code: 'fen-refused', faults: [{ path: '/fen' }] });
  });

  it('fills in the path', async () => {
    const { data } = await client.GET('/api/v1/problems/{code}', { params: { path: { code: 'not-json' } } });
    expect(data?.status).toBe(400);
  });
});
