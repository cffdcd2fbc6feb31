/** Whether a lever of a sheet is to be had in a position. */
import { ahead, manOn, PAWN, PAWN_STRIKES, type Position, relativeRank, STRIKE_ROW } from '../../board';
import { pawnMoves } from '../../pawns';
import type { Side, Square } from '../../types';
import type { SheetLever } from './sides';

/** Where a lever stands: it attacks now, needs pawn moves, waits for men on its road, or cannot be. */
export const LEVER_STATES = ['ready', 'needs-moves', 'blocked', 'impossible'] as const;
export type LeverState = (typeof LEVER_STATES)[number];

/** Why a lever cannot be: its pawn is gone or past the square, nothing is there to attack, an enemy pawn stands before it. */
export const LEVER_FAULTS = ['no-pawn', 'no-target', 'rammed'] as const;
export type LeverFault = (typeof LEVER_FAULTS)[number];

export interface LeverValue extends SheetLever {
  readonly state: LeverState;
  /** Null where it can be. */
  readonly fault: LeverFault | null;
  /** The pawn that makes it: the foremost on its file that is not past the square. */
  readonly from: Square | null;
  /** Pawn moves to the square, the double step being one; null where it cannot be. */
  readonly moves: number | null;
  /** Men other than enemy pawns that stand on the road, nearest first. */
  readonly blockers: readonly Square[];
  /** Another own pawn guards the square, as things stand. */
  readonly supported: boolean;
}

/** The lever of the side in this position; men on the road are told, captures on it are not played out. */
export function leverValue(position: Position, side: Side, { on, against }: SheetLever): LeverValue {
  const road: Square[] = [];
  let from: Square | undefined = on;
  while (from !== undefined && !isPawn(position, side, from)) {
    road.unshift(from);
    from = ahead(from, side, -1);
  }
  const pawn = from ?? null;
  const fault = faultOf(position, side, against, road, pawn);
  const blockers = fault === null ? road.filter((square) => position.board[square] !== 0) : [];
  const moves = pawn === null || fault !== null ? null : movesTo(side, pawn, on);
  const state = fault ? 'impossible' : blockers.length > 0 ? 'blocked' : moves === 0 ? 'ready' : 'needs-moves';
  return { on, against, state, fault, from: pawn, moves, blockers, supported: isSupported(position, side, on) };
}

function faultOf(
  position: Position,
  side: Side,
  against: Square,
  road: readonly Square[],
  pawn: Square | null,
): LeverFault | null {
  if (pawn === null) return 'no-pawn';
  if (!isPawn(position, side === 'white' ? 'black' : 'white', against)) return 'no-target';
  return road.some((square) => (position.board[square]! & 7) === PAWN) ? 'rammed' : null;
}

function isPawn(position: Position, side: Side, square: Square): boolean {
  const man = manOn(position, square);
  return man !== null && man.kind === 'pawn' && man.side === side;
}

function movesTo(side: Side, from: Square, to: Square): number {
  return pawnMoves(relativeRank(from, side) - 1, relativeRank(to, side) - 1);
}

/** The squares from which own pawns guard one are those that an enemy pawn would strike from it. */
function isSupported(position: Position, side: Side, square: Square): boolean {
  const row = (((side === 'white' ? 1 : 0) << 6) | square) * STRIKE_ROW;
  for (let at = row; PAWN_STRIKES[at]! >= 0; at++) {
    if (isPawn(position, side, PAWN_STRIKES[at]! as Square)) return true;
  }
  return false;
}
