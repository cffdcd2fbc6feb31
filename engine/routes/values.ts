/** What routes answer, as engine values. Squares are numbers; `encode.ts` gives the JSON. */
import type { PartName } from '../posts';
import type { GuardValue } from '../tactics';
import type { Kind, Side, Square } from '../types';

export interface StepValue {
  readonly to: Square;
  /** The enemy gains nothing by capturing the man there. */
  readonly safe: boolean;
  readonly attackedBy: readonly Square[];
  /** Own men that guard it there, the man itself not counted. */
  readonly guardedBy: readonly Square[];
  /** The enemy pawn that can hit it there soonest, and in how many pawn moves. */
  readonly pawnHit: { readonly from: Square; readonly moves: number } | null;
}

export interface ChallengeValue {
  readonly by: Square;
  readonly kind: Kind;
  /** Enemy moves until it attacks the post; 0: it does. */
  readonly moves: number;
}

export interface PreparationValue {
  readonly from: Square;
  readonly to: Square;
  readonly kind: Kind;
  /** Own moves in all, the preparation included. */
  readonly moves: number;
}

export type PartCounts = Readonly<Record<PartName, { readonly now: number; readonly there: number }>>;

export interface RouteValue {
  readonly man: Square;
  readonly kind: Kind;
  readonly post: Square;
  /** Moves of the man itself: as many as stops. */
  readonly moves: number;
  readonly stops: readonly Square[];
  readonly shortest: number;
  readonly steps: readonly StepValue[];
  readonly parts: PartCounts;
  /** Weighted sum of the differences. */
  readonly gain: number;
  readonly challenge: ChallengeValue | null;
  readonly drops: readonly { readonly square: Square; readonly loses: number }[];
  readonly preparations: readonly PreparationValue[];
  /** The preparation without which there is no such route; null where it can be walked at once. */
  readonly needs: PreparationValue | null;
  /** The heaviest verdict after any of its steps. */
  readonly guard: GuardValue;
  /** The stop after which the guard's line begins. */
  readonly guardStop: Square;
}

export interface RoutesValue {
  readonly side: Side;
  /** Best first. */
  readonly choices: readonly RouteValue[];
}
