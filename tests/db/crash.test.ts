/** What the database has acknowledged is kept, however the process or the server ends. */
import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createInterface } from 'node:readline';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { type Database, openDatabase, type Place } from '@/db/client';
import { insertWorkspace } from '@/db/queries/workspaces';
import { changes, studies } from '@/db/schema';
import { startPostgres } from '@/tests/support/postgres';
import { MIGRATIONS } from '@/tests/support/world';

const ROUNDS = 5;
const TIMEOUT_MS = 120_000;

/** Writes acknowledged before each kill: another moment each round. */
const BEFORE_KILL = [60, 150, 25, 220, 90];

/** A writer at work. */
interface Writer {
  readonly acknowledged: number[];
  readonly reached: (count: number) => Promise<void>;
  readonly kill: () => Promise<void>;
}

function startWriter(place: Place, workspaceId: string, first: number): Writer {
  const args = ['--import', 'tsx', 'tests/db/stream-writes.ts', JSON.stringify(place), workspaceId, String(first)];
  const child: ChildProcess = spawn(process.execPath, args, { stdio: ['ignore', 'pipe', 'pipe'] });
  const acknowledged: number[] = [];
  let said = '';
  child.stderr?.on('data', (part) => {
    said += part;
  });
  const closed = new Promise<void>((resolve) => child.once('close', () => resolve()));
  const lines = createInterface({ input: child.stdout ?? process.stdin });
  lines.on('line', (line) => acknowledged.push(Number(line)));
  return {
    acknowledged,
    reached: async (count) => {
      while (acknowledged.length < count) {
        if (child.exitCode !== null) throw new Error(`the writer ended by itself:\n${said}`);
        await new Promise((resolve) => setTimeout(resolve, 5));
      }
    },
    kill: async () => {
      child.kill('SIGKILL');
      await closed;
    },
  };
}

/** A migrated database at the place, with one workspace; closed again. */
async function prepare(place: Place): Promise<string> {
  const database = await openDatabase(place);
  await database.migrate(MIGRATIONS);
  const workspace = await insertWorkspace(database.db, { name: 'Rounds', slug: 'rounds' });
  await database.close();
  return workspace?.id ?? '';
}

/** The numbers that are kept, and those whose study or change is there without the other. */
async function kept({ db }: Database): Promise<{ numbers: Set<number>; halves: unknown[] }> {
  const rows = await db
    .select({ title: studies.title, after: changes.after })
    .from(studies)
    .fullJoin(changes, eq(changes.entityId, studies.id));
  return {
    numbers: new Set(rows.map(({ title }) => Number(title))),
    halves: rows.filter(({ title, after }) => title === null || after?.number !== Number(title)),
  };
}

/** Kills writers in the midst of writing, round after round, and looks each time whether all they had acknowledged is there. */
async function rounds(place: Place, crash: (writer: Writer) => Promise<void>): Promise<number> {
  const workspaceId = await prepare(place);
  const acknowledged = new Set<number>();
  for (const count of BEFORE_KILL) {
    const writer = startWriter(place, workspaceId, Math.max(0, ...acknowledged) + 1_000);
    await writer.reached(count);
    await crash(writer);
    for (const number of writer.acknowledged) acknowledged.add(number);
    const database = await openDatabase(place);
    const { numbers, halves } = await kept(database);
    await database.close();
    expect([...acknowledged].filter((number) => !numbers.has(number))).toEqual([]);
    expect(halves).toEqual([]);
  }
  expect(BEFORE_KILL.length).toBe(ROUNDS);
  return acknowledged.size;
}

function print(what: string, count: number): void {
  console.log(`kill -9 while writing, ${ROUNDS} rounds, ${what}: ${count} writes acknowledged, 0 lost, 0 half there`);
}

describe('kill -9 during a stream of writes', () => {
  it('loses nothing that was acknowledged, embedded in a folder', { timeout: TIMEOUT_MS }, async () => {
    const parent = mkdtempSync(join(tmpdir(), 'waypost-crash-'));
    print('PGlite', await rounds({ folder: join(parent, 'database') }, (writer) => writer.kill()));
    rmSync(parent, { recursive: true, force: true });
  });

  it('loses nothing that was acknowledged, on a server', { timeout: TIMEOUT_MS }, async () => {
    const server = await startPostgres();
    const kill = async (writer: Writer) => writer.kill();
    print('PostgreSQL, writer killed', await rounds({ url: await server.newDatabase() }, kill));
    await server.stop();
  });

  it('loses nothing that was acknowledged when the server itself is killed', { timeout: TIMEOUT_MS }, async () => {
    const server = await startPostgres();
    const crash = async (writer: Writer) => {
      await server.crash();
      await writer.kill();
    };
    print('PostgreSQL, server killed', await rounds({ url: await server.newDatabase() }, crash));
    await server.stop();
  });
});
