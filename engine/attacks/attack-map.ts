/**
 * The attack map: which men attack which square, computed once a position and handed down.
 *
 * Men of a side are numbered from 0 in order of worth, so in a mask of attackers the lowest bit is the
 * cheapest. One 32-bit mask holds a side, which is why the door admits no more than 32 men of one.
 * Attackers are those of the Laws of Chess (FIDE, article 3.1): a pinned man still attacks.
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
  RAY_ROW,
  RAYS,
  ROOK,
  STRIDES,
  STRIKE_ROW,
} from '../board';

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
  /** Squares that a man attacks, as two words: entry ((side << 5 | number) << 1 | word). */
  readonly sights: Int32Array;
  /** Squares that a side attacks, as two words: entry (side << 1 | word). */
  readonly control: Int32Array;
  /** Squares of a side's men, as two words: entry (side << 1 | word). */
  readonly men: Int32Array;
  /** King's square of each side, -1 in diagrams without one. */
  readonly kings: Int8Array;
  /** Mask of each side's absolutely pinned men, see `pinnedMask`. */
  readonly pinned: Int32Array;
  /** Whether `pinned` has been filled for this position. */
  pinsKnown: boolean;
  /** First man in a direction, see `firstMen`: entry (square << 3 | direction), -1 where the line is empty to the edge. */
  readonly lines: Int8Array;
  /** Whether `lines` has been filled for this position. */
  lined: boolean;
}

/** Empty tables, to be filled by `attackMap` again and again. */
export function newAttackMap(): AttackMap {
  return {
    board: new Uint8Array(64),
    counts: new Uint8Array(2),
    squares: new Uint8Array(64),
    numbers: new Int8Array(64),
    attackers: new Int32Array(128),
    sights: new Int32Array(128),
    control: new Int32Array(4),
    men: new Int32Array(4),
    kings: new Int8Array(2),
    pinned: new Int32Array(2),
    pinsKnown: false,
    lines: new Int8Array(512).fill(-1),
    lined: false,
  };
}

/** The attack map of a position; `into` gives the tables to fill, so that bulk work allocates nothing. */
export function attackMap(position: Pick<Position, 'board'>, into: AttackMap = newAttackMap()): AttackMap {
  into.board = position.board;
  into.lined = false;
  into.pinsKnown = false;
  fillAttackers(into);
  return into;
}

const tally = new Uint8Array(16);
/** Squares by the code of the man on them: entry (code << 6 | count so far). */
const buckets = new Uint8Array(16 << 6);

/** One pass sorts the men by code, a second numbers them in order of worth and marks what each attacks. */
function fillAttackers(map: AttackMap): void {
  const { board, numbers, attackers } = map;
  attackers.fill(0);
  numbers.fill(-1);
  tally.fill(0);
  for (let square = 0; square < 64; square++) {
    const code = board[square]!;
    if (code !== 0) buckets[(code << 6) | tally[code]!++] = square;
  }
  fillSide(map, 0);
  fillSide(map, 8);
}

/** The set that the marking of one man fills: what it attacks. Scratch. */
const sight = new Int32Array(2);

/** `white` is 0, `black` 8: what is added to a kind's place to give the code. */
function fillSide(map: AttackMap, sideCode: number): void {
  const { board, counts, squares, numbers, attackers, kings, sights, control, men } = map;
  const side = sideCode >> 3;
  const offset = side << 6;
  const row = side << 5;
  let number = 0;
  let controlLow = 0;
  let controlHigh = 0;
  men[side << 1] = 0;
  men[(side << 1) | 1] = 0;
  for (let kind = PAWN; kind <= KING; kind++) {
    const code = sideCode | kind;
    const end = tally[code]!;
    for (let i = 0; i < end; i++) {
      const from = buckets[(code << 6) | i]!;
      numbers[from] = number;
      squares[row | number] = from;
      men[(side << 1) | (from >> 5)]! |= 1 << (from & 31);
      const man = row | number;
      const bit = 1 << number++;
      sight[0] = 0;
      sight[1] = 0;
      if (kind === PAWN) markLeaps(attackers, offset, PAWN_STRIKES, (offset | from) * STRIKE_ROW, bit);
      else if (kind === KNIGHT) markLeaps(attackers, offset, KNIGHT_LEAPS, from * LEAP_ROW, bit);
      else if (kind === KING) markLeaps(attackers, offset, KING_STEPS, from * LEAP_ROW, bit);
      else {
        if (kind !== BISHOP) markLines(attackers, board, offset, from, bit, 0);
        if (kind !== ROOK) markLines(attackers, board, offset, from, bit, 4);
      }
      const low = sight[0];
      const high = sight[1];
      sights[man << 1] = low;
      sights[(man << 1) | 1] = high;
      controlLow |= low;
      controlHigh |= high;
    }
  }
  control[side << 1] = controlLow;
  control[(side << 1) | 1] = controlHigh;
  counts[side] = number;
  const kingCode = sideCode | KING;
  kings[side] = tally[kingCode]! > 0 ? buckets[kingCode << 6]! : -1;
}

