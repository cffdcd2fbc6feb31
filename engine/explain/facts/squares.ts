/** Facts about squares. */
import type { Colour, Side, SquareName } from '../../types';
import type { Comer, ManAt } from '../words';
import type { FactBase } from './base';

export interface StoppedPawn {
  readonly pawn: SquareName;
  readonly on: SquareName;
  readonly by: 'ram' | 'controlled';
}

export interface WeakSquareFact extends FactBase {
  readonly id: 'weak-for-good' | 'weak-while-fixed';
  /** The side whose weakness it is. */
  readonly side: Side;
  readonly square: SquareName;
  readonly commandedByEnemy: boolean;
  /** The enemy man that stands there safely now. */
  readonly occupant: ManAt | null;
  /** Enemy pieces that can come, soonest first. */
  readonly comers: readonly Comer[];
  /** Knights that the enemy has. */
  readonly enemyKnights: number;
  /** Where it is fixed: the pawns that are stopped, the squares that stop them, and how. */
  readonly stopped: readonly StoppedPawn[];
}

export interface WeakComplex extends FactBase {
  readonly id: 'weak-complex';
  readonly side: Side;
  readonly colour: Colour;
  readonly weak: readonly SquareName[];
  readonly enemyBishop: boolean;
}

export interface CentreCommand extends FactBase {
  readonly id: 'centre-command';
  readonly side: Side;
  readonly commanded: readonly SquareName[];
}

export interface DisputedSquare extends FactBase {
  readonly id: 'disputed-square';
  readonly square: SquareName;
  /** Attackers of each side, the side to move first. */
  readonly first: Side;
  readonly firstCount: number;
  readonly secondCount: number;
}

export interface ClosedSquare extends FactBase {
  readonly id: 'square-closed';
  /** The side that commands it. */
  readonly side: Side;
  readonly square: SquareName;
  readonly own: number;
  readonly enemy: number;
}

export type SquaresFact = WeakSquareFact | WeakComplex | CentreCommand | DisputedSquare | ClosedSquare;
