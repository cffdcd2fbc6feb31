/** The computing call of each kind of result. */
import type { ComputedCall } from '@/lib/compute/calls';
import type { ResultKind } from '@/openapi/schemas/results';

export const CALL_OF = {
  comparison: 'createComparison',
  route: 'createRoutes',
  exchange: 'createExchanges',
} as const satisfies Readonly<Record<ResultKind, ComputedCall>>;
