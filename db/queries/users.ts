/** Rows of people. */
import { and, eq, isNull, sql } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { users } from '@/db/schema';

/** A person as stored. */
export type UserRow = typeof users.$inferSelect;

/** A person who is still here, by id. */
export async function userById(db: Db, id: string): Promise<UserRow | undefined> {
  const rows = await db
    .select()
    .from(users)
    .where(and(eq(users.id, id), isNull(users.deletedAt)));
  return rows[0];
}

/** A person who is still here, by the normalised address. */
export async function userByEmailKey(db: Db, emailKey: string): Promise<UserRow | undefined> {
  const rows = await db
    .select()
    .from(users)
    .where(and(eq(users.emailKey, emailKey), isNull(users.deletedAt)));
  return rows[0];
}

/** A new person; undefined when the address has one already. */
export async function insertUser(db: Db, user: typeof users.$inferInsert): Promise<UserRow | undefined> {
  const rows = await db.insert(users).values(user).onConflictDoNothing({ target: users.emailKey }).returning();
  return rows[0];
}

/** Ends every session of a person at once. */
export async function raiseTokenVersion(db: Db, id: string): Promise<void> {
  await db
    .update(users)
    .set({ tokenVersion: sql`${users.tokenVersion} + 1` })
    .where(eq(users.id, id));
}

/** Whether anybody ever had an account here. */
export async function isPeopled(db: Db): Promise<boolean> {
  return (await db.select({ id: users.id }).from(users).limit(1)).length > 0;
}
