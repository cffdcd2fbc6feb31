/** Jobs as they are: listed, read, watched, and what became of their items. */
import { itemsPage, jobById, jobsPage } from '@/db/queries/jobs';
import { pageOf, readCursor } from '@/lib/api/cursor';
import type { Context } from '@/lib/context';
import { memberFor } from '@/lib/permissions';
import type { JobAnswer } from '@/openapi/schemas/jobs';
import { jobAnswer, noJob } from './answers';

interface Page {
  readonly limit: number;
  readonly cursor?: string | undefined;
}

/** The workspace's jobs, the newest first. */
export async function listJobs(
  ctx: Context,
  { limit, cursor }: Page,
): Promise<{ readonly items: JobAnswer[]; readonly next: string | null }> {
  const { workspaceId } = memberFor(ctx.actor, 'studies:write');
  const after = cursor === undefined ? undefined : readCursor(cursor);
  const rows = await jobsPage(ctx.db, {
    workspaceId,
    limit: limit + 1,
    after: after && { at: new Date(after.after), id: after.id },
  });
  const { items, next } = pageOf(rows, limit, (row) => ({ after: row.createdAt.toISOString(), id: row.id }));
  return { items: items.map(jobAnswer), next };
}

/** A job. */
export async function readJob(ctx: Context, { id }: { readonly id: string }): Promise<JobAnswer> {
  const { workspaceId } = memberFor(ctx.actor, 'studies:write');
  const row = await jobById(ctx.db, workspaceId, id);
  if (!row) throw noJob();
  return jobAnswer(row);
}

/** Milliseconds between looks at a job that is watched. */
const LOOK_MS = 400;

/** The job at once, at each change, and at its end. Throws before the first where there is none. */
export async function watchJob(ctx: Context, { id }: { readonly id: string }): Promise<AsyncGenerator<JobAnswer>> {
  const first = await readJob(ctx, { id });
  return (async function* () {
    let shown = first;
    yield first;
    while (shown.endedAt === null && !ctx.signal.aborted) {
      await new Promise((resolve) => setTimeout(resolve, LOOK_MS).unref());
      const job = await readJob(ctx, { id });
      if (JSON.stringify(job) === JSON.stringify(shown)) continue;
      shown = job;
      yield job;
    }
  })();
}

interface ItemsWanted {
  readonly id: string;
  readonly limit: number;
  readonly after: number;
}

/** What became of a job's items, in order. */
export async function listJobItems(ctx: Context, { id, limit, after }: ItemsWanted) {
  await readJob(ctx, { id });
  const rows = await itemsPage(ctx.db, { jobId: id, limit: limit + 1, after });
  const items = rows.slice(0, limit).map(({ number, state, output }) => ({ number, state, output }));
  return { items, next: rows.length > limit ? (items[items.length - 1]?.number ?? null) : null };
}
