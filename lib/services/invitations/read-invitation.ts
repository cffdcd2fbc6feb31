/** What an invitation offers, to whoever has its link. */
import { type InvitationRow, invitationOfHash } from '@/db/queries/invitations';
import { userByEmailKey } from '@/db/queries/users';
import type { Role } from '@/db/schema';
import { tokenHash } from '@/lib/auth/links';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';

export interface Invitation {
  readonly workspace: string;
  readonly role: Role;
  readonly email: string;
  /** Whether the address has an account: whoever has the link has the address's mail. */
  readonly hasAccount: boolean;
}

/** Reads an invitation that is open. Throws `not-found` where it is none, `conflict` where it is good no more, with the reason. */
export async function readInvitation(ctx: Context, { token }: { readonly token: string }): Promise<Invitation> {
  const { invitation, workspace } = await openInvitation(ctx, ctx.db, token);
  const { role, email, emailKey } = invitation;
  return { workspace, role, email, hasAccount: (await userByEmailKey(ctx.db, emailKey)) !== undefined };
}

/** The invitation of a token as stored, if it is open. */
export async function openInvitation(
  ctx: Context,
  db: Context['db'],
  token: string,
): Promise<{ readonly invitation: InvitationRow; readonly workspace: string }> {
  const found = await invitationOfHash(db, tokenHash(token));
  if (!found) throw new AppError('not-found', 'There is no such invitation.');
  const { acceptedAt, revokedAt, expiresAt } = found.invitation;
  if (acceptedAt !== null)
    throw new AppError('conflict', 'This invitation has been accepted already. Each is good once.');
  if (revokedAt !== null)
    throw new AppError('conflict', 'This invitation was taken back, or another one came after it.');
  if (expiresAt.getTime() <= ctx.now().getTime())
    throw new AppError('conflict', 'This invitation is too old. Ask for a new one.');
  return found;
}
