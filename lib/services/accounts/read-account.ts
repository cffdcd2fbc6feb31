/** One's own account, for the page of settings. */
import { userById } from '@/db/queries/users';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';

export interface Account {
  readonly name: string;
  readonly email: string;
  /** False: signs in by link only. */
  readonly hasPassword: boolean;
}

/** The account of whoever is signed in; never its password's hash. */
export async function readAccount(ctx: Context): Promise<Account> {
  const { userId } = personFor(ctx.actor, 'account');
  const user = await userById(ctx.db, userId);
  if (!user) throw new AppError('not-found', 'There is no such account.');
  return { name: user.name ?? '', email: user.email ?? '', hasPassword: user.passwordHash !== null };
}
