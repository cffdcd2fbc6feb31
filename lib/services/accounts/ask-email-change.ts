/** Another address for one's account: asked for here, made by the link that goes to it. */
import { newLinkToken } from '@/lib/auth/links';
import { takeTry } from '@/lib/auth/tries';
import type { Context } from '@/lib/context';
import { emailKeyOf } from '@/lib/email-address';
import { sendMail } from '@/lib/mail/send-mail';
import { siteHref } from '@/lib/site-address';
import { checkOwnPassword } from './check-own-password';

/** Sends the link to the new address and word of it to the present one. Whether the new one has an account is not said. */
export async function askEmailChange(
  ctx: Context,
  { email, present }: { readonly email: string; readonly present: string },
): Promise<void> {
  const user = await checkOwnPassword(ctx, present);
  const emailKey = emailKeyOf(email);
  await takeTry(ctx, 'message', { emailKey, address: undefined });
  const token = await newLinkToken(ctx, 'change-email', `${user.id} ${emailKey}`);
  await sendMail(ctx.db, {
    to: emailKey,
    subject: 'Confirm your new address at Waypost',
    paragraphs: [
      'With this link the account that you are signed in with gets this address:',
      siteHref(`/settings/email/${token}`),
      'It is good once, for 30 minutes.',
    ],
  });
  await sendMail(ctx.db, {
    to: user.email ?? '',
    subject: 'Your address at Waypost is about to change',
    paragraphs: [
      'Somebody who is signed in as you asked for another address for your account.',
      'If it was not you, end your sessions and change your password:',
      siteHref('/sessions'),
    ],
  });
}
