import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { listed } from '@/lib/api/versioned';
import { listChanges } from '@/lib/services/studies/read-study';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.listChanges, async ({ ctx, params, query }) =>
  listed(await listChanges(ctx, { ...params, ...query }), { path: `/api/v1/studies/${params.id}/history`, query }),
);

export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
