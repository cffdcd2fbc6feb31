/** The calls that are computed apart from the web server's thread as a whole: a request in, its JSON out. */
import { env } from '@/lib/env';
import { replyText } from '@/lib/api/reply';
import { AppError, type InputFault } from '@/lib/errors';
import { compareSubjects } from '@/lib/services/compare/compare-subjects';
import { testExchanges } from '@/lib/services/compare/test-exchanges';
import { readGames } from '@/lib/services/games/read-games';
import { checkGivenRoute } from '@/lib/services/routes/check-given-route';
import { findRoutes } from '@/lib/services/routes/find-routes';
import { contracts } from '@/openapi/contracts';
import type { JsonReply } from '@/openapi/contract';
import type { ProblemCode } from '@/openapi/schemas/problem';
import type { z } from 'zod';

/** Joins the computing of a call to the writing of its reply. */
function computed<I, S extends z.ZodType>(compute: (input: I) => z.output<S>, reply: JsonReply<S>) {
  const text = replyText(reply, env.isProduction);
  return (input: I): string => text(compute(input));
}

/** Each computed call by its contract's id. */
const CALLS = {
  createRoutes: computed(findRoutes, contracts.createRoutes.reply),
  createComparison: computed(compareSubjects, contracts.createComparison.reply),
  createGames: computed(readGames, contracts.createGames.reply),
  createExchanges: computed(testExchanges, contracts.createExchanges.reply),
  createRouteCheck: computed(checkGivenRoute, contracts.createRouteCheck.reply),
} as const;

export type ComputedCall = keyof typeof CALLS;
export type InputOf<C extends ComputedCall> = Parameters<(typeof CALLS)[C]>[0];

export interface CallJob<C extends ComputedCall = ComputedCall> {
  readonly kind: 'call';
  readonly call: C;
  readonly input: InputOf<C>;
}

/** The JSON in UTF-8, or the refusal as plain data that can pass from thread to thread. */
export type CallOutcome =
  | { readonly ok: true; readonly json: Uint8Array }
  | {
      readonly ok: false;
      readonly refusal: { readonly code: ProblemCode; readonly detail: string; readonly faults: readonly InputFault[] };
    };

const encoder = new TextEncoder();

/** Computes a call. Throws only by our own mistake. */
export function doCall<C extends ComputedCall>({ call, input }: CallJob<C>): CallOutcome {
  const compute = CALLS[call] as (input: InputOf<C>) => string;
  try {
    return { ok: true, json: encoder.encode(compute(input)) };
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    return { ok: false, refusal: { code: error.code, detail: error.message, faults: error.faults } };
  }
}
