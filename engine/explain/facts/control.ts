/** Facts about counts over the whole board. Each names the side that has more. */
import type { Side } from '../../types';
import type { FactBase } from './base';

interface Balance extends FactBase {
  readonly side: Side;
  readonly more: number;
  readonly fewer: number;
}

export interface ReachBalance extends Balance {
  readonly id: 'reach';
}

export interface SafeMovesBalance extends Balance {
  readonly id: 'safe-moves';
}

export interface SpaceBalance extends Balance {
  readonly id: 'space';
}

export interface CommandBalance extends Balance {
  readonly id: 'command';
}

export type ControlFact = ReachBalance | SafeMovesBalance | SpaceBalance | CommandBalance;
