/**
 * Who may call what: every role and every scope against every contract, in their own workspace and in another's,
 * generated from the contracts, so that a new one without a rule fails here.
 */
import { afterAll, describe, expect, it } from 'vitest';
import type { Role } from '@/db/schema';
import { ROLES } from '@/db/schema';
import { ACTS, may, PERMISSIONS } from '@/lib/permissions';
import { type Contract, isOpen, KEY_SCOPES, type KeyScope, type Scope } from '@/openapi/contract';
import { contractList } from '@/openapi/contracts';
import { exampleWorld, renewed } from '@/tests/support/example-world';
import { call } from './caller';

/** The table of the service, written out a second time: which roles each scope is for. */
const ALLOWED: Readonly<Record<Scope, readonly Role[]>> = {
  open: ROLES,
  compute: ROLES,
  'studies:read': ROLES,
  'studies:write': ['owner', 'coach', 'writer'],
  publish: ['owner', 'coach', 'writer'],
  workspace: ['owner'],
  person: ROLES,
};

const guarded = contractList.filter((contract) => !isOpen(contract));

/** A student reads what is shared with them; the example's study is not. */
function isShared({ scope, params }: Contract): boolean {
  return scope === 'studies:read' && params !== undefined;
}

describe('the table of permissions', () => {
  it('has a rule for every act, and an act for every scope', () => {
    expect(Object.keys(PERMISSIONS).sort()).toEqual([...ACTS].sort());
    for (const scope of KEY_SCOPES) expect(ACTS).toContain(scope);
  });

  it('lets a visitor compute and do nothing else', () => {
    expect(ACTS.filter((act) => may({ kind: 'visitor' }, act))).toEqual(['compute']);
  });

  it('gives an owner all that anybody may', () => {
    for (const roles of Object.values(PERMISSIONS)) expect(roles).toContain('owner');
  });
});

describe('every call that is not open', async () => {
  const example = await exampleWorld();
  afterAll(() => example.close());
  const rows = guarded.map((contract) => [contract.id, contract] as const);

  it.each(rows)('%s: a visitor is asked to sign in', async (_, contract) => {
    await renewed(example);
    const response = await call(contract, { ...contract.example, headers: { 'if-match': '"v1"' } });
    expect(response.status).toBe(401);
  });

  it.each(rows)('%s: each role as the table says', async (_, contract) => {
    for (const role of ROLES) {
      const { people, session } = await renewed(example);
      const headers = { ...(await session(people[role])), ...(contract.guarded && { 'if-match': '"v1"' }) };
      const { status } = await call(contract, { ...contract.example, headers });
      const isAllowed = ALLOWED[contract.scope].includes(role);
      const wanted = isAllowed ? (role === 'student' && isShared(contract) ? 404 : (contract.status ?? 200)) : 403;
      expect(status, `${role} ${contract.id}`).toBe(wanted);
    }
  });

  it.each(rows)('%s: each scope as the contract says, and no key does what is for people', async (_, contract) => {
    for (const scope of KEY_SCOPES) {
      const { key } = await renewed(example);
      const headers = { ...(await key([scope])), ...(contract.guarded && { 'if-match': '"v1"' }) };
      const { status } = await call(contract, { ...contract.example, headers });
      expect(status, `${scope} ${contract.id}`).toBe(
        scope === (contract.scope as KeyScope) ? (contract.status ?? 200) : 403,
      );
    }
  });

  it.each(rows.filter(([, { params }]) => params !== undefined))(
    '%s: what is another workspace’s and what never was are answered the same',
    async (_, contract) => {
      const { world, session } = await renewed(example);
      const stranger = await world.person('Nora Pike');
      const elsewhere = await world.workspace('Elsewhere', { owner: stranger });
      const headers = {
        ...(await session(stranger)),
        cookie: (await session(stranger)).cookie!.replace(/waypost\.workspace=.*/, `waypost.workspace=${elsewhere.id}`),
        ...(contract.guarded && { 'if-match': '"v1"' }),
      };
      const foreign = await call(contract, { ...contract.example, headers });
      const never = Object.fromEntries(
        Object.keys(contract.example.params ?? {}).map((name) => [name, '99999999-0000-4000-8000-000000000000']),
      );
      const missing = await call(contract, { ...contract.example, params: never, headers });
      expect([foreign.status, missing.status]).toEqual([404, 404]);
      const plain = async (response: Response) => {
        const { instance, requestId, ...rest } = (await response.json()) as Record<string, unknown>;
        expect([typeof instance, typeof requestId]).toEqual(['string', 'string']);
        return rest;
      };
      expect(await plain(foreign)).toEqual(await plain(missing));
    },
  );

  it('is refused to a page of another site, whatever cookie comes along', async () => {
    const { people, session } = await renewed(example);
    const headers = { ...(await session(people.owner)), 'sec-fetch-site': 'cross-site', origin: 'https://example.org' };
    for (const contract of guarded.filter(({ method }) => method !== 'GET')) {
      const { status } = await call(contract, { ...contract.example, headers: { ...headers, 'if-match': '"v1"' } });
      expect(status, contract.id).toBe(403);
    }
  });
});
