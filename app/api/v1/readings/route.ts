import { cacheable } from '@/lib/api/answer';
import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { partsOf } from '@/lib/services/readings/parts';
import { readPosition } from '@/lib/services/readings/read-position';
import { readingEtag } from '@/lib/api/reading-etag';
import { contracts } from '@/openapi/contracts';

export const POST = route(contracts.createReading, async ({ ctx, body }) =>
  partsOf(await readPosition(ctx, body), body.include),
);

export const GET = route(contracts.getReading, async ({ ctx, query }) => {
  const reading = await readPosition(ctx, query);
  return cacheable({
    etag: readingEtag(reading, ...(query.include ?? [])),
    value: () => partsOf(reading, query.include),
  });
});

export const { HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ GET, POST });
