/** Jobs: done once each, item by item, whatever becomes of a worker; cancelled, tried again, bad items named in their place. */
import { type ChildProcess, spawn } from 'node:child_process';
import { eq, sql } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { type Database, type Db, openDatabase } from '@/db/client';
import { cancelJob, insertJob, itemsPage, jobById, type JobRow, requeueJob } from '@/db/queries/jobs';
import { insertStudy, positionsOf } from '@/db/queries/studies';
import { insertWorkspace } from '@/db/queries/workspaces';
import { jobItems, readings } from '@/db/schema';
import { inPlace } from '@/lib/compute/computing';
import { JOB_KINDS } from '@/lib/jobs/kinds';
import { startWorker } from '@/lib/jobs/worker';
import { describeOnBoth } from '@/tests/support/databases';
import { startPostgres } from '@/tests/support/postgres';
import { realPositions } from '@/tests/support/real-positions';
import { MIGRATIONS } from '@/tests/support/world';

const TIMEOUT_MS = 180_000;
/** As many as the figure asks for when it is asked for: JOBS=10000. */
const POSITIONS = Number(process.env.JOBS ?? 600);

async function workspaceIn({ db }: Pick<Database, 'db'>): Promise<string> {
  const row = await insertWorkspace(db, { name: 'Work', slug: `work-${Math.random()}` });
  return row!.id;
}

async function ended(db: Db, workspaceId: string, id: string): Promise<JobRow> {
  for (;;) {
    const job = await jobById(db, workspaceId, id);
    if (job && !['queued', 'running'].includes(job.state)) return job;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
}

function worker(db: Db) {
  return startWorker({ world: { db, compute: inPlace, now: () => new Date() }, kinds: JOB_KINDS, pauseMs: 20 });
}

describeOnBoth('jobs', ({ fresh }) => {
  it(
    'read each position once, and name the bad ones in their place',
    async () => {
      const database = await fresh();
      const workspaceId = await workspaceIn(database);
      const good = realPositions(25);
      const fens = [...good.slice(0, 10), 'not a position', ...good.slice(10), good[0]!];
      const job = await database.db.transaction((tx) =>
        insertJob(tx, { workspaceId, kind: 'readings', input: {} }, fens),
      );
      const working = worker(database.db);
      const done = await ended(database.db, workspaceId, job.id);
      await working.stop();
      expect([done.state, done.total, done.done, done.failed]).toEqual(['done', 27, 26, 1]);
      const items = await itemsPage(database.db, { jobId: job.id, limit: 100, after: 0 });
      expect(items.filter(({ state }) => state === 'failed').map(({ number }) => number)).toEqual([11]);
      const [count] = await database.db.select({ count: sql<number>`count(*)::int` }).from(readings);
      expect(count?.count).toBe(new Set(good.map((fen) => fen.split(' ').slice(0, 4).join(' '))).size);
    },
    TIMEOUT_MS,
  );

  it('import lines into a study in their order, the good ones kept', async () => {
    const database = await fresh();
    const workspaceId = await workspaceIn(database);
    const study = await insertStudy(database.db, { workspaceId, title: 'Imported' });
    const [one, two] = realPositions(2);
    const lines = [`${one}\tThe first`, 'nothing', two!].map((text, place) => ({ line: place + 1, text }));
    const input = { study: study.id, format: 'fens' };
    const job = await database.db.transaction((tx) => insertJob(tx, { workspaceId, kind: 'import', input }, lines));
    const working = worker(database.db);
    expect(await ended(database.db, workspaceId, job.id)).toMatchObject({ done: 2, failed: 1, state: 'done' });
    await working.stop();
    const kept = await positionsOf(database.db, study.id);
    expect(kept.map(({ title, fen }) => [title, fen])).toEqual([
      ['The first', one],
      ['', two],
    ]);
  });

  it('that are cancelled stay so, and go on when they are tried again', async () => {
    const database = await fresh();
    const workspaceId = await workspaceIn(database);
    const job = await database.db.transaction((tx) =>
      insertJob(tx, { workspaceId, kind: 'readings', input: {} }, realPositions(3)),
    );
    expect((await cancelJob(database.db, job.id, new Date()))?.state).toBe('cancelled');
    const working = worker(database.db);
    await new Promise((resolve) => setTimeout(resolve, 200));
    expect((await jobById(database.db, workspaceId, job.id))?.done).toBe(0);
    expect((await requeueJob(database.db, job.id))?.state).toBe('queued');
    expect(await ended(database.db, workspaceId, job.id)).toMatchObject({ state: 'done', done: 3 });
    await working.stop();
    expect(await requeueJob(database.db, job.id)).toBeUndefined();
  });

  it('of a kind that nobody knows fail, in words, and hold up no other', async () => {
    const database = await fresh();
    const workspaceId = await workspaceIn(database);
    const bad = await database.db.transaction((tx) =>
      insertJob(tx, { workspaceId, kind: 'juggling', input: {} }, ['x']),
    );
    const good = await database.db.transaction((tx) =>
      insertJob(tx, { workspaceId, kind: 'readings', input: {} }, realPositions(1)),
    );
    const working = worker(database.db);
    expect(await ended(database.db, workspaceId, bad.id)).toMatchObject({ state: 'failed', error: expect.any(String) });
    expect(await ended(database.db, workspaceId, good.id)).toMatchObject({ state: 'done' });
    await working.stop();
  });
});

/** A process with a worker. */
function startProcess(url: string): { readonly child: ChildProcess; readonly kept: () => number } {
  const child = spawn(process.execPath, ['--import', 'tsx', 'tests/db/work-jobs.ts', url], {
    stdio: ['ignore', 'pipe', 'inherit'],
  });
  let kept = 0;
  child.stdout?.on('data', (part: Buffer) => {
    for (const line of String(part).split('\n')) kept += Number(/^kept (\d+)/.exec(line)?.[1] ?? 0);
  });
  return { child, kept: () => kept };
}

describe('two workers on one PostgreSQL', () => {
  it(
    `read ${POSITIONS} positions, once each, though one is killed on the way`,
    async () => {
      const postgres = await startPostgres();
      const url = await postgres.newDatabase();
      const database = await openDatabase({ url });
      try {
        await database.migrate(MIGRATIONS);
        const workspaceId = await workspaceIn(database);
        const fens = realPositions(POSITIONS);
        const halves = [fens.slice(0, POSITIONS / 2), fens.slice(POSITIONS / 2)];
        const jobs: JobRow[] = [];
        for (const half of halves)
          jobs.push(
            await database.db.transaction((tx) => insertJob(tx, { workspaceId, kind: 'readings', input: {} }, half)),
          );
        const [first, second] = [startProcess(url), startProcess(url)];
        while (first.kept() < POSITIONS / 8) await new Promise((resolve) => setTimeout(resolve, 10));
        first.child.kill('SIGKILL');
        for (const job of jobs)
          expect(await ended(database.db, workspaceId, job.id)).toMatchObject({
            state: 'done',
            done: POSITIONS / 2,
            failed: 0,
          });
        second.child.kill('SIGKILL');
        const [open] = await database.db
          .select({ count: sql<number>`count(*)::int` })
          .from(jobItems)
          .where(eq(jobItems.state, 'queued'));
        const [count] = await database.db.select({ count: sql<number>`count(*)::int` }).from(readings);
        expect(open?.count).toBe(0);
        expect(count?.count).toBe(new Set(fens.map((fen) => fen.split(' ').slice(0, 4).join(' '))).size);
      } finally {
        await database.close();
        await postgres.stop();
      }
    },
    TIMEOUT_MS * 4,
  );
});
