/** Dump and restore: everything, from either database to either, or nothing. */
import { execFile } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { promisify } from 'node:util';
import { gunzipSync, gzipSync } from 'node:zlib';
import { afterAll, describe, expect, it } from 'vitest';
import { type Database, type Db, openDatabase } from '@/db/client';
import { dumpDatabase, restoreDatabase } from '@/db/dump';
import { positionsOf } from '@/db/queries/studies';
import { isPeopled } from '@/db/queries/users';
import { apiKeys, gamePositions, games, keyUsage, positions, readings, results, studies } from '@/db/schema';
import { ENGINE_VERSION, readFen } from '@/engine';
import { answerRequest, dumpToFile, restoreFromFile } from '@/lib/backup';
import { seedDemo } from '@/lib/cli/seed-demo';
import { describeOnBoth } from '@/tests/support/databases';
import { startPostgres } from '@/tests/support/postgres';
import { emptyDatabase, MIGRATIONS } from '@/tests/support/world';

/** All kinds of values that could suffer: long decimals, arrays, documents, every line end of Unicode, dates and moments. */
async function fill({ db }: Database): Promise<void> {
  await seedDemo(db, 'a password of a test');
  const [study] = await db.select().from(studies).limit(1);
  if (!study) throw new Error('the demo has no study');
  const { id: studyId, workspaceId } = study;
  const fen = '8/8/8/3k4/8/3K4/3P4/8 w - - 0 1';
  const reading = readFen(fen, 'strict');
  if (!reading.ok) throw new Error(fen);
  await db.insert(readings).values({ positionKey: fen, engineVersion: ENGINE_VERSION, reading: reading.value });
  const order = '3.00000000000000000000000000000000000000000000000001';
  const note = 'a\nb\r\nc\u2028d\u2029e\t"\\ {} [] 🏰 \u0085';
  await db.insert(positions).values({ studyId, order, fen, positionKey: fen, note, deletedAt: new Date(0) });
  const result = { deep: [1, null, 'x', { y: 1e21 }], number: 0.1 };
  await db.insert(results).values({ studyId, kind: 'route', request: { a: [] }, result, engineVersion: '1' });
  const [game] = await db.insert(games).values({ studyId, pgn: '1. e4 *', fingerprint: 'f' }).returning();
  const gameId = game?.id ?? '';
  await db.insert(gamePositions).values({ gameId, ply: 0, fen, positionKey: fen, structures: ['a,b', 'c"d', ''] });
  const [key] = await db
    .insert(apiKeys)
    .values({ workspaceId, name: 'k', prefix: 'p', hash: 'h', scopes: ['compute'] })
    .returning();
  await db.insert(keyUsage).values({ keyId: key?.id ?? '', day: '2026-02-28', call: 'x', count: 2_147_483_647 });
  // More than are fetched or written at once.
  const many = Array.from({ length: 501 }, (_, ply) => ({ gameId, ply: ply + 1, fen, positionKey: fen }));
  await db.insert(gamePositions).values(many);
}

async function linesOf(db: Db): Promise<string[]> {
  const lines: string[] = [];
  await dumpDatabase(db, new Date('2026-03-01T00:00:00Z'), async (line) => void lines.push(line));
  return lines;
}

async function* given(lines: readonly string[]): AsyncGenerator<string> {
  yield* lines;
}

/** Lines that one dump has and the other has not, cut short; rows may come in another order. The first line has the time. */
function differences(one: readonly string[], two: readonly string[]): string[] {
  const missing = (from: readonly string[], among: ReadonlySet<string>) => from.filter((line) => !among.has(line));
  const [left, right] = [one.slice(1), two.slice(1)];
  return [...missing(left, new Set(right)), ...missing(right, new Set(left))].map((line) => line.slice(0, 120));
}

function linesIn(file: string): string[] {
  return gunzipSync(readFileSync(file)).toString().trimEnd().split('\n');
}

describeOnBoth('dump and restore', ({ fresh }) => {
  it('bring back every row of every table as it was', { timeout: 60_000 }, async () => {
    const [first, second] = [await fresh(), await fresh()];
    await fill(first);
    const lines = await linesOf(first.db);
    const rows = await restoreDatabase(second.db, given(lines));
    expect(rows).toBeGreaterThan(550);
    expect(differences(await linesOf(second.db), lines)).toEqual([]);
    const [study] = await second.db.select().from(studies).limit(1);
    expect(await positionsOf(second.db, study?.id ?? '')).toEqual(await positionsOf(first.db, study?.id ?? ''));
  });

  it('refuse a database that has rows, and change nothing', async () => {
    const database = await fresh();
    await fill(database);
    const lines = await linesOf(database.db);
    await expect(restoreDatabase(database.db, given(lines))).rejects.toThrow('The database is not empty');
    expect(await linesOf(database.db)).toEqual(lines);
  });

  it('restore nothing of a dump that is cut, altered or of another version', { timeout: 60_000 }, async () => {
    const first = await fresh();
    await fill(first);
    const lines = await linesOf(first.db);
    const nothing = await fresh();
    const empty = await linesOf(nothing.db);
    const row = lines.findIndex((line) => line.startsWith('['));
    const table = lines.findIndex((line) => line.startsWith('{"table"'));
    const head = (change: object) => JSON.stringify({ ...JSON.parse(lines[table] ?? ''), ...change });
    const bad: readonly (readonly [string, readonly string[]])[] = [
      ['ends in the middle', lines.slice(0, -1)],
      ['ends in the middle', []],
      [
        'rows, and has',
        lines.toSpliced(
          lines.findLastIndex((line) => line.startsWith('[')),
          1,
        ),
      ],
      ['not a dump', lines.slice(1)],
      ['not understood', lines.toSpliced(row, 0, 'what?')],
      ['were refused', lines.toSpliced(row, 1, '[{]')],
      ['goes on after its end', [...lines, ...lines]],
      ['the table later, which', lines.toSpliced(table, 1, head({ table: 'later' }))],
      ['the column', lines.toSpliced(table, 1, head({ columns: ['later'] }))],
    ];
    for (const [words, altered] of bad) {
      await expect(restoreDatabase(nothing.db, given(altered))).rejects.toThrow(words);
    }
    expect(await linesOf(nothing.db)).toEqual(empty);
  });

  it('give a column that the dump does not know yet what a new row has', async () => {
    const [first, second] = [await fresh(), await fresh()];
    await fill(first);
    const older = (await linesOf(first.db)).map((line) =>
      line.startsWith('{"table":"studies"') ? line.replace('"summary",', '') : line,
    );
    await restoreDatabase(second.db, given(older));
    const rows = await second.db.select({ summary: studies.summary }).from(studies);
    expect(new Set(rows.map(({ summary }) => summary))).toEqual(new Set(['']));
  });
});

