/** The workspaces that one belongs to. */
import { workspacesOfUser } from '@/db/queries/workspaces';
import type { Role } from '@/db/schema';
import type { Context } from '@/lib/context';
import { personFor } from '@/lib/permissions';

/** By name, each with one's own role in it. */
export async function listWorkspaces(
  ctx: Context,
): Promise<readonly { readonly id: string; readonly name: string; readonly role: Role }[]> {
  const { userId } = personFor(ctx.actor, 'account');
  const rows = await workspacesOfUser(ctx.db, userId);
  return rows.map(({ workspace: { id, name }, role }) => ({ id, name, role }));
}
