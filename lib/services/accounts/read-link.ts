/** What a link that came by e-mail is good for, before it is used. */
import { type LinkPurpose, readLinkToken } from '@/lib/auth/links';
import type { Context } from '@/lib/context';

/** The address that the link went to. Whoever has the link may ask. Throws `not-found` where it is good no more. */
export function readLink(
  ctx: Context,
  { purpose, token }: { readonly purpose: Exclude<LinkPurpose, 'change-email'>; readonly token: string },
): Promise<string> {
  return readLinkToken(ctx, purpose, token);
}
