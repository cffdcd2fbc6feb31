/** What every action of a form needs: who acts, and refusals that come back to the form with what was typed. */
import { randomUUID } from 'node:crypto';
import { cookies, headers } from 'next/headers';
import type { z } from 'zod';
import { addressOf } from '@/lib/address';
import {
  SECURE_SESSION_COOKIE,
  SESSION_COOKIE,
  SESSION_SECONDS,
  sessionActor,
  WORKSPACE_COOKIE,
} from '@/lib/auth/session-actor';
import { type Context, contextOf } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { log } from '@/lib/log';
import { isSecureSite } from '@/lib/site-address';
import type { FormState } from '@/openapi/schemas/form-state';

const YEAR_SECONDS = 31_536_000;

/** Who acts: the context of their session, their network address, their browser's name of itself. */
export interface Acting {
  readonly ctx: Context;
  readonly address: string | undefined;
  readonly agent: string | null;
}

/** The context of whoever sends this request. Next has refused those that a page of another site made. */
export async function acting(): Promise<Acting> {
  const sent = await headers();
  const ctx = contextOf(await sessionActor(sent), randomUUID(), new AbortController().signal);
  return { ctx, address: addressOf({ headers: sent }), agent: sent.get('user-agent') };
}

/** Does what a form asks. A refusal comes back with its place and what was typed; our own mistake is logged. */
export async function answered(form: FormData, act: () => Promise<string>): Promise<FormState> {
  const values = typedIn(form);
  try {
    return { done: await act(), values: {} };
  } catch (error) {
    if (error instanceof AppError) return { fault: error.message, at: error.faults[0]?.path.slice(1), values };
    // Next sends people elsewhere by throwing.
    if (error instanceof Error && 'digest' in error) throw error;
    log.error({ err: error }, 'our own mistake');
    return { fault: 'This did not work, by our mistake. Try again.', values };
  }
}

/** Fields whose text goes back to the form; secrets never do. */
function typedIn(form: FormData): Record<string, string> {
  return Object.fromEntries(
    [...form].flatMap(([name, value]) =>
      typeof value === 'string' && !name.startsWith('$') && !/password|present|token/.test(name) ? [[name, value]] : [],
    ),
  );
}

/** A field's text; empty where there is none. */
export function field(form: FormData, name: string): string {
  const value = form.get(name);
  return typeof value === 'string' ? value : '';
}

/** What was given, in the shape that is asked for. Throws `invalid-request` at the first field that is not. */
export function parsed<V>(schema: z.ZodType<V>, given: unknown): V {
  const result = schema.safeParse(given);
  if (result.success) return result.data;
  const [issue] = result.error.issues;
  const message = issue?.message ?? 'This cannot be understood.';
  const path = `/${String(issue?.path[0] ?? '')}`;
  throw new AppError('invalid-request', message, { faults: [{ path, code: 'invalid', message }] });
}

/** Hands the browser its session. */
export async function keepSession(sealed: string): Promise<void> {
  await keepCookie(isSecureSite() ? SECURE_SESSION_COOKIE : SESSION_COOKIE, sealed, SESSION_SECONDS);
}

/** Remembers which workspace is chosen. It opens nothing: whoever does not belong there works in their first. */
export async function keepWorkspace(id: string): Promise<void> {
  await keepCookie(WORKSPACE_COOKIE, id, YEAR_SECONDS);
}

async function keepCookie(name: string, value: string, maxAge: number): Promise<void> {
  (await cookies()).set(name, value, { httpOnly: true, sameSite: 'lax', secure: isSecureSite(), path: '/', maxAge });
}

/** Takes session and choice away from the browser. */
export async function dropSession(): Promise<void> {
  const jar = await cookies();
  for (const name of [SESSION_COOKIE, SECURE_SESSION_COOKIE, WORKSPACE_COOKIE]) jar.delete(name);
}
