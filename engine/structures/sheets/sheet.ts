/**
 * How a structure sheet is written down: what the handbooks teach of one named structure, for both sides.
 *
 * A sheet is written once, for the colours of its model in the table of structures, and turned over by code. Its
 * lines are text, as one would note them: squares as `c5 e5`; posts as a man and its squares, `N e5 c5; R b1`; a
 * lever as the square from which the pawn attacks and the pawn it attacks, `b5xc6`; a trade as own man and enemy
 * man, `N-B`, a bishop of light or dark squares being `Bl` or `Bd`.
 */
import type { BookName } from './books';

/** What the handbooks teach for one side. */
export interface SheetLines {
  /** Squares that the side wants in hand. */
  readonly keys: string;
  /** Usual posts by kind of man. */
  readonly posts: string;
  /** Pawn levers; the pawn is the side's on the file of the first square. */
  readonly levers: string;
  /** Trades that the side looks for, own man first. */
  readonly wanted: string;
  /** Trades that the side keeps out of. */
  readonly unwanted: string;
  /** The typical plan in one sentence; `{b5}` is a square, turned over with the colours. */
  readonly plan: string;
}

export interface StructureSheet {
  /** Id of the structure in the table. */
  readonly id: string;
  readonly white: SheetLines;
  readonly black: SheetLines;
  /** Books that treat the structure, from memory. */
  readonly books: readonly BookName[];
}
