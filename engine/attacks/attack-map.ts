/**
 * The attack map: which men attack which square, computed once a position and handed down.
 *
 * Men of a side are numbered from 0 in order of worth, so in a mask of attackers the lowest bit is the
 * cheapest. One 32-bit mask holds a side, which is why the door admits no more than 32 men of one.
 * Attackers are those of the Laws of Chess (FIDE, article 3.1): a pinned man still attacks.
 */
import {
  KING_STEPS,
  KNIGHT_LEAPS,
  LEAP_ROW,
  NEIGHBOURS,
  PAWN_STRIKES,
  type Position,
  RAY_ROW,
  RAYS,
  STRIKE_ROW,
} from '../board';

/** Places of the kinds in a man's code (`code & 7`). */
export const PAWN = 1;
export const KNIGHT = 2;
export const BISHOP = 3;
export const ROOK = 4;
export const QUEEN = 5;
export const KING = 6;

/** Sides as numbers: 0 White, 1 Black. */
export type SideIndex = 0 | 1;

/** Raw tables of one position. Everything is indexed by numbers; `queries.ts` has the kinder questions. */
export interface AttackMap {
  /** Man codes, a1 first: the position's own mailbox. */
  board: Readonly<Uint8Array>;
  /** Number of men of each side. */
  readonly counts: Uint8Array;
  /** Square of a man: entry (side << 5 | number). */
  readonly squares: Uint8Array;
  /** Number of the man on a square, within its side; -1 empty. */
  readonly numbers: Int8Array;
  /** Mask of the men of a side that attack a square: entry (side << 6 | square). */
  readonly attackers: Int32Array;
  /** First man in a direction: entry (square << 3 | direction), -1 where the line is empty to the edge. */
  readonly firstMan: Int8Array;
  /** King's square of each side, -1 in diagrams without one. */
  readonly kings: Int8Array;
  /** Mask of each side's absolutely pinned men. */
  readonly pinned: Int32Array;
}

/** Empty tables, to be filled by `attackMap` again and again. */
export function newAttackMap(): AttackMap {
  return {
    board: new Uint8Array(64),
    counts: new Uint8Array(2),
    squares: new Uint8Array(64),
    numbers: new Int8Array(64),
    attackers: new Int32Array(128),
    firstMan: new Int8Array(512),
    kings: new Int8Array(2),
    pinned: new Int32Array(2),
  };
}

/** The attack map of a position; `into` gives the tables to fill, so that bulk work allocates nothing. */
export function attackMap(position: Position, into: AttackMap = newAttackMap()): AttackMap {
  into.board = position.board;
  into.attackers.fill(0);
  numberMen(into);
  fillFirstMen(into);
  fillAttackers(into);
  fillPins(into);
  return into;
}

const placeOf = new Uint8Array(16);

function numberMen(map: AttackMap): void {
  const { board, counts, squares, numbers, kings } = map;
  placeOf.fill(0);
  kings[0] = -1;
  kings[1] = -1;
  for (let square = 63; square >= 0; square--) {
    const code = board[square] as number;
    if (code === 0) continue;
    placeOf[code]!++;
    if ((code & 7) === KING) kings[code >> 3] = square;
  }
  for (let side = 0; side < 2; side++) {
    let next = 0;
    for (let kind = PAWN; kind <= KING; kind++) {
      const count = placeOf[(side << 3) | kind] as number;
      placeOf[(side << 3) | kind] = next;
      next += count;
    }
    counts[side] = next;
  }
  for (let square = 0; square < 64; square++) {
    const code = board[square] as number;
    if (code === 0) {
      numbers[square] = -1;
      continue;
    }
    const number = placeOf[code]!++;
    numbers[square] = number;
    squares[((code >> 3) << 5) | number] = square;
  }
}

/** North, east and the two upward diagonals are filled from the top, the others from the bottom. */
function fillFirstMen({ board, firstMan }: AttackMap): void {
  for (let square = 63; square >= 0; square--) {
    const row = square << 3;
    fillFirstMan(board, firstMan, row, 0);
    fillFirstMan(board, firstMan, row, 2);
    fillFirstMan(board, firstMan, row, 4);
    fillFirstMan(board, firstMan, row, 7);
  }
  for (let square = 0; square < 64; square++) {
    const row = square << 3;
    fillFirstMan(board, firstMan, row, 1);
    fillFirstMan(board, firstMan, row, 3);
    fillFirstMan(board, firstMan, row, 5);
    fillFirstMan(board, firstMan, row, 6);
  }
}

