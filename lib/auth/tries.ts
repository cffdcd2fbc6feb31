/** Limits on tries of passwords and on messages asked for: by account and by address. */
import { createHash } from 'node:crypto';
import { countTry, forgetTries } from '@/db/queries/tries';
import { isLoopback } from '@/lib/address';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';

const WINDOW_MS = 15 * 60_000;
/** Wrong passwords for one account, and messages to one address, in a window. */
const ACCOUNT_TRIES_MAX = 10;
/** Of one network address: a classroom signs in from one. */
const ADDRESS_TRIES_MAX = 60;

/** What is tried. A password that is blocked leaves the link by e-mail open. */
export type Tried = 'password' | 'message';

/** Whose tries are counted. */
export interface Trier {
  readonly emailKey: string;
  /** The network address; undefined or this machine itself: not counted. */
  readonly address: string | undefined;
}

/** Counts a try. Throws `too-many-requests` beyond the limits, whether or not there is such an account. */
export async function takeTry(ctx: Context, what: Tried, { emailKey, address }: Trier): Promise<void> {
  await count(ctx, keyOf(what, `account ${emailKey}`), ACCOUNT_TRIES_MAX);
  if (address !== undefined && !isLoopback(address))
    await count(ctx, keyOf(what, `address ${address}`), ADDRESS_TRIES_MAX);
}

/** Forgets an account's tries, after one that was right. */
export async function forgetAccountTries(ctx: Context, what: Tried, emailKey: string): Promise<void> {
  await forgetTries(ctx.db, keyOf(what, `account ${emailKey}`));
}

async function count(ctx: Context, key: string, most: number): Promise<void> {
  if ((await countTry(ctx.db, { key, at: ctx.now(), windowMs: WINDOW_MS })) <= most) return;
  throw new AppError('too-many-requests', 'Too many tries. Wait a quarter of an hour, then try again.', {
    headers: { 'Retry-After': String(WINDOW_MS / 1000) },
  });
}

/** The database need not hold addresses of people who have no account. */
function keyOf(what: Tried, who: string): string {
  return `${what}:${createHash('sha256').update(who).digest('base64url')}`;
}
