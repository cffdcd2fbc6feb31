/** The whole outside world of a service: who asks, what time it is, the database, where to compute, and whether anyone still waits. */
import type { Db } from '@/db/client';
import type { Actor } from '@/lib/actor';
import { type Computing, computing } from '@/lib/compute/computing';
import { openDb } from '@/lib/database';

export interface Context {
  readonly actor: Actor;
  /** Also in the answer's X-Request-Id header and in every log line. */
  readonly requestId: string;
  readonly now: () => Date;
  /** Asked for where it is used: what computes only, needs none. Throws when the process has not opened one. */
  readonly db: Db;
  readonly compute: Computing;
  /** Aborted when the caller has gone away. */
  readonly signal: AbortSignal;
}

/** The context of a request by this actor, over the database of the process. Copying it by spreading asks for that database. */
export function contextOf(actor: Actor, requestId: string, signal: AbortSignal): Context {
  return {
    actor,
    requestId,
    now: () => new Date(),
    get db() {
      return openDb();
    },
    compute: computing,
    signal,
  };
}
