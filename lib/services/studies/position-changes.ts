/** Changes of a position in a study: its words and board, its place, its way into the trash and back. */
import { changeOf, insertChange } from '@/db/queries/changes';
import type { CountedStudy } from '@/db/queries/study-list';
import { touchStudy } from '@/db/queries/study-list';
import { changePosition as changeRow, orderBehind, positionById } from '@/db/queries/study-positions';
import type { PositionRow } from '@/db/queries/studies';
import type { Db } from '@/db/client';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import type { Member } from '@/lib/permissions';
import type { PositionAnswer, PositionChange } from '@/openapi/schemas/studies';
import { authorOf, versionLost, writableStudy } from './access';
import { positionAnswer, positionKept } from './answers';
import { keyed } from './keyed';

interface Place {
  readonly id: string;
  readonly positionId: string;
}

interface Versioned extends Place {
  /** The version that the caller has seen. */
  readonly version: number;
}

/** Changes the fields that are given. Throws `version-lost` where another change was first, `fen-refused` on a bad FEN. */
export async function changePosition(
  ctx: Context,
  { id, positionId, version, after, fen, ...fields }: Versioned & PositionChange,
): Promise<PositionAnswer> {
  const { member, study } = await writableStudy(ctx, id);
  const before = await positionIn(ctx, id, positionId);
  const order = after === undefined ? undefined : await orderAfter(ctx, id, after);
  return changed(ctx, { member, study, before }, version, 'update', {
    ...withoutUndefined(fields),
    ...(fen !== undefined && keyed(fen)),
    ...(order !== undefined && { order }),
  });
}

/** Puts a position into the trash. */
export async function trashPosition(ctx: Context, { id, positionId, version }: Versioned): Promise<undefined> {
  const { member, study } = await writableStudy(ctx, id);
  const before = await positionIn(ctx, id, positionId);
  await changed(ctx, { member, study, before }, version, 'delete', { deletedAt: ctx.now() });
}

/** Takes a position out of the trash as it was, or back to what it was at a version. */
export async function restorePosition(
  ctx: Context,
  { id, positionId, version }: Place & { readonly version?: number | undefined },
): Promise<PositionAnswer> {
  const { member, study } = await writableStudy(ctx, id);
  const before = await positionIn(ctx, id, positionId, true);
  const kept = version === undefined ? undefined : await keptAt(ctx.db, before, version);
  return changed(ctx, { member, study, before }, before.version, 'restore', { ...kept, deletedAt: null });
}

async function keptAt(db: Db, row: PositionRow, version: number): Promise<Partial<PositionRow>> {
  const change = await changeOf(db, row.id, version);
  if (!change?.after) throw new AppError('not-found', `Nothing is kept of a version ${version} of this position.`);
  const { fen, title, note, marks, layer, man, order } = change.after as unknown as PositionRow;
  return { ...keyed(fen), title, note, marks, layer, man, order };
}

/** A position of the study; those in the trash only where they are asked for. */
export async function positionIn(ctx: Context, id: string, positionId: string, trashed = false): Promise<PositionRow> {
  const row = await positionById(ctx.db, id, positionId);
  if (!row || (row.deletedAt !== null && !trashed)) throw new AppError('not-found', 'There is no such position.');
  return row;
}

/** The order behind a position of the study, or before all of them. */
export async function orderAfter(ctx: Context, id: string, after: string | null): Promise<string> {
  if (after === null) return orderBehind(ctx.db, id, null);
  const row = await positionById(ctx.db, id, after);
  if (row && row.deletedAt === null) return orderBehind(ctx.db, id, row.order);
  const message = 'The position to be put behind is not in this study.';
  throw new AppError('invalid-request', message, { faults: [{ path: '/after', code: 'no-position', message }] });
}

interface Changing {
  readonly member: Member;
  readonly study: CountedStudy;
  readonly before: PositionRow;
}

async function changed(
  ctx: Context,
  { member, study, before }: Changing,
  version: number,
  kind: 'update' | 'delete' | 'restore',
  set: Partial<PositionRow>,
): Promise<PositionAnswer> {
  const at = ctx.now();
  return ctx.db.transaction(async (tx) => {
    const row = await changeRow(tx, { id: before.id, version }, { ...set, updatedAt: at });
    if (!row) throw versionLost(before.version);
    await touchStudy(tx, study.id, at);
    await insertChange(tx, {
      ...authorOf(member),
      workspaceId: study.workspaceId,
      studyId: study.id,
      entity: 'position',
      entityId: row.id,
      version: row.version,
      kind,
      at,
      before: positionKept(before),
      after: kind === 'delete' ? null : positionKept(row),
    });
    return positionAnswer(row);
  });
}

function withoutUndefined<T extends object>(fields: T): { [K in keyof T]?: Exclude<T[K], undefined> } {
  return Object.fromEntries(Object.entries(fields).filter(([, value]) => value !== undefined)) as {
    [K in keyof T]?: Exclude<T[K], undefined>;
  };
}
