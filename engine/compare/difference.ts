/** What differs between two readings, as plain data: per square, per man, per theme, and what is said of one only. */
import type { Reading, Statement } from '../reading/schema';
import type { BySide, Kind, Side, SquareName, Theme } from '../types';
import type { DifferenceFact } from './facts';

/** A value before and after. */
export interface Change<V> {
  readonly a: V;
  readonly b: V;
}

/** What stands on a square. */
export type Occupant = Reading['squares'][number]['occupant'];

/** A weak square's hold for the side that suffers; null where it is none. */
export type Hold = 'permanent' | 'fixed' | null;

/** A square on which anything differs. */
export interface SquareDifference {
  readonly square: SquareName;
  readonly occupant: Change<Occupant>;
  /** How many men of each side attack it. */
  readonly attackers: BySide<Change<number>>;
  readonly command: Change<Reading['squares'][number]['command']>;
  readonly weakFor: BySide<Change<Hold>>;
  readonly outpostFor: BySide<Change<boolean>>;
}

/** What is counted of a man where it stands. */
export interface ManCounts {
  readonly safeMoves: number;
  /** Squares attacked in the enemy half. */
  readonly enemyHalf: number;
  readonly attackers: number;
  readonly defenders: number;
  /** Pawns the enemy gains by taking it now. */
  readonly enPrise: number;
}

/** A man that stands elsewhere, is gone or new, or whose counts differ. */
export interface ManDifference {
  readonly side: Side;
  readonly kind: Kind;
  /** Null where it is not on the board. */
  readonly squares: Change<SquareName | null>;
  readonly counts: Change<ManCounts | null>;
}

/** One count a theme, for lines from A to B. */
export interface BalanceLine {
  readonly theme: Theme;
  readonly counts: string;
  readonly white: Change<number>;
  readonly black: Change<number>;
}

/** A sentence of the difference. */
export interface DifferenceSentence {
  readonly id: DifferenceFact['id'];
  readonly theme: Theme;
  /** Whose gain or loss it is; null: of both. */
  readonly side: Side | null;
  /** Good for that side; where it is of both: there is more of it. */
  readonly good: boolean;
  readonly weight: number;
  readonly text: string;
  readonly squares: readonly SquareName[];
  /** Men of B that it points at. */
  readonly men: readonly SquareName[];
  readonly facts: Readonly<Record<string, unknown>>;
}

/** What differs from A to B on the board, and how it is said. */
export interface BoardDifference {
  readonly squares: readonly SquareDifference[];
  readonly men: readonly ManDifference[];
  readonly balance: readonly BalanceLine[];
  readonly sentences: readonly DifferenceSentence[];
}

/** All that differs from A to B. */
export interface Difference extends BoardDifference {
  /** Statements of B that A does not make, and the reverse. */
  readonly gained: readonly Statement[];
  readonly lost: readonly Statement[];
  /** How many statements both make. */
  readonly unchanged: number;
}
