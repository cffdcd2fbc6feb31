import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { versioned } from '@/lib/api/versioned';
import { createResult, listResults } from '@/lib/services/results/results';
import { contracts } from '@/openapi/contracts';

const kind = 'exchange';

export const GET = route(contracts.listStudyExchanges, ({ ctx, params }) => listResults(ctx, { ...params, kind }));

export const POST = route(contracts.createStudyExchange, async ({ ctx, params, body }) => {
  const made = await createResult(ctx, { ...params, ...body, kind });
  return versioned(made, `/api/v1/studies/${params.id}/exchanges/${made.id}`);
});

export const { HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ GET, POST });
