import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { readUsage } from '@/lib/services/keys/read-usage';
import { contracts } from '@/openapi/contracts';

export const GET = route(contracts.getUsage, ({ ctx, query }) => readUsage(ctx, query));

export const { HEAD, OPTIONS, POST, PUT, PATCH, DELETE } = others({ GET });
