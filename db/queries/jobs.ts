/** Jobs: made, claimed by one worker at a time, done item by item, ended. */
import { and, asc, desc, eq, gt, inArray, lt, or, sql } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { jobItems, jobs } from '@/db/schema';
import type { After } from './study-list';

export type JobRow = typeof jobs.$inferSelect;
export type JobItemRow = typeof jobItems.$inferSelect;

/** Rows of one insert: the protocol takes at most 65,535 values at once. */
const INSERT_ROWS = 5000;

/** A new job with its items, numbered from 1. Run inside a transaction. */
export async function insertJob(
  db: Db,
  values: Omit<typeof jobs.$inferInsert, 'total'>,
  inputs: readonly unknown[],
): Promise<JobRow> {
  const [job] = await db
    .insert(jobs)
    .values({ ...values, total: inputs.length })
    .returning();
  if (!job) throw new Error('an insert gave no row');
  for (let from = 0; from < inputs.length; from += INSERT_ROWS) {
    const rows = inputs.slice(from, from + INSERT_ROWS);
    await db.insert(jobItems).values(rows.map((input, place) => ({ jobId: job.id, number: from + place + 1, input })));
  }
  return job;
}

/** A job of the workspace. */
export async function jobById(db: Db, workspaceId: string, id: string): Promise<JobRow | undefined> {
  const [row] = await db
    .select()
    .from(jobs)
    .where(and(eq(jobs.id, id), eq(jobs.workspaceId, workspaceId)));
  return row;
}

/** A workspace's jobs, the newest first. */
export function jobsPage(
  db: Db,
  {
    workspaceId,
    limit,
    after,
  }: { readonly workspaceId: string; readonly limit: number; readonly after?: After | undefined },
): Promise<JobRow[]> {
  return db
    .select()
    .from(jobs)
    .where(
      and(
        eq(jobs.workspaceId, workspaceId),
        after && or(lt(jobs.createdAt, after.at), and(eq(jobs.createdAt, after.at), lt(jobs.id, after.id))),
      ),
    )
    .orderBy(desc(jobs.createdAt), desc(jobs.id))
    .limit(limit);
}

/** The items of a job behind a number, in order. */
export function itemsPage(
  db: Db,
  { jobId, limit, after }: { readonly jobId: string; readonly limit: number; readonly after: number },
): Promise<JobItemRow[]> {
  return db
    .select()
    .from(jobItems)
    .where(and(eq(jobItems.jobId, jobId), gt(jobItems.number, after)))
    .orderBy(asc(jobItems.number))
    .limit(limit);
}

interface Claim {
  readonly worker: string;
  readonly at: Date;
  /** A running job whose last sign of life is older has lost its worker. */
  readonly staleBefore: Date;
}

/** Takes the oldest job that is free; undefined where none is. Two workers never get the same one. */
export async function claimJob(db: Db, { worker, at, staleBefore }: Claim): Promise<JobRow | undefined> {
  return db.transaction(async (tx) => {
    const [free] = await tx
      .select({ id: jobs.id })
      .from(jobs)
      .where(or(eq(jobs.state, 'queued'), and(eq(jobs.state, 'running'), lt(jobs.heartbeatAt, staleBefore))))
      .orderBy(asc(jobs.createdAt))
      .limit(1)
      .for('update', { skipLocked: true });
    if (!free) return undefined;
    const [job] = await tx
      .update(jobs)
      .set({
        state: 'running',
        lockedBy: worker,
        heartbeatAt: at,
        startedAt: sql`coalesce(${jobs.startedAt}, ${at.toISOString()}::timestamptz)`,
        attempts: sql`${jobs.attempts} + 1`,
      })
      .where(eq(jobs.id, free.id))
      .returning();
    return job;
  });
}

/** The next items to be done. */
export function openItems(db: Db, jobId: string, limit: number): Promise<JobItemRow[]> {
  return db
    .select()
    .from(jobItems)
    .where(and(eq(jobItems.jobId, jobId), eq(jobItems.state, 'queued')))
    .orderBy(asc(jobItems.number))
    .limit(limit);
}

/** What became of an item. */
export interface DoneItem {
  readonly number: number;
  readonly state: 'done' | 'failed';
  readonly output: unknown;
}

/**
 * Holds the job for this worker for the rest of the transaction, counts items and gives a sign of life. False where the job was
 * cancelled or another worker has taken it: then nothing of this transaction may be kept.
 */
export async function holdJob(
  db: Db,
  {
    id,
    worker,
    at,
    items,
  }: { readonly id: string; readonly worker: string; readonly at: Date; readonly items: readonly DoneItem[] },
): Promise<boolean> {
  const failed = items.filter(({ state }) => state === 'failed').length;
  const held = await db
    .update(jobs)
    .set({
      heartbeatAt: at,
      done: sql`${jobs.done} + ${items.length - failed}`,
      failed: sql`${jobs.failed} + ${failed}`,
    })
    .where(and(eq(jobs.id, id), eq(jobs.lockedBy, worker), eq(jobs.state, 'running')))
    .returning({ id: jobs.id });
  return held.length > 0;
}

/** Notes what became of items. */
export async function keepItems(db: Db, jobId: string, items: readonly DoneItem[]): Promise<void> {
  for (const { number, state, output } of items) {
    await db
      .update(jobItems)
      .set({ state, output })
      .where(and(eq(jobItems.jobId, jobId), eq(jobItems.number, number), eq(jobItems.state, 'queued')));
  }
}

/** Ends a job that this worker holds. */
export async function endJob(
  db: Db,
  {
    id,
    worker,
    at,
    state,
    error,
  }: {
    readonly id: string;
    readonly worker: string;
    readonly at: Date;
    readonly state: 'done' | 'failed';
    readonly error?: string;
  },
): Promise<void> {
  await db
    .update(jobs)
    .set({ state, endedAt: at, lockedBy: null, error: error ?? null })
    .where(and(eq(jobs.id, id), eq(jobs.lockedBy, worker), eq(jobs.state, 'running')));
}

/** Cancels a job that has not ended; undefined where it has. */
export async function cancelJob(db: Db, id: string, at: Date): Promise<JobRow | undefined> {
  const [row] = await db
    .update(jobs)
    .set({ state: 'cancelled', endedAt: at, lockedBy: null })
    .where(and(eq(jobs.id, id), inArray(jobs.state, ['queued', 'running'])))
    .returning();
  return row;
}

/** Puts a job that has failed or was cancelled back into the queue; its failed items are tried anew, its done ones stay. */
export async function requeueJob(db: Db, id: string): Promise<JobRow | undefined> {
  return db.transaction(async (tx) => {
    const [row] = await tx
      .update(jobs)
      .set({ state: 'queued', endedAt: null, error: null, lockedBy: null, heartbeatAt: null, failed: 0 })
      .where(
        and(
          eq(jobs.id, id),
          or(inArray(jobs.state, ['failed', 'cancelled']), and(eq(jobs.state, 'done'), gt(jobs.failed, 0))),
        ),
      )
      .returning();
    if (!row) return undefined;
    await tx
      .update(jobItems)
      .set({ state: 'queued', output: null })
      .where(and(eq(jobItems.jobId, id), eq(jobItems.state, 'failed')));
    return row;
  });
}
