/** Every problem that a contract declares is really answered, in the promised form. */
import { describe, expect, it } from 'vitest';
import { route } from '@/lib/api/route';
import { type Contract, problemsOf } from '@/openapi/contract';
import { contractList } from '@/openapi/contracts';
import { PROBLEMS, type Problem, type ProblemCode, problemType } from '@/openapi/schemas/problem';
import { call, ORIGIN, promisedJson, type Wanted } from './caller';

/** A request that has to be refused with the code: the contract's own example with one thing wrong. */
function faultyRequest(contract: Contract, code: ProblemCode): Wanted {
  const { example } = contract;
  switch (code) {
    case 'not-json':
      return { ...example, body: '{"fen": ' };
    case 'body-too-large':
      return { ...example, body: ' '.repeat((contract.body?.bytesMax ?? 0) + 1) };
    case 'unsupported-media-type':
      return { ...example, headers: { 'content-type': 'text/plain' } };
    case 'invalid-request':
      if (contract.body) return { ...example, body: { ...(example.body as object), colour: 'red' } };
      if (contract.query) return { ...example, query: { ...example.query, colour: 'red' } };
      return { ...example, params: { code: 'x'.repeat(65) } };
    case 'fen-refused':
      return contract.body
        ? { ...example, body: { ...(example.body as object), fen: '8/8 w - - 0 1' } }
        : { ...example, query: { ...example.query, fen: '8/8 w - - 0 1' } };
    case 'not-found':
      return { ...example, params: { code: 'no-such-code' } };
    default:
      throw new Error(`No faulty request is known for ${contract.id} ${code}`);
  }
}

const declared = contractList.flatMap((contract) =>
  problemsOf(contract)
    .filter((code) => code !== 'internal')
    .map((code) => [contract.id, code, contract] as const),
);

describe('declared problems', () => {
  it.each(declared)('%s answers %s', async (_, code, contract) => {
    const response = await call(contract, faultyRequest(contract, code));
    expect(response.status).toBe(PROBLEMS[code].status);
    expect(response.headers.get('content-type')).toBe('application/problem+json');
    const problem = await promisedJson<Problem>(contract, response);
    expect(problem).toMatchObject({
      code,
      type: problemType(code),
      status: response.status,
      title: PROBLEMS[code].title,
    });
    expect(problem.requestId).toBe(response.headers.get('x-request-id'));
    expect(problem.instance).toBe(
      contract.path.replace('{code}', code === 'not-found' ? 'no-such-code' : 'x'.repeat(65)),
    );
  });

  it.each(contractList.map((contract) => [contract.id, contract] as const))(
    '%s answers our own mistakes blankly',
    async (_, contract) => {
      const broken = route({ ...contract, params: undefined, query: undefined, body: undefined }, () => {
        throw new Error('secret of the house');
      });
      const response = await broken(new Request(ORIGIN + contract.path, { method: contract.method }));
      expect(response.status).toBe(500);
      const text = await response.text();
      expect(text).not.toContain('secret');
      expect(JSON.parse(text)).toMatchObject({ code: 'internal', requestId: response.headers.get('x-request-id') });
    },
  );

  it('a reply that was never promised is not sent', async () => {
    const health = contractList.find(({ id }) => id === 'getHealth') as Contract;
    const broken = route(health, () => ({ status: 'ready', engine: 7 }));
    expect((await broken(new Request(ORIGIN + health.path))).status).toBe(500);
  });

  it('a field that was never promised does not leave', async () => {
    const health = contractList.find(({ id }) => id === 'getHealth') as Contract;
    const loose = route(health, () => ({ status: 'ready', engine: '1', uptimeSeconds: 2, password: 'x' }));
    expect(await (await loose(new Request(ORIGIN + health.path))).json()).toEqual({
      status: 'ready',
      engine: '1',
      uptimeSeconds: 2,
    });
  });
});
