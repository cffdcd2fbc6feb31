/** The audit log: members, keys, publishing, deletion. */
import { and, desc, eq, lt, or } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { apiKeys, auditLog, users } from '@/db/schema';
import type { After } from './study-list';

/** Keeps what was done, in the transaction that does it. */
export async function insertAudit(db: Db, entry: typeof auditLog.$inferInsert): Promise<void> {
  await db.insert(auditLog).values(entry);
}

/** A workspace's log with the names of who did it, the newest first. */
export function auditPage(
  db: Db,
  {
    workspaceId,
    limit,
    after,
  }: { readonly workspaceId: string; readonly limit: number; readonly after?: After | undefined },
) {
  return db
    .select({ entry: auditLog, person: users.name, key: apiKeys.name })
    .from(auditLog)
    .leftJoin(users, eq(users.id, auditLog.userId))
    .leftJoin(apiKeys, eq(apiKeys.id, auditLog.keyId))
    .where(
      and(
        eq(auditLog.workspaceId, workspaceId),
        after && or(lt(auditLog.at, after.at), and(eq(auditLog.at, after.at), lt(auditLog.id, after.id))),
      ),
    )
    .orderBy(desc(auditLog.at), desc(auditLog.id))
    .limit(limit);
}
