import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { versioned } from '@/lib/api/versioned';
import { changeStudy, trashStudy } from '@/lib/services/studies/change-study';
import { readStudy } from '@/lib/services/studies/read-study';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.getStudy, async ({ ctx, params }) => versioned(await readStudy(ctx, params)));

export const PATCH = route(contracts.changeStudy, async ({ ctx, params, body, version }) =>
  versioned(await changeStudy(ctx, { ...params, ...body, version })),
);

export const DELETE = route(contracts.deleteStudy, ({ ctx, params, version }) =>
  trashStudy(ctx, { ...params, version }),
);

export const { HEAD, OPTIONS, POST, PUT } = others({ GET, PATCH, DELETE });
