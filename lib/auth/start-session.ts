/** A session begins: one row in the list of sessions, one sealed cookie. */
import { randomBytes } from 'node:crypto';
import { insertSignIn } from '@/db/queries/sessions';
import type { UserRow } from '@/db/queries/users';
import { insertWorkspace, putMembership, workspacesOfUser } from '@/db/queries/workspaces';
import type { Db } from '@/db/client';
import type { Context } from '@/lib/context';
import { sealSession } from './session-actor';

const AGENT_LENGTH_MAX = 200;

/** Begins a session of a person on the browser of that name; gives the sealed text for its cookie. */
export async function startSession(ctx: Context, tx: Db, user: UserRow, agent: string | null): Promise<string> {
  if ((await workspacesOfUser(tx, user.id)).length === 0) await giveWorkspace(tx, user);
  const signInId = await insertSignIn(tx, {
    userId: user.id,
    agent: agent?.slice(0, AGENT_LENGTH_MAX) ?? null,
    at: ctx.now(),
  });
  return sealSession({ userId: user.id, signInId, tokenVersion: user.tokenVersion });
}

/** A workspace of the person's own, so that whoever is signed in is somewhere. */
export async function giveWorkspace(tx: Db, { id, name }: Pick<UserRow, 'id' | 'name'>): Promise<void> {
  const workspace = await insertWorkspace(tx, {
    name: name ? `Workspace of ${name}` : 'My workspace',
    slug: newSlug(name ?? ''),
  });
  if (!workspace) throw new Error('a slug of chance was taken');
  await putMembership(tx, workspace.id, id, 'owner');
}

/** A slug from a name, made one of its kind by chance. */
export function newSlug(name: string): string {
  const words = name
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .slice(0, 40)
    .replace(/^-+|-+$/g, '');
  return `${words || 'workspace'}-${randomBytes(6).toString('hex')}`;
}
