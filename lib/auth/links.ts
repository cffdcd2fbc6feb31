/** Links that are sent by e-mail: good once, for a time, stored as a hash only. */
import { createHash, randomBytes } from 'node:crypto';
import { insertToken, takeToken, tokenOf } from '@/db/queries/tokens';
import type { Db } from '@/db/client';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';

const TOKEN_BYTES = 32;
const LINK_MINUTES = 30;

/** What a link does. */
export type LinkPurpose = 'sign-in' | 'sign-up' | 'change-email';

/** A new token of a purpose for somebody (an address, or a person and an address). */
export async function newLinkToken(ctx: Context, purpose: LinkPurpose, who: string): Promise<string> {
  const token = newToken();
  const expires = new Date(ctx.now().getTime() + LINK_MINUTES * 60_000);
  await insertToken(ctx.db, { identifier: `${purpose} ${who}`, token: tokenHash(token), expires });
  return token;
}

/** Whom a link is for, without using it up. Throws `not-found` where it is none, was used, or is too old: the same is said of all. */
export async function readLinkToken(ctx: Context, purpose: LinkPurpose, token: string): Promise<string> {
  return whoOf(ctx, purpose, await tokenOf(ctx.db, tokenHash(token)));
}

/** Uses a link up in a transaction; whom it was for. Throws `not-found` like readLinkToken. */
export async function takeLinkToken(ctx: Context, tx: Db, purpose: LinkPurpose, token: string): Promise<string> {
  return whoOf(ctx, purpose, await takeToken(tx, tokenHash(token)));
}

function whoOf(ctx: Context, purpose: LinkPurpose, row: Awaited<ReturnType<typeof tokenOf>>): string {
  if (row && row.expires.getTime() > ctx.now().getTime() && row.identifier.startsWith(`${purpose} `))
    return row.identifier.slice(purpose.length + 1);
  throw new AppError('not-found', `This link is used, or older than ${LINK_MINUTES} minutes. Ask for a new one.`);
}

/** A token with 256 bits of chance. */
export function newToken(): string {
  return randomBytes(TOKEN_BYTES).toString('base64url');
}

/** SHA-256 in hex: a token of chance needs no slow hash. */
export function tokenHash(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
