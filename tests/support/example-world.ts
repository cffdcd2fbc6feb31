/** A world in which every example of the API works: what the examples name is there, under the ids they use. */
import { randomUUID } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { insertJob } from '@/db/queries/jobs';
import { insertKey } from '@/db/queries/keys';
import { insertResult } from '@/db/queries/results';
import { insertPositions, insertStudy } from '@/db/queries/studies';
import type { UserRow } from '@/db/queries/users';
import type { Role } from '@/db/schema';
import { ALLOWANCES, spend } from '@/lib/api/limits';
import { newKeySecret } from '@/lib/key-secret';
import { type Contract, isOpen, KEY_SCOPES, type KeyScope } from '@/openapi/contract';
import { EXAMPLE_ENDING, EXAMPLE_IDS } from '@/openapi/schemas/examples';
import { RESULT_KINDS } from '@/openapi/schemas/results';
import { sessionHeaders } from './sessions';
import { freshWorld, type World } from './world';

export interface ExampleWorld {
  readonly world: World;
  readonly workspaceId: string;
  readonly people: Readonly<Record<Role, UserRow>>;
  /** Headers of a key with these scopes. */
  readonly key: (scopes?: readonly KeyScope[]) => Promise<Record<string, string>>;
  /** Headers of a person's browser. */
  readonly session: (user: UserRow) => Promise<Record<string, string>>;
  /** Headers that a contract's example needs: of a key with every scope, or of the owner's browser. */
  readonly headersFor: (contract: Contract) => Promise<Record<string, string>>;
  /** Headers of somebody whose allowance for this contract is used up. */
  readonly spent: (contract: Contract) => Promise<Record<string, string>>;
  readonly close: () => Promise<void>;
}

/** A world with one workspace, a person in each role, a study with a position, and a key. */
export async function exampleWorld(): Promise<ExampleWorld> {
  const world = await freshWorld();
  const example = await peopled(world);
  return { ...example, close: world.close };
}

/** The same world as it was at the beginning, in a few milliseconds. */
export async function renewed({ world }: Pick<ExampleWorld, 'world'>): Promise<ExampleWorld> {
  await world.db.execute(sql`truncate users, workspaces, idempotency_keys, readings, rate_limits, mail cascade`);
  return { ...(await peopled(world)), close: world.close };
}

async function peopled(world: World): Promise<Omit<ExampleWorld, 'close'>> {
  const { db } = world;
  const people = {
    owner: await world.person('Ines Ward'),
    coach: await world.person('Tom Fell'),
    writer: await world.person('Rosa Lind'),
    student: await world.person('Jo Marsh'),
  };
  const { id: workspaceId } = await world.workspace('Lantern Chess Circle', people);
  await insertStudy(db, { id: EXAMPLE_IDS.study, workspaceId, title: 'King and pawns', createdBy: people.coach.id });
  const positionKey = EXAMPLE_ENDING.split(' ').slice(0, 4).join(' ');
  await insertPositions(db, [
    {
      id: EXAMPLE_IDS.position,
      studyId: EXAMPLE_IDS.study,
      order: '1',
      fen: EXAMPLE_ENDING,
      positionKey,
      title: 'One',
    },
  ]);
  const kept = { studyId: EXAMPLE_IDS.study, request: { fen: EXAMPLE_ENDING }, result: {}, engineVersion: '0' };
  for (const kind of RESULT_KINDS) await insertResult(db, { ...kept, id: EXAMPLE_IDS[kind], kind });
  const job = { id: EXAMPLE_IDS.job, workspaceId, kind: 'readings', state: 'failed', input: {} } as const;
  await insertJob(db, { ...job, endedAt: new Date() }, [EXAMPLE_ENDING]);
  const makeKey = async (scopes: readonly KeyScope[], id?: string): Promise<Record<string, string>> => {
    const { secret, prefix, hash } = newKeySecret();
    await insertKey(db, { ...(id && { id }), workspaceId, name: 'A program', prefix, hash, scopes: [...scopes] });
    return { authorization: `Bearer ${secret}` };
  };
  const spent = async ({ scope }: Contract): Promise<Record<string, string>> => {
    const byBrowser = scope === 'workspace' || scope === 'person';
    const [payer, who] = byBrowser ? (['person', people.owner.id] as const) : (['key', randomUUID()] as const);
    await spend(payer, who, ALLOWANCES[payer]);
    return byBrowser ? sessionHeaders(db, people.owner, workspaceId) : makeKey(KEY_SCOPES, who);
  };
  const everyScope = await makeKey(KEY_SCOPES, EXAMPLE_IDS.key);
  return {
    world,
    workspaceId,
    people,
    key: (scopes = KEY_SCOPES) => makeKey(scopes),
    spent,
    session: (user) => sessionHeaders(db, user, workspaceId),
    headersFor: async (contract) => {
      const who = isOpen(contract)
        ? {}
        : contract.scope === 'workspace' || contract.scope === 'person'
          ? await sessionHeaders(db, people.owner, workspaceId)
          : everyScope;
      return { ...who, ...(contract.guarded && { 'if-match': '"v1"' }) };
    },
  };
}
