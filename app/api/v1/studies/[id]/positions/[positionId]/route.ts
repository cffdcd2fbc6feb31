import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { versioned } from '@/lib/api/versioned';
import { changePosition, trashPosition } from '@/lib/services/studies/position-changes';
import { readPositionOf } from '@/lib/services/studies/read-study';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.getPosition, async ({ ctx, params }) =>
  versioned(await readPositionOf(ctx, params)),
);

export const PATCH = route(contracts.changePosition, async ({ ctx, params, body, version }) =>
  versioned(await changePosition(ctx, { ...params, ...body, version })),
);

export const DELETE = route(contracts.deletePosition, ({ ctx, params, version }) =>
  trashPosition(ctx, { ...params, version }),
);

export const { HEAD, OPTIONS, POST, PUT } = others({ GET, PATCH, DELETE });
