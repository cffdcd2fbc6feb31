/** Two to four positions or placements compared. */
import { ENGINE_VERSION, formatFen, newDesk, type Position, readPosition, squareNamed } from '@/engine';
import { compare, placed } from '@/engine/compare';
import type { Comparison } from '@/engine/reading/schema/compare';
import { AppError } from '@/lib/errors';
import { positionOf } from '@/lib/services/readings/position';
import type { ComparisonRequest } from '@/openapi/schemas/compare';

/** Computes the differences in place. Throws `fen-refused`, or `invalid-request` where a man cannot be put there. */
export function compareSubjects({ subjects, mode }: ComparisonRequest): Comparison {
  const positions = subjects.map(({ fen, place }, index) => {
    const position = positionOf(fen, `/subjects/${index}/fen`, mode);
    return place ? placedAt(position, place, `/subjects/${index}/place`) : position;
  });
  const desk = newDesk();
  const [first, ...others] = positions.map((position) => readPosition(position, [], desk));
  return {
    engine: ENGINE_VERSION,
    subjects: positions.map((position, index) => ({
      fen: formatFen(position),
      label: subjects[index]?.label ?? labelOf(subjects[index]!, index),
    })),
    differences: first
      ? others.map((other) => ({ ...compare(first, other) }) as Comparison['differences'][number])
      : [],
  };
}

function placedAt(position: Position, place: { readonly from: string; readonly to: string }, path: string): Position {
  const done = placed(position, squareNamed(place.from)!, squareNamed(place.to)!);
  if (done.ok) return done.value;
  const { code, message } = done.fault;
  throw new AppError('invalid-request', message, { faults: [{ path, code, message }] });
}

/** A subject without a label of its own: A to D, and what was put where. */
function labelOf({ place }: ComparisonRequest['subjects'][number], index: number): string {
  const letter = 'ABCD'.charAt(index);
  return place ? `${letter}: ${place.from} to ${place.to}` : letter;
}