function fillFirstMan(board: Readonly<Uint8Array>, firstMan: Int8Array, row: number, direction: number): void {
  const next = NEIGHBOURS[row | direction] as number;
  firstMan[row | direction] = next < 0 ? -1 : board[next] !== 0 ? next : (firstMan[(next << 3) | direction] as number);
}

function fillAttackers({ board, counts, squares, attackers }: AttackMap): void {
  for (let side = 0; side < 2; side++) {
    const offset = side << 6;
    const count = counts[side] as number;
    for (let number = 0; number < count; number++) {
      const from = squares[(side << 5) | number] as number;
      const bit = 1 << number;
      const kind = (board[from] as number) & 7;
      if (kind === PAWN) {
        for (let at = (offset | from) * STRIKE_ROW, to = PAWN_STRIKES[at]!; to >= 0; to = PAWN_STRIKES[++at]!) {
          attackers[offset | to]! |= bit;
        }
      } else if (kind === KNIGHT || kind === KING) {
        const table = kind === KNIGHT ? KNIGHT_LEAPS : KING_STEPS;
        for (let at = from * LEAP_ROW, to = table[at]!; to >= 0; to = table[++at]!) attackers[offset | to]! |= bit;
      } else {
        const last = kind === ROOK ? 4 : 8;
        for (let direction = kind === BISHOP ? 4 : 0; direction < last; direction++) {
          for (let at = ((from << 3) | direction) * RAY_ROW, to = RAYS[at]!; to >= 0; to = RAYS[++at]!) {
            attackers[offset | to]! |= bit;
            if (board[to] !== 0) break;
          }
        }
      }
    }
  }
}

/** Whether a man's code moves along a direction of the rook (0 to 3) or bishop (4 to 7). */
export function slidesAlong(code: number, direction: number): boolean {
  const kind = code & 7;
  return kind === QUEEN || kind === (direction < 4 ? ROOK : BISHOP);
}

function fillPins({ board, firstMan, kings, numbers, pinned }: AttackMap): void {
  for (let side = 0; side < 2; side++) {
    const king = kings[side] as number;
    let mask = 0;
    if (king >= 0) {
      for (let direction = 0; direction < 8; direction++) {
        const front = firstMan[(king << 3) | direction] as number;
        if (front < 0 || (board[front] as number) >> 3 !== side) continue;
        const pinner = firstMan[(front << 3) | direction] as number;
        if (pinner < 0) continue;
        const code = board[pinner] as number;
        if (code >> 3 !== side && slidesAlong(code, direction)) mask |= 1 << (numbers[front] as number);
      }
    }
    pinned[side] = mask;
  }
}

/** Mask of a side's men that stand behind an attacker of the square: see `behind` in the queries. */
export function behindMask(map: AttackMap, side: SideIndex, square: number): number {
  const { board, firstMan, numbers, attackers } = map;
  const direct = attackers[(side << 6) | square] as number;
  let mask = 0;
  if (direct === 0) return 0;
  for (let direction = 0; direction < 8; direction++) {
    const front = firstMan[(square << 3) | direction] as number;
    if (front < 0) continue;
    const code = board[front] as number;
    if (code >> 3 !== side) continue;
    if (!slidesAlong(code, direction) && (code & 7) !== PAWN) continue;
    if (((direct >>> (numbers[front] as number)) & 1) === 0) continue;
    for (let next = firstMan[(front << 3) | direction]!; next >= 0; next = firstMan[(next << 3) | direction]!) {
      const behind = board[next] as number;
      if (behind >> 3 !== side || !slidesAlong(behind, direction)) break;
      mask |= 1 << (numbers[next] as number);
    }
  }
  return mask;
}

/** Whether a pinned man's pin keeps it from capturing on the square: the square is off the pin's line. */
export function isHeldFrom(map: AttackMap, side: SideIndex, from: number, square: number): boolean {
  const king = map.kings[side] as number;
  if (king < 0 || king === square) return false;
  for (let direction = 0; direction < 8; direction++) {
    if (map.firstMan[(king << 3) | direction] !== from) continue;
    const pinner = map.firstMan[(from << 3) | direction] as number;
    if (square === pinner) return false;
    for (let at = ((king << 3) | direction) * RAY_ROW, to = RAYS[at]!; to >= 0 && to !== pinner; to = RAYS[++at]!) {
      if (to === square) return false;
    }
    return true;
  }
  return false;
}

