/** A whole reading: values, sentences, JSON. */
import { type Fault, type Faults, formatFen, type Mode, parseFen, type Position } from '../board';
import { explain } from '../explain';
import { ok, type Result } from '../result';
import { encodeReading } from './encode';
import { type Desk, newDesk, readValues } from './read-values';
import type { Reading } from './schema';
import { type ReadingPart, writeReading } from './write';

/** Reads a FEN to the JSON of a reading; a refusal lists its faults, the most basic first. */
export function readFen(text: string, mode: Mode = 'strict', desk: Desk = newDesk()): Result<Reading, Faults> {
  const admitted = parseFen(text, mode);
  if (!admitted.ok) return admitted;
  return ok(readPosition(admitted.value.position, admitted.value.warnings, desk));
}

/** Reads a position that the FEN door has admitted. The answer stands on its own, whatever the desk reads next. */
export function readPosition(position: Position, warnings: readonly Fault[] = [], desk: Desk = newDesk()): Reading {
  const values = readValues(position, desk);
  const { statements, lead } = explain(values);
  return encodeReading(values, statements, lead, warnings);
}

/** A reading as JSON, and what says which reading it is. */
export interface ReadingBytes {
  /** Six fields, normalised. */
  readonly fen: string;
  readonly warnings: readonly Fault[];
  /** The JSON in UTF-8: the whole reading, or the parts asked for. */
  readonly json: Uint8Array<ArrayBuffer>;
}

/** Reads a FEN to the JSON of its reading: the same as `readFen` gives as a value, at half the time. */
export function writeFen(
  text: string,
  mode: Mode = 'strict',
  include?: readonly ReadingPart[],
  desk: Desk = newDesk(),
): Result<ReadingBytes, Faults> {
  const admitted = parseFen(text, mode);
  if (!admitted.ok) return admitted;
  const { position, warnings } = admitted.value;
  return ok({ fen: formatFen(position), warnings, json: writeReading(readValues(position, desk), warnings, include) });
}
