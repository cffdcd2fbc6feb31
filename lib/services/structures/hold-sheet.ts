/** A structure sheet held against a position. */
import { encodeSheet, sheetOf } from '@/engine';
import type { SheetAnswer } from '@/engine/reading/schema/sheets';
import { positionOf } from '@/lib/services/readings/position';
import type { Mode } from '@/openapi/schemas/ids';

/** Computes the answer in place: under a millisecond. Throws `fen-refused` with every fault that the engine found. */
export function holdSheet({ fen, mode }: { readonly fen: string; readonly mode: Mode }): SheetAnswer {
  const position = positionOf(fen, '/fen', mode);
  return encodeSheet(position, sheetOf(position));
}
