/** Every contract has its route file, and every route file its contracts. */
import { describe, expect, it } from 'vitest';
import type { Route } from '@/lib/api/route';
import { contractList } from '@/openapi/contracts';
import { METHODS, routeFileOf, routeFiles, routeModule } from '../api/caller';

/** Answers addresses where nothing is, and next-auth's own addresses: neither has a contract. */
const NOTHING_HERE = 'app/api/[[...path]]/route.ts';
const SIGN_IN = 'app/api/auth/[...nextauth]/route.ts';

describe('contracts and route files', () => {
  it('stand at each other’s addresses', () => {
    const wanted = new Set(contractList.map(({ path }) => routeFileOf(path)));
    expect(routeFiles()).toEqual([...wanted, NOTHING_HERE, SIGN_IN].sort());
  });

  it.each(contractList.map((contract) => [contract.id, contract] as const))(
    '%s is what its file serves',
    async (_, contract) => {
      const served = (await routeModule(routeFileOf(contract.path)))[contract.method] as Route;
      expect(served.contract).toBe(contract);
    },
  );

  it.each(routeFiles())('%s serves no call that has no contract', async (file) => {
    const handlers = await routeModule(file);
    const served = METHODS.flatMap((method) => {
      const handler = handlers[method];
      return handler && 'contract' in handler ? [handler.contract] : [];
    });
    const ids = (contracts: readonly { readonly id: string }[]): string[] => contracts.map(({ id }) => id).sort();
    expect(ids(served)).toEqual(ids(contractList.filter((contract) => routeFileOf(contract.path) === file)));
  });

  it.each(routeFiles())('%s answers every method, so that none is left to the framework', async (file) => {
    expect(Object.keys(await routeModule(file)).sort()).toEqual([...METHODS].sort());
  });
});
