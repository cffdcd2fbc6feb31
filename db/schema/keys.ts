/** API keys, what they have used, the limits, and replies kept for requests that are sent again. */
import { sql } from 'drizzle-orm';
import { date, index, integer, jsonb, pgTable, primaryKey, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { users } from './accounts';
import { createdAt, id, moment, newestFirst } from './columns';
import { workspaces } from './workspaces';

/** A key of a workspace. The key itself is shown once and never stored. */
export const apiKeys = pgTable(
  'api_keys',
  {
    id: id(),
    workspaceId: uuid('workspace_id')
      .notNull()
      .references(() => workspaces.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    /** The beginning of the key, by which its owner recognises it. */
    prefix: text('prefix').notNull(),
    /** SHA-256 of the whole key, in hex: unique, and so also the way a key is found. */
    hash: text('hash').notNull().unique(),
    scopes: text('scopes').array().notNull(),
    createdBy: uuid('created_by').references(() => users.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    expiresAt: moment('expires_at'),
    revokedAt: moment('revoked_at'),
    usedAt: moment('used_at'),
  },
  // The keys page: a workspace's keys, the newest first.
  (table) => [index('api_keys_workspace').on(table.workspaceId, newestFirst(table.createdAt))],
);

/** How often a key made a call on a day (UTC). */
export const keyUsage = pgTable(
  'key_usage',
  {
    keyId: uuid('key_id')
      .notNull()
      .references(() => apiKeys.id, { onDelete: 'cascade' }),
    /** `2026-03-31`. */
    day: date('day', { mode: 'string' }).notNull(),
    /** The id of the contract. */
    call: text('call').notNull(),
    count: integer('count').notNull().default(0),
  },
  // In this order a key's last days are one range of the primary key.
  (table) => [primaryKey({ columns: [table.keyId, table.day, table.call] })],
);

/** Points used against a limit (calls of a key, tries of a password), in the shape that rate-limiter-flexible asks for. */
export const rateLimits = pgTable(
  'rate_limits',
  {
    key: text('key').primaryKey(),
    points: integer('points').notNull(),
    /** Without a value: never expires. */
    expire: timestamp('expire', { withTimezone: true, precision: 3, mode: 'date' }),
  },
  // Expired rows are swept by time.
  (table) => [index('rate_limits_expire').on(table.expire)],
);

/** The reply to a POST that stores, kept so that the same request sent again stores nothing twice. */
export const idempotencyKeys = pgTable(
  'idempotency_keys',
  {
    /** Whose: the id of a key, or of a person. The same text from two callers is two keys. */
    owner: text('owner').notNull(),
    key: text('key').notNull(),
    /** The id of the contract. */
    call: text('call').notNull(),
    /** SHA-256 of the body: another body under the same key is refused. */
    bodyHash: text('body_hash').notNull(),
    /** Null while the first request is still at work. */
    status: integer('status'),
    reply: jsonb('reply').$type<unknown>(),
    /** Headers of the reply that are not made anew for each answer: Location, ETag. */
    headers: jsonb('headers').$type<Readonly<Record<string, string>>>().notNull().default(sql`'{}'::jsonb`),
    createdAt: createdAt(),
  },
  (table) => [
    primaryKey({ columns: [table.owner, table.key] }),
    // Old ones are swept by age.
    index('idempotency_keys_age').on(table.createdAt),
  ],
);
