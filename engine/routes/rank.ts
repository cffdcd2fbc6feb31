/** The ranking, with the guard in it: cheap counts for all placements, the guard for the likely ones, a second look for the best. */
import type { Side, Square } from '../types';
import type { Position } from '../board';
import {
  type Field,
  fieldOf,
  guardPlacement,
  lookAgain,
  merit,
  type Placement,
  piecesOf,
  placementsOf,
} from './placements';

export interface RankOptions {
  /** One man only. */
  readonly from?: Square;
  /** Longest route in own moves of the man. */
  readonly movesMax: number;
  /** How many placements are guarded and given back. */
  readonly choicesMax: number;
}

/** Placements one move away which get a second look. */
const SECOND_LOOKS = 8;

export interface Ranking {
  readonly field: Field;
  /** Best first. */
  readonly placements: readonly Placement[];
}

/** The side's placements, best first. */
export function rankPlacements(position: Position, side: Side, options: RankOptions): Ranking {
  const field = fieldOf(position, side);
  const men = options.from === undefined ? piecesOf(field) : [options.from];
  const near: Placement[] = [];
  const far: Placement[] = [];
  for (const man of men) {
    for (const placement of placementsOf(field, man, options.movesMax)) {
      (placement.moves === 1 ? near : far).push(placement);
    }
  }
  for (const placement of near) guardPlacement(placement);
  near.sort(byMerit);
  for (const placement of near.slice(0, SECOND_LOOKS)) lookAgain(placement);
  far.sort(byMerit);
  const likely = far.slice(0, options.choicesMax);
  for (const placement of likely) guardPlacement(placement);
  const placements = [...near, ...likely].sort(byMerit).slice(0, options.choicesMax);
  return { field, placements };
}

/** Best first; of equals the shorter, then the one nearer to its own side, so that mirrored boards agree. */
export function byMerit(a: Placement, b: Placement): number {
  const difference = merit(b) - merit(a);
  if (Math.abs(difference) > 1e-9) return difference;
  const flip = a.field.ground.index === 0 ? 0 : 56;
  return a.moves - b.moves || (a.man ^ flip) - (b.man ^ flip) || (a.post ^ flip) - (b.post ^ flip);
}
