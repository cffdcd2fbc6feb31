/** The history of studies: every change with who and when. */
import { and, desc, eq, lt, or } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { apiKeys, changes, users } from '@/db/schema';
import type { After } from './study-list';

/** A change as stored. */
export type ChangeRow = typeof changes.$inferSelect;

/** Keeps a change. */
export async function insertChange(db: Db, change: typeof changes.$inferInsert): Promise<void> {
  await db.insert(changes).values(change);
}

/** Keeps many changes at once. */
export async function insertChanges(db: Db, many: readonly (typeof changes.$inferInsert)[]): Promise<void> {
  if (many.length > 0) await db.insert(changes).values([...many]);
}

/** A study's changes with the names of who made them, the newest first. */
export async function changesPage(
  db: Db,
  { studyId, limit, after }: { readonly studyId: string; readonly limit: number; readonly after?: After | undefined },
): Promise<{ readonly change: ChangeRow; readonly person: string | null; readonly key: string | null }[]> {
  return db
    .select({ change: changes, person: users.name, key: apiKeys.name })
    .from(changes)
    .leftJoin(users, eq(users.id, changes.userId))
    .leftJoin(apiKeys, eq(apiKeys.id, changes.keyId))
    .where(
      and(
        eq(changes.studyId, studyId),
        after && or(lt(changes.at, after.at), and(eq(changes.at, after.at), lt(changes.id, after.id))),
      ),
    )
    .orderBy(desc(changes.at), desc(changes.id))
    .limit(limit);
}

/** What an entity was at a version: the change that made it. */
export async function changeOf(db: Db, entityId: string, version: number): Promise<ChangeRow | undefined> {
  const [row] = await db
    .select()
    .from(changes)
    .where(and(eq(changes.entityId, entityId), eq(changes.version, version)));
  return row;
}
