/** A kept result computed anew by the present engine. */
import type { ResultRow } from '@/db/queries/results';
import type { Computing } from '@/lib/compute/computing';
import { AppError } from '@/lib/errors';
import type { ResultKind } from '@/openapi/schemas/results';
import { CALL_OF } from './call-of';

/** The result of the same request. Throws where the present engine refuses what an older one took. */
export async function computeAgain(compute: Computing, { kind, request }: ResultRow): Promise<unknown> {
  const outcome = await compute.run({ kind: 'call', call: CALL_OF[kind as ResultKind], input: request as never });
  if (!outcome.ok) throw new AppError(outcome.refusal.code, outcome.refusal.detail);
  return JSON.parse(new TextDecoder().decode(outcome.json)) as unknown;
}
