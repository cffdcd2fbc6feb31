/** The end of one's account. */
import { eraseUser, lockedOwners } from '@/db/queries/accounts';
import { insertAudit } from '@/db/queries/audit';
import { deleteWorkspaceRow } from '@/db/queries/members';
import { membersOf, workspacesOfUser } from '@/db/queries/workspaces';
import type { Db } from '@/db/client';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';
import { checkOwnPassword } from './check-own-password';

/**
 * Ends every session and erases address, name and password for good; histories keep a 'who' without a name. Workspaces
 * with nobody else go with it. Throws `conflict` while somebody else's workspace would be left without an owner.
 */
export async function deleteAccount(
  ctx: Context,
  { present, email }: { readonly present: string; readonly email: string },
): Promise<void> {
  const { userId } = personFor(ctx.actor, 'account');
  const user = await checkOwnPassword(ctx, present);
  if (email.trim().normalize('NFKC').toLowerCase() !== user.emailKey) {
    const message = 'Type the address of your account, to be sure.';
    throw new AppError('invalid-request', message, { faults: [{ path: '/email', code: 'other-address', message }] });
  }
  await ctx.db.transaction(async (tx) => {
    for (const { workspace, role } of await workspacesOfUser(tx, userId)) {
      if ((await membersOf(tx, workspace.id)).length === 1) {
        await deleteWorkspaceRow(tx, workspace.id);
        continue;
      }
      if (role === 'owner') await refuseLastOwner(tx, workspace, userId);
      await insertAudit(tx, {
        workspaceId: workspace.id,
        userId,
        at: ctx.now(),
        action: 'member.leave',
        subject: userId,
      });
    }
    await eraseUser(tx, user, ctx.now());
  });
}

async function refuseLastOwner(tx: Db, { id, name }: { readonly id: string; readonly name: string }, userId: string) {
  const owners = await lockedOwners(tx, id);
  if (owners.some((owner) => owner !== userId)) return;
  throw new AppError('conflict', `You are the only owner of ${name}. Make somebody else owner, or delete it, first.`);
}
