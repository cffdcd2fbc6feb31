/** The end of a key. */
import { insertAudit } from '@/db/queries/audit';
import { endKey } from '@/db/queries/keys';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';

/** Ends a key at once and for good. */
export async function revokeKey(ctx: Context, { id }: { readonly id: string }): Promise<undefined> {
  const { workspaceId, userId } = personFor(ctx.actor, 'workspace');
  const at = ctx.now();
  await ctx.db.transaction(async (tx) => {
    const row = await endKey(tx, { workspaceId, id, at });
    if (!row) throw new AppError('not-found', 'There is no such key.');
    await insertAudit(tx, { workspaceId, userId, at, action: 'key.revoke', subject: id, detail: { name: row.name } });
  });
}
