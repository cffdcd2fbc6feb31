/**
 * Allowances of calls, by key, person or address, and the headers that tell of them
 * (draft-ietf-httpapi-ratelimit-headers).
 *
 * Counted in the memory of this process: several web processes together allow as many times more. Tries of passwords,
 * where that would matter, are counted in the database.
 */
import { RateLimiterMemory, RateLimiterRes } from 'rate-limiter-flexible';
import { AppError } from '@/lib/errors';

/** Seconds of a window. */
const WINDOW_SECONDS = 60;

/** Points in a window. A call costs one; a batch one for each ten positions. */
export const ALLOWANCES = { address: 300, person: 1200, key: 3000 } as const;
export type LimitKind = keyof typeof ALLOWANCES;

const limiters = Object.fromEntries(
  Object.entries(ALLOWANCES).map(([kind, points]) => [
    kind,
    new RateLimiterMemory({ keyPrefix: kind, points, duration: WINDOW_SECONDS }),
  ]),
) as Readonly<Record<LimitKind, RateLimiterMemory>>;

/** Takes points from the allowance. Gives the headers of the answer; throws `too-many-requests` when it is used up. */
export async function spend(kind: LimitKind, who: string, points = 1): Promise<Readonly<Record<string, string>>> {
  try {
    return limitHeaders(kind, await limiters[kind].consume(who, points));
  } catch (rejected) {
    if (!(rejected instanceof RateLimiterRes)) throw rejected;
    const seconds = Math.max(1, Math.ceil(rejected.msBeforeNext / 1000));
    throw new AppError(
      'too-many-requests',
      `The allowance of ${ALLOWANCES[kind]} points in ${WINDOW_SECONDS} seconds is used up.`,
      {
        bound: { name: 'pointsAMinute', max: ALLOWANCES[kind] },
        headers: { ...limitHeaders(kind, rejected), 'Retry-After': String(seconds) },
      },
    );
  }
}

function limitHeaders(kind: LimitKind, { remainingPoints, msBeforeNext }: RateLimiterRes): Record<string, string> {
  return {
    'RateLimit-Policy': `"${kind}";q=${ALLOWANCES[kind]};w=${WINDOW_SECONDS}`,
    RateLimit: `"${kind}";r=${Math.max(0, remainingPoints)};t=${Math.max(0, Math.ceil(msBeforeNext / 1000))}`,
  };
}
