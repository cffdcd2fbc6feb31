import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { versioned } from '@/lib/api/versioned';
import { restoreResult } from '@/lib/services/results/results';
import { contracts } from '@/openapi/contracts';

export const POST = route(contracts.restoreStudyExchange, async ({ ctx, params }) =>
  versioned(await restoreResult(ctx, { ...params, kind: 'exchange' })),
);

export const { GET, HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ POST });
