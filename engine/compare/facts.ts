/** What can be said of a difference: one fact a sentence, each with the counts of both readings. */
import type { ManAt } from '../explain';
import type { Reading } from '../reading/schema';
import type { Kind, Side, SquareName } from '../types';
import type { Change } from './difference';

interface Base {
  /** Whose gain or loss it is. */
  readonly side: Side;
  /** Good for that side. */
  readonly good: boolean;
  readonly squares: readonly SquareName[];
}

/** The same man stands elsewhere. */
export interface ManPlaced extends Base {
  readonly id: 'man-placed';
  readonly kind: Kind;
  readonly at: Change<SquareName>;
  readonly safeMoves: Change<number>;
  readonly enemyHalf: Change<number>;
}

/** A man that did not move has more or fewer safe moves. */
export interface ManFreed extends Base {
  readonly id: 'man-freed' | 'man-shut-in';
  readonly man: ManAt;
  readonly safeMoves: Change<number>;
}

/** The last attacker of a square has gone; who of the enemy gets there. */
export interface LastGuard extends Base {
  readonly id: 'last-guard-gone';
  readonly square: SquareName;
  /** Attackers of the side before. */
  readonly before: number;
  readonly user: { readonly kind: Kind; readonly from: SquareName; readonly moves: number } | null;
  /** Men that A has and B has not. */
  readonly gone: readonly { readonly side: Side; readonly kind: Kind; readonly square: SquareName }[];
}

/** A square of the wider centre has changed hands. */
export interface CommandTaken extends Base {
  readonly id: 'command-taken';
  readonly square: SquareName;
  readonly command: Change<'white' | 'black' | 'open' | 'disputed'>;
  readonly attackers: { readonly white: number; readonly black: number };
}

/** A weak square of the side came or went. */
export interface WeakSquareChange extends Base {
  readonly id: 'weak-square-made' | 'weak-square-mended';
  readonly square: SquareName;
  readonly hold: 'permanent' | 'fixed';
}

/** An outpost of the side came or went. */
export interface OutpostChange extends Base {
  readonly id: 'outpost-made' | 'outpost-gone';
  readonly square: SquareName;
}

/** A file changed its state, or its owner. */
export interface FileChange extends Base {
  readonly id: 'file-opened' | 'file-taken';
  readonly file: Reading['files'][number]['file'];
  readonly status: Change<'open' | 'half-open' | 'closed'>;
  readonly control: Change<'white' | 'black' | 'shared' | 'none'>;
}

/** A man can be taken with gain now, or no longer. */
export interface EnPriseChange extends Base {
  readonly id: 'now-en-prise' | 'en-prise-no-more';
  readonly man: ManAt;
  readonly loses: number;
}

/** The king has its first flight square, or has lost its last. */
export interface FlightChange extends Base {
  readonly id: 'flight-gained' | 'flight-lost';
  readonly king: SquareName;
  readonly flights: readonly SquareName[];
}

/** A bishop is a problem piece now, or no longer one. */
export interface ProblemBishop extends Base {
  readonly id: 'problem-bishop-made' | 'problem-bishop-gone';
  readonly square: SquareName;
  /** It is not on the board any more. */
  readonly traded: boolean;
}

/** Pawns with a trait that they had not, or have no longer. */
export interface PawnTrait extends Base {
  readonly id: 'pawn-trait-made' | 'pawn-trait-gone';
  readonly trait: 'isolated' | 'doubled' | 'backward' | 'passed';
}

/** One side alone has both bishops now. */
export interface BishopPair extends Base {
  readonly id: 'bishop-pair-won' | 'bishop-pair-given';
}

/** The pawns have another name. */
export interface StructureChange extends Base {
  readonly id: 'structure-changed';
  readonly name: Change<string | null>;
}

export type DifferenceFact =
  | ManPlaced
  | ManFreed
  | LastGuard
  | CommandTaken
  | WeakSquareChange
  | OutpostChange
  | FileChange
  | EnPriseChange
  | FlightChange
  | ProblemBishop
  | PawnTrait
  | BishopPair
  | StructureChange;
