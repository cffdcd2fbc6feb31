/** Rows of invitations. */
import { and, desc, eq, gt, isNull } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { invitations, workspaces } from '@/db/schema';

/** An invitation as stored. */
export type InvitationRow = typeof invitations.$inferSelect;

const isOpen = and(isNull(invitations.acceptedAt), isNull(invitations.revokedAt));

/** A new invitation. An open one of the same address is ended: the newest is what counts. */
export async function insertInvitation(db: Db, values: typeof invitations.$inferInsert): Promise<InvitationRow> {
  await db
    .update(invitations)
    .set({ revokedAt: values.createdAt ?? new Date() })
    .where(and(eq(invitations.workspaceId, values.workspaceId), eq(invitations.emailKey, values.emailKey), isOpen));
  const [row] = await db.insert(invitations).values(values).returning();
  if (!row) throw new Error('an insert gave no row');
  return row;
}

/** A workspace's invitations that can still be accepted, the newest first. */
export function openInvitationsOf(db: Db, workspaceId: string, at: Date): Promise<InvitationRow[]> {
  return db
    .select()
    .from(invitations)
    .where(and(eq(invitations.workspaceId, workspaceId), isOpen, gt(invitations.expiresAt, at)))
    .orderBy(desc(invitations.createdAt));
}

/** An invitation by its token's hash, with the name of its workspace. */
export async function invitationOfHash(
  db: Db,
  tokenHash: string,
): Promise<{ readonly invitation: InvitationRow; readonly workspace: string } | undefined> {
  const [row] = await db
    .select({ invitation: invitations, workspace: workspaces.name })
    .from(invitations)
    .innerJoin(workspaces, eq(workspaces.id, invitations.workspaceId))
    .where(eq(invitations.tokenHash, tokenHash))
    .limit(1);
  return row;
}

/** Marks an invitation as accepted; of two who do so at once one is told true. */
export async function takeInvitation(db: Db, id: string, at: Date): Promise<boolean> {
  const taken = await db
    .update(invitations)
    .set({ acceptedAt: at })
    .where(and(eq(invitations.id, id), isOpen, gt(invitations.expiresAt, at)))
    .returning({ id: invitations.id });
  return taken.length > 0;
}

/** Takes an invitation of the workspace back; undefined where none is open. */
export async function endInvitation(
  db: Db,
  { workspaceId, id, at }: { readonly workspaceId: string; readonly id: string; readonly at: Date },
): Promise<InvitationRow | undefined> {
  const [row] = await db
    .update(invitations)
    .set({ revokedAt: at })
    .where(and(eq(invitations.id, id), eq(invitations.workspaceId, workspaceId), isOpen))
    .returning();
  return row;
}
