/** Studies, the positions in them, with whom they are shared, and every change with who and when. */
import { sql } from 'drizzle-orm';
import {
  check,
  index,
  integer,
  jsonb,
  numeric,
  pgTable,
  primaryKey,
  text,
  uniqueIndex,
  uuid,
} from 'drizzle-orm/pg-core';
import { users } from './accounts';
import { createdAt, deletedAt, id, moment, newestFirst, updatedAt, version } from './columns';
import { workspaces } from './workspaces';

/** A folder of positions, games and results on one subject. */
export const studies = pgTable(
  'studies',
  {
    id: id(),
    workspaceId: uuid('workspace_id')
      .notNull()
      .references(() => workspaces.id, { onDelete: 'cascade' }),
    title: text('title').notNull(),
    summary: text('summary').notNull().default(''),
    version: version(),
    createdBy: uuid('created_by').references(() => users.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
    deletedAt: deletedAt(),
  },
  (table) => [
    // The list of studies, last changed first, by cursor.
    index('studies_list')
      .on(table.workspaceId, newestFirst(table.updatedAt), newestFirst(table.id))
      .where(sql`${table.deletedAt} is null`),
    // The trash, and its emptying.
    index('studies_trash').on(table.workspaceId, table.deletedAt).where(sql`${table.deletedAt} is not null`),
  ],
);

/** A student to whom a study is shown. */
export const studyShares = pgTable(
  'study_shares',
  {
    studyId: uuid('study_id')
      .notNull()
      .references(() => studies.id, { onDelete: 'cascade' }),
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    createdAt: createdAt(),
  },
  (table) => [
    primaryKey({ columns: [table.studyId, table.userId] }),
    // What is shared with one student.
    index('study_shares_user').on(table.userId),
  ],
);

/** A position in a study: the diagram, what is said of it, and how it is shown. */
export const positions = pgTable(
  'positions',
  {
    id: id(),
    studyId: uuid('study_id')
      .notNull()
      .references(() => studies.id, { onDelete: 'cascade' }),
    /** Place in the study, a decimal of any length as text: between two there is always another, and moving one writes one. */
    order: numeric('order').notNull(),
    fen: text('fen').notNull(),
    /** By which the reading is found. */
    positionKey: text('position_key').notNull(),
    title: text('title').notNull().default(''),
    /** Markdown. */
    note: text('note').notNull().default(''),
    marks: jsonb('marks').$type<readonly unknown[]>().notNull().default([]),
    /** The layer the plate shows; null: the reader's choice. */
    layer: text('layer'),
    /** The square of the man whose layer is shown, as `f3`. */
    man: text('man'),
    version: version(),
    createdBy: uuid('created_by').references(() => users.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    updatedAt: updatedAt(),
    deletedAt: deletedAt(),
  },
  (table) => [
    // A study's positions in their order.
    index('positions_study').on(table.studyId, table.order, table.id).where(sql`${table.deletedAt} is null`),
    // Which studies hold a position: for recomputing after a new engine, and for search.
    index('positions_key').on(table.positionKey),
  ],
);

/** What a change can be of. */
export const ENTITIES = ['study', 'position', 'result', 'game'] as const;

/** What was done in a change. */
export const CHANGE_KINDS = ['create', 'update', 'delete', 'restore'] as const;

/** The history of a study: what stood before and after, who and when. The version is the one after the change. */
export const changes = pgTable(
  'changes',
  {
    id: id(),
    workspaceId: uuid('workspace_id')
      .notNull()
      .references(() => workspaces.id, { onDelete: 'cascade' }),
    studyId: uuid('study_id')
      .notNull()
      .references(() => studies.id, { onDelete: 'cascade' }),
    entity: text('entity', { enum: ENTITIES }).notNull(),
    entityId: uuid('entity_id').notNull(),
    version: integer('version').notNull(),
    kind: text('kind', { enum: CHANGE_KINDS }).notNull(),
    at: moment('at').notNull().defaultNow(),
    userId: uuid('user_id').references(() => users.id, { onDelete: 'set null' }),
    keyId: uuid('key_id'),
    before: jsonb('before').$type<Readonly<Record<string, unknown>> | null>(),
    after: jsonb('after').$type<Readonly<Record<string, unknown>> | null>(),
  },
  (table) => [
    // One change makes one version: two editors who both believed to have made version 5 cannot both be kept.
    uniqueIndex('changes_version').on(table.entityId, table.version),
    // Deleting a workspace asks for its changes; what was last done in a workspace.
    index('changes_workspace').on(table.workspaceId, newestFirst(table.at)),
    // A study's history, the newest first, by cursor.
    index('changes_study').on(table.studyId, newestFirst(table.at), newestFirst(table.id)),
    check('changes_entity', sql`${table.entity} in ('study', 'position', 'result', 'game')`),
    check('changes_kind', sql`${table.kind} in ('create', 'update', 'delete', 'restore')`),
  ],
);
