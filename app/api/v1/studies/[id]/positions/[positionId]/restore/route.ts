import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { versioned } from '@/lib/api/versioned';
import { restorePosition } from '@/lib/services/studies/position-changes';
import { contracts } from '@/openapi/contracts';

export const POST = route(contracts.restorePosition, async ({ ctx, params, body }) =>
  versioned(await restorePosition(ctx, { ...params, ...body })),
);

export const { GET, HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ POST });
