/** A place in the workspace, offered by e-mail. */
import { insertAudit } from '@/db/queries/audit';
import { insertInvitation } from '@/db/queries/invitations';
import type { Role } from '@/db/schema';
import { newToken, tokenHash } from '@/lib/auth/links';
import { takeTry } from '@/lib/auth/tries';
import type { Context } from '@/lib/context';
import { emailKeyOf } from '@/lib/email-address';
import { sendMail } from '@/lib/mail/send-mail';
import { personFor } from '@/lib/permissions';
import { siteHref } from '@/lib/site-address';
import { readWorkspace } from '@/lib/services/workspaces/read-workspace';

const INVITATION_DAYS = 7;

/** Sends an invitation with a role. The same is done and said whether or not the address has an account. */
export async function invite(
  ctx: Context,
  { email, role }: { readonly email: string; readonly role: Role },
): Promise<void> {
  const { workspaceId, userId, name } = personFor(ctx.actor, 'workspace');
  const emailKey = emailKeyOf(email);
  await takeTry(ctx, 'message', { emailKey, address: undefined });
  const { name: workspace } = await readWorkspace(ctx);
  const token = newToken();
  const at = ctx.now();
  await ctx.db.transaction(async (tx) => {
    const expiresAt = new Date(at.getTime() + INVITATION_DAYS * 86_400_000);
    const row = { workspaceId, email: emailKey, emailKey, role, tokenHash: tokenHash(token), invitedBy: userId };
    const { id } = await insertInvitation(tx, { ...row, createdAt: at, expiresAt });
    await insertAudit(tx, { workspaceId, userId, at, action: 'member.invite', subject: id, detail: { role } });
  });
  await sendMail(ctx.db, {
    to: emailKey,
    subject: `You are invited to ${workspace}`,
    paragraphs: [
      `${name ?? 'Somebody'} invites you to the workspace ${workspace} at Waypost, as ${role}.`,
      siteHref(`/invitation/${token}`),
      `The invitation is good once, for ${INVITATION_DAYS} days.`,
    ],
  });
}
