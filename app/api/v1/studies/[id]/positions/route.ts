import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { versioned } from '@/lib/api/versioned';
import { createPosition } from '@/lib/services/studies/create-position';
import { listPositions } from '@/lib/services/studies/read-study';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.listPositions, ({ ctx, params }) => listPositions(ctx, params));

export const POST = route(contracts.createPosition, async ({ ctx, params, body }) => {
  const position = await createPosition(ctx, { ...params, ...body });
  return versioned(position, `/api/v1/studies/${params.id}/positions/${position.id}`);
});

export const { HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ GET, POST });
