/** Rows of studies and their positions. Studies are always asked for within a workspace. */
import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { positions, studies } from '@/db/schema';

/** A study as stored. */
export type StudyRow = typeof studies.$inferSelect;

/** A position of a study as stored. */
export type PositionRow = typeof positions.$inferSelect;

/** A new study. */
export async function insertStudy(db: Db, study: typeof studies.$inferInsert): Promise<StudyRow> {
  const [row] = await db.insert(studies).values(study).returning();
  if (!row) throw new Error('an insert gave no row');
  return row;
}

/** A study's positions in their order, without those in the trash. The study has been asked for within its workspace. */
export async function positionsOf(db: Db, studyId: string): Promise<PositionRow[]> {
  return db
    .select()
    .from(positions)
    .where(and(eq(positions.studyId, studyId), isNull(positions.deletedAt)))
    .orderBy(asc(positions.order), asc(positions.id));
}

/** New positions, in the order given. */
export async function insertPositions(db: Db, rows: (typeof positions.$inferInsert)[]): Promise<PositionRow[]> {
  return db.insert(positions).values(rows).returning();
}
