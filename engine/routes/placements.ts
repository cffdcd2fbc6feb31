/** Placements of a side's pieces, weighed: each man on each post, cheap counts for all and searches for the best. */
import { type AttackMap, attackMap, sideIndex } from '../attacks';
import type { Position } from '../board';
import { type Safety, safetyOf } from '../exchange';
import { countParts, type Ground, groundOf, MOVE_COST, PARTS, PLACE, PREPARATION_MOVES } from '../posts';
import { GUARD_BOUNDS, type GuardValue, guardFrom, SECOND_LOOK, searchGain } from '../tactics';
import type { Side, Square } from '../types';
import { isKingAttacked, mapOf, moved } from './boards';
import { stopsTo, type Ways, waysOf } from './ways';

/** The position as routes of one side see it. */
export interface Field {
  readonly position: Position;
  readonly ground: Ground;
  readonly map: AttackMap;
  readonly safety: Safety;
  /** What the enemy would win and the side would win if it were their move now; a side in check cannot wait, so 0. */
  readonly lostNow: number;
  readonly threatensNow: number;
}

export interface Placement {
  readonly field: Field;
  readonly ways: Ways;
  readonly man: Square;
  readonly post: Square;
  readonly moves: number;
  readonly now: Float64Array;
  readonly there: Float64Array;
  /** The verdict after each stop; undefined until the guard has looked. */
  guard?: GuardValue;
  /** The stop after which that verdict was given. */
  guardStop?: Square;
  /** Weighted difference, with what the guard has seen so far. */
  gain: number;
}

/** Pawns beyond which losses and gains are not told apart in the counts: a rook, as in the second look. */
const LOSS_MAX = 5;

/** Nodes for what the side threatens: captures alone. */
const THREAT_BOUNDS = { nodesMax: 2000, checkPlies: 0 };

/** Prepares a position for the side's routes. */
export function fieldOf(position: Position, side: Side): Field {
  const { board } = position;
  const own = sideIndex(side);
  const mustMove = isKingAttacked(mapOf(board), own);
  return fieldWith(position, side, {
    lostNow: mustMove ? 0 : capped(searchGain(board, own ^ 1, GUARD_BOUNDS).gains),
    threatensNow: searchGain(board, own, THREAT_BOUNDS).gains > 0 ? 1 : 0,
  });
}

/** The same where what is won and lost now is known, or is that of another position. */
export function fieldWith(position: Position, side: Side, now: Pick<Field, 'lostNow' | 'threatensNow'>): Field {
  const map = attackMap(position);
  const { lostNow, threatensNow } = now;
  return { position, ground: groundOf(position, side), map, safety: safetyOf(map), lostNow, threatensNow };
}

/** Squares of the side's knights, bishops, rooks and queens. */
export function piecesOf({ map, ground: { index } }: Field): Square[] {
  const squares: Square[] = [];
  for (let number = 0; number < map.counts[index]!; number++) {
    const square = map.squares[(index << 5) | number]! as Square;
    const place = map.board[square]! & 7;
    if (place >= 2 && place <= 5) squares.push(square);
  }
  return squares;
}

/** All placements of one man with a way to them, weighed without a search. */
export function placementsOf(field: Field, man: Square, movesMax: number): Placement[] {
  const ways = waysOf(field.safety, man, movesMax);
  const now = rowNow(field, man);
  const found: Placement[] = [];
  for (let post = 0; post < 64; post++) {
    if (ways.moves[post]! > 0) found.push(placementOn(field, ways, now, post as Square));
  }
  return found;
}

/** The counts of a man where it stands. */
export function rowNow(field: Field, man: Square): Float64Array {
  const now = new Float64Array(PARTS.length);
  countParts(field.ground, field.map, man, now);
  now[PLACE.lost] = field.lostNow;
  now[PLACE.threatens] = field.threatensNow;
  return now;
}

/** One placement, weighed without a search; `now` are the man's counts where it stands. */
export function placementOn(field: Field, ways: Ways, now: Float64Array, post: Square): Placement {
  const there = new Float64Array(PARTS.length);
  countParts(field.ground, mapOf(moved(field.map.board, ways.from, post)), post, there);
  there[PLACE.lost] = field.lostNow;
  there[PLACE.threatens] = field.threatensNow;
  if ((field.map.board[ways.from]! & 7) >= 4) there[PLACE.heavy] = 1;
  const placement = { field, ways, man: ways.from, post, moves: ways.moves[post]!, now, there, gain: 0 };
  return { ...placement, gain: gainOf(placement) };
}

/** Weighted sum of the differences of a placement's counts. */
export function gainOf({ now, there }: Pick<Placement, 'now' | 'there'>): number {
  let gain = 0;
  for (let place = 0; place < PARTS.length; place++) gain += PARTS[place]!.weight * (there[place]! - now[place]!);
  return gain;
}

/** What orders placements: the gain, less the time it takes. */
export function merit({ gain, moves }: Placement, isPrepared = false): number {
  return gain - MOVE_COST * (moves - 1 + (isPrepared ? PREPARATION_MOVES : 0));
}

/** The guard looks at every stop, and whether the man threatens something from its post. */
export function guardPlacement(placement: Placement): void {
  const { field, man, post, ways, there } = placement;
  const { index } = field.ground;
  let heaviest: GuardValue | undefined;
  let lost = 0;
  for (const stop of stopsTo(ways, post)) {
    const found = searchGain(moved(field.map.board, man, stop), index ^ 1, GUARD_BOUNDS);
    const verdict = guardFrom(found);
    if (isHeavier(verdict, heaviest)) {
      heaviest = verdict;
      placement.guardStop = stop;
    }
    lost = Math.max(lost, found.gains);
  }
  placement.guard = heaviest;
  there[PLACE.lost] = capped(lost);
  // In check the enemy cannot pass, so that nothing more is threatened.
  const threat =
    there[PLACE.check] === 1 ? 0 : searchGain(moved(field.map.board, man, post), index, THREAT_BOUNDS).gains;
  there[PLACE.threatens] = threat > 0 ? 1 : 0;
  placement.gain = gainOf(placement);
}

/**
 * The second look, for a placement one move away: threats by quiet moves, and what the side wins whatever comes. Where
 * it came to an end its word counts, for it also knows the answers that are no captures.
 */
export function lookAgain(placement: Placement): void {
  const { field, man, post, there } = placement;
  const found = searchGain(moved(field.map.board, man, post), field.ground.index ^ 1, SECOND_LOOK);
  if (!found.complete) return;
  placement.guard = guardFrom(found);
  placement.guardStop = post;
  there[PLACE.lost] = capped(found.gains);
  there[PLACE.wins] = capped(-found.gains);
  placement.gain = gainOf(placement);
}

function isHeavier(a: GuardValue, b: GuardValue | undefined): boolean {
  if (b === undefined) return true;
  return a.loses === b.loses ? a.verdict === 'unknown' && b.verdict === 'holds' : a.loses > b.loses;
}

function capped(gains: number): number {
  return Math.min(LOSS_MAX, Math.max(0, gains));
}
