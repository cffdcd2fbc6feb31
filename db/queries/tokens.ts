/** Tokens of links, hashed. */
import { eq, lt } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { verificationTokens } from '@/db/schema';

type TokenRow = typeof verificationTokens.$inferSelect;

/** Keeps a token. */
export async function insertToken(db: Db, row: TokenRow): Promise<void> {
  await db.insert(verificationTokens).values(row);
}

/** Takes a token away: of two who use it at once one gets it. */
export async function takeToken(db: Db, token: string): Promise<TokenRow | undefined> {
  const [row] = await db.delete(verificationTokens).where(eq(verificationTokens.token, token)).returning();
  return row;
}

/** A token as stored. */
export async function tokenOf(db: Db, token: string): Promise<TokenRow | undefined> {
  const [row] = await db.select().from(verificationTokens).where(eq(verificationTokens.token, token)).limit(1);
  return row;
}

/** Forgets tokens that were too old at a moment. */
export async function sweepTokens(db: Db, at: Date): Promise<void> {
  await db.delete(verificationTokens).where(lt(verificationTokens.expires, at));
}
