/**
 * next-auth's settings, built for each request, for the secret is in the data folder. Sessions are sealed tokens that name a
 * row of the database; whoever asks holds them against it (session-actor.ts), so a session can be ended at once.
 */
import type { NextAuthOptions } from 'next-auth';
import Credentials from 'next-auth/providers/credentials';
import { VISITOR } from '@/lib/actor';
import { addressOf } from '@/lib/address';
import { requestIdOf } from '@/lib/api/headers';
import { contextOf } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { log } from '@/lib/log';
import { signIn } from '@/lib/services/accounts/sign-in';
import { isSecureSite, ownPath, siteHref } from '@/lib/site-address';
import { sessionSecret } from './secret';
import { openSession, SESSION_SECONDS, sessionActor } from './session-actor';

/** The settings for one request. The forms of our own pages need none of this; programs that know next-auth do. */
export function authOptions(request: Request): NextAuthOptions {
  const ctx = contextOf(VISITOR, requestIdOf(request), request.signal);
  const agent = request.headers.get('user-agent');
  return {
    secret: sessionSecret(),
    useSecureCookies: isSecureSite(),
    session: { strategy: 'jwt', maxAge: SESSION_SECONDS },
    pages: { signIn: '/sign-in', error: '/sign-in', verifyRequest: '/sign-in' },
    // Its own log would print what it was sent.
    logger: { error: (code) => log.warn({ code }, 'next-auth refused'), warn: () => undefined, debug: () => undefined },
    providers: [
      Credentials({
        name: 'Password',
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        authorize: async (given) => {
          const { email = '', password = '' } = given ?? {};
          try {
            return { id: await signIn(ctx, { email, password, address: addressOf(request), agent }) };
          } catch (error) {
            if (error instanceof AppError) return null;
            throw error;
          }
        },
      }),
    ],
    callbacks: {
      /** The id of whoever has just signed in is their sealed session; its claims become the token's. */
      jwt: async ({ token, user }) => {
        if (!user) return token;
        const claims = await openSession(user.id);
        return claims ? { sub: claims.userId, sid: claims.signInId, ver: claims.tokenVersion } : {};
      },
      /** Of a session that is ended nothing is told. */
      session: async ({ session }) => {
        const actor = await sessionActor(request.headers);
        return { ...session, user: actor.kind === 'person' ? { name: actor.name } : {} };
      },
      redirect: async ({ url, baseUrl }) => siteHref(ownPath(url.replace(baseUrl, ''), '/')),
    },
  };
}
