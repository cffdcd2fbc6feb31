/**
 * The board on which the small search plays: a mutable mailbox with lists of men, moves made and taken back.
 *
 * One board for the whole module, filled by `setUp`, so that a search allocates nothing; nothing on it outlives
 * the call that filled it. Captures in passing are played; castling is not, for it neither captures nor parries a check.
 */
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
  ROOK,
  STRIDES,
  STRIKE_ROW,
} from '../board';

/** A move: from | to << 6 | place of the new kind << 12 (0 without promotion) | 1 << 15 for a capture in passing. */
export type PlayedMove = number;

export const IN_PASSING = 1 << 15;

/** Man codes, a1 first. */
export const men = new Uint8Array(64);
/** Squares of a side's men: entry (side << 6 | place in the list). */
export const lists = new Uint8Array(128);
/** Men of each side. */
export const counts = new Uint8Array(2);
/** King's square of each side, -1 without one. */
export const kings = new Int8Array(2);
/** Place of the man on a square in its side's list. */
const places = new Uint8Array(64);
/** The square that a pawn has just passed over, -1 for none. */
export const passing = { square: -1 };

/** Plies that can be taken back. */
const PLIES_MAX = 64;
const taken = new Uint8Array(PLIES_MAX);
const takenPlace = new Uint8Array(PLIES_MAX);
const moverBefore = new Uint8Array(PLIES_MAX);
const passingBefore = new Int8Array(PLIES_MAX);
let ply = 0;

/** Fills the board from a mailbox of man codes and the en-passant square, -1 for none. */
export function setUp(board: Readonly<Uint8Array>, passedOver: number): void {
  counts[0] = 0;
  counts[1] = 0;
  kings[0] = -1;
  kings[1] = -1;
  passing.square = passedOver;
  ply = 0;
  for (let square = 0; square < 64; square++) {
    const code = board[square]!;
    men[square] = code;
    if (code !== 0) {
      const side = code >> 3;
      places[square] = counts[side]!;
      lists[(side << 6) | counts[side]!++] = square;
      if ((code & 7) === KING) kings[side] = square;
    }
  }
}

function lift(square: number): void {
  const side = men[square]! >> 3;
  const place = places[square]!;
  const last = --counts[side]!;
  const moved = lists[(side << 6) | last]!;
  lists[(side << 6) | place] = moved;
  places[moved] = place;
  men[square] = 0;
}

/** Undoes `lift`: the man that was put in the gap goes back to the end of its list. */
function putBack(square: number, code: number, place: number): void {
  const side = code >> 3;
  const last = counts[side]!++;
  const moved = lists[(side << 6) | place]!;
  if (place !== last) {
    lists[(side << 6) | last] = moved;
    places[moved] = last;
  }
  lists[(side << 6) | place] = square;
  places[square] = place;
  men[square] = code;
}

/** Plays a move of the list; the caller has made sure that it is at least pseudo-legal. */
export function play(move: PlayedMove): void {
  const from = move & 63;
  const to = (move >> 6) & 63;
  const promoted = (move >> 12) & 7;
  const code = men[from]!;
  const side = code >> 3;
  const struck = move & IN_PASSING ? (side === 0 ? to - 8 : to + 8) : to;
  passingBefore[ply] = passing.square;
  moverBefore[ply] = code;
  taken[ply] = men[struck]!;
  if (men[struck] !== 0) {
    takenPlace[ply] = places[struck]!;
    lift(struck);
  }
  const place = places[from]!;
  men[from] = 0;
  men[to] = promoted === 0 ? code : (code & 8) | promoted;
  lists[(side << 6) | place] = to;
  places[to] = place;
  if ((code & 7) === KING) kings[side] = to;
  const isDoubleStep = (code & 7) === PAWN && (to - from === 16 || from - to === 16);
  passing.square = isDoubleStep ? (from + to) >> 1 : -1;
  ply++;
}

/** Takes back the last move, which must be the one given. */
export function takeBack(move: PlayedMove): void {
  ply--;
  const from = move & 63;
  const to = (move >> 6) & 63;
  const code = moverBefore[ply]!;
  const side = code >> 3;
  const place = places[to]!;
  men[to] = 0;
  men[from] = code;
  lists[(side << 6) | place] = from;
  places[from] = place;
  if ((code & 7) === KING) kings[side] = from;
  passing.square = passingBefore[ply]!;
  if (taken[ply] === 0) return;
  const struck = move & IN_PASSING ? (side === 0 ? to - 8 : to + 8) : to;
  putBack(struck, taken[ply]!, takenPlace[ply]!);
}

/** Code of the man that the last move captured, 0 for none. */
export function lastTaken(): number {
  return ply === 0 ? 0 : taken[ply - 1]!;
}

/** Whether a side's men attack the square on the board as it stands. */
export function isStruck(square: number, bySide: number): boolean {
  const own = bySide << 3;
  for (let at = square * LEAP_ROW, from = KNIGHT_LEAPS[at]!; from >= 0; from = KNIGHT_LEAPS[++at]!) {
    if (men[from] === (own | KNIGHT)) return true;
  }
  // A pawn of the side attacks the square from where a pawn of the other side on the square would strike.
  const strikes = (((bySide ^ 1) << 6) | square) * STRIKE_ROW;
  for (let at = strikes, from = PAWN_STRIKES[at]!; from >= 0; from = PAWN_STRIKES[++at]!) {
    if (men[from] === (own | PAWN)) return true;
  }
  for (let direction = 0; direction < 8; direction++) {
    const stride = STRIDES[direction]!;
    const edge = EDGES[(square << 3) | direction]!;
    const slider = direction < 4 ? ROOK : BISHOP;
    for (let from = square; from !== edge; ) {
      from += stride;
      const code = men[from]!;
      if (code === 0) continue;
      if (code >> 3 === bySide && ((code & 7) === slider || (code & 7) === 5)) return true;
      break;
    }
  }
  for (let at = square * LEAP_ROW, from = KING_STEPS[at]!; from >= 0; from = KING_STEPS[++at]!) {
    if (men[from] === (own | KING)) return true;
  }
  return false;
}

/** Whether the side's king stands in check; never for a side without a king. */
export function isInCheck(side: number): boolean {
  const king = kings[side]!;
  return king >= 0 && isStruck(king, side ^ 1);
}