describe('from one kind of database to the other', () => {
  it('and back leaves every row as it was', { timeout: 120_000 }, async () => {
    const server = await startPostgres();
    const first = await emptyDatabase();
    const there = await openDatabase({ url: await server.newDatabase() });
    const back = await emptyDatabase();
    await there.migrate(MIGRATIONS);
    await fill(first);
    const lines = await linesOf(first.db);
    await restoreDatabase(there.db, given(lines));
    const rows = await restoreDatabase(back.db, given(await linesOf(there.db)));
    expect(differences(await linesOf(back.db), lines)).toEqual([]);
    console.log(`dump and restore, PGlite to PostgreSQL and back: ${rows} rows in ${lines.length} lines, equal`);
    for (const database of [first, there, back]) await database.close();
    await server.stop();
  });
});

describe('the commands', () => {
  const folder = mkdtempSync(join(tmpdir(), 'waypost-dump-'));
  afterAll(() => rmSync(folder, { recursive: true, force: true }));
  const waypost = (data: string, ...words: string[]) =>
    promisify(execFile)(process.execPath, ['--import', 'tsx', 'lib/cli/waypost.ts', ...words], {
      env: { ...process.env, WAYPOST_DATA: join(folder, data), DATABASE_URL: '' },
    });
  const file = join(folder, 'kept.gz');

  it('seed once, dump, and restore into a second folder', { timeout: 120_000 }, async () => {
    const seeded = await waypost('one', 'seed');
    expect(seeded.stdout).toMatch(/owner +maren@lantern-quay\.example\n[^]*\npassword \S{12}\n$/);
    expect((await waypost('one', 'seed')).stdout).toBe(seeded.stdout);
    expect((await waypost('one', 'dump', file)).stdout).toMatch(/^\d+ rows of .*\/one\/database are in .*kept\.gz\n$/);
    expect(statSync(file).mode & 0o777).toBe(0o600);
    expect((await waypost('two', 'restore', file)).stdout).toMatch(
      /^\d+ rows of .*kept\.gz are in .*\/two\/database\n$/,
    );
    const two = await openDatabase({ folder: join(folder, 'two/database') });
    expect(differences(await linesOf(two.db), linesIn(file))).toEqual([]);
    await two.close();
    const password = /password (\S+)/.exec(seeded.stdout)?.[1] ?? '';
    expect(linesIn(file).join('\n')).not.toContain(password);
  });

  it('dump by the server that has the database', { timeout: 60_000 }, async () => {
    const database = await openDatabase({ folder: join(folder, 'one/database') });
    const live = join(folder, 'live.gz');
    await expect(waypost('one', 'dump', live)).rejects.toMatchObject({
      code: 1,
      stderr: expect.stringContaining(`in use by process ${process.pid}`),
    });
    database.answerWith?.((request) => answerRequest(database.db, request));
    expect((await waypost('one', 'dump', live)).stdout).toMatch(/^\d+ rows of .* are in .*live\.gz\n$/);
    const again = waypost('one', 'dump', live);
    await expect(again).rejects.toMatchObject({ code: 1, stderr: expect.stringContaining('was not touched') });
    await database.close();
    expect(differences(linesIn(live), linesIn(file))).toEqual([]);
  });

  it('say in a sentence why they cannot, and change nothing', { timeout: 60_000 }, async () => {
    const kept = readFileSync(file);
    const { db, close } = await emptyDatabase();
    await expect(dumpToFile(db, file)).rejects.toThrow('already; it was not touched');
    expect(readFileSync(file)).toEqual(kept);
    await expect(dumpToFile(db, '/nowhere/x.gz')).rejects.toThrow('/nowhere/x.gz cannot be written');
    await expect(restoreFromFile(db, join(folder, 'nothing.gz'))).rejects.toThrow('There is no file');
    const bad = join(folder, 'bad.gz');
    writeFileSync(bad, kept.subarray(0, kept.length / 2));
    await expect(restoreFromFile(db, bad)).rejects.toThrow('cannot be read');
    writeFileSync(bad, gzipSync('hello\n'));
    await expect(restoreFromFile(db, bad)).rejects.toThrow('not understood');
    expect(await isPeopled(db)).toBe(false);
    expect(await restoreFromFile(db, file)).toBeGreaterThan(50);
    await expect(restoreFromFile(db, file)).rejects.toThrow('is not empty');
    await close();
    await expect(waypost('one', 'dump')).rejects.toMatchObject({
      code: 2,
      stderr: expect.stringContaining('takes one file'),
    });
  });
});
