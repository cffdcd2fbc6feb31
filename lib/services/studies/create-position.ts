/** A position is kept in a study. */
import { insertChange } from '@/db/queries/changes';
import { insertPositions } from '@/db/queries/studies';
import { touchStudy } from '@/db/queries/study-list';
import { countPositions, lastOrder } from '@/db/queries/study-positions';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { type PositionAnswer, type PositionRequest, STUDY_POSITIONS_MAX } from '@/openapi/schemas/studies';
import { authorOf, writableStudy } from './access';
import { positionAnswer, positionKept } from './answers';
import { keyed } from './keyed';
import { orderAfter } from './position-changes';

/** Keeps a position, at the end unless a place is said. Throws `fen-refused`, or `conflict` where the study is full. */
export async function createPosition(
  ctx: Context,
  { id, after, fen, ...fields }: PositionRequest & { readonly id: string },
): Promise<PositionAnswer> {
  const { member, study } = await writableStudy(ctx, id);
  const board = keyed(fen);
  const author = authorOf(member);
  const at = ctx.now();
  const order = after === undefined ? undefined : await orderAfter(ctx, id, after);
  return ctx.db.transaction(async (tx) => {
    if ((await countPositions(tx, id)) >= STUDY_POSITIONS_MAX) {
      throw new AppError('conflict', `A study holds at most ${STUDY_POSITIONS_MAX} positions.`, {
        bound: { name: 'positions', max: STUDY_POSITIONS_MAX },
      });
    }
    const last = Number((await lastOrder(tx, id)) ?? 0);
    const [row] = await insertPositions(tx, [
      {
        studyId: id,
        order: order ?? String(Math.floor(last) + 1),
        ...board,
        ...fields,
        createdBy: author.userId,
        createdAt: at,
        updatedAt: at,
      },
    ]);
    if (!row) throw new Error('an insert gave no row');
    await touchStudy(tx, id, at);
    await insertChange(tx, {
      ...author,
      workspaceId: study.workspaceId,
      studyId: id,
      entity: 'position',
      entityId: row.id,
      version: row.version,
      kind: 'create',
      at,
      before: null,
      after: positionKept(row),
    });
    return positionAnswer(row);
  });
}
