/** A legal move as a value. */
import type { Kind, Square } from '../types';

export interface Move {
  readonly from: Square;
  readonly to: Square;
  readonly kind: Kind;
  readonly captured: Kind | null;
  readonly promotion: Kind | null;
  readonly special: 'castle-king' | 'castle-queen' | 'en-passant' | 'double-step' | null;
}
