/** Another name for the workspace. */
import { insertAudit } from '@/db/queries/audit';
import { setWorkspaceName } from '@/db/queries/members';
import type { Context } from '@/lib/context';
import { personFor } from '@/lib/permissions';

/** Renames the workspace that is chosen. */
export async function renameWorkspace(ctx: Context, { name }: { readonly name: string }): Promise<void> {
  const { workspaceId, userId } = personFor(ctx.actor, 'workspace');
  await ctx.db.transaction(async (tx) => {
    await setWorkspaceName(tx, workspaceId, name);
    await insertAudit(tx, { workspaceId, userId, at: ctx.now(), action: 'workspace.rename', detail: { name } });
  });
}
