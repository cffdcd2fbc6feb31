/** Moves on the small search's board: captures and promotions, or all, pseudo-legal, into a stack that the caller owns. */
import {
  BISHOP,
  EDGES,
  KING,
  KING_STEPS,
  KNIGHT,
  KNIGHT_LEAPS,
  LEAP_ROW,
  PAWN,
  PAWN_STRIKES,
  QUEEN,
  ROOK,
  STRIDES,
  STRIKE_ROW,
} from '../board';
import { counts, IN_PASSING, lists, men, passing } from './desk';

/** Moves found; entries from a search's own offset on. */
export const stack = new Int32Array(64 * 256);

let top = 0;
let quiet = false;
let own = 0;

/**
 * Writes the moves of a side from `offset` and returns where they end: captures and promotions (to a queen, and
 * to a knight), with `all` the quiet ones too. The enemy king counts as not to be captured.
 */
export function listMoves(side: number, offset: number, all: boolean): number {
  top = offset;
  quiet = all;
  own = side;
  for (let place = 0; place < counts[side]!; place++) {
    const from = lists[(side << 6) | place]!;
    const kind = men[from]! & 7;
    if (kind === PAWN) listPawn(from);
    else if (kind === KNIGHT) listLeaps(from, KNIGHT_LEAPS);
    else if (kind === KING) listLeaps(from, KING_STEPS);
    else listLines(from, kind);
  }
  return top;
}

function add(from: number, to: number): void {
  stack[top++] = from | (to << 6);
}

function tryTo(from: number, to: number): void {
  const code = men[to]!;
  if (code === 0 ? quiet : code >> 3 !== own && (code & 7) !== KING) add(from, to);
}

function listLeaps(from: number, table: Readonly<Int8Array>): void {
  for (let at = from * LEAP_ROW, to = table[at]!; to >= 0; to = table[++at]!) tryTo(from, to);
}

function listLines(from: number, kind: number): void {
  const last = kind === ROOK ? 4 : 8;
  for (let direction = kind === BISHOP ? 4 : 0; direction < last; direction++) {
    const stride = STRIDES[direction]!;
    const edge = EDGES[(from << 3) | direction]!;
    for (let to = from; to !== edge; ) {
      to += stride;
      tryTo(from, to);
      if (men[to] !== 0) break;
    }
  }
}

function listPawn(from: number): void {
  const strikes = ((own << 6) | from) * STRIKE_ROW;
  for (let at = strikes, to = PAWN_STRIKES[at]!; to >= 0; to = PAWN_STRIKES[++at]!) {
    const code = men[to]!;
    if (code !== 0) {
      if (code >> 3 !== own && (code & 7) !== KING) addPawn(from, to);
    } else if (to === passing.square) stack[top++] = from | (to << 6) | IN_PASSING;
  }
  const to = own === 0 ? from + 8 : from - 8;
  if (to < 0 || to > 63 || men[to] !== 0) return;
  const isLast = to < 8 || to > 55;
  if (isLast || quiet) addPawn(from, to);
  if (!quiet || from >> 3 !== (own === 0 ? 1 : 6)) return;
  const second = own === 0 ? from + 16 : from - 16;
  if (men[second] === 0) add(from, second);
}

function addPawn(from: number, to: number): void {
  if (to >= 8 && to <= 55) {
    add(from, to);
    return;
  }
  stack[top++] = from | (to << 6) | (QUEEN << 12);
  stack[top++] = from | (to << 6) | (KNIGHT << 12);
}