/** Marks the squares of a row of leaps, which ends with -1. */
function markLeaps(attackers: Int32Array, offset: number, leaps: Readonly<Int8Array>, row: number, bit: number): void {
  for (let at = row, to = leaps[at]!; to >= 0; to = leaps[++at]!) {
    attackers[offset | to]! |= bit;
    sight[to >> 5]! |= 1 << (to & 31);
  }
}

/** Marks the four lines of a rook (`first` 0) or bishop (`first` 4). */
function markLines(
  attackers: Int32Array,
  board: Readonly<Uint8Array>,
  offset: number,
  from: number,
  bit: number,
  first: number,
): void {
  for (let direction = first; direction < first + 4; direction++) {
    const stride = STRIDES[direction]!;
    const edge = EDGES[(from << 3) | direction]!;
    for (let to = from; to !== edge; ) {
      to += stride;
      attackers[offset | to]! |= bit;
      sight[to >> 5]! |= 1 << (to & 31);
      if (board[to] !== 0) break;
    }
  }
}

/** The table of first men in every direction, filled on first use: entry (square << 3 | direction), -1 where there is none. */
export function firstMen(map: AttackMap): Readonly<Int8Array> {
  if (!map.lined) fillLines(map);
  return map.lines;
}

/**
 * Each square asks its neighbour: the man there is the first, or else the neighbour's own first man is. Squares at the end of
 * a line keep the -1 that the table is made with.
 */
function fillLines(map: AttackMap): void {
  const { board, lines } = map;
  for (let square = 62; square >= 0; square--) {
    const file = square & 7;
    if (file < 7) lookOn(board, lines, square, 2, 1);
    if (square > 55) continue;
    lookOn(board, lines, square, 0, 8);
    if (file < 7) lookOn(board, lines, square, 4, 9);
    if (file > 0) lookOn(board, lines, square, 7, 7);
  }
  for (let square = 1; square < 64; square++) {
    const file = square & 7;
    if (file > 0) lookOn(board, lines, square, 3, -1);
    if (square < 8) continue;
    lookOn(board, lines, square, 1, -8);
    if (file > 0) lookOn(board, lines, square, 5, -9);
    if (file < 7) lookOn(board, lines, square, 6, -7);
  }
  map.lined = true;
}

function lookOn(
  board: Readonly<Uint8Array>,
  lines: Int8Array,
  square: number,
  direction: number,
  stride: number,
): void {
  const next = square + stride;
  lines[(square << 3) | direction] = board[next] !== 0 ? next : lines[(next << 3) | direction]!;
}

/** Whether a man's code moves along a direction of the rook (0 to 3) or bishop (4 to 7). */
export function slidesAlong(code: number, direction: number): boolean {
  const kind = code & 7;
  return kind === QUEEN || kind === (direction < 4 ? ROOK : BISHOP);
}

/** Mask of a side's absolutely pinned men, found on first use. */
export function pinnedMask(map: AttackMap, side: SideIndex): number {
  if (!map.pinsKnown) fillPins(map);
  map.pinsKnown = true;
  return map.pinned[side]!;
}

function fillPins(map: AttackMap): void {
  const { board, kings, numbers, pinned } = map;
  const lines = firstMen(map);
  for (let side = 0; side < 2; side++) {
    const king = kings[side]!;
    let mask = 0;
    if (king >= 0) {
      for (let direction = 0; direction < 8; direction++) {
        const front = lines[(king << 3) | direction]!;
        if (front < 0 || board[front]! >> 3 !== side) continue;
        const pinner = lines[(front << 3) | direction]!;
        if (pinner < 0) continue;
        const code = board[pinner]!;
        if (code >> 3 !== side && slidesAlong(code, direction)) mask |= 1 << numbers[front]!;
      }
    }
    pinned[side] = mask;
  }
}

/** Whether a pinned man's pin keeps it from capturing on the square: the square is off the pin's line. */
export function isHeldFrom(map: AttackMap, side: SideIndex, from: number, square: number): boolean {
  const king = map.kings[side] as number;
  if (king < 0 || king === square) return false;
  for (let direction = 0; direction < 8; direction++) {
    if (firstMen(map)[(king << 3) | direction] !== from) continue;
    const pinner = firstMen(map)[(from << 3) | direction] as number;
    if (square === pinner) return false;
    for (let at = ((king << 3) | direction) * RAY_ROW, to = RAYS[at]!; to >= 0 && to !== pinner; to = RAYS[++at]!) {
      if (to === square) return false;
    }
    return true;
  }
  return false;
}
