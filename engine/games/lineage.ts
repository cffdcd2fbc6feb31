/** Which pawn is which along a game, and who has castled: what one position alone does not tell. */
import { PAWN, type Position } from '../board';
import type { Step } from '../rules';
import { bySide, type BySide } from '../types';
import { canCastle } from './features';

export interface Lineage {
  /** For each square with a pawn: the square on which this pawn began, a1 = 0; -1 elsewhere. */
  readonly origins: Int8Array;
  readonly couldCastle: BySide<boolean>;
  readonly hasCastled: { white: boolean; black: boolean };
}

/** The lineage at the start of a game. */
export function lineageOf(start: Position): Lineage {
  return {
    origins: Int8Array.from(start.board, (code, square) => ((code & 7) === PAWN ? square : -1)),
    couldCastle: bySide((side) => canCastle(start, side)),
    hasCastled: { white: false, black: false },
  };
}

/** Follows a move, in place. */
export function follow(
  { origins, hasCastled }: Lineage,
  { from, to, man, captured, capturedOn, promoted, castling }: Step,
): void {
  if (castling) hasCastled[man >> 3 ? 'black' : 'white'] = true;
  if (captured !== 0) origins[capturedOn] = -1;
  if ((man & 7) !== PAWN) return;
  origins[to] = promoted > 0 ? -1 : origins[from]!;
  origins[from] = -1;
}
