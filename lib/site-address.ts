/** Where the site is, for links in messages, and who may see its mailbox. */
import { addressOf, isLoopback } from './address';
import { env } from './env';

/** A whole address of a path of ours. Never taken from the Host header: whoever asks could write that. */
export function siteHref(path: string): string {
  return `${env.publicUrl ?? `http://localhost:${env.port}`}${path}`;
}

/** Whether cookies are kept to https. */
export function isSecureSite(): boolean {
  return siteHref('/').startsWith('https:');
}

/**
 * Whether the mailbox page may be seen by whoever sends these headers: no mail server and no public address is set, and
 * the request comes from this machine to this machine, through no proxy. Messages hold links that sign people in.
 */
export function hasMailbox(headers: Pick<Headers, 'get'>): boolean {
  if (env.smtpUrl !== undefined || env.publicUrl !== undefined) return false;
  const forwarded = (headers.get('x-forwarded-for') ?? '').split(',').map((part) => part.trim());
  const addresses = [addressOf({ headers }) ?? '', ...forwarded.filter((part) => part !== '')];
  return addresses.every(isLoopback) && /^(localhost|127\.0\.0\.1|\[::1\])(:\d+)?$/.test(headers.get('host') ?? '');
}

/** The path if it leads to a page of ours, else the other one: a link must not send people who sign in to another site. */
export function ownPath(path: string | undefined, otherwise: string): string {
  return path !== undefined && /^\/(?![/\\])[\w\-./?=&%~]*$/.test(path) ? path : otherwise;
}
