/** The end of all sessions but one's own present one. */
import { endSignInsOf } from '@/db/queries/sign-ins';
import type { Context } from '@/lib/context';
import { personFor } from '@/lib/permissions';

/** Ends them at once; gives how many. */
export function endOtherSignIns(ctx: Context): Promise<number> {
  const { userId, signInId } = personFor(ctx.actor, 'account');
  return endSignInsOf(ctx.db, { userId, except: signInId, at: ctx.now() });
}
