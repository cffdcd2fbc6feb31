/** Which workspace one works in. */
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { listWorkspaces } from './list-workspaces';

/** The id, if one belongs there. Of another's workspace and of none the same is said. */
export async function chooseWorkspace(ctx: Context, { id }: { readonly id: string }): Promise<string> {
  if ((await listWorkspaces(ctx)).some((workspace) => workspace.id === id)) return id;
  throw new AppError('not-found', 'There is no such workspace.');
}
