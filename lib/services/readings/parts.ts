/** A reading cut down to the parts that were asked for. */
import type { Reading } from '@/engine/reading/schema';
import type { ReadingPart } from '@/openapi/schemas/ids';
import type { ReadingAnswer } from '@/openapi/schemas/readings';

/** The position itself and these parts; without a list, the whole reading. */
export function partsOf(reading: Reading, include: readonly ReadingPart[] | undefined): ReadingAnswer {
  if (!include) return reading;
  const { engine, fen, mode, warnings, sideToMove } = reading;
  const parts = include.map((part) => [part, reading[part]] as const);
  return { engine, fen, mode, warnings, sideToMove, ...Object.fromEntries(parts) };
}
