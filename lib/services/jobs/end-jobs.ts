/** Jobs cancelled and tried again. */
import { cancelJob as cancelRow, requeueJob } from '@/db/queries/jobs';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { memberFor } from '@/lib/permissions';
import type { JobAnswer } from '@/openapi/schemas/jobs';
import { jobAnswer } from './answers';
import { readJob } from './read-jobs';

/** Ends a job; one that has ended stays as it is. */
export async function cancelJob(ctx: Context, { id }: { readonly id: string }): Promise<JobAnswer> {
  memberFor(ctx.actor, 'studies:write');
  const job = await readJob(ctx, { id });
  const row = await cancelRow(ctx.db, id, ctx.now());
  return row ? jobAnswer(row) : job;
}

/** Queues a job again. Throws `conflict` where it still runs or has nothing left to do. */
export async function retryJob(ctx: Context, { id }: { readonly id: string }): Promise<JobAnswer> {
  memberFor(ctx.actor, 'studies:write');
  const job = await readJob(ctx, { id });
  const row = await requeueJob(ctx.db, id);
  if (row) return jobAnswer(row);
  throw new AppError('conflict', `This job is ${job.state}, and nothing of it is left to try again.`);
}
