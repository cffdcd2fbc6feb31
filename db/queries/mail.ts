/** The local mailbox. */
import { desc } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { mail } from '@/db/schema';

/** Keeps a message. */
export async function insertMail(
  db: Db,
  message: { readonly to: string; readonly subject: string; readonly text: string },
): Promise<void> {
  await db.insert(mail).values(message);
}

/** The newest messages. */
export function latestMail(db: Db, limit: number) {
  return db.select().from(mail).orderBy(desc(mail.at)).limit(limit);
}
