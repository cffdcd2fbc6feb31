/** An invitation taken back. */
import { insertAudit } from '@/db/queries/audit';
import { endInvitation } from '@/db/queries/invitations';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';

/** Ends an open invitation of the workspace. */
export async function revokeInvitation(ctx: Context, { id }: { readonly id: string }): Promise<void> {
  const { workspaceId, userId } = personFor(ctx.actor, 'workspace');
  const at = ctx.now();
  await ctx.db.transaction(async (tx) => {
    if (!(await endInvitation(tx, { workspaceId, id, at })))
      throw new AppError('not-found', 'There is no such invitation.');
    await insertAudit(tx, { workspaceId, userId, at, action: 'invitation.revoke', subject: id });
  });
}
