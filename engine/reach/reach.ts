/**
 * How soon each man can come to each square, safely, on a frozen board: the enemy stands still, every stop
 * is safe for that man, no stop lays its own king open, and nothing is captured before the last move.
 *
 * Asked for knights, bishops, rooks and queens; kings and pawns have questions of their own.
 */
import { type AttackMap, BISHOP, KING, KNIGHT, PAWN, pinnedMask, ROOK, type SideIndex } from '../attacks';
import { DIRECTION_TO, EDGES, KNIGHT_LEAPS, LEAP_ROW, STRIDES } from '../board';
import { isSafeMove, type Safety } from '../exchange';
import type { Side, Square } from '../types';

/** Moves to every square for every man. */
export interface Reach {
  readonly safety: Safety;
  /** How far was looked, in own moves. */
  readonly movesMax: number;
  /** Entry ((side << 5 | man's number) << 6 | square): moves needed, 0 where it stands, negative where not within `movesMax`. */
  readonly moves: Int8Array;
}

const UNKNOWN = -1;
const UNSAFE = -2;

/** The reach of all men of both sides within `movesMax` own moves; `into` gives the table to use again. */
export function reachOf(safety: Safety, movesMax: number, into: Int8Array = new Int8Array(4096)): Reach {
  const { map } = safety;
  for (let side = 0; side < 2; side++) {
    for (let number = 0; number < map.counts[side]!; number++) {
      const man = (side << 5) | number;
      const place = map.board[map.squares[man]!]! & 7;
      if (place !== PAWN && place !== KING) fillReach(safety, map.squares[man]!, movesMax, into, man << 6);
    }
  }
  return { safety, movesMax, moves: into };
}

/** Moves that the man on `from` needs to stand safely on `to`; undefined where it cannot within the reach's bound. */
export function movesTo(reach: Reach, from: Square, to: Square): number | undefined {
  const { map } = reach.safety;
  const man = ((map.board[from]! >> 3) << 5) | map.numbers[from]!;
  const moves = reach.moves[(man << 6) | to]!;
  return moves < 0 ? undefined : moves;
}

/** A man that can come, and how soon. */
export interface User {
  readonly from: Square;
  readonly moves: number;
}

/** Pieces of the side (king and pawns apart) that can come to stand safely on the square, soonest first, cheaper before dearer. */
export function usersOf(reach: Reach, side: Side, square: Square): User[] {
  const { map } = reach.safety;
  const row = side === 'white' ? 0 : 32;
  const users: User[] = [];
  for (let number = 0; number < map.counts[row >> 5]!; number++) {
    const from = map.squares[row | number]!;
    const place = map.board[from]! & 7;
    if (place === PAWN || place === KING) continue;
    const moves = reach.moves[((row | number) << 6) | square]!;
    if (moves >= 0) users.push({ from: from as Square, moves });
  }
  return users.length > 1 ? users.sort((a, b) => a.moves - b.moves) : users;
}

const frontier = new Uint8Array(64);
/** Lines already swept through a square: one bit an axis (direction >> 1). */
const swept = new Uint8Array(64);
/** King and direction of the pin of the man that is searched for; king -1 where it is free. */
let pinKing = -1;
let pinDirection = -1;

/**
 * Fills 64 entries of `out` from `offset` with the moves that the man on `from` needs: a search in breadth,
 * each square tested once, since the board is frozen and safety does not hang on the way taken.
 */
export function fillReach(safety: Safety, from: number, movesMax: number, out: Int8Array, offset: number): void {
  const { map } = safety;
  const code = map.board[from]!;
  const side = (code >> 3) as SideIndex;
  const place = code & 7;
  out.fill(UNKNOWN, offset, offset + 64);
  swept.fill(0);
  pinKing = -1;
  if (((pinnedMask(map, side) >>> map.numbers[from]!) & 1) === 1) {
    pinKing = map.kings[side]!;
    pinDirection = DIRECTION_TO[(pinKing << 6) | from]!;
  }
  out[offset + from] = isSafeMove(safety, from, from) ? 0 : UNSAFE;
  frontier[0] = from;
  let begin = 0;
  let end = 1;
  for (let moves = 1; moves <= movesMax && begin < end; moves++) {
    const last = end;
    for (; begin < last; begin++) {
      const at = frontier[begin]!;
      if (place === KNIGHT) {
        for (let row = at * LEAP_ROW, to = KNIGHT_LEAPS[row]!; to >= 0; to = KNIGHT_LEAPS[++row]!) {
          end = visit(safety, from, to, moves, out, offset, end);
        }
        continue;
      }
      for (let direction = place === BISHOP ? 4 : 0; direction < (place === ROOK ? 4 : 8); direction++) {
        // A line between two blockers is swept once, from the first square on it that is reached.
        const axis = 1 << (direction >> 1);
        if ((direction & 1) === 0 && (swept[at]! & axis) !== 0) {
          direction++;
          continue;
        }
        const stride = STRIDES[direction]!;
        const edge = EDGES[(at << 3) | direction]!;
        for (let to = at; to !== edge; ) {
          to += stride;
          end = visit(safety, from, to, moves, out, offset, end);
          if (map.board[to] !== 0 && to !== from) break;
          swept[to]! |= axis;
        }
      }
    }
  }
}

/** Tests a square on first sight; a safe empty one joins the frontier, whose new end is returned. */
function visit(safety: Safety, from: number, to: number, moves: number, out: Int8Array, offset: number, end: number): number {
  if (out[offset + to] !== UNKNOWN) return end;
  const { board }: AttackMap = safety.map;
  const code = board[to]!;
  if (code !== 0 && (code >> 3 === board[from]! >> 3 || (code & 7) === KING)) return end;
  if (pinKing >= 0 && DIRECTION_TO[(pinKing << 6) | to] !== pinDirection) return end;
  if (!isSafeMove(safety, from, to)) {
    out[offset + to] = UNSAFE;
    return end;
  }
  out[offset + to] = moves;
  if (code !== 0) return end;
  frontier[end] = to;
  return end + 1;
}
