/**
 * Whether and how soon a side's pawns can attack a square. Weak squares, outposts and posts all ask this.
 *
 * Pawns advance straight on; captures that change files are not considered, nor are men in the way. A pawn
 * is stopped on the way where an enemy pawn stands, and where an enemy pawn controls the next square and
 * no own pawn does (so in J. R. Capablanca, Chess Fundamentals, 1921, game 6, note to move 19: the
 * white pawn on c2 stands before a black one on c3 and will never drive the knight from d5).
 */
import type { Side, Square } from '../types';
import { type PawnMap, type PawnView, pawnMoves, squareIn } from './pawn-map';
import { AHEAD, at, FOREMOST, REARMOST, UP_TO } from './rank-masks';

/**
 * How a square is held against a side's pawns. `attacked`: one attacks it now. `permanent`: none could ever
 * attack it. `fixed`: one could, but every such pawn is stopped on the way. `open`: one can come to attack it.
 */
export type PawnHold = 'attacked' | 'permanent' | 'fixed' | 'open';

export interface StoppedPawn {
  readonly from: Square;
  /** The first square that stops it. */
  readonly stoppedOn: Square;
  /** `ram`: an enemy pawn stands there. `controlled`: enemy pawns control it and no own pawn does. */
  readonly by: 'ram' | 'controlled';
}

export interface PawnReach {
  readonly hold: PawnHold;
  /** The pawns that attack the square now, none to two. */
  readonly attackedNow: readonly Square[];
  /**
   * The pawn that can attack it soonest and the pawn moves needed, 0 for one that does already; null where
   * none can. Of two equally soon the one further from the centre, whose advance usually costs less.
   */
  readonly soonest: { readonly from: Square; readonly moves: number } | null;
  /** Where it is `fixed`: the foremost pawn of each file that is stopped. */
  readonly stopped: readonly StoppedPawn[];
}

const NO_SQUARES: readonly Square[] = [];
const NONE_STOPPED: readonly StoppedPawn[] = [];
const NEVER: PawnReach = { hold: 'permanent', attackedNow: NO_SQUARES, soonest: null, stopped: NONE_STOPPED };

/** How a square is held against the pawns of a side. Quick: two table look-ups. */
export function pawnHold(pawns: PawnMap, side: Side, square: Square): PawnHold {
  const view = pawns[side];
  const lane = (square & 7) + 1;
  const rank = (square ^ view.flip) >> 3;
  if ((at(view.attacks, lane) >> rank) & 1) return 'attacked';
  if (!((at(view.span, lane) >> rank) & 1)) return 'permanent';
  return (at(view.freeSpan, lane) >> rank) & 1 ? 'open' : 'fixed';
}

/** The pawns of a side that attack a square now or soonest, and those that are stopped on the way. */
export function pawnReach(pawns: PawnMap, side: Side, square: Square): PawnReach {
  const hold = pawnHold(pawns, side, square);
  if (hold === 'permanent') return NEVER;
  const view = pawns[side];
  const lane = (square & 7) + 1;
  const landing = ((square ^ view.flip) >> 3) - 1;
  if (hold === 'fixed')
    return { hold, attackedNow: NO_SQUARES, soonest: null, stopped: stoppedPawns(view, lane, landing) };

  const outer = lane < 5 ? lane - 1 : lane + 1;
  const inner = lane < 5 ? lane + 1 : lane - 1;
  const outerMoves = movesTo(view, outer, landing);
  const innerMoves = movesTo(view, inner, landing);
  const soonest =
    outerMoves <= innerMoves
      ? { from: nearest(view, outer, landing), moves: outerMoves }
      : { from: nearest(view, inner, landing), moves: innerMoves };
  const attackedNow = hold === 'attacked' ? attackingPawns(view, lane, landing) : NO_SQUARES;
  return { hold, attackedNow, soonest, stopped: NONE_STOPPED };
}

/** Pawn moves until the pawn of a lane that is nearest to the landing rank stands on it; Infinity if none gets there. */
function movesTo(view: PawnView, lane: number, landing: number): number {
  const from = at(FOREMOST, at(view.own, lane) & at(UP_TO, landing));
  if (from < 0) return Infinity;
  const path = at(AHEAD, from) & at(UP_TO, landing);
  return path & at(view.stops, lane) ? Infinity : pawnMoves(from, landing);
}

function nearest(view: PawnView, lane: number, landing: number): Square {
  return squareIn(view, lane, at(FOREMOST, at(view.own, lane) & at(UP_TO, landing)));
}

function attackingPawns(view: PawnView, lane: number, landing: number): Square[] {
  const squares: Square[] = [];
  if ((at(view.own, lane - 1) >> landing) & 1) squares.push(squareIn(view, lane - 1, landing));
  if ((at(view.own, lane + 1) >> landing) & 1) squares.push(squareIn(view, lane + 1, landing));
  return squares;
}

function stoppedPawns(view: PawnView, lane: number, landing: number): StoppedPawn[] {
  const stopped: StoppedPawn[] = [];
  for (let beside = lane - 1; beside <= lane + 1; beside += 2) {
    const from = at(FOREMOST, at(view.own, beside) & at(UP_TO, landing));
    if (from < 0) continue;
    const stop = at(REARMOST, at(AHEAD, from) & at(UP_TO, landing) & at(view.stops, beside));
    stopped.push({
      from: squareIn(view, beside, from),
      stoppedOn: squareIn(view, beside, stop),
      by: (at(view.enemy, beside) >> stop) & 1 ? 'ram' : 'controlled',
    });
  }
  return stopped;
}
