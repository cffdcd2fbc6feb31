/** The pawns of one side together: islands, majorities, hanging pawns, minority attacks, weak and passed pawns. */
import { colourOf } from '../board';
import type { Side, Square } from '../types';
import type { Lever } from './levers';
import { type PawnView, squareIn } from './pawn-map';
import type { PawnReading } from './pawn-reading';
import { at, COUNT } from './rank-masks';

/** The wings: files a to c, d and e, f to h. Authors draw the borders differently; these are ours. */
export const WINGS = ['queenside', 'centre', 'kingside'] as const;
export type Wing = (typeof WINGS)[number];

/** First and last lane of each wing. */
const WING_LANES: readonly { wing: Wing; first: number; last: number }[] = [
  { wing: 'queenside', first: 1, last: 3 },
  { wing: 'centre', first: 4, last: 5 },
  { wing: 'kingside', first: 6, last: 8 },
];

/** A group of own pawns on neighbouring files, in square order. */
export type PawnIsland = readonly Square[];

/**
 * Minority attack: on a flank where the side has fewer pawns, the inner file (c or f) holds an enemy pawn
 * and no own one, and the own pawn of the next file (b or g) can attack that enemy pawn by advancing, from no
 * further than its fifth rank. So the Carlsbad's b2-b4-b5 against c6 (common practice; the bounds are ours).
 */
export interface MinorityAttack {
  readonly wing: 'queenside' | 'kingside';
  readonly lever: Lever;
}

/** Lists of squares run a1, b1 … h8. */
export interface PawnSideValue {
  readonly side: Side;
  readonly pawns: readonly Square[];
  /** Groups of pawns on neighbouring files, from the a-file on. */
  readonly islands: readonly PawnIsland[];
  readonly isolated: readonly Square[];
  readonly doubled: readonly Square[];
  readonly backward: readonly Square[];
  readonly passed: readonly Square[];
  readonly protectedPassed: readonly Square[];
  readonly candidates: readonly Square[];
  /** Wings where this side has more pawns than the other. */
  readonly majorities: readonly Wing[];
  /**
   * Majorities that, being doubled, stand on no more files than the enemy's pawns there and so cannot make a
   * passed pawn by themselves (so Edward Lasker, Chess Strategy, 1915, diagram 66).
   */
  readonly crippledMajorities: readonly Wing[];
  readonly onLight: number;
  readonly onDark: number;
  /**
   * Two pawns abreast on the side's fourth rank, on the c- and d-files or on the e- and f-files, no other own pawn
   * on these files or beside them, both files half-open for the enemy (Nimzowitsch, My System, from memory,
   * who speaks of c and d; the mirrored pair is ours).
   */
  readonly hangingPawns: readonly [Square, Square] | null;
  readonly minorityAttacks: readonly MinorityAttack[];
}

/** The pawns of the view's side together. `readings`: its pawns one by one, in square order. */
export function pawnSide(view: PawnView, readings: readonly PawnReading[]): PawnSideValue {
  const pawns: Square[] = [];
  const isolated: Square[] = [];
  const doubled: Square[] = [];
  const backward: Square[] = [];
  const passed: Square[] = [];
  const protectedPassed: Square[] = [];
  const candidates: Square[] = [];
  let onLight = 0;
  for (const pawn of readings) {
    const { square } = pawn;
    pawns.push(square);
    if (pawn.isolated) isolated.push(square);
    if (pawn.doubled) doubled.push(square);
    if (pawn.backward) backward.push(square);
    if (pawn.passed) passed.push(square);
    if (pawn.protectedPassed) protectedPassed.push(square);
    if (pawn.candidate) candidates.push(square);
    if (colourOf(square) === 'light') onLight++;
  }
  const majorities: Wing[] = [];
  const crippledMajorities: Wing[] = [];
  for (const { wing, first, last } of WING_LANES) {
    if (pawnsOn(view.own, first, last) <= pawnsOn(view.enemy, first, last)) continue;
    majorities.push(wing);
    if (filesHeld(view.own, first, last) <= filesHeld(view.enemy, first, last)) crippledMajorities.push(wing);
  }
  return {
    side: view.side,
    pawns,
    islands: pawnIslands(view, pawns),
    isolated,
    doubled,
    backward,
    passed,
    protectedPassed,
    candidates,
    majorities,
    crippledMajorities,
    onLight,
    onDark: pawns.length - onLight,
    hangingPawns: hangingPair(view, 3) ?? hangingPair(view, 5),
    minorityAttacks: minorityAttacks(view, readings),
  };
}

