/** Whether the service takes work. */
import type { Context } from '@/lib/context';
import { engineVersion } from '../readings/engine';

const startedAt = Date.now();

/** It answers, and it needs nothing that could be missing: so it is ready. */
export async function health(ctx: Context) {
  return {
    status: 'ready' as const,
    engine: engineVersion,
    uptimeSeconds: Math.max(0, ctx.now().getTime() - startedAt) / 1000,
  };
}
