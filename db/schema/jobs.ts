/** Long work: kept here, so that it survives a crash and goes on where it was. */
import { sql } from 'drizzle-orm';
import { check, index, integer, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { users } from './accounts';
import { createdAt, id, moment, newestFirst } from './columns';
import { workspaces } from './workspaces';

/** States of a job. The last three are ends. */
export const JOB_STATES = ['queued', 'running', 'done', 'failed', 'cancelled'] as const;

/** States of one item of a job. */
export const JOB_ITEM_STATES = ['queued', 'done', 'failed'] as const;

/** A piece of long work, with its progress counted in items. */
export const jobs = pgTable(
  'jobs',
  {
    id: id(),
    workspaceId: uuid('workspace_id')
      .notNull()
      .references(() => workspaces.id, { onDelete: 'cascade' }),
    /** What does it: `readings`, `import`. */
    kind: text('kind').notNull(),
    state: text('state', { enum: JOB_STATES }).notNull().default('queued'),
    total: integer('total').notNull().default(0),
    done: integer('done').notNull().default(0),
    failed: integer('failed').notNull().default(0),
    input: jsonb('input').$type<Readonly<Record<string, unknown>>>().notNull(),
    createdBy: uuid('created_by').references(() => users.id, { onDelete: 'set null' }),
    /** The key that asked for it, when none of the people did. */
    keyId: uuid('key_id'),
    /** The worker that has it. */
    lockedBy: text('locked_by'),
    /** The last sign of life of that worker: a job whose heartbeat is old is free again. */
    heartbeatAt: moment('heartbeat_at'),
    attempts: integer('attempts').notNull().default(0),
    /** Why it failed, in words for the one who asked. */
    error: text('error'),
    createdAt: createdAt(),
    startedAt: moment('started_at'),
    endedAt: moment('ended_at'),
  },
  (table) => [
    // Workers look for the oldest that is free, many times a minute; ended jobs, the most, are not in the way.
    index('jobs_open').on(table.createdAt).where(sql`${table.state} in ('queued', 'running')`),
    // A workspace's jobs, the newest first.
    index('jobs_workspace').on(table.workspaceId, newestFirst(table.createdAt), newestFirst(table.id)),
    check('jobs_state', sql`${table.state} in ('queued', 'running', 'done', 'failed', 'cancelled')`),
  ],
);

/** One item of a job: a FEN, a game. Job and number are its identity, so nothing is computed or kept twice. */
export const jobItems = pgTable(
  'job_items',
  {
    jobId: uuid('job_id')
      .notNull()
      .references(() => jobs.id, { onDelete: 'cascade' }),
    /** From 1, in the order of the input. */
    number: integer('number').notNull(),
    state: text('state', { enum: JOB_ITEM_STATES }).notNull().default('queued'),
    input: jsonb('input').$type<unknown>(),
    output: jsonb('output').$type<unknown>(),
  },
  (table) => [
    primaryKey({ columns: [table.jobId, table.number] }),
    // The next items to do; those done are not in the way.
    index('job_items_open').on(table.jobId, table.number).where(sql`${table.state} = 'queued'`),
    check('job_items_state', sql`${table.state} in ('queued', 'done', 'failed')`),
  ],
);
