/** Sets of squares as two 32-bit words: for set algebra, not for hot loops. */
import type { Square } from '../types';

/** A set of squares: `low` holds a1 to h4, `high` a5 to h8, one bit a square. */
export interface SquareSet {
  readonly low: number;
  readonly high: number;
}

export const EMPTY_SET: SquareSet = { low: 0, high: 0 };

/** The set of the squares given. */
export function squareSet(squares: Iterable<Square>): SquareSet {
  let low = 0;
  let high = 0;
  for (const square of squares) {
    if (square < 32) low |= 1 << square;
    else high |= 1 << (square - 32);
  }
  return { low, high };
}

/** Whether the square is in the set. */
export function has(set: SquareSet, square: Square): boolean {
  return ((square < 32 ? set.low >>> square : set.high >>> (square - 32)) & 1) === 1;
}

export function union(a: SquareSet, b: SquareSet): SquareSet {
  return { low: a.low | b.low, high: a.high | b.high };
}

export function intersection(a: SquareSet, b: SquareSet): SquareSet {
  return { low: a.low & b.low, high: a.high & b.high };
}

/** The squares of a that are not in b. */
export function difference(a: SquareSet, b: SquareSet): SquareSet {
  return { low: a.low & ~b.low, high: a.high & ~b.high };
}

export function isEmpty(set: SquareSet): boolean {
  return (set.low | set.high) === 0;
}

/** Number of squares in the set. */
export function size(set: SquareSet): number {
  return bitCount(set.low) + bitCount(set.high);
}

/** The squares of the set, a1 first. */
export function squaresOf(set: SquareSet): Square[] {
  const squares: Square[] = [];
  for (let word = set.low; word !== 0; word &= word - 1) squares.push((31 - Math.clz32(word & -word)) as Square);
  for (let word = set.high; word !== 0; word &= word - 1) squares.push((63 - Math.clz32(word & -word)) as Square);
  return squares;
}

/** Number of bits set in a 32-bit word. */
export function bitCount(word: number): number {
  let n = word - ((word >>> 1) & 0x55555555);
  n = (n & 0x33333333) + ((n >>> 2) & 0x33333333);
  return (((n + (n >>> 4)) & 0x0f0f0f0f) * 0x01010101) >>> 24;
}
