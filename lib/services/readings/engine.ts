/** The only door of the services to the engine: what they need of it, by the names they use. */
import { ENGINE_VERSION, newDesk, readFen } from '@/engine';
import type { Fault, Reading } from '@/engine/reading/schema';
import type { Result } from '@/engine/result';
import type { Mode } from '@/openapi/schemas/ids';

export const engineVersion: string = ENGINE_VERSION;

/** The tables that every reading is worked out on, one after the other; the answers do not share them. */
const desk = newDesk();

/** A reading of the FEN, or at least one fault. */
export function computeReading(fen: string, mode: Mode): Result<Reading, readonly [Fault, ...Fault[]]> {
  return readFen(fen, mode, desk);
}
