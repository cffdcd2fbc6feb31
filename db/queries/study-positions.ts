/** Positions of a study one by one, and their places. */
import { and, asc, desc, eq, gt, isNull, sql } from 'drizzle-orm';
import type { Db } from '@/db/client';
import { positions } from '@/db/schema';
import type { PositionRow } from './studies';

/** A position of the study, in the trash or not. */
export async function positionById(db: Db, studyId: string, id: string): Promise<PositionRow | undefined> {
  const [row] = await db
    .select()
    .from(positions)
    .where(and(eq(positions.id, id), eq(positions.studyId, studyId)));
  return row;
}

/** How many positions a study has, those in the trash left out. */
export async function countPositions(db: Db, studyId: string): Promise<number> {
  const [row] = await db
    .select({ count: sql<number>`count(*)::int` })
    .from(positions)
    .where(and(eq(positions.studyId, studyId), isNull(positions.deletedAt)));
  return row?.count ?? 0;
}

/** Changes a position that still has this version; undefined where another change was first. */
export async function changePosition(
  db: Db,
  { id, version }: { readonly id: string; readonly version: number },
  set: Partial<Omit<PositionRow, 'id' | 'studyId' | 'version' | 'createdAt' | 'createdBy'>>,
): Promise<PositionRow | undefined> {
  const [row] = await db
    .update(positions)
    .set({ ...set, version: version + 1 })
    .where(and(eq(positions.id, id), eq(positions.version, version)))
    .returning();
  return row;
}

/** The order of the last position, for one that is put behind it; undefined in an empty study. */
export async function lastOrder(db: Db, studyId: string): Promise<string | undefined> {
  const [row] = await db
    .select({ order: positions.order })
    .from(positions)
    .where(and(eq(positions.studyId, studyId), isNull(positions.deletedAt)))
    .orderBy(desc(positions.order))
    .limit(1);
  return row?.order;
}

/** The order between a position and the next, or before the first; decimals never run out of room between two. */
export async function orderBehind(db: Db, studyId: string, order: string | null): Promise<string> {
  const present = and(eq(positions.studyId, studyId), isNull(positions.deletedAt));
  const [next] = await db
    .select({ order: positions.order })
    .from(positions)
    .where(order === null ? present : and(present, gt(positions.order, order)))
    .orderBy(asc(positions.order))
    .limit(1);
  const [row] = await db
    .select({
      between: sql<string>`(case when ${next?.order ?? null}::numeric is null then coalesce(${order}::numeric, 0) + 1
        when ${order}::numeric is null then ${next?.order ?? null}::numeric - 1
        else (${order}::numeric + ${next?.order ?? null}::numeric) * 0.5 end)::text`,
    })
    .from(sql`(select 1) as one`);
  return row?.between ?? '1';
}
