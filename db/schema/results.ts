/** What was computed: readings by position, and the comparisons, routes and exchange tests kept in a study. */
import { sql } from 'drizzle-orm';
import { check, index, jsonb, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import type { Reading } from '@/engine/reading/schema';
import { users } from './accounts';
import { createdAt, deletedAt, id, moment, updatedAt, version } from './columns';
import { studies } from './studies';

/** A reading, computed once for everyone: it belongs to no workspace and says nothing of who asked. */
export const readings = pgTable(
  'readings',
  {
    positionKey: text('position_key').notNull(),
    engineVersion: text('engine_version').notNull(),
    reading: jsonb('reading').$type<Reading>().notNull(),
    computedAt: moment('computed_at').notNull().defaultNow(),
  },
  (table) => [
    primaryKey({ columns: [table.positionKey, table.engineVersion] }),
    // Readings of an engine that is gone are swept by version.
    index('readings_engine').on(table.engineVersion),
  ],
);

/** What kinds of results a study keeps. */
export const RESULT_KINDS = ['comparison', 'route', 'exchange'] as const;

/** A result kept in a study: what was asked, what came out, and which engine said so. */
export const results = pgTable(
  'results',
  {
    id: id(),
    studyId: uuid('study_id')
      .notNull()
      .references(() => studies.id, { onDelete: 'cascade' }),
    kind: text('kind', { enum: RESULT_KINDS }).notNull(),
    title: text('title').notNull().default(''),
    /** Markdown. */
    note: text('note').notNull().default(''),
    request: jsonb('request').$type<unknown>().notNull(),
    result: jsonb('result').$type<unknown>().notNull(),
    engineVersion: text('engine_version').notNull(),
    computedAt: moment('computed_at').notNull().defaultNow(),
    version: version(),
    createdBy: uuid('created_by').references(() => users.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
    deletedAt: deletedAt(),
  },
  (table) => [
    // A study's results of one kind, the oldest first.
    index('results_study')
      .on(table.studyId, table.kind, table.createdAt, table.id)
      .where(sql`${table.deletedAt} is null`),
    check('results_kind', sql`${table.kind} in ('comparison', 'route', 'exchange')`),
  ],
);
