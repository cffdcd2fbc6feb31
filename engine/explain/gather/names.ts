/** From engine values to what facts hold: names of squares, men as they stand, comers in a stable order. */
import { isPinned, kindOn } from '../../attacks';
import { ahead, fileOf, manCode, rankOf, squareName, viewOrder } from '../../board';
import type { User } from '../../reach';
import type { Side, Square, SquareName } from '../../types';
import type { ReadingValues } from '../values';
import type { PawnMoves } from '../facts/base';
import type { Comer, ManAt } from '../words';

/** The man on an occupied square. */
export function manAt({ map }: ReadingValues, square: Square): ManAt {
  return { kind: kindOn(map, square), square: squareName(square) };
}

/** The man on a square, null where it is empty or does not exist. */
export function manAtOrNull(values: ReadingValues, square: Square | null): ManAt | null {
  return square === null || values.map.board[square] === 0 ? null : manAt(values, square);
}

/** Names by file, then rank as the side counts it. */
export function namesInView(squares: readonly Square[], side: Side): SquareName[] {
  const ordered = squares.slice();
  if (ordered.length > 1) ordered.sort((a, b) => viewOrder(a, side) - viewOrder(b, side));
  return ordered.map(squareName);
}

/** Men by file, then rank as the side counts it. */
export function menInView(values: ReadingValues, squares: readonly Square[], side: Side): ManAt[] {
  const ordered = squares.slice();
  if (ordered.length > 1) ordered.sort((a, b) => viewOrder(a, side) - viewOrder(b, side));
  return ordered.map((square) => manAt(values, square));
}

/** Order of users: soonest first, of those cheaper kinds first, then in the side's view. */
function userOrder({ map }: ReadingValues, { from, moves }: User, side: Side): number {
  return (moves << 10) | ((map.board[from]! & 7) << 6) | viewOrder(from, side);
}

/** Users as facts hold them: soonest first, of those cheaper kinds first, then in the side's view. */
export function comers(values: ReadingValues, users: readonly User[], side: Side): Comer[] {
  const ordered = users.slice();
  if (ordered.length > 1) ordered.sort((a, b) => userOrder(values, a, side) - userOrder(values, b, side));
  return ordered.map(({ from, moves }) => ({ kind: kindOn(values.map, from), square: squareName(from), moves }));
}

/** Men of one kind that a side has. */
export function countOf({ map }: ReadingValues, side: Side, kind: ManAt['kind']): number {
  const code = manCode(side, kind);
  let count = 0;
  for (let square = 0; square < 64; square++) if (map.board[square] === code) count++;
  return count;
}

/** Whether a pin keeps a pawn of the side from going straight on. */
export function isHeldOffItsFile({ map }: ReadingValues, side: Side, pawn: Square): boolean {
  return isPinned(map, pawn) && fileOf(pawn) !== fileOf(map.kings[side === 'white' ? 0 : 1] as Square);
}

/** A pawn of the side on its way to attack a square, with the first man that stands in its way. */
export function pawnOnItsWay(
  values: ReadingValues,
  side: Side,
  from: Square,
  moves: number,
  target: Square,
): PawnMoves {
  const landing = rankOf(target) + (side === 'white' ? -1 : 1);
  let blocker: ManAt | null = null;
  for (let at: Square | undefined = from; at !== undefined && rankOf(at) !== landing && blocker === null; ) {
    at = ahead(at, side);
    if (at !== undefined) blocker = manAtOrNull(values, at);
  }
  return { pawn: squareName(from), moves, blocker };
}
