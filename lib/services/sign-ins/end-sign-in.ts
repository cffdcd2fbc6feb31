/** The end of a session. */
import { endSignIn as endRow } from '@/db/queries/sessions';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';

/** Ends one of one's own sessions at once; of another's session and of none the same is said. */
export async function endSignIn(ctx: Context, { id }: { readonly id: string }): Promise<void> {
  const { userId } = personFor(ctx.actor, 'account');
  if (!(await endRow(ctx.db, { userId, id, at: ctx.now() })))
    throw new AppError('not-found', 'There is no such session.');
}
