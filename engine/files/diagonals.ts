/** Diagonals: how far each bishop and queen sees along them, and what stops it. */
import { type AttackMap } from '../attacks';
import { BISHOP, QUEEN, RAY_ROW, RAYS, SQUARES } from '../board';
import type { PawnValues } from '../pawns';
import type { Side, Square } from '../types';

export interface DiagonalValue {
  readonly from: Square;
  readonly side: Side;
  readonly direction: 'a1h8' | 'h1a8';
  /** Squares seen one way, nearest first, the square of the man that stops it included. */
  readonly squares: readonly Square[];
  readonly stoppedBy: Square | null;
  /** A rammed pawn stops it: it will stay. */
  readonly stopperFixed: boolean;
}

/** The diagonals of all bishops and queens, men in square order, empty ones left out. */
export function diagonalValues(map: AttackMap, pawns: PawnValues): DiagonalValue[] {
  const found: DiagonalValue[] = [];
  for (const from of SQUARES) {
    const kind = map.board[from]! & 7;
    if (kind !== BISHOP && kind !== QUEEN) continue;
    for (let direction = 4; direction < 8; direction++) {
      const squares: Square[] = [];
      let stoppedBy: Square | null = null;
      for (
        let at = ((from << 3) | direction) * RAY_ROW, to = RAYS[at]!;
        to >= 0 && stoppedBy === null;
        to = RAYS[++at]!
      ) {
        squares.push(to as Square);
        if (map.board[to] !== 0) stoppedBy = to as Square;
      }
      if (squares.length === 0) continue;
      const stopper = stoppedBy;
      found.push({
        from,
        side: map.board[from]! >> 3 ? 'black' : 'white',
        direction: direction < 6 ? 'a1h8' : 'h1a8',
        squares,
        stoppedBy,
        stopperFixed: stopper !== null && pawns.rams.some(({ white, black }) => white === stopper || black === stopper),
      });
    }
  }
  return found;
}
