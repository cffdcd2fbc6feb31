/** The keys of the workspace. */
import { keysOf } from '@/db/queries/keys';
import type { Context } from '@/lib/context';
import { personFor } from '@/lib/permissions';
import type { KeyAnswer } from '@/openapi/schemas/keys';
import { keyAnswer } from './answers';

/** All keys, the newest first. */
export async function listKeys(ctx: Context): Promise<{ readonly items: KeyAnswer[] }> {
  const { workspaceId } = personFor(ctx.actor, 'workspace');
  return { items: (await keysOf(ctx.db, workspaceId)).map(keyAnswer) };
}
