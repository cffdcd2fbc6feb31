/** Contexts of people and visitors, for services called without a request. */
import { randomUUID } from 'node:crypto';
import { latestMail } from '@/db/queries/mail';
import type { Db } from '@/db/client';
import { type Actor, VISITOR } from '@/lib/actor';
import { SESSION_COOKIE, sessionActor } from '@/lib/auth/session-actor';
import { computing } from '@/lib/compute/computing';
import type { Context } from '@/lib/context';

/** A context of this actor, at a moment that the test chooses. */
export function contextFor(db: Db, actor: Actor = VISITOR, now: () => Date = () => new Date()): Context {
  return { actor, requestId: randomUUID(), now, db, compute: computing, signal: new AbortController().signal };
}

/** Whoever a sealed session is for, asked as every request asks: a visitor when it is good no more. */
export function actorOf(sealed: string): Promise<Actor> {
  return sessionActor(new Headers({ cookie: `${SESSION_COOKIE}=${sealed}` }));
}

/** A context of whoever a sealed session is for. */
export async function signedIn(db: Db, sealed: string): Promise<Context> {
  return contextFor(db, await actorOf(sealed));
}

/** The token in the link of the newest message to an address. */
export async function linkTo(db: Db, address: string, path: string): Promise<string> {
  const message = (await latestMail(db, 50)).find(({ to, text }) => to === address && text.includes(`/${path}/`));
  const token = message && new RegExp(`/${path}/([\\w-]+)`).exec(message.text)?.[1];
  if (!token) throw new Error(`no message to ${address} with a link to /${path}/`);
  return token;
}
