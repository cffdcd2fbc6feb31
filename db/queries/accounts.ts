/** Changes of a person's row, and all that is kept of them. */
import { and, asc, desc, eq, isNull, sql } from 'drizzle-orm';
import type { Db } from '@/db/client';
import {
  accounts,
  auditLog,
  changes,
  invitations,
  mail,
  memberships,
  positions,
  signIns,
  studies,
  studyShares,
  users,
  workspaces,
} from '@/db/schema';

/** Changes a person's name or password. */
export async function updateUser(
  db: Db,
  id: string,
  values: { readonly name?: string; readonly passwordHash?: string },
): Promise<void> {
  await db.update(users).set(values).where(eq(users.id, id));
}

/** Gives a person another address; false when it is somebody else's. */
export async function updateEmail(
  db: Db,
  { userId, emailKey, at }: { readonly userId: string; readonly emailKey: string; readonly at: Date },
): Promise<boolean> {
  const taken = sql`exists (select 1 from users other where other.email_key = ${emailKey} and other.id <> ${userId})`;
  const changed = await db
    .update(users)
    .set({ email: emailKey, emailKey, emailVerified: at })
    .where(and(eq(users.id, userId), isNull(users.deletedAt), sql`not ${taken}`))
    .returning({ id: users.id });
  return changed.length > 0;
}

/** The owners of a workspace, held until the transaction ends: of two who step back at once the second sees the first. */
export async function lockedOwners(db: Db, workspaceId: string): Promise<string[]> {
  const rows = await db
    .select({ userId: memberships.userId })
    .from(memberships)
    .where(and(eq(memberships.workspaceId, workspaceId), eq(memberships.role, 'owner')))
    .orderBy(asc(memberships.id))
    .for('update');
  return rows.map(({ userId }) => userId);
}

/** Leaves of a person only the row that histories point at. */
export async function eraseUser(
  db: Db,
  { id, email, emailKey }: { readonly id: string; readonly email: string | null; readonly emailKey: string | null },
  at: Date,
): Promise<void> {
  if (email !== null) await db.delete(mail).where(eq(mail.to, email));
  if (emailKey !== null) await db.delete(invitations).where(eq(invitations.emailKey, emailKey));
  await db.delete(studyShares).where(eq(studyShares.userId, id));
  await db.delete(memberships).where(eq(memberships.userId, id));
  await db.delete(signIns).where(eq(signIns.userId, id));
  await db.delete(accounts).where(eq(accounts.userId, id));
  await db
    .update(users)
    .set({
      email: null,
      emailKey: null,
      name: null,
      passwordHash: null,
      emailVerified: null,
      deletedAt: at,
      tokenVersion: sql`${users.tokenVersion} + 1`,
    })
    .where(eq(users.id, id));
}

/** What is kept of a person, without secrets. */
export async function dataOf(db: Db, userId: string) {
  const [account] = await db
    .select({ id: users.id, name: users.name, email: users.email, createdAt: users.createdAt })
    .from(users)
    .where(eq(users.id, userId));
  return {
    account,
    workspaces: await db
      .select({ name: workspaces.name, role: memberships.role, since: memberships.createdAt })
      .from(memberships)
      .innerJoin(workspaces, eq(workspaces.id, memberships.workspaceId))
      .where(eq(memberships.userId, userId))
      .orderBy(asc(workspaces.name)),
    sessions: await db
      .select({ browser: signIns.agent, begun: signIns.createdAt, seen: signIns.seenAt, ended: signIns.endedAt })
      .from(signIns)
      .where(eq(signIns.userId, userId))
      .orderBy(desc(signIns.createdAt)),
    studies: await db
      .select({ id: studies.id, title: studies.title, summary: studies.summary, createdAt: studies.createdAt })
      .from(studies)
      .where(eq(studies.createdBy, userId))
      .orderBy(asc(studies.createdAt)),
    positions: await db
      .select({ studyId: positions.studyId, fen: positions.fen, title: positions.title, note: positions.note })
      .from(positions)
      .where(eq(positions.createdBy, userId))
      .orderBy(asc(positions.createdAt)),
    changes: await db
      .select({ at: changes.at, entity: changes.entity, kind: changes.kind })
      .from(changes)
      .where(eq(changes.userId, userId))
      .orderBy(asc(changes.at)),
    audit: await db
      .select({ at: auditLog.at, action: auditLog.action, subject: auditLog.subject })
      .from(auditLog)
      .where(eq(auditLog.userId, userId))
      .orderBy(asc(auditLog.at)),
  };
}
