/** The server's beginning and its graceful end. */
import { subscribe } from 'node:diagnostics_channel';
import type { Server } from 'node:http';
import { answerRequest } from '@/lib/backup';
import { markAddresses } from '@/lib/address';
import { computing } from '@/lib/compute/computing';
import { closeDatabase, openDb, openedDatabase } from '@/lib/database';
import { env } from '@/lib/env';
import { JOB_KINDS } from '@/lib/jobs/kinds';
import { startWorker } from '@/lib/jobs/worker';
import { log } from '@/lib/log';

/** How long requests under way may take to finish once the server is asked to end. */
const FINISH_TIMEOUT_MS = 10_000;

const STEPS = Symbol.for('waypost.stop');
const process_ = globalThis as typeof globalThis & { [STEPS]?: (() => Promise<void>)[] };
const steps = (process_[STEPS] ??= []);

/** Something to be ended before the database closes, such as a worker of jobs. Steps run in the order they came. */
function beforeStop(step: () => Promise<void>): void {
  steps.push(step);
}

/** Opens the database and arranges the end. Ends the process when the database cannot be opened: it could answer nothing right. */
export async function startServer(): Promise<void> {
  try {
    const { db, answerWith } = await openedDatabase();
    answerWith?.((request) => answerRequest(db, request));
  } catch (error) {
    log.fatal({ err: error }, 'the database could not be opened');
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  }
  markAddresses(env.proxies);
  const worker = startWorker({ world: { db: openDb(), compute: computing, now: () => new Date() }, kinds: JOB_KINDS });
  beforeStop(worker.stop);
  const servers = serversSeen();
  let stopping = false;
  for (const signal of ['SIGTERM', 'SIGINT', 'SIGHUP'] as const) {
    process.on(signal, () => {
      if (stopping) return;
      stopping = true;
      void stop(servers).then((code) => process.exit(code));
    });
  }
}

/** The servers of this process that had a request: Next keeps its own to itself, and one without requests has none to finish. */
function serversSeen(): Set<Server> {
  const servers = new Set<Server>();
  subscribe('http.server.request.start', (message) => {
    const { server } = message as { readonly server?: Server };
    if (server) servers.add(server);
  });
  return servers;
}

/** Refuses new connections, lets requests finish, then ends what was named and the database. Gives the exit code. */
async function stop(servers: Iterable<Server>): Promise<0 | 1> {
  const deadline = new Promise<void>((resolve) => setTimeout(resolve, FINISH_TIMEOUT_MS).unref());
  const finished = [...servers].map((server) => new Promise<void>((resolve) => server.close(() => resolve())));
  await Promise.race([Promise.all(finished), deadline]);
  try {
    for (const step of steps) await step();
    await closeDatabase();
    return 0;
  } catch (error) {
    log.error({ err: error }, 'the end was not graceful');
    return 1;
  }
}
