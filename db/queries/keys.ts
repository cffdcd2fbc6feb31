/** Keys, their use, and the replies kept for requests that are sent again. */
import { and, asc, desc, eq, gte, isNull, lt, sql } from 'drizzle-orm';
import type { Db } from '../client';
import { apiKeys, idempotencyKeys, keyUsage } from '../schema';

export type KeyRow = typeof apiKeys.$inferSelect;

/** A workspace's keys, the newest first. */
export function keysOf(db: Db, workspaceId: string): Promise<KeyRow[]> {
  return db.select().from(apiKeys).where(eq(apiKeys.workspaceId, workspaceId)).orderBy(desc(apiKeys.createdAt));
}

/** The key of a hash, whatever its state. */
export async function keyOfHash(db: Db, hash: string): Promise<KeyRow | undefined> {
  const [row] = await db.select().from(apiKeys).where(eq(apiKeys.hash, hash)).limit(1);
  return row;
}

/** Stores a key. */
export async function insertKey(db: Db, values: typeof apiKeys.$inferInsert): Promise<KeyRow> {
  const [row] = await db.insert(apiKeys).values(values).returning();
  return row!;
}

/** Ends a key of the workspace; undefined where there is none. One that is ended stays as it was. */
export async function endKey(
  db: Db,
  { workspaceId, id, at }: { readonly workspaceId: string; readonly id: string; readonly at: Date },
): Promise<KeyRow | undefined> {
  const [row] = await db
    .update(apiKeys)
    .set({ revokedAt: sql`coalesce(${apiKeys.revokedAt}, ${at.toISOString()}::timestamptz)` })
    .where(and(eq(apiKeys.id, id), eq(apiKeys.workspaceId, workspaceId)))
    .returning();
  return row;
}

/** Counts a call of a key, and notes when it was used. */
export async function countCall(
  db: Db,
  { keyId, call, at }: { readonly keyId: string; readonly call: string; readonly at: Date },
): Promise<void> {
  const day = at.toISOString().slice(0, 10);
  await db
    .insert(keyUsage)
    .values({ keyId, day, call, count: 1 })
    .onConflictDoUpdate({
      target: [keyUsage.keyId, keyUsage.day, keyUsage.call],
      set: { count: sql`${keyUsage.count} + 1` },
    });
  await db.update(apiKeys).set({ usedAt: at }).where(eq(apiKeys.id, keyId));
}

/** What a workspace's keys have used since a day, by key, day and call. */
export function usageOf(db: Db, { workspaceId, since }: { readonly workspaceId: string; readonly since: string }) {
  return db
    .select({ key: apiKeys.id, name: apiKeys.name, day: keyUsage.day, call: keyUsage.call, count: keyUsage.count })
    .from(keyUsage)
    .innerJoin(apiKeys, eq(apiKeys.id, keyUsage.keyId))
    .where(and(eq(apiKeys.workspaceId, workspaceId), gte(keyUsage.day, since)))
    .orderBy(desc(keyUsage.day), asc(apiKeys.name), asc(keyUsage.call));
}

export type KeptReply = typeof idempotencyKeys.$inferSelect;

interface KeptKey {
  readonly owner: string;
  readonly key: string;
}

/** Takes an idempotency key for a request; the reply kept under it, if another request has taken it before. */
export async function takeIdempotencyKey(
  db: Db,
  values: KeptKey & { readonly call: string; readonly bodyHash: string; readonly createdAt: Date },
): Promise<KeptReply | undefined> {
  const taken = await db.insert(idempotencyKeys).values(values).onConflictDoNothing().returning();
  if (taken.length > 0) return undefined;
  const [kept] = await db.select().from(idempotencyKeys).where(ofKey(values)).limit(1);
  return kept;
}

/** Keeps the reply of the request that took the key. */
export async function keepReply(
  db: Db,
  { owner, key, ...reply }: KeptKey & Required<Pick<KeptReply, 'status' | 'reply' | 'headers'>>,
): Promise<void> {
  await db.update(idempotencyKeys).set(reply).where(ofKey({ owner, key }));
}

/** Gives a key back whose request stored nothing. */
export async function dropIdempotencyKey(db: Db, taken: KeptKey): Promise<void> {
  await db.delete(idempotencyKeys).where(and(ofKey(taken), isNull(idempotencyKeys.status)));
}

/** Forgets the keys taken before a moment; without a reply: those whose process ended at work. */
export async function sweepIdempotencyKeys(
  db: Db,
  { owner, key, before, unfinishedBefore }: KeptKey & { readonly before: Date; readonly unfinishedBefore: Date },
): Promise<void> {
  await db.delete(idempotencyKeys).where(lt(idempotencyKeys.createdAt, before));
  await db
    .delete(idempotencyKeys)
    .where(and(ofKey({ owner, key }), isNull(idempotencyKeys.status), lt(idempotencyKeys.createdAt, unfinishedBefore)));
}

function ofKey({ owner, key }: KeptKey) {
  return and(eq(idempotencyKeys.owner, owner), eq(idempotencyKeys.key, key));
}
