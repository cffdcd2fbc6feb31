/** Signing in with a link that came by e-mail. */
import { userByEmailKey } from '@/db/queries/users';
import { takeLinkToken } from '@/lib/auth/links';
import { startSession } from '@/lib/auth/start-session';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';

/** Uses the link up and gives the sealed session. Throws `not-found` where the link is good no more. */
export function signInByLink(
  ctx: Context,
  { token, agent }: { readonly token: string; readonly agent: string | null },
): Promise<string> {
  return ctx.db.transaction(async (tx) => {
    const user = await userByEmailKey(tx, await takeLinkToken(ctx, tx, 'sign-in', token));
    if (!user) throw new AppError('not-found', 'The account of this link is gone.');
    return startSession(ctx, tx, user, agent);
  });
}
