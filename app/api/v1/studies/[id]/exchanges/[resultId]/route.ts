import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { versioned } from '@/lib/api/versioned';
import { changeWords, readResult, trashResult } from '@/lib/services/results/results';
import { contracts } from '@/openapi/contracts';

const kind = 'exchange';

export const GET = route(contracts.getStudyExchange, async ({ ctx, params }) =>
  versioned(await readResult(ctx, { ...params, kind })),
);

export const PATCH = route(contracts.changeStudyExchange, async ({ ctx, params, body, version }) =>
  versioned(await changeWords(ctx, { ...params, ...body, kind, version })),
);

export const DELETE = route(contracts.deleteStudyExchange, ({ ctx, params, version }) =>
  trashResult(ctx, { ...params, kind, version }),
);

export const { HEAD, OPTIONS, POST, PUT } = others({ GET, PATCH, DELETE });
