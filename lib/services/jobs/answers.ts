/** A job as the API answers it. */
import type { JobRow } from '@/db/queries/jobs';
import { AppError } from '@/lib/errors';
import type { JobAnswer } from '@/openapi/schemas/jobs';

/** A job as promised: not who works on it. */
export function jobAnswer(row: JobRow): JobAnswer {
  return {
    id: row.id,
    kind: row.kind,
    state: row.state,
    total: row.total,
    done: row.done,
    failed: row.failed,
    error: row.error,
    createdAt: row.createdAt.toISOString(),
    startedAt: row.startedAt?.toISOString() ?? null,
    endedAt: row.endedAt?.toISOString() ?? null,
  };
}

/** Of a job that is another's, and of one that never was, the same is said. */
export function noJob(): AppError {
  return new AppError('not-found', 'There is no such job.');
}
