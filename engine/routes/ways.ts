/**
 * The ways of one man: all shortest safe routes to every empty square, the enemy standing still.
 *
 * Every stop is safe for the man by exchange, none lays its own king open, and none before the last gives check,
 * since an enemy in check cannot stand still. Nothing is captured. A side in check has only such first moves as
 * answer it, and no second ones.
 */
import { pinnedMask, type SideIndex } from '../attacks';
import { BISHOP, DIRECTION_TO, EDGES, KNIGHT, KNIGHT_LEAPS, LEAP_ROW, ROOK, STRIDES } from '../board';
import { isSafeMove, type Safety } from '../exchange';
import type { Square } from '../types';
import { bears, isKingAttacked, mapOf, moved } from './boards';

/** Longest route looked for, in own moves. */
export const ROUTE_MOVES_MAX = 6;

export interface Ways {
  readonly from: Square;
  /** Moves to each square, 0 where the man stands, -1 where it has no way within the bound. */
  readonly moves: Int8Array;
  /** Number of shortest routes to each square. */
  readonly counts: Uint32Array;
  /** The stop before each square on the safest shortest route; -1 for none. */
  readonly before: Int8Array;
  /** 1 on squares of own men that the man ran into. */
  readonly blockers: Uint8Array;
  /** 1 on empty squares that it touched and would not be safe on. */
  readonly unsafe: Uint8Array;
}

interface Search extends Ways {
  readonly safety: Safety;
  readonly side: SideIndex;
  /** Enemy attackers met on the safest way so far: fewer is safer. */
  readonly danger: Int16Array;
  readonly flip: number;
}

/** All ways of the knight, bishop, rook or queen on a square, within `movesMax` own moves. */
export function waysOf(safety: Safety, from: Square, movesMax: number): Ways {
  const { map } = safety;
  const code = map.board[from]!;
  const side = (code >> 3) as SideIndex;
  const search: Search = {
    safety,
    side,
    from,
    moves: new Int8Array(64).fill(-1),
    counts: new Uint32Array(64),
    before: new Int8Array(64).fill(-1),
    blockers: new Uint8Array(64),
    unsafe: new Uint8Array(64),
    danger: new Int16Array(64),
    flip: side === 0 ? 0 : 56,
  };
  search.moves[from] = 0;
  search.counts[from] = 1;
  const inCheck = isKingAttacked(map, side);
  const bound = Math.min(inCheck ? 1 : movesMax, ROUTE_MOVES_MAX);
  let frontier: Square[] = [from];
  for (let count = 1; count <= bound && frontier.length > 0; count++) {
    const next: Square[] = [];
    for (const at of frontier) spread(search, at, code & 7, count, next);
    frontier = count === bound ? [] : next.filter((at) => !givesCheck(safety, from, at));
  }
  if (inCheck) keepAnswers(search);
  return search;
}

function spread(search: Search, at: Square, place: number, count: number, next: Square[]): void {
  const { board } = search.safety.map;
  if (place === KNIGHT) {
    for (let row = at * LEAP_ROW, to = KNIGHT_LEAPS[row]!; to >= 0; to = KNIGHT_LEAPS[++row]!) {
      visit(search, at, to as Square, count, next);
    }
    return;
  }
  for (let direction = place === BISHOP ? 4 : 0; direction < (place === ROOK ? 4 : 8); direction++) {
    const edge = EDGES[(at << 3) | direction]!;
    for (let to = at as number; to !== edge; ) {
      to += STRIDES[direction]!;
      visit(search, at, to as Square, count, next);
      if (board[to] !== 0 && to !== search.from) break;
    }
  }
}

function visit(search: Search, at: Square, to: Square, count: number, next: Square[]): void {
  const { safety, from, moves, counts, before, danger } = search;
  const { map } = safety;
  const code = map.board[to]!;
  if (to === from) return;
  if (code !== 0) {
    if (code >> 3 === search.side) search.blockers[to] = 1;
    return;
  }
  if (moves[to] === -1) {
    if (search.unsafe[to] === 1 || !keepsPin(search, to)) return;
    if (!isSafeMove(safety, from, to)) {
      search.unsafe[to] = 1;
      return;
    }
    moves[to] = count;
    next.push(to);
  }
  if (moves[to] !== count) return;
  counts[to]! += counts[at]!;
  const attackers = map.attackers[((search.side ^ 1) << 6) | to] === 0 ? 0 : 1;
  const cost = danger[at]! + attackers;
  const known = before[to]!;
  const isSafer =
    known < 0 || cost < danger[to]! || (cost === danger[to] && rankOf(search, at) < rankOf(search, known));
  if (!isSafer) return;
  danger[to] = cost;
  before[to] = at;
}

/** Among equals the route nearer to its own side is shown, so that the choice is the same for both colours. */
function rankOf({ flip }: Search, square: number): number {
  return square ^ flip;
}

function keepsPin({ safety: { map }, side, from }: Search, to: Square): boolean {
  if (((pinnedMask(map, side) >>> map.numbers[from]!) & 1) === 0) return true;
  const king = map.kings[side]!;
  return DIRECTION_TO[(king << 6) | from] === DIRECTION_TO[(king << 6) | to];
}

/** Whether the man, gone from its square to another, gives check or uncovers one. */
function givesCheck({ map }: Safety, from: Square, at: Square): boolean {
  const side = map.board[from]! >> 3;
  if (map.kings[side ^ 1]! < 0) return false;
  return isKingAttacked(mapOf(moved(map.board, from, at)), side ^ 1);
}

function keepAnswers({ safety: { map }, side, from, moves, counts }: Search): void {
  for (let to = 0; to < 64; to++) {
    if (moves[to] !== 1 || !isKingAttacked(mapOf(moved(map.board, from, to as Square)), side)) continue;
    moves[to] = -1;
    counts[to] = 0;
  }
}

/** The stops of the safest shortest route to a square that has one, the square itself last. */
export function stopsTo({ before, from }: Ways, to: Square): Square[] {
  const stops: Square[] = [];
  for (let at = to as number; at !== from && at >= 0; at = before[at]!) stops.unshift(at as Square);
  return stops;
}

/** Every shortest route to a square, as lists of stops; at most `most` of them. */
export function allWays(safety: Safety, ways: Ways, to: Square, most: number): Square[][] {
  const length = ways.moves[to]!;
  if (length <= 0) return [];
  if (length === 1) return [[to]];
  const found: Square[][] = [];
  for (let at = 0; at < 64 && found.length < most; at++) {
    if (ways.moves[at] !== length - 1 || !isStep(safety, ways.from, at as Square, to)) continue;
    if (givesCheck(safety, ways.from, at as Square)) continue;
    for (const stops of allWays(safety, ways, at as Square, most - found.length)) found.push([...stops, to]);
  }
  return found;
}

/** Whether the man of `from`, standing on `at`, moves to the empty square `to` in one move. */
function isStep({ map: { board } }: Safety, from: Square, at: Square, to: Square): boolean {
  return bears(board, board[from]! & 7, at, to, from);
}
