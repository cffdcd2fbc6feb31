/**
 * How soon each man can come to each square, safely, on a frozen board: the enemy stands still, every stop
 * is safe for that man, no stop lays its own king open, and nothing is captured before the last move.
 *
 * Asked for knights, bishops, rooks and queens; kings and pawns have questions of their own.
 */
import { type AttackMap, pinnedMask, type SideIndex } from '../attacks';
import { BISHOP, DIRECTION_TO, KING, KNIGHT, lowestSquare, PAWN, RAY_WORDS, ROOK } from '../board';
import { type Safety, safeAmong } from '../exchange';
import type { Side, Square } from '../types';
import { leapFrom, slideDiagonal, slideStraight, spread } from './spread';

/** The tables of a reach, to be filled again and again. */
export interface ReachTables {
  /** Entry ((side << 5 | man's number) << 6 | square): moves needed, 0 where it stands, negative where not within `movesMax`. */
  readonly moves: Int8Array;
  /** Mask of the men of a side that need just so many moves to a square: entry ((side << 2 | moves) << 6 | square). */
  readonly arrivals: Int32Array;
  /** Squares that some piece of a side reaches, as two words: entry (side << 1 | word). */
  readonly reached: Int32Array;
}

/** Moves to every square for every man. */
export interface Reach extends ReachTables {
  readonly safety: Safety;
  /** How far was looked, in own moves. */
  readonly movesMax: number;
}

const UNKNOWN = -1;

/** The most moves that `reachOf` looks ahead: what the entries of `arrivals` have room for. */
export const REACH_MOVES_MAX = 3;

/** Empty tables for `reachOf`. */
export function newReachTables(): ReachTables {
  return { moves: new Int8Array(4096), arrivals: new Int32Array(512), reached: new Int32Array(4) };
}

/** The reach of all pieces of both sides within `movesMax` own moves, 3 at the most; `into` gives the tables to use again. */
export function reachOf(safety: Safety, movesMax: number, into: ReachTables = newReachTables()): Reach {
  into.arrivals.fill(0);
  into.reached.fill(0);
  const { counts, squares, board } = safety.map;
  for (let side = 0; side < 2; side++) {
    for (let number = counts[side]! - 1; number >= 0; number--) {
      const man = (side << 5) | number;
      const place = board[squares[man]!]! & 7;
      if (place === PAWN) break;
      if (place !== KING) search(safety, man, Math.min(movesMax, REACH_MOVES_MAX), into.moves, man << 6, into);
    }
  }
  return { safety, movesMax, moves: into.moves, arrivals: into.arrivals, reached: into.reached };
}

/** A man that can come, and how soon. */
export interface User {
  readonly from: Square;
  readonly moves: number;
}

const NO_USERS: readonly User[] = [];

/** Pieces of the side (king and pawns apart) that can come to stand safely on the square, soonest first, cheaper before dearer. */
export function usersOf({ safety: { map }, arrivals, reached }: Reach, side: Side, square: Square): readonly User[] {
  const index = side === 'white' ? 0 : 1;
  if (((reached[(index << 1) | (square >> 5)]! >>> (square & 31)) & 1) === 0) return NO_USERS;
  const users: User[] = [];
  for (let moves = 0; moves <= REACH_MOVES_MAX; moves++) {
    for (let rest = arrivals[(((index << 2) | moves) << 6) | square]!; rest !== 0; rest &= rest - 1) {
      users.push({ from: map.squares[(index << 5) | lowestSquare(rest, 0)]! as Square, moves });
    }
  }
  return users;
}

/**
 * Fills 64 entries of `out` from `offset` with the moves that the man on `from` needs, -1 where more than `movesMax`
 * (any number) are.
 */
export function fillReach(safety: Safety, from: number, movesMax: number, out: Int8Array, offset: number): void {
  const { board, numbers } = safety.map;
  search(safety, ((board[from]! >> 3) << 5) | numbers[from]!, movesMax, out, offset, null);
}

