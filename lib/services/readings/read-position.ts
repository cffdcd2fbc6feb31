/** One FEN to the JSON of its reading. */
import { Written } from '@/lib/api/reply';
import type { Context } from '@/lib/context';
import type { ReadingRequest } from '@/openapi/schemas/readings';
import { fenRefused } from './fen-refused';
import { Recent } from './recent';

export interface WrittenReading {
  readonly json: Written;
  /** The same for all spellings of a position, another for each other answer. */
  readonly identity: string;
}

/** How many answers are kept: one has some thirty kilobytes, so six megabytes in all. */
const KEPT_MAX = 200;
const recent = new Recent<WrittenReading>(KEPT_MAX);

/** The reading of a FEN, or the parts of it that were asked for. Throws `fen-refused` with every fault that the engine found. */
export async function readPosition(ctx: Context, { fen, mode, include }: ReadingRequest): Promise<WrittenReading> {
  const key = `${mode} ${include?.join()} ${fen}`;
  const kept = recent.get(key);
  if (kept) return kept;
  const outcome = await ctx.compute.run({ kind: 'reading', fen, mode, include });
  if (!outcome.ok) throw fenRefused(outcome.faults);
  const made = { json: new Written(outcome.json), identity: outcome.identity };
  recent.set(key, made);
  return made;
}
