/** One more workspace. */
import { insertWorkspace, putMembership } from '@/db/queries/workspaces';
import { newSlug } from '@/lib/auth/start-session';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';
import { listWorkspaces } from './list-workspaces';

const WORKSPACES_MAX = 20;

/** Makes a workspace with oneself as owner; gives its id. */
export async function createWorkspace(ctx: Context, { name }: { readonly name: string }): Promise<string> {
  const { userId } = personFor(ctx.actor, 'account');
  if ((await listWorkspaces(ctx)).length >= WORKSPACES_MAX) {
    throw new AppError('conflict', `One person belongs to ${WORKSPACES_MAX} workspaces at most.`);
  }
  return ctx.db.transaction(async (tx) => {
    const workspace = await insertWorkspace(tx, { name, slug: newSlug(name) });
    if (!workspace) throw new Error('a slug of chance was taken');
    await putMembership(tx, workspace.id, userId, 'owner');
    return workspace.id;
  });
}
