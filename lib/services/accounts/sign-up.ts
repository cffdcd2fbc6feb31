/** A new account, by the link that proved the address. */
import { insertUser } from '@/db/queries/users';
import { takeLinkToken } from '@/lib/auth/links';
import { passwordHash } from '@/lib/auth/password';
import { startSession } from '@/lib/auth/start-session';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';

/** Makes the account with a workspace of its own and signs it in; gives the sealed session. Whoever has the link may ask. */
export async function signUp(
  ctx: Context,
  {
    token,
    name,
    password,
    agent,
  }: { readonly token: string; readonly name: string; readonly password: string; readonly agent: string | null },
): Promise<string> {
  // Before the link is used up: a password that is refused leaves it good. Outside the transaction: it takes a while.
  const hashed = await passwordHash(password);
  return ctx.db.transaction(async (tx) => {
    const emailKey = await takeLinkToken(ctx, tx, 'sign-up', token);
    const user = await insertUser(tx, {
      email: emailKey,
      emailKey,
      name,
      passwordHash: hashed,
      emailVerified: ctx.now(),
    });
    if (!user) throw new AppError('conflict', 'This address has an account by now. Sign in with it.');
    return startSession(ctx, tx, user, agent);
  });
}
