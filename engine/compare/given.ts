/** What facts of a difference are gathered from. */
import type { Reading } from '../reading/schema';
import type { ManDifference, SquareDifference } from './difference';

/** What of a reading is compared: all but its statements. */
export type Board = Omit<Reading, 'statements' | 'lead'>;

/** Two readings, and what differs by square and by man. */
export interface Given {
  readonly a: Board;
  readonly b: Board;
  readonly squares: readonly SquareDifference[];
  readonly men: readonly ManDifference[];
}
