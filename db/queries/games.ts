/** Games kept in studies. */
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { games } from '@/db/schema';

type GameRow = typeof games.$inferSelect;

/** A study's games, the oldest first. */
export function gamesOf(db: Db, studyId: string): Promise<GameRow[]> {
  return db
    .select()
    .from(games)
    .where(and(eq(games.studyId, studyId), isNull(games.deletedAt)))
    .orderBy(asc(games.createdAt), asc(games.id));
}
