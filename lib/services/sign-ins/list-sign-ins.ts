/** Where one is signed in. */
import { signInsOf } from '@/db/queries/sessions';
import { SESSION_SECONDS } from '@/lib/auth/session-actor';
import type { Context } from '@/lib/context';
import { personFor } from '@/lib/permissions';

export interface SignIn {
  readonly id: string;
  readonly agent: string | null;
  readonly createdAt: Date;
  readonly seenAt: Date;
  /** Whether it is the one that asks. */
  readonly isThis: boolean;
}

/** One's sessions that are good still, the newest first. */
export async function listSignIns(ctx: Context): Promise<readonly SignIn[]> {
  const { userId, signInId } = personFor(ctx.actor, 'account');
  const oldest = ctx.now().getTime() - SESSION_SECONDS * 1000;
  const rows = (await signInsOf(ctx.db, userId)).filter(({ createdAt }) => createdAt.getTime() > oldest);
  return rows.map(({ id, agent, createdAt, seenAt }) => ({ id, agent, createdAt, seenAt, isThis: id === signInId }));
}
