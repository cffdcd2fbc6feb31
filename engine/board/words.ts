/**
 * Sets of squares as two 32-bit words: the first holds a1 to h4, the second a5 to h8, one bit a square
 * (`1 << (square & 31)` in word `square >> 5`). For hot code; tables have the two words of an entry side by side.
 */
import { RAY_ROW, RAYS } from './geometry';

/** The words of rows of squares, each row ended by -1. */
function wordsOfRows(rows: Readonly<Int8Array>, width: number): Readonly<Int32Array> {
  const words = new Int32Array((rows.length / width) * 2);
  for (let row = 0; row * width < rows.length; row++) {
    for (let at = row * width; (rows[at] ?? -1) >= 0 && at < (row + 1) * width; at++) {
      const square = rows[at]!;
      words[(row << 1) | (square >> 5)]! |= 1 << (square & 31);
    }
  }
  return words;
}

/** All squares in a direction: entry ((square << 3 | direction) << 1 | word). */
export const RAY_WORDS: Readonly<Int32Array> = wordsOfRows(RAYS, RAY_ROW);

/** The square of a word's lowest bit; `half` is 0 for the first word, 1 for the second. */
export function lowestSquare(word: number, half: number): number {
  return (half << 5) | (31 - Math.clz32(word & -word));
}

/** All squares on the lines of a slider: entry (((place - BISHOP) << 6 | square) << 1 | word) for bishop, rook, queen. */
export const LINE_WORDS: Readonly<Int32Array> = Int32Array.from({ length: 384 }, (_, entry) => {
  const kind = entry >> 7;
  const square = (entry >> 1) & 63;
  let word = 0;
  for (let direction = kind === 0 ? 4 : 0; direction < (kind === 1 ? 4 : 8); direction++) {
    word |= RAY_WORDS[(((square << 3) | direction) << 1) | (entry & 1)]!;
  }
  return word;
});
