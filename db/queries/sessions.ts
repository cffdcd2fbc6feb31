/** Sessions as they stand in the database: of a person who is here, not ended, of the present token version. */
import { and, asc, desc, eq, isNull, sql } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { memberships, type Role, signIns, users } from '@/db/schema';

interface Claimed {
  readonly userId: string;
  readonly signInId: string;
  readonly tokenVersion: number;
  /** The workspace that was chosen; the person's first where they do not belong to it. */
  readonly workspaceId: string | undefined;
}

/** Who a session's person is and where; undefined where the session is good no more, or the person belongs nowhere. */
export async function sessionOf(
  db: Db,
  { userId, signInId, tokenVersion, workspaceId }: Claimed,
): Promise<{ readonly name: string | null; readonly workspaceId: string; readonly role: Role } | undefined> {
  // Compared as text: what a cookie says need not be an id.
  const chosen = sql`${memberships.workspaceId}::text = ${workspaceId ?? ''}`;
  const [row] = await db
    .select({ name: users.name, workspaceId: memberships.workspaceId, role: memberships.role })
    .from(signIns)
    .innerJoin(users, eq(users.id, signIns.userId))
    .innerJoin(memberships, eq(memberships.userId, users.id))
    .where(
      and(
        eq(signIns.id, signInId),
        eq(signIns.userId, userId),
        isNull(signIns.endedAt),
        isNull(users.deletedAt),
        eq(users.tokenVersion, tokenVersion),
      ),
    )
    .orderBy(desc(chosen), asc(memberships.createdAt), asc(memberships.id))
    .limit(1);
  return row;
}

/** A new session of a person. */
export async function insertSignIn(
  db: Db,
  { userId, agent, at }: { readonly userId: string; readonly agent: string | null; readonly at: Date },
): Promise<string> {
  const [row] = await db
    .insert(signIns)
    .values({ userId, agent, createdAt: at, seenAt: at })
    .returning({ id: signIns.id });
  if (!row) throw new Error('an insert gave no row');
  return row.id;
}

/** A person's sessions that are not ended, the newest first. */
export function signInsOf(db: Db, userId: string) {
  return db
    .select()
    .from(signIns)
    .where(and(eq(signIns.userId, userId), isNull(signIns.endedAt)))
    .orderBy(desc(signIns.createdAt));
}

/** Ends a session of the person; false where there is none. */
export async function endSignIn(
  db: Db,
  { userId, id, at }: { readonly userId: string; readonly id: string; readonly at: Date },
): Promise<boolean> {
  const ended = await db
    .update(signIns)
    .set({ endedAt: at })
    .where(and(eq(signIns.id, id), eq(signIns.userId, userId), isNull(signIns.endedAt)))
    .returning({ id: signIns.id });
  return ended.length > 0;
}
