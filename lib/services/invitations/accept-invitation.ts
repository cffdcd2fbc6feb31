/** An invitation accepted, by somebody with an account or by somebody new. */
import { insertAudit } from '@/db/queries/audit';
import { type InvitationRow, takeInvitation } from '@/db/queries/invitations';
import { insertUser, userById } from '@/db/queries/users';
import { putMembership, roleIn } from '@/db/queries/workspaces';
import type { Db } from '@/db/client';
import { passwordHash } from '@/lib/auth/password';
import { giveWorkspace, startSession } from '@/lib/auth/start-session';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { personFor } from '@/lib/permissions';
import { openInvitation } from './read-invitation';

/** Gives whoever is signed in the place; the workspace's id. The invitation has to be for their address. */
export function acceptInvitation(ctx: Context, { token }: { readonly token: string }): Promise<string> {
  const { userId } = personFor(ctx.actor, 'account');
  return ctx.db.transaction(async (tx) => {
    const { invitation } = await openInvitation(ctx, tx, token);
    const user = await userById(tx, userId);
    if (user?.emailKey !== invitation.emailKey) {
      throw new AppError('not-allowed', 'This invitation is for another address than that of your account.');
    }
    await takePlace(ctx, tx, invitation, userId);
    return invitation.workspaceId;
  });
}

/** Makes an account for the invited address, with a workspace of its own beside the place; gives the sealed session. */
export async function acceptAsNew(
  ctx: Context,
  {
    token,
    name,
    password,
    agent,
  }: Readonly<Record<'token' | 'name' | 'password', string>> & { readonly agent: string | null },
): Promise<{ readonly workspaceId: string; readonly session: string }> {
  // Outside the transaction: it takes a while.
  const hashed = await passwordHash(password);
  return ctx.db.transaction(async (tx) => {
    const { invitation } = await openInvitation(ctx, tx, token);
    const { email, emailKey, workspaceId } = invitation;
    const user = await insertUser(tx, { email, emailKey, name, passwordHash: hashed, emailVerified: ctx.now() });
    if (!user)
      throw new AppError('conflict', 'This address has an account by now. Sign in, then open the invitation again.');
    await takePlace(ctx, tx, invitation, user.id);
    await giveWorkspace(tx, user);
    return { workspaceId, session: await startSession(ctx, tx, user, agent) };
  });
}

async function takePlace(
  ctx: Context,
  tx: Db,
  { id, workspaceId, role }: InvitationRow,
  userId: string,
): Promise<void> {
  const at = ctx.now();
  if ((await roleIn(tx, workspaceId, userId)) !== undefined) {
    throw new AppError('conflict', 'You belong to this workspace already. An owner can change your role.');
  }
  if (!(await takeInvitation(tx, id, at))) throw new AppError('conflict', 'This invitation has been accepted already.');
  await putMembership(tx, workspaceId, userId, role);
  await insertAudit(tx, { workspaceId, userId, at, action: 'member.join', subject: userId, detail: { role } });
}
