/** Many FENs to lines of JSON, computed as they are taken. */
import { Written } from '@/lib/api/reply';
import type { Context } from '@/lib/context';
import { log } from '@/lib/log';
import type { BatchRequest } from '@/openapi/schemas/readings';

/** Lines computed at once after the first: two or three milliseconds of work, so that nobody else waits long. */
const CHUNK_LINES = 4;

/** Lines in the order of the FENs. The first comes alone; nothing is computed before it is taken, nor after the caller has gone. */
export async function* readBatch(ctx: Context, { fens, mode, include }: BatchRequest): AsyncGenerator<Written> {
  for (let from = 0, count = 1; from < fens.length; from += count, count = CHUNK_LINES) {
    if (ctx.signal.aborted) return;
    const chunk = fens.slice(from, from + count);
    const outcome = await ctx.compute.run({ kind: 'lines', fens: chunk, firstLine: from + 1, mode, include });
    for (const mistake of outcome.mistakes) log.error({ ...mistake, requestId: ctx.requestId }, 'our own mistake');
    yield new Written(outcome.ndjson);
  }
}
