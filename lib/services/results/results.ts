/** Results kept in studies: computed, listed, their words changed, put into the trash. */
import { insertChange } from '@/db/queries/changes';
import { changeResult, insertResult, resultById, type ResultRow, resultsOf } from '@/db/queries/results';
import { type CountedStudy, touchStudy } from '@/db/queries/study-list';
import type { InputOf } from '@/lib/compute/calls';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import type { Member } from '@/lib/permissions';
import { computeCall } from '@/lib/services/computed/compute-call';
import { engineVersion } from '@/lib/services/readings/engine';
import { authorOf, readableStudy, versionLost, writableStudy } from '@/lib/services/studies/access';
import { CALL_OF } from './call-of';
import type { ResultAnswer, ResultChange, ResultKind } from '@/openapi/schemas/results';

interface InStudy<K extends ResultKind = ResultKind> {
  readonly id: string;
  readonly kind: K;
}

interface OneResult extends InStudy {
  readonly resultId: string;
}

/** Computes a request and keeps both it and its result. Throws the computing call's refusals. */
export async function createResult<K extends ResultKind>(
  ctx: Context,
  {
    id,
    kind,
    title,
    note,
    request,
  }: InStudy<K> & { readonly title: string; readonly note: string; readonly request: InputOf<(typeof CALL_OF)[K]> },
): Promise<ResultAnswer> {
  const { member, study } = await writableStudy(ctx, id);
  const written = await computeCall(ctx, CALL_OF[kind], request).catch((error: unknown) => {
    throw error instanceof AppError ? insideRequest(error) : error;
  });
  const result: unknown = JSON.parse(new TextDecoder().decode(written.bytes));
  const at = ctx.now();
  return ctx.db.transaction(async (tx) => {
    const row = await insertResult(tx, {
      studyId: id,
      kind,
      title,
      note,
      request,
      result,
      engineVersion,
      computedAt: at,
      createdBy: authorOf(member).userId,
      createdAt: at,
      updatedAt: at,
    });
    await touchStudy(tx, id, at);
    await insertChange(tx, { ...changeFor(member, study, row, at), kind: 'create', before: null, after: wordsOf(row) });
    return resultAnswer(row);
  });
}

/** The computing call's faults lie one level deeper here. */
function insideRequest({ code, message, faults }: AppError): AppError {
  return new AppError(code, message, { faults: faults.map((fault) => ({ ...fault, path: `/request${fault.path}` })) });
}

/** All results of a kind, the oldest first. */
export async function listResults(ctx: Context, { id, kind }: InStudy): Promise<{ readonly items: ResultAnswer[] }> {
  await readableStudy(ctx, id);
  return { items: (await resultsOf(ctx.db, id, kind)).map(resultAnswer) };
}

/** One result. */
export async function readResult(ctx: Context, { id, kind, resultId }: OneResult): Promise<ResultAnswer> {
  await readableStudy(ctx, id);
  return resultAnswer(await resultIn(ctx, { id, kind, resultId }));
}

/** Changes title or note. */
export async function changeWords(
  ctx: Context,
  { id, kind, resultId, version, title, note }: OneResult & ResultChange & { readonly version: number },
): Promise<ResultAnswer> {
  const { member, study } = await writableStudy(ctx, id);
  const before = await resultIn(ctx, { id, kind, resultId });
  const set = { title: title ?? before.title, note: note ?? before.note };
  return resultAnswer(await changed(ctx, { member, study, before }, version, 'update', set));
}

/** Puts a result into the trash. */
export async function trashResult(
  ctx: Context,
  { id, kind, resultId, version }: OneResult & { readonly version: number },
): Promise<undefined> {
  const { member, study } = await writableStudy(ctx, id);
  const before = await resultIn(ctx, { id, kind, resultId });
  await changed(ctx, { member, study, before }, version, 'delete', { deletedAt: ctx.now() });
}

/** Takes a result out of the trash, as it was. */
export async function restoreResult(ctx: Context, { id, kind, resultId }: OneResult): Promise<ResultAnswer> {
  const { member, study } = await writableStudy(ctx, id);
  const before = await resultIn(ctx, { id, kind, resultId }, true);
  if (before.deletedAt === null) return resultAnswer(before);
  return resultAnswer(await changed(ctx, { member, study, before }, before.version, 'restore', { deletedAt: null }));
}

async function resultIn(ctx: Context, { id, kind, resultId }: OneResult, trashed = false): Promise<ResultRow> {
  const row = await resultById(ctx.db, id, resultId);
  if (!row || row.kind !== kind || (row.deletedAt !== null && !trashed))
    throw new AppError('not-found', `There is no such ${kind}.`);
  return row;
}

interface Changing {
  readonly member: Member;
  readonly study: CountedStudy;
  readonly before: ResultRow;
}

async function changed(
  ctx: Context,
  { member, study, before }: Changing,
  version: number,
  kind: 'update' | 'delete' | 'restore',
  set: Partial<Pick<ResultRow, 'title' | 'note' | 'deletedAt'>>,
): Promise<ResultRow> {
  const at = ctx.now();
  return ctx.db.transaction(async (tx) => {
    const row = await changeResult(tx, { id: before.id, version }, { ...set, updatedAt: at });
    if (!row) throw versionLost(before.version);
    await touchStudy(tx, study.id, at);
    const after = kind === 'delete' ? null : wordsOf(row);
    await insertChange(tx, { ...changeFor(member, study, row, at), kind, before: wordsOf(before), after });
    return row;
  });
}

function changeFor(member: Member, study: CountedStudy, row: ResultRow, at: Date) {
  const { workspaceId } = study;
  return {
    ...authorOf(member),
    workspaceId,
    studyId: study.id,
    entity: 'result',
    entityId: row.id,
    version: row.version,
    at,
  } as const;
}

function wordsOf({ kind, title, note, request }: ResultRow): Record<string, unknown> {
  return { kind, title, note, request };
}

/** A result as promised. */
export function resultAnswer(row: ResultRow): ResultAnswer {
  return {
    id: row.id,
    kind: row.kind as ResultKind,
    title: row.title,
    note: row.note,
    request: row.request,
    result: row.result,
    engine: row.engineVersion,
    current: row.engineVersion === engineVersion,
    version: row.version,
    computedAt: row.computedAt.toISOString(),
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
  };
}
