/** The local mailbox: messages that no mail server took. */
import { latestMail } from '@/db/queries/mail';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { hasMailbox } from '@/lib/site-address';

const MESSAGES_MAX = 50;

/** The newest messages, for whoever sends these headers. Throws `not-found` wherever there is no mailbox to be seen. */
export function readMailbox(ctx: Context, headers: Pick<Headers, 'get'>): ReturnType<typeof latestMail> {
  if (!hasMailbox(headers)) throw new AppError('not-found', 'There is nothing at this address.');
  return latestMail(ctx.db, MESSAGES_MAX);
}
