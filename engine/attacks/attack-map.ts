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
  OPPOSITE,
  PAWN,
  type Position,
  QUEEN,
  RAY_ROW,
  RAYS,
  ROOK,
  STRIDES,
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
    kings: new Int8Array(2),
    pinned: new Int32Array(2),
    pinsKnown: false,
    lines: new Int8Array(512),
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

/** `white` is 0, `black` 8: what is added to a kind's place to give the code. */
function fillSide({ board, counts, squares, numbers, attackers, kings }: AttackMap, sideCode: number): void {
  const side = sideCode >> 3;
  const offset = side << 6;
  const row = side << 5;
  let number = 0;
  for (let kind = PAWN; kind <= KING; kind++) {
    const code = sideCode | kind;
    const end = tally[code]!;
    for (let i = 0; i < end; i++) {
      const from = buckets[(code << 6) | i]!;
      numbers[from] = number;
      squares[row | number] = from;
      const bit = 1 << number++;
      if (kind === PAWN) markPawn(attackers, offset, from, bit);
      else if (kind === KNIGHT) markLeaps(attackers, offset, KNIGHT_LEAPS, from, bit);
      else if (kind === KING) markLeaps(attackers, offset, KING_STEPS, from, bit);
      else {
        if (kind !== BISHOP) markLines(attackers, board, offset, from, bit, 0);
        if (kind !== ROOK) markLines(attackers, board, offset, from, bit, 4);
      }
    }
  }
  counts[side] = number;
  const kingCode = sideCode | KING;
  kings[side] = tally[kingCode]! > 0 ? buckets[kingCode << 6]! : -1;
}

function markPawn(attackers: Int32Array, offset: number, from: number, bit: number): void {
  const ahead = offset === 0 ? from + 8 : from - 8;
  if (ahead < 0 || ahead > 63) return;
  const file = from & 7;
  if (file > 0) attackers[offset | (ahead - 1)]! |= bit;
  if (file < 7) attackers[offset | (ahead + 1)]! |= bit;
}

function markLeaps(attackers: Int32Array, offset: number, leaps: Readonly<Int8Array>, from: number, bit: number): void {
  for (let at = from * LEAP_ROW, to = leaps[at]!; to >= 0; to = leaps[++at]!) attackers[offset | to]! |= bit;
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
      if (board[to] !== 0) break;
    }
  }
}

/**
 * Squares in the order in which a direction's lines are filled: each line from its far end back, so that the last
 * man passed is the first man met. Row (direction << 6); a square that begins a line is marked by FRESH.
 */
const FRESH = 64;
const FILL_ORDER: Readonly<Uint8Array> = (() => {
  const order = new Uint8Array(512);
  for (let direction = 0; direction < 8; direction++) {
    let at = direction << 6;
    const back = OPPOSITE[direction]!;
    for (let start = 0; start < 64; start++) {
      if (EDGES[(start << 3) | direction] !== start) continue;
      order[at++] = start | FRESH;
      for (let square = start; square !== EDGES[(start << 3) | back]; ) {
        square += STRIDES[back]!;
        order[at++] = square;
      }
    }
  }
  return order;
})();

/** The table of first men in every direction, filled on first use: entry (square << 3 | direction), -1 where there is none. */
export function firstMen(map: AttackMap): Readonly<Int8Array> {
  if (!map.lined) fillLines(map);
  return map.lines;
}

function fillLines(map: AttackMap): void {
  const { board, lines } = map;
  for (let direction = 0; direction < 8; direction++) {
    let first = -1;
    for (let at = direction << 6, end = at + 64; at < end; at++) {
      const entry = FILL_ORDER[at]!;
      if (entry >= FRESH) first = -1;
      const square = entry & 63;
      lines[(square << 3) | direction] = first;
      if (board[square] !== 0) first = square;
    }
  }
  map.lined = true;
}

/** Whether a man's code moves along a direction of the rook (0 to 3) or bishop (4 to 7). */
export function slidesAlong(code: number, direction: number): boolean {
  const kind = code & 7;
  return kind === QUEEN || kind === (direction < 4 ? ROOK : BISHOP);
}

/** First man met from a square in a direction by walking the board; -1 where there is none. */
function walk(board: Readonly<Uint8Array>, from: number, direction: number): number {
  const stride = STRIDES[direction]!;
  const edge = EDGES[(from << 3) | direction]!;
  for (let to = from; to !== edge; ) {
    to += stride;
    if (board[to] !== 0) return to;
  }
  return -1;
}

/** Mask of a side's absolutely pinned men, found on first use. */
export function pinnedMask(map: AttackMap, side: SideIndex): number {
  if (!map.pinsKnown) fillPins(map);
  map.pinsKnown = true;
  return map.pinned[side]!;
}

function fillPins({ board, kings, numbers, pinned }: AttackMap): void {
  for (let side = 0; side < 2; side++) {
    const king = kings[side]!;
    let mask = 0;
    if (king >= 0) {
      for (let direction = 0; direction < 8; direction++) {
        const front = walk(board, king, direction);
        if (front < 0 || board[front]! >> 3 !== side) continue;
        const pinner = walk(board, front, direction);
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
