/** What can be read of a study: itself, its positions, its history, with whom it is shared. */
import { changesPage } from '@/db/queries/changes';
import { positionsOf } from '@/db/queries/studies';
import { putShares, sharesOf } from '@/db/queries/study-list';
import { membersOf } from '@/db/queries/workspaces';
import { pageOf, readCursor } from '@/lib/api/cursor';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import type { ChangeAnswer, PositionAnswer, StudyAnswer } from '@/openapi/schemas/studies';
import { readableStudy, writableStudy } from './access';
import { positionAnswer, studyAnswer } from './answers';
import { positionIn } from './position-changes';

/** A study that the caller may read. */
export async function readStudy(ctx: Context, { id }: { readonly id: string }): Promise<StudyAnswer> {
  return studyAnswer((await readableStudy(ctx, id)).study);
}

/** Its positions in their order. */
export async function listPositions(
  ctx: Context,
  { id }: { readonly id: string },
): Promise<{ readonly items: PositionAnswer[] }> {
  await readableStudy(ctx, id);
  return { items: (await positionsOf(ctx.db, id)).map(positionAnswer) };
}

/** One of its positions. */
export async function readPositionOf(
  ctx: Context,
  { id, positionId }: { readonly id: string; readonly positionId: string },
): Promise<PositionAnswer> {
  await readableStudy(ctx, id);
  return positionAnswer(await positionIn(ctx, id, positionId));
}

interface Page {
  readonly id: string;
  readonly limit: number;
  readonly cursor?: string | undefined;
}

/** Its changes, the newest first, for those who may write. */
export async function listChanges(
  ctx: Context,
  { id, limit, cursor }: Page,
): Promise<{ readonly items: ChangeAnswer[]; readonly next: string | null }> {
  await writableStudy(ctx, id, { trashed: true });
  const after = cursor === undefined ? undefined : readCursor(cursor);
  const rows = await changesPage(ctx.db, {
    studyId: id,
    limit: limit + 1,
    after: after && { at: new Date(after.after), id: after.id },
  });
  const { items, next } = pageOf(rows, limit, ({ change }) => ({ after: change.at.toISOString(), id: change.id }));
  return {
    items: items.map(({ change, person, key }) => ({
      id: change.id,
      entity: change.entity,
      entityId: change.entityId,
      version: change.version,
      kind: change.kind,
      at: change.at.toISOString(),
      by: person ?? key,
      before: change.before ?? null,
      after: change.after ?? null,
    })),
    next,
  };
}

/** The students with whom it is shared. */
export async function readShares(
  ctx: Context,
  { id }: { readonly id: string },
): Promise<{ readonly students: string[] }> {
  await writableStudy(ctx, id);
  return { students: await sharesOf(ctx.db, id) };
}

/** Shares it with these students and nobody else. Throws `invalid-request` on one who is no member. */
export async function shareStudy(
  ctx: Context,
  { id, students }: { readonly id: string; readonly students: readonly string[] },
): Promise<{ readonly students: string[] }> {
  const { member } = await writableStudy(ctx, id);
  const members = new Set((await membersOf(ctx.db, member.workspaceId)).map(({ userId }) => userId));
  const stranger = students.findIndex((student) => !members.has(student));
  if (stranger >= 0) {
    const message = 'This is no member of the workspace.';
    throw new AppError('invalid-request', message, {
      faults: [{ path: `/students/${stranger}`, code: 'no-member', message }],
    });
  }
  const wanted = [...new Set(students)];
  await ctx.db.transaction((tx) => putShares(tx, id, wanted));
  return { students: wanted };
}
