/** What can be said of a difference: one fact a sentence, each with the counts of both readings. */
import type { ManAt } from '../explain';
import type { Colour, FileName, Kind, Side, SquareName } from '../types';
import type { Change } from './difference';

export type FileStatus = 'open' | 'half-open' | 'closed';

interface Base {
  /** Whose gain or loss it is; null: of both. */
  readonly side: Side | null;
  /** Good for that side; where it is of both: there is more of it. */
  readonly good: boolean;
  readonly squares: readonly SquareName[];
}

interface SideBase extends Base {
  readonly side: Side;
}

/** The same man stands elsewhere. */
export interface ManPlaced extends SideBase {
  readonly id: 'man-placed';
  readonly kind: Kind;
  readonly at: Change<SquareName>;
  readonly safeMoves: Change<number>;
  readonly enemyHalf: Change<number>;
}

/** A man that did not move has more or fewer safe moves. */
export interface ManFreed extends SideBase {
  readonly id: 'man-freed' | 'man-shut-in';
  readonly man: ManAt;
  readonly safeMoves: Change<number>;
}

/** The last attacker of a square has gone; who of the enemy gets there. */
export interface LastGuard extends SideBase {
  readonly id: 'last-guard-gone';
  readonly square: SquareName;
  /** Attackers of the side before. */
  readonly before: number;
  /** The man that stands on it now. */
  readonly on: { readonly side: Side; readonly kind: Kind } | null;
  readonly user: { readonly kind: Kind; readonly from: SquareName; readonly moves: number } | null;
  /** The guards, where all of them are off the board; else none. */
  readonly gone: readonly ManAt[];
  /** Where one guard is gone with an enemy man of its kind, and nothing else is: what kind; for bishops of one colour which. */
  readonly pair: { readonly kind: Kind; readonly colour: Colour | null } | null;
}

/** A minor man that no pawn guards, two or more heavy enemy men behind one another on its file against it; or no longer. */
export interface TargetChange extends SideBase {
  readonly id: 'target-made' | 'target-gone';
  readonly man: ManAt;
  readonly file: FileName;
  /** The heavy men of the reading in which it is a target. */
  readonly heavy: readonly ManAt[];
}

/** A square of the wider centre has changed hands. */
export interface CommandTaken extends SideBase {
  readonly id: 'command-taken';
  readonly square: SquareName;
  readonly command: Change<'white' | 'black' | 'open' | 'disputed'>;
  readonly attackers: { readonly white: number; readonly black: number };
}

/** A weak square of the side came or went. */
export interface WeakSquareChange extends SideBase {
  readonly id: 'weak-square-made' | 'weak-square-mended';
  readonly square: SquareName;
  readonly hold: 'permanent' | 'fixed';
  /** Whether it matters in the reading that has it. */
  readonly matters: boolean;
}

/** An outpost of the side came or went. */
export interface OutpostChange extends SideBase {
  readonly id: 'outpost-made' | 'outpost-gone';
  readonly square: SquareName;
}

/** A file opened or shut, for one side or for both. */
export interface FileOpened extends Base {
  readonly id: 'file-opened';
  readonly file: FileName;
  readonly status: Change<FileStatus>;
  readonly halfOpenFor: Change<Side | null>;
}

/** A side controls a file now, or no longer. */
export interface FileTaken extends SideBase {
  readonly id: 'file-taken';
  readonly file: FileName;
  readonly heavy: readonly ManAt[];
}

/** A man can be taken with gain now, or no longer. */
export interface EnPriseChange extends SideBase {
  readonly id: 'now-en-prise' | 'en-prise-no-more';
  readonly man: ManAt;
  readonly loses: number;
}

/** The king has its first flight square, or has lost its last. */
export interface FlightChange extends SideBase {
  readonly id: 'flight-gained' | 'flight-lost';
  readonly king: SquareName;
  readonly flights: readonly SquareName[];
}

/** A bishop is a problem piece now, or no longer one. */
export interface ProblemBishop extends SideBase {
  readonly id: 'problem-bishop-made' | 'problem-bishop-gone';
  readonly square: SquareName;
  /** It is not on the board any more. */
  readonly traded: boolean;
}

/** Pawns with a trait that they had not, or have no longer. */
export interface PawnTrait extends SideBase {
  readonly id: 'pawn-trait-made' | 'pawn-trait-gone';
  readonly trait: 'isolated' | 'doubled' | 'backward' | 'passed';
}

/** One side alone has both bishops now. */
export interface BishopPair extends SideBase {
  readonly id: 'bishop-pair-won' | 'bishop-pair-given';
}

/** The pawns have another name. */
export interface StructureChange extends SideBase {
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
  | FileOpened
  | FileTaken
  | TargetChange
  | EnPriseChange
  | FlightChange
  | ProblemBishop
  | PawnTrait
  | BishopPair
  | StructureChange;
