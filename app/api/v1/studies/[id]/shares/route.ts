import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { readShares, shareStudy } from '@/lib/services/studies/read-study';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.getShares, ({ ctx, params }) => readShares(ctx, params));

export const PUT = route(contracts.putShares, ({ ctx, params, body }) => shareStudy(ctx, { ...params, ...body }));

export const { HEAD, OPTIONS, POST, PATCH, DELETE } = others({ GET, PUT });
