/** What every fact carries besides what it says. Squares are names, so that a fact is JSON as it stands. */
import type { Side, SquareName } from '../../types';
import type { ManAt } from '../words';

export interface FactBase {
  /** The side it speaks of; null for both. */
  readonly side: Side | null;
  /** Squares that the sentence points at. */
  readonly squares: readonly SquareName[];
  /** Men that it speaks of, by where they stand. */
  readonly men: readonly SquareName[];
}

/** The soonest own or enemy pawn, how many moves it needs, and a man that stands in its way. */
export interface PawnMoves {
  readonly pawn: SquareName;
  readonly moves: number;
  readonly blocker: ManAt | null;
}
