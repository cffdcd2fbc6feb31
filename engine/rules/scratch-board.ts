/**
 * The board on which moves are made and taken back: one mailbox, changed in place. Moves are packed in a number,
 * from | to << 6 | promotion place << 12 | special << 16, so that generating them allocates nothing.
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
  type Position,
  QUEEN,
  ROOK,
  STRIDES,
  STRIKE_ROW,
} from '../board';

/** Special moves: places in the packed number. */
export const DOUBLE = 1;
export const PASSING = 2;
export const CASTLE_KING = 3;
export const CASTLE_QUEEN = 4;

/** Pseudo-legal moves of any board stay below this: 32 men of a side, each with fewer than 28 (a queen in the centre). */
export const MOVES_MAX = 1024;

export interface ScratchBoard {
  readonly men: Uint8Array;
  /** 0 White, 1 Black. */
  side: number;
  /** Bits: 1 White king's side, 2 White queen's, 4 Black king's, 8 Black queen's. */
  rights: number;
  /** The square passed over, -1 for none. */
  passing: number;
  readonly kings: Int8Array;
}

/** Rights that are lost when a man leaves or enters a square. */
const RIGHTS_LOST: Readonly<Uint8Array> = (() => {
  const table = new Uint8Array(64);
  table[4] = 3;
  table[7] = 1;
  table[0] = 2;
  table[60] = 12;
  table[63] = 4;
  table[56] = 8;
  return table;
})();

/**
 * A scratch board of a position. A side without a king has -1 there and is never in check; of several kings, as
 * diagrams may have them, the first from a1 on is the one that must not be left in check.
 */
export function scratchBoard(position: Position): ScratchBoard {
  const { castling } = position;
  const men = Uint8Array.from(position.board);
  return {
    men,
    side: position.sideToMove === 'white' ? 0 : 1,
    rights:
      (castling.whiteKing ? 1 : 0) |
      (castling.whiteQueen ? 2 : 0) |
      (castling.blackKing ? 4 : 0) |
      (castling.blackQueen ? 8 : 0),
    passing: position.enPassant ?? -1,
    kings: Int8Array.of(men.indexOf(KING), men.indexOf(KING | 8)),
  };
}

/** Whether the side attacks the square. */
export function attacks(board: ScratchBoard, side: number, square: number): boolean {
  const { men } = board;
  const own = side << 3;
  for (let at = square * LEAP_ROW, from = KNIGHT_LEAPS[at]!; from >= 0; from = KNIGHT_LEAPS[++at]!) {
    if (men[from] === (own | KNIGHT)) return true;
  }
  for (let at = square * LEAP_ROW, from = KING_STEPS[at]!; from >= 0; from = KING_STEPS[++at]!) {
    if (men[from] === (own | KING)) return true;
  }
  const row = (((side ^ 1) << 6) | square) * STRIKE_ROW;
  for (let at = row, from = PAWN_STRIKES[at]!; from >= 0; from = PAWN_STRIKES[++at]!) {
    if (men[from] === (own | PAWN)) return true;
  }
  for (let direction = 0; direction < 8; direction++) {
    const stride = STRIDES[direction]!;
    const edge = EDGES[(square << 3) | direction]!;
    for (let from = square; from !== edge; ) {
      from += stride;
      const man = men[from]!;
      if (man === 0) continue;
      if (man === (own | QUEEN) || man === (own | (direction < 4 ? ROOK : BISHOP))) return true;
      break;
    }
  }
  return false;
}

/** Whether the side's king is attacked. */
export function inCheck(board: ScratchBoard, side: number): boolean {
  const king = board.kings[side]!;
  return king >= 0 && attacks(board, side ^ 1, king);
}

/** What `unmake` needs to take a move back. */
export interface Undo {
  captured: number;
  capturedOn: number;
  rights: number;
  passing: number;
}

/** A fresh undo, to be filled by `make`. */
export function newUndo(): Undo {
  return { captured: 0, capturedOn: 0, rights: 0, passing: -1 };
}

/** Makes a packed move. */
export function make(board: ScratchBoard, move: number, undo: Undo): void {
  const { men, side } = board;
  const from = move & 63;
  const to = (move >> 6) & 63;
  const promotion = (move >> 12) & 15;
  const special = (move >> 16) & 7;
  const man = men[from]!;
  const capturedOn = special === PASSING ? to + (side === 0 ? -8 : 8) : to;
  undo.captured = men[capturedOn]!;
  undo.capturedOn = capturedOn;
  undo.rights = board.rights;
  undo.passing = board.passing;
  men[capturedOn] = 0;
  men[from] = 0;
  men[to] = promotion === 0 ? man : (side << 3) | promotion;
  if (board.kings[side] === from) board.kings[side] = to;
  if (special === CASTLE_KING) moveRook(men, to + 1, to - 1);
  else if (special === CASTLE_QUEEN) moveRook(men, to - 2, to + 1);
  board.rights &= ~(RIGHTS_LOST[from]! | RIGHTS_LOST[to]!);
  board.passing = special === DOUBLE ? (from + to) >> 1 : -1;
  board.side = side ^ 1;
}

/** Takes the last made move back. */
export function unmake(board: ScratchBoard, move: number, undo: Undo): void {
  const { men } = board;
  const side = board.side ^ 1;
  const from = move & 63;
  const to = (move >> 6) & 63;
  const special = (move >> 16) & 7;
  const man = ((move >> 12) & 15) === 0 ? men[to]! : (side << 3) | PAWN;
  men[to] = 0;
  men[from] = man;
  men[undo.capturedOn] = undo.captured;
  if (board.kings[side] === to) board.kings[side] = from;
  if (special === CASTLE_KING) moveRook(men, to - 1, to + 1);
  else if (special === CASTLE_QUEEN) moveRook(men, to + 1, to - 2);
  board.rights = undo.rights;
  board.passing = undo.passing;
  board.side = side;
}

function moveRook(men: Uint8Array, from: number, to: number): void {
  men[to] = men[from]!;
  men[from] = 0;
}
