/** All that is kept of a person, for them to take away. */
import { dataOf } from '@/db/queries/accounts';
import type { Context } from '@/lib/context';
import { personFor } from '@/lib/permissions';

/** One's own data as JSON: account, workspaces, sessions, what one made and did. Nothing of others, no secret. */
export async function exportAccount(ctx: Context): Promise<Readonly<Record<string, unknown>>> {
  const { userId } = personFor(ctx.actor, 'account');
  return { exportedAt: ctx.now().toISOString(), ...(await dataOf(ctx.db, userId)) };
}
