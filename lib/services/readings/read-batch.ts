/** Many FENs to readings, each made when it is asked for. */
import type { Context } from '@/lib/context';
import { log } from '@/lib/log';
import type { BatchLine, BatchRequest } from '@/openapi/schemas/readings';
import { computeReading } from './engine';
import { partsOf } from './parts';

/** One line a FEN, in order; nothing is computed before it is taken, and nothing after the caller has gone. */
export async function readBatch(ctx: Context, { fens, mode, include }: BatchRequest): Promise<Iterable<BatchLine>> {
  return linesOf(ctx, { fens, mode, include });
}

function* linesOf(ctx: Context, { fens, mode, include }: BatchRequest): Generator<BatchLine> {
  for (const [index, fen] of fens.entries()) {
    if (ctx.signal.aborted) return;
    const line = index + 1;
    try {
      const result = computeReading(fen, mode);
      yield result.ok ? partsOf(result.value, include) : { error: result.fault[0], line };
    } catch (error) {
      log.error({ err: error, requestId: ctx.requestId, line }, 'our own mistake');
      yield {
        error: { code: 'internal', field: 'text', message: 'This position could not be read, by our mistake.' },
        line,
      };
    }
  }
}
