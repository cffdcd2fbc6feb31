/** Squares: names, files, ranks, colours, steps. */
import { type Colour, FILES, type FileName, RANKS, type Side, type Square, type SquareName } from '../types';

/** All 64 squares, a1, b1 … h8. */
export const SQUARES: readonly Square[] = Array.from({ length: 64 }, (_, index) => index as Square);

const NAMES: readonly SquareName[] = RANKS.flatMap((rank) => FILES.map((file): SquareName => `${file}${rank}`));
const BY_NAME: ReadonlyMap<string, Square> = new Map(NAMES.map((name, index) => [name, index as Square]));

/** The square's name, "a1" to "h8". */
export function squareName(square: Square): SquareName {
  return NAMES[square] as SquareName;
}

/** The square of a name, or undefined where the text names none. */
export function squareNamed(name: string): Square | undefined {
  return BY_NAME.get(name);
}

/** The square of a name that is known to be one; for tables written by hand. Throws on any other text. */
export function sq(name: SquareName): Square {
  const square = BY_NAME.get(name);
  if (square === undefined) throw new Error(`not a square: ${name}`);
  return square;
}

/** The square on a file (0 = a … 7 = h) and rank (0 = first … 7 = eighth); undefined off the board. */
export function squareAt(file: number, rank: number): Square | undefined {
  return file >= 0 && file < 8 && rank >= 0 && rank < 8 ? ((rank * 8 + file) as Square) : undefined;
}

/** File of a square, 0 = a … 7 = h. */
export function fileOf(square: Square): number {
  return square & 7;
}

/** Rank of a square, 0 = first … 7 = eighth. */
export function rankOf(square: Square): number {
  return square >> 3;
}

/** Rank as the side counts it, 1 = its own back rank … 8. White's d6 and Black's d3 are both on 6. */
export function relativeRank(square: Square, side: Side): number {
  return side === 'white' ? rankOf(square) + 1 : 8 - rankOf(square);
}

/**
 * Order of squares that holds when colours and board are turned: by file, then by rank as the side counts it. Ties
 * are broken by it, never by the square's number.
 */
export function viewOrder(square: Square, side: Side): number {
  return (fileOf(square) << 3) | (relativeRank(square, side) - 1);
}

/** Letter of a file, 0 = a. */
export function fileName(file: number): FileName {
  return FILES[file] as FileName;
}

/** Colour of a square; a1 is dark. */
export function colourOf(square: Square): Colour {
  return ((square >> 3) + square) & 1 ? 'light' : 'dark';
}

/** The square `files` to the right and `ranks` up (as White sits), or undefined off the board. */
export function step(square: Square, files: number, ranks: number): Square | undefined {
  return squareAt(fileOf(square) + files, rankOf(square) + ranks);
}

/** The square straight ahead of a man as its side sees it, or undefined on the last rank. */
export function ahead(square: Square, side: Side, ranks = 1): Square | undefined {
  return step(square, 0, side === 'white' ? ranks : -ranks);
}

/** King's distance between two squares: moves of a king on an empty board. */
export function kingDistance(a: Square, b: Square): number {
  return Math.max(Math.abs(fileOf(a) - fileOf(b)), Math.abs(rankOf(a) - rankOf(b)));
}

/** The same square with the board turned over the middle line: a1 to a8. */
export function mirrored(square: Square): Square {
  return (square ^ 56) as Square;
}
