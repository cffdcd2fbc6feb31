/** A computed call, done wherever the context computes. */
import { Written } from '@/lib/api/reply';
import type { ComputedCall, InputOf } from '@/lib/compute/calls';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';

/** The JSON of a call's answer. Throws the call's own refusals. */
export async function computeCall<C extends ComputedCall>(ctx: Context, call: C, input: InputOf<C>): Promise<Written> {
  const outcome = await ctx.compute.run({ kind: 'call', call, input });
  if (outcome.ok) return new Written(outcome.json);
  const { code, detail, faults } = outcome.refusal;
  throw new AppError(code, detail, { faults });
}
