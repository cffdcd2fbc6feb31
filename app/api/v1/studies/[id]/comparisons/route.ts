import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { versioned } from '@/lib/api/versioned';
import { createResult, listResults } from '@/lib/services/results/results';
import { contracts } from '@/openapi/contracts';

const kind = 'comparison';

export const GET = route(contracts.listStudyComparisons, ({ ctx, params }) => listResults(ctx, { ...params, kind }));

export const POST = route(contracts.createStudyComparison, async ({ ctx, params, body }) => {
  const made = await createResult(ctx, { ...params, ...body, kind });
  return versioned(made, `/api/v1/studies/${params.id}/comparisons/${made.id}`);
});

export const { HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ GET, POST });
