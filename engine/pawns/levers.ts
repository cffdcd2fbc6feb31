/**
 * Levers: captures that a pawn offers an enemy pawn, now or after advancing (the word is Hans Kmoch's,
 * Pawn Power in Chess, from memory).
 *
 * Pure pawn geometry. The road is free when no pawn of either side stands on it; other men are not looked at,
 * nor whether the pawn could be captured on its way. The double step from the home rank is one move.
 */
import type { Side, Square } from '../types';
import { type PawnView, pawnMoves, squareIn } from './pawn-map';
import { AHEAD, at, REARMOST } from './rank-masks';

export interface Lever {
  readonly side: Side;
  readonly from: Square;
  /** The enemy pawn it will attack. */
  readonly against: Square;
  /** The square from which it attacks: `from` itself when the lever is there now. */
  readonly on: Square;
  /** Pawn moves needed, 0 to LEVER_MOVES_MAX. */
  readonly moves: number;
  /** Another own pawn guards the square from which it attacks, as things stand. */
  readonly supported: boolean;
}

/** How far ahead levers are looked for: further ones are no plan yet. Picked by hand. */
export const LEVER_MOVES_MAX = 3;

const NONE: readonly Lever[] = [];

/** The levers of the pawn on a lane and rank of the view, soonest first; of two equally soon the lower file's. */
export function leversOf(view: PawnView, lane: number, rank: number): readonly Lever[] {
  const { own, enemy } = view;
  const landings = at(view.enemyAttacks, lane) & (at(AHEAD, rank) | (1 << rank));
  if (landings === 0) return NONE;
  const blocker = at(REARMOST, (at(own, lane) | at(enemy, lane)) & at(AHEAD, rank));
  const levers: Lever[] = [];
  for (let landing = rank; landing < blocker && landing < 7; landing++) {
    if (!((landings >> landing) & 1)) continue;
    const moves = pawnMoves(rank, landing);
    if (moves > LEVER_MOVES_MAX) break;
    for (let beside = lane - 1; beside <= lane + 1; beside += 2) {
      if (!((at(enemy, beside) >> (landing + 1)) & 1)) continue;
      levers.push({
        side: view.side,
        from: squareIn(view, lane, rank),
        against: squareIn(view, beside, landing + 1),
        on: squareIn(view, lane, landing),
        moves,
        supported: ((at(view.attacks, lane) >> landing) & 1) === 1,
      });
    }
  }
  return levers.length === 0 ? NONE : levers;
}
