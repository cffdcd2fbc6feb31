/** Signing in with a password. */
import { userByEmailKey } from '@/db/queries/users';
import { isPassword } from '@/lib/auth/password';
import { startSession } from '@/lib/auth/start-session';
import { forgetAccountTries, takeTry } from '@/lib/auth/tries';
import type { Context } from '@/lib/context';
import { emailKeyOf } from '@/lib/email-address';
import { AppError } from '@/lib/errors';

export interface SignInRequest {
  readonly email: string;
  readonly password: string;
  /** The network address, for the limit on tries. */
  readonly address: string | undefined;
  /** The browser's name of itself. */
  readonly agent: string | null;
}

/** Gives the sealed session. Of no account, no password and a wrong password the same is said, after the same time. */
export async function signIn(ctx: Context, { email, password, address, agent }: SignInRequest): Promise<string> {
  const emailKey = emailKeyOf(email);
  await takeTry(ctx, 'password', { emailKey, address });
  const user = await userByEmailKey(ctx.db, emailKey);
  const isRight = await isPassword(user?.passwordHash, password);
  if (!user || !isRight) throw new AppError('not-signed-in', 'Address and password do not go together.');
  await forgetAccountTries(ctx, 'password', emailKey);
  return ctx.db.transaction((tx) => startSession(ctx, tx, user, agent));
}
