/** Pages of studies, and their changes in place: every change asks for the version it starts from. */
import { and, desc, eq, exists, isNotNull, isNull, lt, or, sql } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { studies, studyShares } from '@/db/schema';
import type { StudyRow } from './studies';

/** A study with the number of its positions. */
export type CountedStudy = StudyRow & { readonly positions: number };

/** Where a page of a list goes on: behind this moment and id. */
export interface After {
  readonly at: Date;
  readonly id: string;
}

// Names in full: among the columns of one table drizzle leaves the table's name away, and `id` would be the position's own.
const counted = sql<number>`(select count(*)::int from positions p where p.study_id = studies.id and p.deleted_at is null)`;

const columns = { study: studies, positions: counted };

/** A workspace's studies, the last changed first; of a student only those shared with them. */
export async function studiesPage(
  db: Db,
  wanted: {
    readonly workspaceId: string;
    readonly sharedWith?: string | undefined;
    readonly trash: boolean;
    readonly limit: number;
    readonly after?: After | undefined;
  },
): Promise<CountedStudy[]> {
  const { workspaceId, sharedWith, trash, limit, after } = wanted;
  const shared =
    sharedWith === undefined
      ? undefined
      : exists(
          db
            .select({ one: sql`1` })
            .from(studyShares)
            .where(and(eq(studyShares.studyId, studies.id), eq(studyShares.userId, sharedWith))),
        );
  const behind =
    after && or(lt(studies.updatedAt, after.at), and(eq(studies.updatedAt, after.at), lt(studies.id, after.id)));
  const rows = await db
    .select(columns)
    .from(studies)
    .where(
      and(
        eq(studies.workspaceId, workspaceId),
        trash ? isNotNull(studies.deletedAt) : isNull(studies.deletedAt),
        shared,
        behind,
      ),
    )
    .orderBy(desc(studies.updatedAt), desc(studies.id))
    .limit(limit);
  return rows.map(({ study, positions: count }) => ({ ...study, positions: count }));
}

/** A study of the workspace, in the trash or not, with the number of its positions. */
export async function countedStudy(db: Db, workspaceId: string, id: string): Promise<CountedStudy | undefined> {
  const [row] = await db
    .select(columns)
    .from(studies)
    .where(and(eq(studies.id, id), eq(studies.workspaceId, workspaceId)));
  return row && { ...row.study, positions: row.positions };
}

/** Changes a study that still has this version; undefined where another change was first. */
export async function changeStudy(
  db: Db,
  { id, version }: { readonly id: string; readonly version: number },
  set: Partial<Pick<StudyRow, 'title' | 'summary' | 'deletedAt'>> & { readonly updatedAt: Date },
): Promise<StudyRow | undefined> {
  const [row] = await db
    .update(studies)
    .set({ ...set, version: version + 1 })
    .where(and(eq(studies.id, id), eq(studies.version, version)))
    .returning();
  return row;
}

/** Notes that something in the study changed; its own version stays. */
export async function touchStudy(db: Db, id: string, at: Date): Promise<void> {
  await db.update(studies).set({ updatedAt: at }).where(eq(studies.id, id));
}

/** Whether a study is shared with a person. */
export async function isSharedWith(db: Db, studyId: string, userId: string): Promise<boolean> {
  const rows = await db
    .select({ id: studyShares.studyId })
    .from(studyShares)
    .where(and(eq(studyShares.studyId, studyId), eq(studyShares.userId, userId)));
  return rows.length > 0;
}

/** Ids of the people with whom a study is shared. */
export async function sharesOf(db: Db, studyId: string): Promise<string[]> {
  const rows = await db
    .select({ id: studyShares.userId })
    .from(studyShares)
    .where(eq(studyShares.studyId, studyId))
    .orderBy(studyShares.createdAt, studyShares.userId);
  return rows.map(({ id }) => id);
}

/** Shares a study with these people and no others. */
export async function putShares(db: Db, studyId: string, userIds: readonly string[]): Promise<void> {
  await db.delete(studyShares).where(eq(studyShares.studyId, studyId));
  if (userIds.length > 0) await db.insert(studyShares).values(userIds.map((userId) => ({ studyId, userId })));
}
