/**
 * The guard: whether something is lost by force after a step, the enemy to move. It is a safeguard, not an opinion:
 * it counts men and looks a few plies deep.
 */
import type { Square } from '../types';
import type { PlayedMove } from './desk';
import { type Bounds, type Found, searchGain } from './search';

/** `unknown`: the nodes ran out before either was proved. */
export const VERDICTS = ['holds', 'loses', 'unknown'] as const;
export type Verdict = (typeof VERDICTS)[number];

/** A move of a guard's line. */
export interface LineMove {
  readonly from: Square;
  readonly to: Square;
  /** Place of the new kind in KINDS, from 1; 0 without promotion. */
  readonly promoted: number;
}

export interface GuardValue {
  readonly verdict: Verdict;
  /** The line that shows the loss, the enemy moving first; empty where it holds. */
  readonly line: readonly LineMove[];
  /** Pawns lost; MATE for mate; 0 where it holds. */
  readonly loses: number;
}

/** Captures, promotions, answers, and one quiet check by the enemy. */
export const GUARD_BOUNDS: Bounds = { nodesMax: 4000, checkPlies: 1 };

/**
 * The second look: every move of the enemy, every answer and every move after it, then captures. It sees a threat
 * made by a quiet move, a fork or a man hemmed in. More than a rook is
 * not told apart.
 */
export const SECOND_LOOK: Bounds = { nodesMax: 20000, checkPlies: 0, quietPlies: 3, gainsMax: 5 };

/** What a board with the enemy (0 White, 1 Black) to move costs the other side. */
export function guardOf(
  board: Readonly<Uint8Array>,
  enemy: number,
  bounds: Bounds = GUARD_BOUNDS,
  passedOver = -1,
): GuardValue {
  return guardFrom(searchGain(board, enemy, bounds, passedOver));
}

/** A guard's verdict from what the search found; a search that gave up has proved neither. */
export function guardFrom({ gains, line, complete }: Found): GuardValue {
  if (!complete) return { verdict: 'unknown', line: [], loses: 0 };
  if (gains <= 0) return { verdict: 'holds', line: [], loses: 0 };
  return { verdict: 'loses', line: line.map(lineMove), loses: gains };
}

function lineMove(move: PlayedMove): LineMove {
  return { from: (move & 63) as Square, to: ((move >> 6) & 63) as Square, promoted: (move >> 12) & 7 };
}
