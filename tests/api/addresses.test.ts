/** What every address answers: methods it does not take, unknown addresses, preflights, request ids, health, index. */
import { describe, expect, it } from 'vitest';
import type { Problem } from '@/openapi/schemas/problem';
import { PROBLEM_CODES, PROBLEMS, problemSchema } from '@/openapi/schemas/problem';
import { isOpen } from '@/openapi/contract';
import { contractList, contracts } from '@/openapi/contracts';
import { apiDocument } from '@/openapi/document';
import { type AnyMethod, call, mediaOf, ORIGIN, promisedJson, routeFileOf, routeFiles, routeModule } from './caller';

const REFUSED: readonly AnyMethod[] = ['GET', 'POST', 'PUT', 'PATCH', 'DELETE'];

async function asked(
  file: string,
  method: AnyMethod,
  headers: Readonly<Record<string, string>> = {},
): Promise<Response> {
  const path = file
    .replace(/^app|\/route\.ts$/g, '')
    .replace('[[...path]]', 'nowhere')
    .replace('[code]', 'internal');
  const handler = (await routeModule(file))[method];
  if (!handler) throw new Error(`${file} exports no ${method}`);
  return handler(new Request(ORIGIN + path, { method, headers }), { params: Promise.resolve({ code: 'internal' }) });
}

const addresses = routeFiles().filter((file) => !/\[\[?\.\.\./.test(file));

/** Those whose calls compute or describe only. */
const openAddresses = addresses.filter((file) =>
  contractList.filter((contract) => routeFileOf(contract.path) === file).every(isOpen),
);

describe('every address', () => {
  it.each(addresses)('%s refuses other methods with 405, Allow and a problem', async (file) => {
    const allow = (await asked(file, 'OPTIONS')).headers.get('allow') ?? '';
    expect(allow).toMatch(/GET|POST|DELETE/);
    const others = REFUSED.filter((method) => !allow.split(', ').includes(method));
    expect(others.length).toBeGreaterThanOrEqual(2);
    for (const method of others) {
      const response = await asked(file, method);
      expect(response.status).toBe(405);
      expect(response.headers.get('allow')).toBe(allow);
      expect(mediaOf(response)).toBe('application/problem+json');
      expect(problemSchema.parse(await response.json())).toMatchObject({ code: 'method-not-allowed', status: 405 });
    }
  });

  it.each(openAddresses)('%s may be called from any site', async (file) => {
    const response = await asked(file, 'OPTIONS', {
      origin: 'https://example.org',
      'access-control-request-method': 'POST',
    });
    expect(response.status).toBe(204);
    expect(response.headers.get('access-control-allow-origin')).toBe('*');
    expect(response.headers.get('access-control-allow-methods')).toBe(response.headers.get('allow'));
    expect(response.headers.get('access-control-allow-headers')).toContain('Content-Type');
    expect(response.headers.get('access-control-allow-credentials')).toBeNull();
  });

  it.each(addresses.filter((file) => !openAddresses.includes(file)))('%s opens to no other site', async (file) => {
    const response = await asked(file, 'OPTIONS', {
      origin: 'https://example.org',
      'access-control-request-method': 'GET',
    });
    expect(response.status).toBe(204);
    expect([...response.headers.keys()].filter((name) => name.startsWith('access-control'))).toEqual([]);
  });

  it('lets a page of another site read problems too', async () => {
    const response = await call(contracts.createReading, { body: {} });
    expect(response.headers.get('access-control-allow-origin')).toBe('*');
  });
});

describe('an address where nothing is', () => {
  it.each([...REFUSED, 'OPTIONS'] as const)('answers %s with a 404 problem', async (method) => {
    const response = await asked('app/api/[[...path]]/route.ts', method);
    expect(response.status).toBe(404);
    expect(problemSchema.parse(await response.json())).toMatchObject({ code: 'not-found', instance: '/api/nowhere' });
  });

  it('answers HEAD with 404 and no body', async () => {
    const response = await asked('app/api/[[...path]]/route.ts', 'HEAD');
    expect([response.status, await response.text()]).toEqual([404, '']);
  });
});

describe('request ids', () => {
  it('are made anew for each answer', async () => {
    const ids = await Promise.all(
      [1, 2].map(async () => (await call(contracts.getHealth)).headers.get('x-request-id')),
    );
    expect(ids[0]).toMatch(/^[\w-]{36}$/);
    expect(ids[0]).not.toBe(ids[1]);
  });

  it('are the caller’s own when they are harmless', async () => {
    expect(
      (await call(contracts.getHealth, { headers: { 'x-request-id': 'abc.123' } })).headers.get('x-request-id'),
    ).toBe('abc.123');
    const odd = await call(contracts.getHealth, { headers: { 'x-request-id': '{"level":60}' } });
    expect(odd.headers.get('x-request-id')).toMatch(/^[\w-]{36}$/);
  });
});

describe('what the API says of itself', () => {
  it('health: ready, the engine’s version, and how long', async () => {
    const health = await promisedJson(contracts.getHealth, await call(contracts.getHealth));
    expect(health).toMatchObject({ status: 'ready', engine: expect.any(String), uptimeSeconds: expect.any(Number) });
  });

  it('index: every call, with the address of the document', async () => {
    const index = await promisedJson<{ calls: { id: string }[]; document: string }>(
      contracts.getIndex,
      await call(contracts.getIndex),
    );
    expect(index.calls.map(({ id }) => id)).toEqual(Object.keys(contracts));
    expect(index.document).toBe(contracts.getDocument.path);
  });

  it('the document that is served is the one that is generated, whole', async () => {
    const response = await call(contracts.getDocument);
    expect(await response.json()).toEqual(JSON.parse(JSON.stringify(apiDocument())));
  });

  it.each(PROBLEM_CODES)('the type of the problem %s is an address that explains it', async (code) => {
    const refused = await call(contracts.getProblem, { params: { code } });
    expect(await promisedJson(contracts.getProblem, refused)).toEqual({
      type: `/api/v1/problems/${code}`,
      code,
      ...PROBLEMS[code],
    });
  });

  it('a code that only an object’s prototype knows is not found', async () => {
    const response = await call(contracts.getProblem, { params: { code: 'constructor' } });
    expect(await promisedJson<Problem>(contracts.getProblem, response)).toMatchObject({
      status: 404,
      code: 'not-found',
    });
  });
});
