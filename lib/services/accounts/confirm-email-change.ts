/** The new address, by the link that proved it. */
import { updateEmail } from '@/db/queries/accounts';
import { takeLinkToken } from '@/lib/auth/links';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';

/** Gives the account its new address. Only the person who asked for it can: another's link is as good as none. */
export async function confirmEmailChange(ctx: Context, { token }: { readonly token: string }): Promise<void> {
  const { userId } = personFor(ctx.actor, 'account');
  await ctx.db.transaction(async (tx) => {
    const [who, emailKey] = (await takeLinkToken(ctx, tx, 'change-email', token)).split(' ');
    if (who !== userId || emailKey === undefined) {
      throw new AppError('not-found', 'This link belongs to another account. Sign in with that one.');
    }
    if (!(await updateEmail(tx, { userId, emailKey, at: ctx.now() }))) {
      throw new AppError('conflict', 'This address cannot be taken: another account has it.');
    }
  });
}
