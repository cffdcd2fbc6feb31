/** Changes of who belongs to a workspace, and of the workspace itself. */
import { and, eq, inArray } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { memberships, type Role, studies, studyShares, workspaces } from '@/db/schema';

interface Place {
  readonly workspaceId: string;
  readonly userId: string;
}

/** Gives a member another role. */
export async function setRole(db: Db, { workspaceId, userId, role }: Place & { readonly role: Role }): Promise<void> {
  await db
    .update(memberships)
    .set({ role })
    .where(and(eq(memberships.workspaceId, workspaceId), eq(memberships.userId, userId)));
}

/** Takes a member out of a workspace, with what was shared with them there. */
export async function deleteMembership(db: Db, { workspaceId, userId }: Place): Promise<void> {
  const theirs = db.select({ id: studies.id }).from(studies).where(eq(studies.workspaceId, workspaceId));
  await db.delete(studyShares).where(and(eq(studyShares.userId, userId), inArray(studyShares.studyId, theirs)));
  await db.delete(memberships).where(and(eq(memberships.workspaceId, workspaceId), eq(memberships.userId, userId)));
}

/** Gives a workspace another name. */
export async function setWorkspaceName(db: Db, id: string, name: string): Promise<void> {
  await db.update(workspaces).set({ name }).where(eq(workspaces.id, id));
}

/** Deletes a workspace with all that is in it. */
export async function deleteWorkspaceRow(db: Db, id: string): Promise<void> {
  await db.delete(workspaces).where(eq(workspaces.id, id));
}
