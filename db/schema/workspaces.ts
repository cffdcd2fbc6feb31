/** Workspaces, who belongs to them in which role, who is invited, and what was done that matters. */
import { sql } from 'drizzle-orm';
import { check, index, jsonb, pgTable, text, unique, uuid } from 'drizzle-orm/pg-core';
import { users } from './accounts';
import { createdAt, id, moment, newestFirst } from './columns';

/** Roles of a person in a workspace, from the one who may most. What each may do is lib's table. */
export const ROLES = ['owner', 'coach', 'writer', 'student'] as const;

/** A role of a person in a workspace. */
export type Role = (typeof ROLES)[number];

const rolesText = sql.raw(ROLES.map((role) => `'${role}'`).join(', '));

/** The tenant: a club, an academy, a magazine, one coach. Deleting one deletes all that is in it. */
export const workspaces = pgTable('workspaces', {
  id: id(),
  name: text('name').notNull(),
  /** For addresses: lower case, digits and hyphens. */
  slug: text('slug').notNull().unique(),
  createdAt: createdAt(),
});

/** A person's place in a workspace: one role. */
export const memberships = pgTable(
  'memberships',
  {
    id: id(),
    workspaceId: uuid('workspace_id')
      .notNull()
      .references(() => workspaces.id, { onDelete: 'cascade' }),
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    role: text('role', { enum: ROLES }).notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    unique('memberships_workspace_user').on(table.workspaceId, table.userId),
    // A person's workspaces, asked for with every page.
    index('memberships_user').on(table.userId),
    check('memberships_role', sql`${table.role} in (${rolesText})`),
  ],
);

/** A place offered by e-mail. Open while neither accepted nor revoked, and not expired. */
export const invitations = pgTable(
  'invitations',
  {
    id: id(),
    workspaceId: uuid('workspace_id')
      .notNull()
      .references(() => workspaces.id, { onDelete: 'cascade' }),
    email: text('email').notNull(),
    emailKey: text('email_key').notNull(),
    role: text('role', { enum: ROLES }).notNull(),
    /** SHA-256 of the token in the link: what is stored opens nothing. */
    tokenHash: text('token_hash').notNull().unique(),
    invitedBy: uuid('invited_by').references(() => users.id, { onDelete: 'set null' }),
    createdAt: createdAt(),
    expiresAt: moment('expires_at').notNull(),
    acceptedAt: moment('accepted_at'),
    revokedAt: moment('revoked_at'),
  },
  (table) => [
    // The members page lists a workspace's invitations; inviting anew looks for the address among them.
    index('invitations_workspace').on(table.workspaceId, table.emailKey),
    check('invitations_role', sql`${table.role} in (${rolesText})`),
  ],
);

/** What was done to members, keys, publishing and deletion. The actor is a person or a key; a key that is gone leaves its id. */
export const auditLog = pgTable(
  'audit_log',
  {
    id: id(),
    workspaceId: uuid('workspace_id')
      .notNull()
      .references(() => workspaces.id, { onDelete: 'cascade' }),
    at: moment('at').notNull().defaultNow(),
    userId: uuid('user_id').references(() => users.id, { onDelete: 'set null' }),
    keyId: uuid('key_id'),
    /** A noun and a verb: `member.invite`, `key.revoke`. */
    action: text('action').notNull(),
    /** The id of what it was done to. */
    subject: text('subject'),
    detail: jsonb('detail').$type<Readonly<Record<string, unknown>>>().notNull().default({}),
  },
  // The audit page: a workspace's log, the newest first, by cursor.
  (table) => [index('audit_log_workspace').on(table.workspaceId, newestFirst(table.at), newestFirst(table.id))],
);
