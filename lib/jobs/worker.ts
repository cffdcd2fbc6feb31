/**
 * The worker of jobs: takes the oldest that is free, does its items in small lots, and keeps each lot in one transaction.
 *
 * A worker that dies leaves its job running without a sign of life; after a while another takes it and goes on with
 * the items that are not done. A lot is kept only while the job is still this worker's, so nothing is done twice.
 */
import { randomUUID } from 'node:crypto';
import {
  claimJob,
  type DoneItem,
  endJob,
  holdJob,
  type JobItemRow,
  type JobRow,
  keepItems,
  openItems,
} from '@/db/queries/jobs';
import type { Db } from '@/db/client';
import type { Computing } from '@/lib/compute/computing';
import { log } from '@/lib/log';

/** What a job's kind does with a lot of its items. */
export interface JobKind {
  /** Computes, outside of any transaction. */
  readonly compute: (world: JobWorld, job: JobRow, items: readonly JobItemRow[]) => Promise<Lot>;
}

/** What became of a lot, and what is to be stored with it in the same transaction. */
export interface Lot {
  readonly items: readonly DoneItem[];
  readonly store?: (tx: Db) => Promise<void>;
}

/** What a worker has of the outside world. */
export interface JobWorld {
  readonly db: Db;
  readonly compute: Computing;
  readonly now: () => Date;
}

interface Options {
  readonly world: JobWorld;
  readonly kinds: Readonly<Record<string, JobKind>>;
  /** Milliseconds between looks at an empty queue. */
  readonly pauseMs?: number;
  /** Milliseconds without a sign of life after which a job is free. */
  readonly staleMs?: number;
  readonly lotItems?: number;
}

export interface JobWorker {
  readonly id: string;
  /** Ends after the lot at hand. */
  readonly stop: () => Promise<void>;
}

const PAUSE_MS = 500;
const STALE_MS = 15_000;
const LOT_ITEMS = 20;
/** A job that has begun so often and never ended takes its workers down. */
const ATTEMPTS_MAX = 5;

/** Starts a worker. */
export function startWorker({
  world,
  kinds,
  pauseMs = PAUSE_MS,
  staleMs = STALE_MS,
  lotItems = LOT_ITEMS,
}: Options): JobWorker {
  const id = randomUUID();
  let stopping = false;
  let wake: (() => void) | undefined;
  const loop = (async () => {
    while (!stopping) {
      const job = await claimed().catch((error: unknown) => {
        log.error({ err: error }, 'jobs could not be looked for');
        return undefined;
      });
      if (job) await work(job);
      else await new Promise<void>((resolve) => ((wake = resolve), setTimeout(resolve, pauseMs).unref()));
    }
  })();

  function claimed(): Promise<JobRow | undefined> {
    const at = world.now();
    return claimJob(world.db, { worker: id, at, staleBefore: new Date(at.getTime() - staleMs) });
  }

  async function work(job: JobRow): Promise<void> {
    const kind = kinds[job.kind];
    try {
      if (!kind) throw new Error(`There is no kind of job "${job.kind}".`);
      if (job.attempts > ATTEMPTS_MAX) throw new Error(`Begun ${job.attempts} times and never ended.`);
      while (!stopping) {
        const items = await openItems(world.db, job.id, lotItems);
        if (items.length === 0)
          return await endJob(world.db, { id: job.id, worker: id, at: world.now(), state: 'done' });
        const lot = await kind.compute(world, job, items);
        if (!(await kept(job, lot))) return;
      }
    } catch (error) {
      log.error({ err: error, job: job.id }, 'a job failed');
      await endJob(world.db, { id: job.id, worker: id, at: world.now(), state: 'failed', error: FAILED }).catch(
        () => undefined,
      );
    }
  }

  /** False where the job is not this worker's any more. */
  function kept(job: JobRow, { items, store }: Lot): Promise<boolean> {
    return world.db.transaction(async (tx) => {
      if (!(await holdJob(tx, { id: job.id, worker: id, at: world.now(), items }))) return false;
      await keepItems(tx, job.id, items);
      await store?.(tx);
      return true;
    });
  }

  return {
    id,
    stop: async () => {
      stopping = true;
      wake?.();
      await loop;
    },
  };
}

/** What the one who asked is told: the reason itself is for the log. */
const FAILED = 'This job failed by our mistake; it can be tried again.';
