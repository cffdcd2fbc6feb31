/**
 * Geometry of the empty board as flat typed tables, made once at load. Hot code reads them by index;
 * everything else has kinder functions.
 */
import type { Square } from '../types';
import { SQUARES, step } from './squares';

/** The eight directions as steps of file and rank: first the four of the rook, then the four of the bishop. */
export const DIRECTIONS: readonly (readonly [number, number])[] = [
  [0, 1],
  [0, -1],
  [1, 0],
  [-1, 0],
  [1, 1],
  [-1, -1],
  [1, -1],
  [-1, 1],
];

const KNIGHT_STEPS = [
  [1, 2],
  [2, 1],
  [2, -1],
  [1, -2],
  [-1, -2],
  [-2, -1],
  [-2, 1],
  [-1, 2],
] as const;

/** A leaper's squares from each square: row of `width` entries a square, -1 after the last. */
function leaps(steps: readonly (readonly [number, number])[], width: number): Int8Array {
  const table = new Int8Array(64 * width).fill(-1);
  for (const from of SQUARES) {
    let at = from * width;
    for (const [files, ranks] of steps) {
      const to = step(from, files, ranks);
      if (to !== undefined) table[at++] = to;
    }
  }
  return table;
}

/** Entries in a row of KNIGHT_LEAPS and KING_STEPS, the closing -1 included. */
export const LEAP_ROW = 9;
export const KNIGHT_LEAPS: Readonly<Int8Array> = leaps(KNIGHT_STEPS, LEAP_ROW);
export const KING_STEPS: Readonly<Int8Array> = leaps(DIRECTIONS, LEAP_ROW);

/** Entries in a row of PAWN_STRIKES, the closing -1 included. */
export const STRIKE_ROW = 3;
/** Squares that a pawn attacks: row of (side << 6 | square), side 0 White, 1 Black. */
export const PAWN_STRIKES: Readonly<Int8Array> = (() => {
  const table = new Int8Array(128 * STRIKE_ROW);
  table.set(
    leaps(
      [
        [-1, 1],
        [1, 1],
      ],
      STRIKE_ROW,
    ),
  );
  table.set(
    leaps(
      [
        [-1, -1],
        [1, -1],
      ],
      STRIKE_ROW,
    ),
    64 * STRIKE_ROW,
  );
  return table;
})();

/** Entries in a row of RAYS, the closing -1 included. */
export const RAY_ROW = 8;
/** Squares in a direction, nearest first: row of (square << 3 | direction), -1 after the last. */
export const RAYS: Readonly<Int8Array> = (() => {
  const table = new Int8Array(512 * RAY_ROW).fill(-1);
  for (const from of SQUARES) {
    DIRECTIONS.forEach(([files, ranks], direction) => {
      let at = ((from << 3) | direction) * RAY_ROW;
      for (let to = step(from, files, ranks); to !== undefined; to = step(to, files, ranks)) table[at++] = to;
    });
  }
  return table;
})();

/** Next square in a direction: entry (square << 3 | direction), -1 off the board. */
export const NEIGHBOURS: Readonly<Int8Array> = Int8Array.from({ length: 512 }, (_, row) => RAYS[row * RAY_ROW] ?? -1);

/** What a step in a direction adds to a square's number. */
export const STRIDES: Readonly<Int8Array> = Int8Array.from(DIRECTIONS, ([files, ranks]) => files + 8 * ranks);

/** Last square in a direction, the square itself where there is none: entry (square << 3 | direction). */
export const EDGES: Readonly<Int8Array> = Int8Array.from({ length: 512 }, (_, row) => {
  const ray = RAYS.subarray(row * RAY_ROW, (row + 1) * RAY_ROW);
  return ray[ray.indexOf(-1) - 1] ?? row >> 3;
});

/** Direction from one square to another on the same line: entry (from << 6 | to), -1 where there is none. */
export const DIRECTION_TO: Readonly<Int8Array> = (() => {
  const table = new Int8Array(4096).fill(-1);
  for (const from of SQUARES) {
    for (let direction = 0; direction < 8; direction++) {
      for (let at = ((from << 3) | direction) * RAY_ROW; RAYS[at] !== -1; at++) {
        table[(from << 6) | (RAYS[at] as number)] = direction;
      }
    }
  }
  return table;
})();

/** The squares strictly between two squares of one line, nearest to `from` first; none where there is no line. */
export function between(from: Square, to: Square): Square[] {
  const squares: Square[] = [];
  const direction = DIRECTION_TO[(from << 6) | to] as number;
  if (direction < 0) return squares;
  for (
    let at = NEIGHBOURS[(from << 3) | direction] as number;
    at !== to;
    at = NEIGHBOURS[(at << 3) | direction] as number
  ) {
    squares.push(at as Square);
  }
  return squares;
}
