/** From engine values to what facts hold: names of squares, men as they stand, comers in a stable order. */
import { isPinned, kindOn } from '../../attacks';
import { ahead, fileOf, rankOf, squareName } from '../../board';
import type { User } from '../../reach';
import { KINDS, type Side, type Square, type SquareName } from '../../types';
import type { ReadingValues } from '../values';
import type { PawnMoves } from '../facts/base';
import { type Comer, inView, type ManAt } from '../words';

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
  return inView(squares.map(squareName), side);
}

/** Users as facts hold them: soonest first, of those cheaper kinds first, then in the side's view. */
export function comers(values: ReadingValues, users: readonly User[], side: Side): Comer[] {
  const list = users.map(({ from, moves }) => ({ kind: kindOn(values.map, from), square: squareName(from), moves }));
  if (list.length < 2) return list;
  const order = inView(
    list.map(({ square }) => square),
    side,
  );
  return list.sort(
    (a, b) =>
      a.moves - b.moves ||
      KINDS.indexOf(a.kind) - KINDS.indexOf(b.kind) ||
      order.indexOf(a.square) - order.indexOf(b.square),
  );
}

/** Men of one kind that a side has. */
export function countOf({ men }: ReadingValues, side: Side, kind: ManAt['kind']): number {
  return men.reduce((sum, man) => sum + (man.side === side && man.kind === kind ? 1 : 0), 0);
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
