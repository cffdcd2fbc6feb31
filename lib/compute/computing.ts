/**
 * Where readings are computed: beside the web server's thread, so that it goes on answering meanwhile.
 *
 * A request costs the server's thread as much again as its reading takes; with the reading on a thread of its own both go on
 * at once. In development and tests the same jobs run in place, for a thread cannot load TypeScript without a loader.
 */
import { availableParallelism } from 'node:os';
import { Worker } from 'node:worker_threads';
import { env } from '@/lib/env';
import { doJob, type Job, type Outcome } from './jobs';
import type { Answered, Asked } from './messages';

export interface Computing {
  /** Does a job; rejects only when the job failed by our own mistake. */
  readonly run: <J extends Job>(job: J) => Promise<Outcome<J>>;
}

/** Jobs done in place. Each waits for its turn of the event loop first, so that a long row of them leaves room for others. */
export const inPlace: Computing = {
  run: async (job) => {
    await new Promise((resolve) => setImmediate(resolve));
    return doJob(job);
  },
};

interface Waiting {
  readonly resolve: (outcome: Outcome<Job>) => void;
  readonly reject: (error: Error) => void;
}

/** Jobs done by one thread, in the order they are asked. A thread that dies fails its jobs and is followed by another. */
export class ComputingThread implements Computing {
  readonly #start: () => Worker;
  readonly #waiting = new Map<number, Waiting>();
  #worker: Worker | undefined;
  #count = 0;

  /** `start` starts a thread that runs lib/compute/thread.ts. */
  constructor(start: () => Worker) {
    this.#start = start;
  }

  /** How many jobs are not answered yet. */
  get pending(): number {
    return this.#waiting.size;
  }

  readonly run = <J extends Job>(job: J): Promise<Outcome<J>> => {
    const id = this.#count++;
    const asked: Asked = { id, job };
    return new Promise((resolve, reject) => {
      this.#waiting.set(id, { resolve: resolve as Waiting['resolve'], reject });
      this.#started().postMessage(asked);
    });
  };

  /** Ends the thread; jobs not answered yet fail. */
  async stop(): Promise<void> {
    await this.#worker?.terminate();
  }

  #started(): Worker {
    if (this.#worker) return this.#worker;
    const worker = this.#start();
    worker.unref();
    worker.on('message', (answered: Answered) => this.#settle(answered));
    worker.on('error', (error) => this.#fail(worker, error));
    worker.on('exit', () => this.#fail(worker, new Error('The computing thread has ended.')));
    this.#worker = worker;
    return worker;
  }

  #settle(answered: Answered): void {
    const waiting = this.#waiting.get(answered.id);
    this.#waiting.delete(answered.id);
    if ('outcome' in answered) waiting?.resolve(answered.outcome);
    else waiting?.reject(new Error(answered.mistake));
  }

  /** An error is followed by an end: by then another thread may be at work already. */
  #fail(worker: Worker, error: Error): void {
    if (worker !== this.#worker) return;
    this.#worker = undefined;
    const failed = [...this.#waiting.values()];
    this.#waiting.clear();
    for (const { reject } of failed) reject(error);
  }
}

/** The build finds the thread's file by this very form, and puts it beside its own. */
function builtThread(): Worker {
  return new Worker(new URL('./thread.ts', import.meta.url));
}

/** Several threads; a job goes to the one with the fewest before it. */
function threads(count: number): Computing {
  const all = Array.from({ length: count }, () => new ComputingThread(builtThread));
  return {
    run: (job) => all.reduce((least, thread) => (thread.pending < least.pending ? thread : least)).run(job),
  };
}

/** The server's thread keeps a core for itself; more than three more would compute faster than it can send. */
const THREADS_MAX = 3;

/** Where this process computes. */
export const computing: Computing = env.isProduction
  ? threads(Math.min(THREADS_MAX, Math.max(1, availableParallelism() - 1)))
  : inPlace;
