/** Results kept in studies: comparisons, routes and exchange tests. */
import { and, asc, eq, isNull, ne } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { type RESULT_KINDS, results } from '@/db/schema';

export type ResultRow = typeof results.$inferSelect;
export type ResultKind = (typeof RESULT_KINDS)[number];

/** A new result. */
export async function insertResult(db: Db, values: typeof results.$inferInsert): Promise<ResultRow> {
  const [row] = await db.insert(results).values(values).returning();
  if (!row) throw new Error('an insert gave no row');
  return row;
}

/** A study's results of a kind, the oldest first. */
export function resultsOf(db: Db, studyId: string, kind: ResultKind): Promise<ResultRow[]> {
  return db
    .select()
    .from(results)
    .where(and(eq(results.studyId, studyId), eq(results.kind, kind), isNull(results.deletedAt)))
    .orderBy(asc(results.createdAt), asc(results.id));
}

/** A result of the study, in the trash or not. */
export async function resultById(db: Db, studyId: string, id: string): Promise<ResultRow | undefined> {
  const [row] = await db
    .select()
    .from(results)
    .where(and(eq(results.id, id), eq(results.studyId, studyId)));
  return row;
}

/** Results of the study that another engine made. */
export function oldResultsOf(db: Db, studyId: string, engineVersion: string): Promise<ResultRow[]> {
  return db
    .select()
    .from(results)
    .where(and(eq(results.studyId, studyId), ne(results.engineVersion, engineVersion), isNull(results.deletedAt)));
}

/** Changes a result that still has this version; undefined where another change was first. */
export async function changeResult(
  db: Db,
  { id, version }: { readonly id: string; readonly version: number },
  set: Partial<Omit<ResultRow, 'id' | 'studyId' | 'version'>>,
): Promise<ResultRow | undefined> {
  const [row] = await db
    .update(results)
    .set({ ...set, version: version + 1 })
    .where(and(eq(results.id, id), eq(results.version, version)))
    .returning();
  return row;
}
