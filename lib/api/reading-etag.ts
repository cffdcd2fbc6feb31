/** The ETag of a reading: it changes when the engine does, and never otherwise. */
import type { Reading } from '@/engine/reading/schema';
import { etagOf } from './etag';

/**
 * A strong ETag for what is made from a reading and from further choices. The warnings take part, since a diagram's say what
 * its FEN claimed before it was normalised.
 */
export function readingEtag(reading: Reading, ...choices: readonly string[]): string {
  return etagOf(reading.engine, reading.mode, reading.fen, JSON.stringify(reading.warnings), ...choices);
}
