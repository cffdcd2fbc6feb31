/** The only door of the services to the engine: what they need of it, by the names they use. */
import { ENGINE_VERSION, newDesk, readFen, writeFen, type ReadingBytes } from '@/engine';
import type { Fault, Reading } from '@/engine/reading/schema';
import type { Result } from '@/engine/result';
import type { Mode, ReadingPart } from '@/openapi/schemas/ids';

export const engineVersion: string = ENGINE_VERSION;

/** The tables that every reading is worked out on, one after the other; the answers do not share them. */
const desk = newDesk();

/** A reading of the FEN as a value, for what is made from it; or at least one fault. */
export function computeReading(fen: string, mode: Mode): Result<Reading, readonly [Fault, ...Fault[]]> {
  return readFen(fen, mode, desk);
}

/** The JSON of a reading, or of some parts of it, as it is sent; or at least one fault. */
export function writeReading(
  fen: string,
  mode: Mode,
  include?: readonly ReadingPart[],
): Result<ReadingBytes, readonly [Fault, ...Fault[]]> {
  return writeFen(fen, mode, include, desk);
}