/** Number of a side's pawns from one lane to another. */
function pawnsOn(files: Uint8Array, first: number, last: number): number {
  let count = 0;
  for (let lane = first; lane <= last; lane++) count += at(COUNT, at(files, lane));
  return count;
}

/** Number of files from one lane to another on which a side has pawns. */
function filesHeld(files: Uint8Array, first: number, last: number): number {
  let count = 0;
  for (let lane = first; lane <= last; lane++) if (at(files, lane) !== 0) count++;
  return count;
}

/**
 * Pawn islands: groups of a side's pawns on neighbouring files. A file without a pawn of that side ends an
 * island. Doubled pawns share a file and so never make an island longer.
 */
function pawnIslands(view: PawnView, pawns: readonly Square[]): PawnIsland[] {
  const islands: Square[][] = [];
  for (let lane = 1; lane <= 8; lane++) {
    if (at(view.own, lane) !== 0 && at(view.own, lane - 1) === 0) islands.push([]);
  }
  if (islands.length < 2) return pawns.length > 0 ? [pawns] : [];
  for (const square of pawns) islands[islandOf(view.own, square)]?.push(square);
  return islands;
}

/** Number of the island, counted from the a-file, to which the pawn on a square belongs. */
function islandOf(own: Uint8Array, square: Square): number {
  let island = -1;
  for (let lane = 1; lane <= (square & 7) + 1; lane++) if (at(own, lane) !== 0 && at(own, lane - 1) === 0) island++;
  return island;
}

const FOURTH_RANK = 3;

/** The hanging pawns whose left pawn stands on the given lane, or null. */
function hangingPair(view: PawnView, lane: number): [Square, Square] | null {
  const { own, enemy } = view;
  const alone = 1 << FOURTH_RANK;
  if (at(own, lane) !== alone || at(own, lane + 1) !== alone) return null;
  if (at(own, lane - 1) !== 0 || at(own, lane + 2) !== 0) return null;
  if (at(enemy, lane) !== 0 || at(enemy, lane + 1) !== 0) return null;
  return [squareIn(view, lane, FOURTH_RANK), squareIn(view, lane + 1, FOURTH_RANK)];
}

const FLANKS = [
  { wing: 'queenside', inner: 3, attacker: 2, first: 1, last: 3 },
  { wing: 'kingside', inner: 6, attacker: 7, first: 6, last: 8 },
] as const;
const NO_ATTACKS: readonly MinorityAttack[] = [];

function minorityAttacks(view: PawnView, readings: readonly PawnReading[]): readonly MinorityAttack[] {
  let attacks: MinorityAttack[] | undefined;
  for (const { wing, inner, attacker, first, last } of FLANKS) {
    if (at(view.own, inner) !== 0 || at(view.enemy, inner) === 0 || at(view.own, attacker) === 0) continue;
    if (pawnsOn(view.own, first, last) >= pawnsOn(view.enemy, first, last)) continue;
    const lever = soonestLever(view, readings, attacker, inner);
    if (lever) attacks = [...(attacks ?? []), { wing, lever }];
  }
  return attacks ?? NO_ATTACKS;
}

const FIFTH_RANK = 4;

/**
 * The soonest lever of a pawn of one lane against a pawn of another that is reached by the side's fifth rank; of
 * two equally soon the one further forward as the side sees it.
 */
function soonestLever(
  view: PawnView,
  readings: readonly PawnReading[],
  from: number,
  against: number,
): Lever | undefined {
  const rankOn = (lever: Lever) => (lever.on ^ view.flip) >> 3;
  let soonest: Lever | undefined;
  for (const pawn of readings) {
    if ((pawn.square & 7) + 1 !== from) continue;
    for (const lever of pawn.levers) {
      if ((lever.against & 7) + 1 !== against || rankOn(lever) > FIFTH_RANK) continue;
      const isSooner = !soonest || lever.moves < soonest.moves;
      if (isSooner || (soonest && lever.moves === soonest.moves && rankOn(lever) > rankOn(soonest))) soonest = lever;
    }
  }
  return soonest;
}
