/** A whole reading: values, sentences, JSON. */
import { type Fault, type Faults, type Mode, parseFen, type Position } from '../board';
import { explain } from '../explain';
import { ok, type Result } from '../result';
import { encodeReading } from './encode';
import { type Desk, newDesk, readValues } from './read-values';
import type { Reading } from './schema';

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

/** A reading without its statements, at a third of the time: enough to compare by the dozen. */
export function readBoard(position: Position, desk: Desk = newDesk()): Omit<Reading, 'statements' | 'lead'> {
  return encodeReading(readValues(position, desk), [], [], []);
}
