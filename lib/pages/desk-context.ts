/** Who opens a page of the desk; whoever is not signed in is led to sign in and back. */
import { randomUUID } from 'node:crypto';
import { headers } from 'next/headers';
import { notFound, redirect } from 'next/navigation';
import type { Person } from '@/lib/actor';
import { sessionActor } from '@/lib/auth/session-actor';
import { type Context, contextOf } from '@/lib/context';
import { openedDatabase } from '@/lib/database';
import { AppError } from '@/lib/errors';

/** The context of the signed-in person. `path` is where they come back to. */
export async function deskContext(path: string): Promise<{ readonly ctx: Context; readonly person: Person }> {
  const sent = new Headers(await headers());
  await openedDatabase();
  const actor = await sessionActor(sent);
  if (actor.kind !== 'person') redirect(`/sign-in?next=${encodeURIComponent(path)}`);
  return { ctx: contextOf(actor, randomUUID(), new AbortController().signal), person: actor };
}

/** What a page shows, or the page that says that there is nothing: for what is missing, and for what is not one's own. */
export async function shownOrNothing<V>(read: () => Promise<V>): Promise<V> {
  try {
    return await read();
  } catch (error) {
    if (error instanceof AppError && ['not-found', 'not-allowed', 'invalid-request'].includes(error.code)) notFound();
    throw error;
  }
}
