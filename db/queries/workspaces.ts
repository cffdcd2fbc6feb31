/** Rows of workspaces and of who belongs to them. */
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { memberships, type Role, users, workspaces } from '@/db/schema';

/** A workspace as stored. */
export type WorkspaceRow = typeof workspaces.$inferSelect;

/** A workspace and the role that somebody has in it. */
export interface WorkspaceOfUser {
  readonly workspace: WorkspaceRow;
  readonly role: Role;
}

/** A new workspace; undefined when the slug is taken. */
export async function insertWorkspace(
  db: Db,
  workspace: typeof workspaces.$inferInsert,
): Promise<WorkspaceRow | undefined> {
  const rows = await db
    .insert(workspaces)
    .values(workspace)
    .onConflictDoNothing({ target: workspaces.slug })
    .returning();
  return rows[0];
}

/** A person's role in a workspace; undefined when they have none. */
export async function roleIn(db: Db, workspaceId: string, userId: string): Promise<Role | undefined> {
  const rows = await db
    .select({ role: memberships.role })
    .from(memberships)
    .where(and(eq(memberships.workspaceId, workspaceId), eq(memberships.userId, userId)));
  return rows[0]?.role;
}

/** A person's workspaces, by name. */
export async function workspacesOfUser(db: Db, userId: string): Promise<WorkspaceOfUser[]> {
  return db
    .select({ workspace: workspaces, role: memberships.role })
    .from(memberships)
    .innerJoin(workspaces, eq(workspaces.id, memberships.workspaceId))
    .where(eq(memberships.userId, userId))
    .orderBy(asc(workspaces.name), asc(workspaces.id));
}

/** A workspace's members who are still here, by name. */
export async function membersOf(db: Db, workspaceId: string) {
  return db
    .select({
      userId: users.id,
      name: users.name,
      email: users.email,
      role: memberships.role,
      since: memberships.createdAt,
    })
    .from(memberships)
    .innerJoin(users, eq(users.id, memberships.userId))
    .where(and(eq(memberships.workspaceId, workspaceId), isNull(users.deletedAt)))
    .orderBy(asc(users.name), asc(users.id));
}

/** Gives a person a role in a workspace, whether or not they had one. */
export async function putMembership(db: Db, workspaceId: string, userId: string, role: Role): Promise<void> {
  await db
    .insert(memberships)
    .values({ workspaceId, userId, role })
    .onConflictDoUpdate({ target: [memberships.workspaceId, memberships.userId], set: { role } });
}
