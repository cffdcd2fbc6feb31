/**
 * SAN read and written by our own generator (PGN Standard, 12 March 1994, 8.2.3), for whole files of games. The library
 * behind `notation.ts` takes 12 to 37 ms a game, this about a tenth of one; tests hold the two equal. Men are looked
 * for from the target square, so that no list of all moves is made.
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
import { isLegal, pseudoMoves } from './generate';
import {
  CASTLE_KING,
  CASTLE_QUEEN,
  DOUBLE,
  inCheck,
  make,
  MOVES_MAX,
  newUndo,
  PASSING,
  type ScratchBoard,
  unmake,
} from './scratch-board';

const FILE_LETTERS = 'abcdefgh';
/** A man's letter stands at its place less one; a pawn has none. */
const PIECES = ' NBRQK';
const MOVE =
  /^([NBRQK])?([a-h])?([1-8])?[-x:]?([a-h])([1-8])(?:[=/]?\(?([NBRQ])\)?)?(?:\s*e\.?p\.?)?[+#!?]*(?:\s*e\.?p\.?)?$/;
const CASTLING = /^[O0o]-?[O0o](-?[O0o])?[+#!?]*$/;

const packed = new Int32Array(MOVES_MAX);
const undo = newUndo();
const tried = newUndo();

/** What `findSan` answers where it finds no move: the text is no move at all; none is legal; several are. */
export const UNREADABLE = -1;
export const ILLEGAL = -2;
export const AMBIGUOUS = -3;

/**
 * The legal move that a text names, packed; one of the three numbers below zero where it names none. Forgiven: missing
 * and needless check signs, too exact a start, zeros in castling, 'e.p.', squares alone as in "e2e4" and "e7e8Q".
 */
export function findSan(board: ScratchBoard, text: string): number {
  const read = MOVE.exec(text);
  if (!read) {
    const castling = CASTLING.exec(text);
    return castling ? castlingMove(board, castling[1] === undefined ? CASTLE_KING : CASTLE_QUEEN) : UNREADABLE;
  }
  const [, letter, fileLetter, rankDigit, toFile, toRank, promotion] = read;
  const to = toFile!.charCodeAt(0) - 97 + (toRank!.charCodeAt(0) - 49) * 8;
  const promoted = promotion === undefined ? 0 : PIECES.indexOf(promotion) + 1;
  const file = fileLetter === undefined ? -1 : fileLetter.charCodeAt(0) - 97;
  const rank = rankDigit === undefined ? -1 : rankDigit.charCodeAt(0) - 49;
  if (letter === undefined && file >= 0 && rank >= 0) return moveBySquares(board, rank * 8 + file, to, promoted);
  const place = letter === undefined ? PAWN : PIECES.indexOf(letter) + 1;
  const end = movesTo(board, place, to, promoted);
  const checked = inCheck(board, board.side);
  let found = ILLEGAL;
  for (let at = 0; at < end; at++) {
    const move = packed[at]!;
    if ((file >= 0 && (move & 7) !== file) || (rank >= 0 && (move & 63) >> 3 !== rank)) continue;
    if (!isLegal(board, move, checked, undo)) continue;
    if (found >= 0) return AMBIGUOUS;
    found = move;
  }
  return found;
}

/** Both squares given and no letter: the man is whatever stands there, a king that castles too. */
function moveBySquares(board: ScratchBoard, from: number, to: number, promoted: number): number {
  return oneOfAll(board, (move) => (move & 4095) === (from | (to << 6)) && ((move >> 12) & 15) === promoted);
}

function castlingMove(board: ScratchBoard, special: number): number {
  return oneOfAll(board, (move) => move >> 16 === special);
}

function oneOfAll(board: ScratchBoard, isMeant: (move: number) => boolean): number {
  const end = pseudoMoves(board, packed, 0);
  const checked = inCheck(board, board.side);
  for (let at = 0; at < end; at++) {
    const move = packed[at]!;
    if (isMeant(move) && isLegal(board, move, checked, undo)) return move;
  }
  return ILLEGAL;
}

/** Writes the pseudo-legal moves to a square of the men of a kind, castling left out; returns their number. */
function movesTo(board: ScratchBoard, place: number, to: number, promoted: number): number {
  const { men, side } = board;
  const own = side << 3;
  if (men[to] !== 0 && men[to]! >> 3 === side) return 0;
  if (place === PAWN) return pawnMovesTo(board, to, promoted);
  if (promoted !== 0) return 0;
  let end = 0;
  if (place === KNIGHT || place === KING) {
    const table = place === KNIGHT ? KNIGHT_LEAPS : KING_STEPS;
    for (let at = to * LEAP_ROW, from = table[at]!; from >= 0; from = table[++at]!) {
      if (men[from] === (own | place)) packed[end++] = from | (to << 6);
    }
    return end;
  }
  for (let direction = place === BISHOP ? 4 : 0; direction < (place === ROOK ? 4 : 8); direction++) {
    const edge = EDGES[(to << 3) | direction]!;
    for (let from = to; from !== edge; ) {
      from += STRIDES[direction]!;
      if (men[from] === 0) continue;
      if (men[from] === (own | place)) packed[end++] = from | (to << 6);
      break;
    }
  }
  return end;
}

function pawnMovesTo({ men, side, passing }: ScratchBoard, to: number, promoted: number): number {
  const pawn = (side << 3) | PAWN;
  const rank = side === 0 ? to >> 3 : 7 - (to >> 3);
  if ((rank === 7) !== promoted > 0 || rank === 0) return 0;
  const stride = side === 0 ? 8 : -8;
  let end = 0;
  if (men[to] === 0) {
    if (men[to - stride] === pawn) packed[end++] = (to - stride) | (to << 6) | (promoted << 12);
    else if (rank === 3 && men[to - stride] === 0 && men[to - 2 * stride] === pawn)
      packed[end++] = (to - 2 * stride) | (to << 6) | (DOUBLE << 16);
    if (to !== passing) return end;
  }
  const special = men[to] === 0 ? PASSING << 16 : 0;
  for (let at = (((side ^ 1) << 6) | to) * STRIKE_ROW, from = PAWN_STRIKES[at]!; from >= 0; from = PAWN_STRIKES[++at]!)
    if (men[from] === pawn) packed[end++] = from | (to << 6) | (promoted << 12) | special;
  return end;
}

/** SAN of a legal move, with check and mate signs. */
export function sanOf(board: ScratchBoard, move: number): string {
  const special = move >> 16;
  const body = special === CASTLE_KING ? 'O-O' : special === CASTLE_QUEEN ? 'O-O-O' : plainSan(board, move);
  make(board, move, tried);
  const check = inCheck(board, board.side) ? (hasMove(board) ? '+' : '#') : '';
  unmake(board, move, tried);
  return body + check;
}

function plainSan(board: ScratchBoard, move: number): string {
  const [from, to, promoted] = [move & 63, (move >> 6) & 63, (move >> 12) & 15];
  const place = board.men[from]! & 7;
  const takes = board.men[to] !== 0 || (place === PAWN && (from & 7) !== (to & 7));
  const target = FILE_LETTERS.charAt(to & 7) + ((to >> 3) + 1);
  if (place === PAWN) {
    const start = takes ? `${FILE_LETTERS.charAt(from & 7)}x` : '';
    return start + target + (promoted ? `=${PIECES.charAt(promoted - 1)}` : '');
  }
  return PIECES.charAt(place - 1) + (place === KING ? '' : startOf(board, move)) + (takes ? 'x' : '') + target;
}

/** The file, the rank or both, where another man of the kind could go there too. */
function startOf(board: ScratchBoard, move: number): string {
  const from = move & 63;
  const end = movesTo(board, board.men[from]! & 7, (move >> 6) & 63, 0);
  if (end < 2) return '';
  const checked = inCheck(board, board.side);
  let others = 0;
  let onFile = false;
  let onRank = false;
  for (let at = 0; at < end; at++) {
    const square = packed[at]! & 63;
    if (square === from || !isLegal(board, packed[at]!, checked, undo)) continue;
    others++;
    onFile ||= (square & 7) === (from & 7);
    onRank ||= square >> 3 === from >> 3;
  }
  if (others === 0) return '';
  const file = FILE_LETTERS.charAt(from & 7);
  const rank = String((from >> 3) + 1);
  return onFile ? (onRank ? file + rank : rank) : file;
}

function hasMove(board: ScratchBoard): boolean {
  const end = pseudoMoves(board, packed, 0);
  const checked = inCheck(board, board.side);
  for (let at = 0; at < end; at++) if (isLegal(board, packed[at]!, checked, undo)) return true;
  return false;
}
