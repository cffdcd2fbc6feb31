/** A link by e-mail: to sign in, or, where there is no account yet, to make one. */
import { sweepTokens } from '@/db/queries/tokens';
import { userByEmailKey } from '@/db/queries/users';
import { newLinkToken } from '@/lib/auth/links';
import { takeTry } from '@/lib/auth/tries';
import type { Context } from '@/lib/context';
import { emailKeyOf } from '@/lib/email-address';
import { sendMail } from '@/lib/mail/send-mail';
import { siteHref } from '@/lib/site-address';

/** Anyone may ask; what is answered is the same whether or not there is an account, and only the message tells. */
export async function sendLink(
  ctx: Context,
  { email, address, next }: { readonly email: string; readonly address: string | undefined; readonly next: string },
): Promise<void> {
  const emailKey = emailKeyOf(email);
  await takeTry(ctx, 'message', { emailKey, address });
  await sweepTokens(ctx.db, ctx.now());
  const user = await userByEmailKey(ctx.db, emailKey);
  const purpose = user ? 'sign-in' : 'sign-up';
  const token = await newLinkToken(ctx, purpose, emailKey);
  const link = siteHref(`/${purpose}/${token}?next=${encodeURIComponent(next)}`);
  await sendMail(ctx.db, {
    to: user?.email ?? emailKey,
    subject: user ? 'Sign in to Waypost' : 'Your account at Waypost',
    paragraphs: [
      user
        ? 'With this link you sign in:'
        : 'With this link you choose a name and a password, and your account is made:',
      link,
      'It is good once, for 30 minutes. If you did not ask for it, leave it: nothing happens then.',
    ],
  });
}
