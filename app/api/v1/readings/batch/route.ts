import { Answer } from '@/lib/api/answer';
import { others } from '@/lib/api/others';
import { route } from '@/lib/api/route';
import { readBatch } from '@/lib/services/readings/read-batch';
import { contracts } from '@/openapi/contracts';

/** Nothing between here and the caller may gather the lines, not even to compress them. */
const AS_THEY_COME = { 'Cache-Control': 'no-store, no-transform', 'X-Accel-Buffering': 'no' };

export const POST = route(
  contracts.createReadings,
  ({ ctx, body }) => new Answer({ value: () => readBatch(ctx, body), headers: AS_THEY_COME }),
);
export const { GET, HEAD, OPTIONS, PUT, PATCH, DELETE } = others({ POST });
