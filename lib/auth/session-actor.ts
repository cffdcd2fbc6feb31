/** The person behind a session's cookie, held against the database at every request: a session that was ended is ended. */
import { decode, encode } from 'next-auth/jwt';
import { sessionOf } from '@/db/queries/sessions';
import { noteSeen } from '@/db/queries/sign-ins';
import { type Actor, VISITOR } from '@/lib/actor';
import { openDb } from '@/lib/database';
import { sessionSecret } from './secret';

/** Named as next-auth names it; the prefix keeps it to https where the site is served so. */
export const SESSION_COOKIE = 'next-auth.session-token';
export const SECURE_SESSION_COOKIE = `__Secure-${SESSION_COOKIE}`;
/** The workspace that a person has chosen; it opens nothing by itself. */
export const WORKSPACE_COOKIE = 'waypost.workspace';

/** How long a session lasts, in seconds. */
export const SESSION_SECONDS = 30 * 86_400;

/** How exactly the list of sessions knows when each was last used. */
const SEEN_MS = 5 * 60_000;

/** What a session's cookie holds, sealed. */
export interface SessionClaims {
  readonly userId: string;
  readonly signInId: string;
  /** The person's token version when the session was made: a higher one in the database ends it. */
  readonly tokenVersion: number;
}

/** Seals a session's claims. */
export function sealSession({ userId, signInId, tokenVersion }: SessionClaims): Promise<string> {
  return encode({
    token: { sub: userId, sid: signInId, ver: tokenVersion },
    secret: sessionSecret(),
    maxAge: SESSION_SECONDS,
  });
}

/** The claims of a sealed text; undefined where it was not sealed here, was tampered with, or is too old. */
export async function openSession(sealed: string): Promise<SessionClaims | undefined> {
  const token = await decode({ token: sealed, secret: sessionSecret() }).catch(() => null);
  if (!token || typeof token.sub !== 'string' || typeof token.sid !== 'string' || typeof token.ver !== 'number')
    return undefined;
  return { userId: token.sub, signInId: token.sid, tokenVersion: token.ver };
}

/** The person who sends these headers, in the workspace they have chosen or their first; else a visitor. */
export async function sessionActor(headers: Headers): Promise<Actor> {
  const cookies = cookiesOf(headers.get('cookie'));
  const sealed = cookies.get(SECURE_SESSION_COOKIE) ?? cookies.get(SESSION_COOKIE);
  const claims = sealed === undefined ? undefined : await openSession(sealed);
  if (!claims) return VISITOR;
  const found = await sessionOf(openDb(), { ...claims, workspaceId: cookies.get(WORKSPACE_COOKIE) });
  if (found) await noteSeen(openDb(), { id: claims.signInId, at: new Date(), everyMs: SEEN_MS });
  return found ? { kind: 'person', userId: claims.userId, signInId: claims.signInId, ...found } : VISITOR;
}

function cookiesOf(header: string | null): ReadonlyMap<string, string> {
  const pairs = (header ?? '').split(';').flatMap((part) => {
    const at = part.indexOf('=');
    return at < 0 ? [] : [[part.slice(0, at).trim(), decoded(part.slice(at + 1).trim())] as const];
  });
  return new Map(pairs);
}

/** A value that was tampered with may be no longer well-formed; it is then taken as it is, and opens nothing. */
function decoded(value: string): string {
  try {
    return decodeURIComponent(value);
  } catch {
    return value;
  }
}
