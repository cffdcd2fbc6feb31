/**
 * How soon each man can come to each square, safely, on a frozen board: the enemy stands still, every stop
 * is safe for that man, no stop lays its own king open, and nothing is captured before the last move.
 *
 * Asked for knights, bishops, rooks and queens; kings and pawns have questions of their own.
 */
import { pinnedMask, type SideIndex } from '../attacks';
import { BISHOP, DIRECTION_TO, EDGES, KING, KNIGHT, KNIGHT_LEAPS, LEAP_ROW, PAWN, ROOK, STRIDES } from '../board';
import { isSafeMove, type Safety } from '../exchange';
import type { Side, Square } from '../types';

/** Moves to every square for every man. */
export interface Reach {
  readonly safety: Safety;
  /** How far was looked, in own moves. */
  readonly movesMax: number;
  /** Entry ((side << 5 | man's number) << 6 | square): moves needed, 0 where it stands, negative where not within `movesMax`. */
  readonly moves: Int8Array;
  /** Number of the first man of each side that is no pawn: men are numbered by worth. */
  readonly firstPieces: readonly [number, number];
}

const UNKNOWN = -1;
const UNSAFE = -2;

/** The reach of all men of both sides within `movesMax` own moves; `into` gives the table to use again. */
export function reachOf(safety: Safety, movesMax: number, into: Int8Array = new Int8Array(4096)): Reach {
  const white = fillSide(safety, 0, movesMax, into);
  const black = fillSide(safety, 1, movesMax, into);
  return { safety, movesMax, moves: into, firstPieces: [white, black] };
}

/** Fills the rows of a side's pieces; returns the number of its first one. */
function fillSide(safety: Safety, side: SideIndex, movesMax: number, into: Int8Array): number {
  const { map } = safety;
  let first = 0;
  for (let number = 0; number < map.counts[side]!; number++) {
    const man = (side << 5) | number;
    const place = map.board[map.squares[man]!]! & 7;
    if (place === PAWN) first = number + 1;
    else if (place !== KING) fillReach(safety, map.squares[man]!, movesMax, into, man << 6);
  }
  return first;
}

/** A man that can come, and how soon. */
export interface User {
  readonly from: Square;
  readonly moves: number;
}

const NO_USERS: readonly User[] = [];

/** Pieces of the side (king and pawns apart) that can come to stand safely on the square, soonest first, cheaper before dearer. */
export function usersOf({ safety: { map }, moves, firstPieces }: Reach, side: Side, square: Square): readonly User[] {
  const index = side === 'white' ? 0 : 1;
  const row = index << 5;
  let users: User[] | null = null;
  for (let number = firstPieces[index]!; number < map.counts[index]!; number++) {
    const needed = moves[((row | number) << 6) | square]!;
    const from = map.squares[row | number]! as Square;
    if (needed < 0 || (map.board[from]! & 7) === KING) continue;
    if (users === null) users = [{ from, moves: needed }];
    else users.push({ from, moves: needed });
  }
  if (users === null) return NO_USERS;
  return users.length > 1 ? users.sort((a, b) => a.moves - b.moves) : users;
}

const frontier = new Uint8Array(64);
/** Lines already swept through a square: one bit an axis (direction >> 1). */
const swept = new Uint8Array(64);

/** The search under way: whose reach it is, and where it is written. It lives here so that nothing is allocated. */
const search = { from: 0, enemyRow: 0, moves: 0, offset: 0, end: 0, pinKing: -1, pinDirection: 0 };

/**
 * Fills 64 entries of `out` from `offset` with the moves that the man on `from` needs: a search in breadth,
 * each square tested once, since the board is frozen and safety does not hang on the way taken.
 */
export function fillReach(safety: Safety, from: number, movesMax: number, out: Int8Array, offset: number): void {
  const { map } = safety;
  const side = (map.board[from]! >> 3) as SideIndex;
  const place = map.board[from]! & 7;
  out.fill(UNKNOWN, offset, offset + 64);
  swept.fill(0);
  search.from = from;
  search.enemyRow = (side ^ 1) << 6;
  search.offset = offset;
  search.pinKing = (pinnedMask(map, side) >>> map.numbers[from]!) & 1 ? map.kings[side]! : -1;
  search.pinDirection = search.pinKing < 0 ? 0 : DIRECTION_TO[(search.pinKing << 6) | from]!;
  out[offset + from] = isSafeMove(safety, from, from) ? 0 : UNSAFE;
  frontier[0] = from;
  search.end = 1;
  let begin = 0;
  for (search.moves = 1; search.moves <= movesMax && begin < search.end; search.moves++) {
    for (const last = search.end; begin < last; begin++) {
      const at = frontier[begin]!;
      if (place === KNIGHT) leap(safety, at, out);
      else slide(safety, at, out, place);
    }
  }
}

function leap(safety: Safety, at: number, out: Int8Array): void {
  for (let row = at * LEAP_ROW, to = KNIGHT_LEAPS[row]!; to >= 0; to = KNIGHT_LEAPS[++row]!) {
    if (out[search.offset + to] === UNKNOWN) visit(safety, to, out);
  }
}

/** A line between two blockers is swept once, both ways, from the first square on it that is reached. */
function slide(safety: Safety, at: number, out: Int8Array, place: number): void {
  const { board } = safety.map;
  const { from, offset } = search;
  const last = place === ROOK ? 4 : 8;
  for (let direction = place === BISHOP ? 4 : 0; direction < last; direction += 2) {
    const axis = 1 << (direction >> 1);
    if ((swept[at]! & axis) !== 0) continue;
    for (let way = direction; way < direction + 2; way++) {
      const stride = STRIDES[way]!;
      const edge = EDGES[(at << 3) | way]!;
      for (let to = at; to !== edge; ) {
        to += stride;
        if (out[offset + to] === UNKNOWN) visit(safety, to, out);
        if (board[to] !== 0 && to !== from) break;
        swept[to]! |= axis;
      }
    }
  }
}

/** Tests a square on first sight; a safe empty one joins the frontier. */
function visit(safety: Safety, to: number, out: Int8Array): void {
  const { map } = safety;
  const code = map.board[to]!;
  if (code !== 0 && (code >> 3 !== search.enemyRow >> 6 || (code & 7) === KING)) return;
  if (search.pinKing >= 0 && DIRECTION_TO[(search.pinKing << 6) | to] !== search.pinDirection) return;
  const free = map.attackers[search.enemyRow | to] === 0 && safety.uncovers[search.from] === 0;
  if (!free && !isSafeMove(safety, search.from, to)) {
    out[search.offset + to] = UNSAFE;
    return;
  }
  out[search.offset + to] = search.moves;
  if (code === 0) frontier[search.end++] = to;
}
