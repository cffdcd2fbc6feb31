/** Placements: the same position with one man put elsewhere. */
import { formatFen, manOn, parseFen, type Position, squareName, withMen } from '../board';
import { fail, ok, type Result } from '../result';
import type { Square } from '../types';

/** Why a man cannot be put there, in a sentence. */
export interface PlacementFault {
  readonly code: 'no-man' | 'same-square' | 'taken' | 'pawn-rank' | 'not-readable';
  readonly message: string;
}

/** The position with the man of `from` on `to`: a square that is empty, and for a pawn not on the first or last rank. */
export function placed(position: Position, from: Square, to: Square): Result<Position, PlacementFault> {
  const man = manOn(position, from);
  if (!man) return fail({ code: 'no-man', message: `There is no man on ${squareName(from)}.` });
  if (from === to)
    return fail({ code: 'same-square', message: `The ${man.kind} stands on ${squareName(to)} already.` });
  const there = manOn(position, to);
  if (there) return fail({ code: 'taken', message: `On ${squareName(to)} stands the ${there.side} ${there.kind}.` });
  if (man.kind === 'pawn' && (to < 8 || to >= 56))
    return fail({ code: 'pawn-rank', message: `A pawn cannot stand on ${squareName(to)}.` });
  return admitted(
    withMen(position, [
      { square: from, man: null },
      { square: to, man },
    ]),
  );
}

/** The position without the men of these squares. */
export function without(position: Position, squares: readonly Square[]): Result<Position, PlacementFault> {
  return admitted(
    withMen(
      position,
      squares.map((square) => ({ square, man: null })),
    ),
  );
}

/** Castling rights and en passant that the board no longer bears out are dropped by reading it as a diagram. */
function admitted(position: Position): Result<Position, PlacementFault> {
  const read = parseFen(formatFen(position), 'diagram');
  if (read.ok) return ok(read.value.position);
  return fail({ code: 'not-readable', message: read.fault[0].message });
}
