/** What the keys have used. */
import { usageOf } from '@/db/queries/keys';
import type { Context } from '@/lib/context';
import { personFor } from '@/lib/permissions';
import type { Usage } from '@/openapi/schemas/keys';

const DAY_MS = 86_400_000;

/** Counts of calls by key, day and call, over so many days until today (UTC). */
export async function readUsage(ctx: Context, { days }: { readonly days: number }): Promise<Usage> {
  const { workspaceId } = personFor(ctx.actor, 'workspace');
  const since = new Date(ctx.now().getTime() - (days - 1) * DAY_MS).toISOString().slice(0, 10);
  return { since, items: await usageOf(ctx.db, { workspaceId, since }) };
}
