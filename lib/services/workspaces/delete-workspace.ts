/** The end of a workspace. */
import { deleteWorkspaceRow } from '@/db/queries/members';
import { userById, type UserRow } from '@/db/queries/users';
import { workspacesOfUser } from '@/db/queries/workspaces';
import { giveWorkspace } from '@/lib/auth/start-session';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';
import { readWorkspace } from './read-workspace';

/** Deletes the workspace that is chosen with all that is in it, once its name is typed. Its owner keeps a place to be. */
export async function deleteWorkspace(ctx: Context, { name }: { readonly name: string }): Promise<void> {
  const { workspaceId, userId } = personFor(ctx.actor, 'workspace');
  const workspace = await readWorkspace(ctx);
  if (name.trim() !== workspace.name) {
    const message = `Type the name of the workspace as it stands: ${workspace.name}`;
    throw new AppError('invalid-request', message, { faults: [{ path: '/name', code: 'other-name', message }] });
  }
  await ctx.db.transaction(async (tx) => {
    await deleteWorkspaceRow(tx, workspaceId);
    const user: UserRow | undefined = await userById(tx, userId);
    if (user && (await workspacesOfUser(tx, userId)).length === 0) await giveWorkspace(tx, user);
  });
}
