/** Games kept in studies. */
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { gamePositions, games } from '@/db/schema';

export type GameRow = typeof games.$inferSelect;
export type GamePositionRow = typeof gamePositions.$inferSelect;

/** Rows of one insert: the protocol takes at most 65,535 values at once. */
const INSERT_ROWS = 2000;

/** Keeps a game with its positions; undefined where the study has it already. Run inside a transaction. */
export async function insertGame(
  db: Db,
  values: typeof games.$inferInsert,
  positionsOfGame: readonly Omit<typeof gamePositions.$inferInsert, 'gameId'>[],
): Promise<GameRow | undefined> {
  const [row] = await db.insert(games).values(values).onConflictDoNothing().returning();
  if (!row) return undefined;
  for (let from = 0; from < positionsOfGame.length; from += INSERT_ROWS) {
    const rows = positionsOfGame.slice(from, from + INSERT_ROWS);
    await db.insert(gamePositions).values(rows.map((position) => ({ ...position, gameId: row.id })));
  }
  return row;
}

/** A study's games, the oldest first. */
export function gamesOf(db: Db, studyId: string): Promise<GameRow[]> {
  return db
    .select()
    .from(games)
    .where(and(eq(games.studyId, studyId), isNull(games.deletedAt)))
    .orderBy(asc(games.createdAt), asc(games.id));
}

/** A game of the study, in the trash or not. */
export async function gameById(db: Db, studyId: string, id: string): Promise<GameRow | undefined> {
  const [row] = await db
    .select()
    .from(games)
    .where(and(eq(games.id, id), eq(games.studyId, studyId)));
  return row;
}

/** Changes a game that still has this version; undefined where another change was first. */
export async function changeGame(
  db: Db,
  { id, version }: { readonly id: string; readonly version: number },
  set: { readonly deletedAt: Date | null; readonly updatedAt: Date },
): Promise<GameRow | undefined> {
  const [row] = await db
    .update(games)
    .set({ ...set, version: version + 1 })
    .where(and(eq(games.id, id), eq(games.version, version)))
    .returning();
  return row;
}
