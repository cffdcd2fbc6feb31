/** One's own password. */
import { updateUser } from '@/db/queries/accounts';
import { raiseTokenVersion, userById } from '@/db/queries/users';
import { endSignInsOf } from '@/db/queries/sign-ins';
import { passwordHash } from '@/lib/auth/password';
import { startSession } from '@/lib/auth/start-session';
import type { Context } from '@/lib/context';
import { personFor } from '@/lib/permissions';
import { checkOwnPassword } from './check-own-password';

/** Changes it and ends every session, this one too; gives a new sealed session in its place. */
export async function changePassword(
  ctx: Context,
  { present, password, agent }: { readonly present: string; readonly password: string; readonly agent: string | null },
): Promise<string> {
  const { userId } = personFor(ctx.actor, 'account');
  await checkOwnPassword(ctx, present);
  const hashed = await passwordHash(password);
  return ctx.db.transaction(async (tx) => {
    await updateUser(tx, userId, { passwordHash: hashed });
    await raiseTokenVersion(tx, userId);
    await endSignInsOf(tx, { userId, at: ctx.now() });
    const user = await userById(tx, userId);
    if (!user) throw new Error('an account vanished in its own transaction');
    return startSession(ctx, tx, user, agent);
  });
}
