/** The password asked for once more, before what cannot be taken back. */
import { type UserRow, userById } from '@/db/queries/users';
import { isPassword } from '@/lib/auth/password';
import { takeTry } from '@/lib/auth/tries';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';

/** The account, if the password is its own or it has none. Tries are limited as at the door. Throws `invalid-request`. */
export async function checkOwnPassword(ctx: Context, password: string): Promise<UserRow> {
  const { userId } = personFor(ctx.actor, 'account');
  const user = await userById(ctx.db, userId);
  if (!user) throw new AppError('not-found', 'There is no such account.');
  if (user.passwordHash === null) return user;
  await takeTry(ctx, 'password', { emailKey: user.emailKey ?? user.id, address: undefined });
  if (await isPassword(user.passwordHash, password)) return user;
  const message = 'This is not your present password.';
  throw new AppError('invalid-request', message, { faults: [{ path: '/present', code: 'wrong-password', message }] });
}
