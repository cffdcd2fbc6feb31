/** A member leaves the workspace, or is taken out of it. */
import { lockedOwners } from '@/db/queries/accounts';
import { insertAudit } from '@/db/queries/audit';
import { deleteMembership } from '@/db/queries/members';
import { roleIn } from '@/db/queries/workspaces';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';

/** Owners take members out; anyone may take themselves out. Throws `conflict` for the last owner. What they wrote stays. */
export async function removeMember(ctx: Context, { userId }: { readonly userId: string }): Promise<void> {
  const self = personFor(ctx.actor, 'account');
  const { workspaceId } = self.userId === userId ? self : personFor(ctx.actor, 'workspace');
  await ctx.db.transaction(async (tx) => {
    const owners = await lockedOwners(tx, workspaceId);
    const role = await roleIn(tx, workspaceId, userId);
    if (role === undefined) throw new AppError('not-found', 'There is no such member.');
    if (role === 'owner' && owners.length === 1)
      throw new AppError('conflict', 'A workspace needs an owner. Make somebody else owner first.');
    await deleteMembership(tx, { workspaceId, userId });
    const action = self.userId === userId ? 'member.leave' : 'member.remove';
    await insertAudit(tx, {
      workspaceId,
      userId: self.userId,
      at: ctx.now(),
      action,
      subject: userId,
      detail: { role },
    });
  });
}
