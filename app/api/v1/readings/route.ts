import { cacheable } from '@/lib/api/answer';
import { etagOf } from '@/lib/api/etag';
import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { readPosition } from '@/lib/services/readings/read-position';
import { contracts } from '@/openapi/contracts';

export const POST = route(contracts.createReading, async ({ ctx, body }) => (await readPosition(ctx, body)).json);

export const GET = route(contracts.getReading, async ({ ctx, query }) => {
  const { identity, json } = await readPosition(ctx, query);
  return cacheable({ etag: etagOf(identity), value: () => json });
});

export const { HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ GET, POST });
