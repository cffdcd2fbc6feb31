/** POSTs that store, sent again with the same Idempotency-Key: stored once, answered the same. */
import { createHash } from 'node:crypto';
import { dropIdempotencyKey, keepReply, sweepIdempotencyKeys, takeIdempotencyKey } from '@/db/queries/keys';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';

const KEPT_HOURS = 24;
/** A request that is still unanswered after so long has lost its process. */
const WORK_MINUTES = 10;
const KEY_LENGTH_MAX = 128;

/** What is kept of an answer. */
interface Kept {
  readonly status: number;
  readonly reply: unknown;
  readonly headers: Readonly<Record<string, string>>;
}

interface Once {
  readonly ctx: Context;
  /** The caller whose key it is: the id of a person or of an API key. */
  readonly owner: string;
  /** The id of the contract. */
  readonly call: string;
  readonly key: string;
  /** What tells requests apart: path and body. */
  readonly request: string;
}

/** The header's text; undefined without one. Throws `invalid-request` on one that is too long. */
export function idempotencyKeyOf(request: Request): string | undefined {
  const key = request.headers.get('idempotency-key')?.trim();
  if (key === undefined) return undefined;
  if (key.length >= 1 && key.length <= KEY_LENGTH_MAX) return key;
  throw new AppError('invalid-request', `An Idempotency-Key has 1 to ${KEY_LENGTH_MAX} characters.`);
}

/** Does the work once for each key, and answers what was answered before when it is asked again. */
export async function once({ ctx, owner, call, key, request }: Once, work: () => Promise<Kept>): Promise<Kept> {
  const now = ctx.now();
  const bodyHash = createHash('sha256').update(request).digest('hex');
  await sweepIdempotencyKeys(ctx.db, {
    owner,
    key,
    before: new Date(now.getTime() - KEPT_HOURS * 3_600_000),
    unfinishedBefore: new Date(now.getTime() - WORK_MINUTES * 60_000),
  });
  const kept = await takeIdempotencyKey(ctx.db, { owner, key, call, bodyHash, createdAt: now });
  if (kept) {
    if (kept.call !== call || kept.bodyHash !== bodyHash)
      throw new AppError('idempotency-mismatch', 'This Idempotency-Key was used with another request.');
    if (kept.status === null)
      throw new AppError('idempotency-busy', 'The first request with this key is still at work.', {
        headers: { 'Retry-After': '1' },
      });
    return { status: kept.status, reply: kept.reply, headers: { ...kept.headers, 'Idempotency-Replayed': 'true' } };
  }
  try {
    const made = await work();
    await keepReply(ctx.db, { owner, key, ...made });
    return made;
  } catch (error) {
    await dropIdempotencyKey(ctx.db, { owner, key });
    throw error;
  }
}
