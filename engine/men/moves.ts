/** What a man attacks and where it can move to, pseudo-legally with pins kept. */
import { type AttackMap, isPinned } from '../attacks';
import {
  ahead,
  bitCount,
  DIRECTION_TO,
  EDGES,
  KING,
  KING_STEPS,
  KNIGHT,
  KNIGHT_LEAPS,
  LEAP_ROW,
  PAWN,
  PAWN_STRIKES,
  type Position,
  relativeRank,
  STRIDES,
  STRIKE_ROW,
} from '../board';
import type { Side, Square } from '../types';

/** Squares as two words, filled by `attacked` and `moveTargets`: [a1 to h4, a5 to h8]. Scratch of this folder. */
export type Words = Int32Array;

export function newWords(): Words {
  return new Int32Array(2);
}

function add(words: Words, square: number): void {
  words[square >> 5]! |= 1 << (square & 31);
}

/** Adds a square to the words. */
export function addSquare(words: Words, square: Square): void {
  add(words, square);
}

/** Whether the square is in the words. */
export function hasSquare(words: Words, square: Square): boolean {
  return ((words[square >> 5]! >>> (square & 31)) & 1) === 1;
}

/** Squares of all men of a side. */
export function wordsOfMen(map: AttackMap, side: Side): Words {
  const words = newWords();
  const row = side === 'white' ? 0 : 32;
  for (let number = 0; number < map.counts[row >> 5]!; number++) add(words, map.squares[row | number]!);
  return words;
}

/** Squares of the words on ranks ahead of a square, as the side sees it. */
export function countAhead(words: Words, side: Side, square: Square): number {
  let count = 0;
  for (let rank = 0; rank < 8; rank++) {
    if (side === 'white' ? rank > square >> 3 : rank < square >> 3) {
      count += bitCount((words[rank >> 2]! >>> ((rank & 3) << 3)) & 0xff);
    }
  }
  return count;
}

/** The squares of two words, a1 first. */
export function squaresOfWords(words: Words): Square[] {
  const squares: Square[] = [];
  for (let half = 0; half < 2; half++) {
    for (let rest = words[half]!; rest !== 0; rest &= rest - 1) {
      squares.push(((half << 5) | (31 - Math.clz32(rest & -rest))) as Square);
    }
  }
  return squares;
}

/** Fills the words with the squares that a man of the code attacks from a square; `vacant` counts as empty. */
export function fillAttacked(
  board: Readonly<Uint8Array>,
  code: number,
  from: number,
  vacant: number,
  into: Words,
): void {
  into[0] = 0;
  into[1] = 0;
  const kind = code & 7;
  if (kind === PAWN) {
    const row = (((code >> 3) << 6) | from) * STRIKE_ROW;
    for (let at = row, to = PAWN_STRIKES[at]!; to >= 0; to = PAWN_STRIKES[++at]!) add(into, to);
    return;
  }
  if (kind === KNIGHT || kind === KING) {
    const table = kind === KNIGHT ? KNIGHT_LEAPS : KING_STEPS;
    for (let at = from * LEAP_ROW, to = table[at]!; to >= 0; to = table[++at]!) add(into, to);
    return;
  }
  for (let direction = kind === 3 ? 4 : 0; direction < (kind === 4 ? 4 : 8); direction++) {
    const edge = EDGES[(from << 3) | direction]!;
    for (let to = from; to !== edge; ) {
      to += STRIDES[direction]!;
      add(into, to);
      if (board[to] !== 0 && to !== vacant) break;
    }
  }
}

/**
 * Fills the words with the moves that a man of the code would have from a square: captures of the enemy king and
 * castling left out. `passing` is the square on which a pawn may capture in passing, -1 for none.
 */
export function fillMoves(
  board: Readonly<Uint8Array>,
  code: number,
  from: number,
  vacant: number,
  passing: number,
  into: Words,
): void {
  const side: Side = code >> 3 ? 'black' : 'white';
  fillAttacked(board, code, from, vacant, into);
  const isPawn = (code & 7) === PAWN;
  for (let half = 0; half < 2; half++) {
    for (let rest = into[half]!; rest !== 0; rest &= rest - 1) {
      const bit = rest & -rest;
      const to = (half << 5) | (31 - Math.clz32(bit));
      const occupant = to === vacant ? 0 : board[to]!;
      const mayGo = occupant === 0 ? !isPawn || to === passing : occupant >> 3 !== code >> 3 && (occupant & 7) !== KING;
      if (!mayGo) into[half]! &= ~bit;
    }
  }
  if (!isPawn) return;
  const next = ahead(from as Square, side);
  if (next === undefined || (board[next] !== 0 && next !== vacant)) return;
  add(into, next);
  const second = relativeRank(from as Square, side) === 2 ? ahead(from as Square, side, 2) : undefined;
  if (second !== undefined && (board[second] === 0 || second === vacant)) add(into, second);
}

/** Fills the words with the moves of the man on a square; a pinned man keeps to its line. */
export function fillMovesOf(map: AttackMap, position: Position, from: Square, into: Words): void {
  const code = map.board[from]!;
  const mayPass = position.enPassant !== null && (code >> 3 ? 'black' : 'white') === position.sideToMove;
  fillMoves(map.board, code, from, from, mayPass ? position.enPassant : -1, into);
  if (!isPinned(map, from)) return;
  const king = map.kings[code >> 3]!;
  const line = DIRECTION_TO[(king << 6) | from]!;
  for (let half = 0; half < 2; half++) {
    for (let rest = into[half]!; rest !== 0; rest &= rest - 1) {
      const bit = rest & -rest;
      const to = (half << 5) | (31 - Math.clz32(bit));
      if (DIRECTION_TO[(king << 6) | to] !== line) into[half]! &= ~bit;
    }
  }
}
