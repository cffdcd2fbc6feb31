/** Another role for a member. */
import { lockedOwners } from '@/db/queries/accounts';
import { insertAudit } from '@/db/queries/audit';
import { setRole } from '@/db/queries/members';
import { roleIn } from '@/db/queries/workspaces';
import type { Role } from '@/db/schema';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';

/** Changes a member's role, at once. Throws `conflict` where the workspace would be left without an owner. */
export async function changeRole(
  ctx: Context,
  { userId, role }: { readonly userId: string; readonly role: Role },
): Promise<void> {
  const actor = personFor(ctx.actor, 'workspace');
  const { workspaceId } = actor;
  await ctx.db.transaction(async (tx) => {
    const owners = await lockedOwners(tx, workspaceId);
    const before = await roleIn(tx, workspaceId, userId);
    if (before === undefined) throw new AppError('not-found', 'There is no such member.');
    if (before === role) return;
    if (before === 'owner' && owners.length === 1)
      throw new AppError('conflict', 'A workspace needs an owner. Make somebody else owner first.');
    await setRole(tx, { workspaceId, userId, role });
    const detail = { from: before, to: role };
    await insertAudit(tx, {
      workspaceId,
      userId: actor.userId,
      at: ctx.now(),
      action: 'member.role',
      subject: userId,
      detail,
    });
  });
}
