/** A page that anybody may open. */
import { randomUUID } from 'node:crypto';
import { headers } from 'next/headers';
import { sessionActor } from '@/lib/auth/session-actor';
import { type Context, contextOf } from '@/lib/context';
import { AppError } from '@/lib/errors';

/** The context of whoever opens it: a person who is signed in, or a visitor. */
export async function openContext(): Promise<Context> {
  return contextOf(await sessionActor(await headers()), randomUUID(), new AbortController().signal);
}

/** What a page shows, or why it shows nothing: for links that may be used up, which is no fault of the page. */
export async function shownOrReason<V>(
  read: () => Promise<V>,
): Promise<{ readonly shown: V } | { readonly reason: string }> {
  try {
    return { shown: await read() };
  } catch (error) {
    if (error instanceof AppError) return { reason: error.message };
    throw error;
  }
}
