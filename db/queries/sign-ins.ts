/** Ends of many sessions, and signs of life. */
import { and, eq, isNull, lt, ne } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { signIns } from '@/db/schema';

/** Ends a person's sessions, all or all but one; gives how many. */
export async function endSignInsOf(
  db: Db,
  { userId, except, at }: { readonly userId: string; readonly except?: string; readonly at: Date },
): Promise<number> {
  const others = except === undefined ? undefined : ne(signIns.id, except);
  const ended = await db
    .update(signIns)
    .set({ endedAt: at })
    .where(and(eq(signIns.userId, userId), isNull(signIns.endedAt), others))
    .returning({ id: signIns.id });
  return ended.length;
}

/** Notes that a session was used, if the last note is older than so long: not every request need write. */
export async function noteSeen(
  db: Db,
  { id, at, everyMs }: { readonly id: string; readonly at: Date; readonly everyMs: number },
): Promise<void> {
  await db
    .update(signIns)
    .set({ seenAt: at })
    .where(and(eq(signIns.id, id), lt(signIns.seenAt, new Date(at.getTime() - everyMs))));
}
