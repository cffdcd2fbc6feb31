/** People and how they sign in. Users, accounts and verification tokens have the shape that next-auth's adapter asks for. */
import { sql } from 'drizzle-orm';
import { check, index, integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt, deletedAt, id, moment, newestFirst } from './columns';

/** A person. One who left stays as a row without address, name or password, so that histories keep their 'who'. */
export const users = pgTable(
  'users',
  {
    id: id(),
    /** As the person wrote it. */
    email: text('email'),
    /** The address in NFKC and lower case: the same address in other dress is the same person. */
    emailKey: text('email_key').unique(),
    name: text('name'),
    /** argon2id in its own text form; null: signs in by link only. */
    passwordHash: text('password_hash'),
    emailVerified: moment('email_verified'),
    /** Asked for by the adapter; never filled. */
    image: text('image'),
    /** Raised to end every session at once: a session carries the version it was made under. */
    tokenVersion: integer('token_version').notNull().default(1),
    createdAt: createdAt(),
    deletedAt: deletedAt(),
  },
  (table) => [
    check(
      'users_has_address',
      sql`${table.deletedAt} is not null or (${table.email} is not null and ${table.emailKey} is not null)`,
    ),
  ],
);

/** A sign-in by another service. None is offered yet; the adapter asks for the table. */
export const accounts = pgTable(
  'accounts',
  {
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    type: text('type').$type<'email' | 'oauth' | 'oidc' | 'webauthn'>().notNull(),
    provider: text('provider').notNull(),
    providerAccountId: text('provider_account_id').notNull(),
    refresh_token: text('refresh_token'),
    access_token: text('access_token'),
    expires_at: integer('expires_at'),
    token_type: text('token_type'),
    scope: text('scope'),
    id_token: text('id_token'),
    session_state: text('session_state'),
  },
  (table) => [
    primaryKey({ columns: [table.provider, table.providerAccountId] }),
    // Deleting a person asks for all of theirs.
    index('accounts_user').on(table.userId),
  ],
);

/** Links sent by e-mail, hashed, each good once. The identifier is an address, or a purpose and an address. */
export const verificationTokens = pgTable(
  'verification_tokens',
  {
    identifier: text('identifier').notNull(),
    token: text('token').notNull(),
    expires: moment('expires').notNull(),
  },
  (table) => [primaryKey({ columns: [table.identifier, table.token] })],
);

/** One browser signed in: what the list of sessions shows, and what ending one of them ends. */
export const signIns = pgTable(
  'sign_ins',
  {
    id: id(),
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    createdAt: createdAt(),
    seenAt: moment('seen_at').notNull().defaultNow(),
    /** The browser's name of itself, cut to 200 characters. */
    agent: text('agent'),
    endedAt: moment('ended_at'),
  },
  // A person's list, the newest first.
  (table) => [index('sign_ins_user').on(table.userId, newestFirst(table.createdAt))],
);
