/** Facts about outposts and advanced posts. */
import type { Side, SquareName } from '../../types';
import type { Comer, ManAt } from '../words';
import type { FactBase, PawnMoves } from './base';

export interface OutpostTaken extends FactBase {
  readonly id: 'outpost-taken';
  readonly side: Side;
  readonly man: ManAt;
  readonly hold: 'permanent' | 'fixed';
  readonly support: PawnMoves;
  /** An enemy minor piece can trade itself for it. */
  readonly tradable: boolean;
}

export interface OutpostFree extends FactBase {
  readonly id: 'outpost-free';
  readonly side: Side;
  readonly square: SquareName;
  readonly hold: 'permanent' | 'fixed';
  readonly support: PawnMoves;
  readonly comers: readonly Comer[];
  readonly ownKnights: number;
}

export interface AdvancedPost extends FactBase {
  readonly id: 'advanced-post';
  readonly side: Side;
  readonly man: ManAt;
  readonly challenge: PawnMoves;
  /** A pawn guards it now. */
  readonly guard: SquareName | null;
}

export type OutpostsFact = OutpostTaken | OutpostFree | AdvancedPost;
