/**
 * Weak squares: where a side's pawns cannot guard (Capablanca, Chess Fundamentals, 1921, speaks of defects
 * in the pawn formation that let the opponent settle without being driven off by a pawn).
 *
 * Counted are the side's own ranks 3 to 5 where none of its pawns attacks: `permanent` where none ever can by
 * advancing straight on, `fixed` where every pawn that could is stopped on its way. Squares on which a pawn
 * of either side stands are left out: no man settles on them before the pawn is gone.
 */
import { colourOf, relativeRank } from '../board';
import { type PawnMap, pawnHold, pawnReach, type StoppedPawn } from '../pawns';
import { type Reach, type User, usersOf } from '../reach';
import { type Colour, opponent, type Side, type Square } from '../types';
import { commandOf, type SquareTable } from './square-table';

export interface WeakSquareValue {
  readonly square: Square;
  /** The side whose weakness it is. */
  readonly side: Side;
  readonly hold: 'permanent' | 'fixed';
  /**
   * Whether it matters: the enemy commands it or a man of his can stand there safely within three moves, and
   * it lies in the camp (ranks 3 and 4) or on the d- or e-file.
   */
  readonly matters: boolean;
  readonly commandedByEnemy: boolean;
  /** Enemy pieces that can come to stand there safely within three moves, soonest first; 0 moves: it stands there. */
  readonly users: readonly User[];
  readonly complex: Colour;
  /** Where it is fixed: the pawns that would guard it if they were not stopped, and where they are. */
  readonly stopped: readonly StoppedPawn[];
}

/** Weak squares of both sides, in square order, White's before Black's on one square. */
export function weakSquares(
  pawns: PawnMap,
  board: Readonly<Uint8Array>,
  table: SquareTable,
  reach: Reach,
): WeakSquareValue[] {
  const found: WeakSquareValue[] = [];
  for (let square = 16; square < 48; square++) {
    for (const side of ['white', 'black'] as const) {
      const weak = weakSquare(pawns, board, table, reach, side, square as Square);
      if (weak) found.push(weak);
    }
  }
  return found;
}

function weakSquare(
  pawns: PawnMap,
  board: Readonly<Uint8Array>,
  table: SquareTable,
  reach: Reach,
  side: Side,
  square: Square,
): WeakSquareValue | null {
  const rank = relativeRank(square, side);
  if (rank < 3 || rank > 5 || (board[square]! & 7) === 1) return null;
  const hold = pawnHold(pawns, side, square);
  if (hold !== 'permanent' && hold !== 'fixed') return null;
  const enemy = opponent(side);
  const users = usersOf(reach, enemy, square);
  const commandedByEnemy = commandOf(table, square) === enemy;
  const file = square & 7;
  return {
    square,
    side,
    hold,
    matters: (users.length > 0 || commandedByEnemy) && (rank <= 4 || file === 3 || file === 4),
    commandedByEnemy,
    users,
    complex: colourOf(square),
    stopped: hold === 'fixed' ? pawnReach(pawns, side, square).stopped : [],
  };
}

export interface ColourComplex {
  /** The side whose camp it is. */
  readonly side: Side;
  readonly colour: Colour;
  readonly squares: readonly Square[];
  /** Whether that side, and the enemy, still has a bishop of the colour. */
  readonly ownBishop: boolean;
  readonly enemyBishop: boolean;
}

/** Colour complexes: three or more weak squares of one colour in one camp (the side's ranks 3 and 4). */
export function colourComplexes(weak: readonly WeakSquareValue[], board: Readonly<Uint8Array>): ColourComplex[] {
  const found: ColourComplex[] = [];
  for (const side of ['white', 'black'] as const) {
    for (const colour of ['light', 'dark'] as const) {
      const squares: Square[] = [];
      for (const one of weak) {
        if (one.side === side && one.complex === colour && relativeRank(one.square, side) <= 4)
          squares.push(one.square);
      }
      if (squares.length < 3) continue;
      found.push({
        side,
        colour,
        squares,
        ownBishop: hasBishop(board, side, colour),
        enemyBishop: hasBishop(board, opponent(side), colour),
      });
    }
  }
  return found;
}

/** Whether the side has a bishop on squares of the colour. */
export function hasBishop(board: Readonly<Uint8Array>, side: Side, colour: Colour): boolean {
  const bishop = side === 'white' ? 3 : 11;
  for (let square = board.indexOf(bishop); square >= 0; square = board.indexOf(bishop, square + 1)) {
    if (colourOf(square as Square) === colour) return true;
  }
  return false;
}
