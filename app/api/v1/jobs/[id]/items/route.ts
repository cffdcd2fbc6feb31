import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { listJobItems } from '@/lib/services/jobs/read-jobs';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.listJobItems, ({ ctx, params, query }) =>
  listJobItems(ctx, { ...params, ...query }),
);

export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
