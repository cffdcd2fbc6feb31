/** One's own name. */
import { updateUser } from '@/db/queries/accounts';
import type { Context } from '@/lib/context';
import { personFor } from '@/lib/permissions';

/** Changes the name that others see. */
export async function renameAccount(ctx: Context, { name }: { readonly name: string }): Promise<void> {
  const { userId } = personFor(ctx.actor, 'account');
  await updateUser(ctx.db, userId, { name });
}
