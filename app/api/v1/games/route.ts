import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { computeCall } from '@/lib/services/computed/compute-call';
import { contracts } from '@/openapi/contracts';

export const POST = route(contracts.createGames, ({ ctx, body }) => computeCall(ctx, 'createGames', body));

export const { GET, HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ POST });
