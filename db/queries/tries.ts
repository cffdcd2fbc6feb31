/** Tries counted in the database, so that several processes count together and a restart forgets nothing. */
import { eq, sql } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { rateLimits } from '@/db/schema';

/** Counts a try under a key; gives how many there were in the window that is open, this one included. */
export async function countTry(
  db: Db,
  { key, at, windowMs }: { readonly key: string; readonly at: Date; readonly windowMs: number },
): Promise<number> {
  const expire = new Date(at.getTime() + windowMs);
  const now = sql`${at.toISOString()}::timestamptz`;
  const [row] = await db
    .insert(rateLimits)
    .values({ key, points: 1, expire })
    .onConflictDoUpdate({
      target: rateLimits.key,
      set: {
        points: sql`case when ${rateLimits.expire} <= ${now} then 1 else ${rateLimits.points} + 1 end`,
        expire: sql`case when ${rateLimits.expire} <= ${now} then ${expire.toISOString()}::timestamptz else ${rateLimits.expire} end`,
      },
    })
    .returning({ points: rateLimits.points });
  return row?.points ?? 1;
}

/** Forgets the tries under a key. */
export async function forgetTries(db: Db, key: string): Promise<void> {
  await db.delete(rateLimits).where(eq(rateLimits.key, key));
}
