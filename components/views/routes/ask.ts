/** What the routes page asks the engine, and what it is told: plain data, the same on the server and from the worker. */
import type { Reading } from '@/engine/reading/schema';
import type { RouteCheck, RouteChoice } from '@/engine/reading/schema/routes';
import type { Kind, Side, SquareName } from '@/engine/types';

export interface Ask {
  /** A position that the page could open, as FEN. */
  readonly fen: string;
  /** Whose routes; the side to move where null. */
  readonly of: Side | null;
  /** One man's posts; those of the whole side where null. */
  readonly man: SquareName | null;
  /** A route of one's own: squares with the man's first, or moves in SAN; empty for none. */
  readonly route: readonly string[];
}

/** A man of the side with the post that helps it most; null where no safe way leads anywhere. */
export interface ManRow {
  readonly square: SquareName;
  readonly kind: Kind;
  readonly best: { readonly post: SquareName; readonly moves: number; readonly merit: number } | null;
}

/** A choice with its worth in the ranking and the other ways of the same length. */
export interface RankedChoice extends RouteChoice {
  /** The gain less the time it takes: what the list is ordered by. */
  readonly merit: number;
  /** Other shortest safe ways, as stops with the post last; a few at most. */
  readonly others: readonly (readonly SquareName[])[];
}

export interface Answer {
  readonly engine: string;
  /** What a plate needs of the reading: its men, its structure's name; the long lists are empty. */
  readonly reading: Reading;
  readonly side: Side;
  /** All knights, bishops, rooks and queens of the side, the one that a move helps most first. */
  readonly men: readonly ManRow[];
  /** Posts of the man asked, or of the whole side; best first. */
  readonly choices: readonly RankedChoice[];
  readonly check: RouteCheck | null;
  /** Why the route of one's own could not be read. */
  readonly fault: string | null;
}
