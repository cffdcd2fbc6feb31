/** The workspace that is chosen. */
import type { Role } from '@/db/schema';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';
import { listWorkspaces } from './list-workspaces';

/** Its id, its name and one's own role in it. */
export async function readWorkspace(
  ctx: Context,
): Promise<{ readonly id: string; readonly name: string; readonly role: Role }> {
  const { workspaceId } = personFor(ctx.actor, 'account');
  const found = (await listWorkspaces(ctx)).find(({ id }) => id === workspaceId);
  if (!found) throw new AppError('not-found', 'There is no such workspace.');
  return found;
}
