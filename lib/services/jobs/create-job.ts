/** Long work begun. */
import { insertJob } from '@/db/queries/jobs';
import { oldResultsOf } from '@/db/queries/results';
import { positionsOf } from '@/db/queries/studies';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { memberFor } from '@/lib/permissions';
import { engineVersion } from '@/lib/services/readings/engine';
import { writableStudy } from '@/lib/services/studies/access';
import { JOB_ITEMS_MAX, type JobAnswer, type JobRequest } from '@/openapi/schemas/jobs';
import { jobAnswer } from './answers';

/** Stores the work and its items; a worker takes it from there. */
export async function createJob(ctx: Context, request: JobRequest): Promise<JobAnswer> {
  const { workspaceId, userId, keyId } = memberFor(ctx.actor, 'studies:write');
  const { input, items } = await itemsOf(ctx, request);
  const job = await ctx.db.transaction((tx) =>
    insertJob(tx, { workspaceId, kind: request.kind, input, createdBy: userId, keyId, createdAt: ctx.now() }, items),
  );
  return jobAnswer(job);
}

async function itemsOf(
  ctx: Context,
  request: JobRequest,
): Promise<{ readonly input: Record<string, unknown>; readonly items: readonly unknown[] }> {
  if (request.kind === 'readings') return { input: {}, items: request.fens };
  const { study } = await writableStudy(ctx, request.study);
  if (request.kind === 'recompute') {
    const fens = new Set((await positionsOf(ctx.db, study.id)).map(({ fen }) => fen));
    const old = await oldResultsOf(ctx.db, study.id, engineVersion);
    return { input: { study: study.id }, items: [...fens, ...old.map(({ id }) => ({ result: id }))] };
  }
  const items = linesOf(request.text);
  if (items.length > JOB_ITEMS_MAX) {
    throw new AppError('invalid-request', `An import takes at most ${JOB_ITEMS_MAX} items; this has ${items.length}.`, {
      bound: { name: 'items', max: JOB_ITEMS_MAX },
      faults: [{ path: '/text', code: 'too-many', message: `${items.length} items.` }],
    });
  }
  return { input: { study: study.id, format: request.format }, items };
}

/** The lines of a list of FENs that are not empty, each with its number in the text. */
function linesOf(text: string): { readonly line: number; readonly text: string }[] {
  return text
    .split(/\r?\n/)
    .map((line, place) => ({ line: place + 1, text: line.trim() }))
    .filter((line) => line.text !== '');
}