/**
 * A search in breadth, all squares of a move at once. Each square is tested once, since the board is frozen and safety
 * does not hang on the way taken.
 */
function search(
  safety: Safety,
  man: number,
  movesMax: number,
  out: Int8Array,
  offset: number,
  tables: ReachTables | null,
): void {
  const { map } = safety;
  const { men, sights } = map;
  const side = (man >> 5) as SideIndex;
  const enemy = side ^ 1;
  const from = map.squares[man]!;
  const place = map.board[from]! & 7;
  const homeLow = from < 32 ? 1 << from : 0;
  const homeHigh = from < 32 ? 0 : 1 << (from & 31);
  const emptyLow = ~(men[0]! | men[2]!) | homeLow;
  const emptyHigh = ~(men[1]! | men[3]!) | homeHigh;
  fillAims(map, side, man);
  let openLow = aims[0]! & ~homeLow;
  let openHigh = aims[1]! & ~homeHigh;
  out.fill(UNKNOWN, offset, offset + 64);
  const home = safeAmong(safety, man, from >> 5, 1 << (from & 31));
  if (home !== 0) record(out, offset, 0, from >> 5, home, man, tables);
  let low = homeLow;
  let high = homeHigh;
  for (let moves = 1; moves <= movesMax && (low | high) !== 0; moves++) {
    if (moves === 1) {
      low = sights[man << 1]!;
      high = sights[(man << 1) | 1]!;
    } else {
      step(place, low, high, emptyLow, emptyHigh);
      low = spread.low;
      high = spread.high;
    }
    low &= openLow;
    high &= openHigh;
    openLow &= ~low;
    openHigh &= ~high;
    low = low === 0 ? 0 : safeAmong(safety, man, 0, low);
    high = high === 0 ? 0 : safeAmong(safety, man, 1, high);
    record(out, offset, moves, 0, low, man, tables);
    record(out, offset, moves, 1, high, man, tables);
    low &= ~men[enemy << 1]!;
    high &= ~men[(enemy << 1) | 1]!;
  }
}

/** Where a man may come to stand at all: not on its side's men, nor on a king; a pinned one keeps to its line. Two words. */
const aims = new Int32Array(2);

function fillAims(map: AttackMap, side: SideIndex, man: number): void {
  const { men, kings, counts, squares, board } = map;
  aims[0] = ~men[side << 1]!;
  aims[1] = ~men[(side << 1) | 1]!;
  // A diagram may have more than one king.
  for (let number = counts[side ^ 1]! - 1; number >= 0; number--) {
    const square = squares[((side ^ 1) << 5) | number]!;
    if ((board[square]! & 7) !== KING) break;
    aims[square >> 5]! &= ~(1 << (square & 31));
  }
  if (((pinnedMask(map, side) >>> (man & 31)) & 1) === 0) return;
  const king = kings[side]!;
  const ray = (king << 3) | DIRECTION_TO[(king << 6) | map.squares[man]!]!;
  aims[0] &= RAY_WORDS[ray << 1]!;
  aims[1] &= RAY_WORDS[(ray << 1) | 1]!;
}

function step(place: number, low: number, high: number, emptyLow: number, emptyHigh: number): void {
  if (place === KNIGHT) {
    leapFrom(low, high);
    return;
  }
  spread.low = 0;
  spread.high = 0;
  if (place !== BISHOP) slideStraight(low, high, emptyLow, emptyHigh);
  if (place !== ROOK) slideDiagonal(low, high, emptyLow, emptyHigh);
}

function record(
  out: Int8Array,
  offset: number,
  moves: number,
  half: number,
  squares: number,
  man: number,
  tables: ReachTables | null,
): void {
  for (let rest = squares; rest !== 0; rest &= rest - 1) {
    const square = lowestSquare(rest, half);
    out[offset + square] = moves;
    if (tables) tables.arrivals[((((man >> 5) << 2) | moves) << 6) | square]! |= 1 << (man & 31);
  }
  if (tables) tables.reached[((man >> 5) << 1) | half]! |= squares;
}
