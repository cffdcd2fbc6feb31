/** One pawn and what it is: weak or passed, stopped or free, its place in a chain and its levers. */
import { manOf, type Position } from '../board';
import type { Side, Square } from '../types';
import { type Lever, leversOf } from './levers';
import { type PawnView, squareIn } from './pawn-map';
import { AHEAD, at, COUNT, REARMOST, UP_TO } from './rank-masks';

/**
 * Place in a chain of pawns that guard one another: `base` guards and is unguarded, `head` is guarded and
 * guards none, `link` is both. Formal reading: in c3-d4-e5 with a pawn on b2 the base is b2, where
 * Nimzowitsch's text speaks of d4 (My System, from memory).
 */
export type ChainPlace = 'base' | 'link' | 'head';

/** Ahead, behind and level are meant as the pawn's side sees them. */
export interface PawnReading {
  readonly square: Square;
  readonly side: Side;
  /** No own pawn on the next files. */
  readonly isolated: boolean;
  /** Another own pawn stands on its file. */
  readonly doubled: boolean;
  /**
   * Not isolated, no own pawn on the next files level or behind, and a square from its stop square up to the one
   * level with its nearest neighbour is attacked by an enemy pawn: the handbooks' wider sense (Capablanca,
   * Chess Fundamentals, 1921, example 65 calls c7 backward although c6 is not attacked, only c5).
   */
  readonly backward: boolean;
  /** An enemy pawn attacks its stop square. */
  readonly stopAttacked: boolean;
  /** Its file holds no enemy pawn, so that enemy rooks can look at it. */
  readonly halfOpen: boolean;
  /** No enemy pawn ahead on its file or the next files. An own pawn ahead does not count against it. */
  readonly passed: boolean;
  /** Passed and guarded by a pawn. */
  readonly protectedPassed: boolean;
  /**
   * Not passed, no pawn ahead on its file, and on the next files at least as many own pawns level or behind as
   * enemy pawns ahead.
   */
  readonly candidate: boolean;
  /** An enemy pawn stands on its stop square. */
  readonly rammed: boolean;
  /** The square straight ahead; null only for a pawn that a diagram puts on its last rank. */
  readonly stop: Square | null;
  /** The stop square when any man of either side stands on it, else null. */
  readonly blockedBy: Square | null;
  /** An own pawn guards it. */
  readonly guarded: boolean;
  /** It can neither step nor capture now. Pins and checks are not looked at; en passant is. */
  readonly fixed: boolean;
  readonly chain: ChainPlace | null;
  readonly levers: readonly Lever[];
}

/** Reads the pawn on a lane (1 to 8) and rank (0 to 7) of its side's view. */
export function pawnReading(position: Position, view: PawnView, lane: number, rank: number): PawnReading {
  const { own, enemy } = view;
  const square = squareIn(view, lane, rank);
  const ahead = at(AHEAD, rank);
  const upTo = at(UP_TO, rank);
  const bit = 1 << rank;

  const left = at(own, lane - 1);
  const right = at(own, lane + 1);
  const neighbours = left | right;
  const enemyOnFile = at(enemy, lane);
  const sentries = ahead & (at(enemy, lane - 1) | at(enemy, lane + 1));
  const enemyAttacks = at(view.enemyAttacks, lane);

  const guarded = (at(view.attacks, lane) & bit) !== 0;
  const guards = (neighbours & (bit << 1)) !== 0;
  const passed = (ahead & enemyOnFile) === 0 && sentries === 0;
  const helpers = at(COUNT, left & upTo) + at(COUNT, right & upTo);
  const stop = rank < 7 ? squareIn(view, lane, rank + 1) : null;
  const blockedBy = stop !== null && position.board[stop] !== 0 ? stop : null;

  return {
    square,
    side: view.side,
    isolated: neighbours === 0,
    doubled: (at(own, lane) & ~bit) !== 0,
    backward: neighbours !== 0 && (neighbours & upTo) === 0 && (enemyAttacks & wayToNeighbour(rank, neighbours)) !== 0,
    stopAttacked: (enemyAttacks & (bit << 1)) !== 0,
    halfOpen: enemyOnFile === 0,
    passed,
    protectedPassed: passed && guarded,
    candidate: !passed && ((enemyOnFile | at(own, lane)) & ahead) === 0 && helpers >= countSentries(enemy, lane, ahead),
    rammed: (enemyOnFile & (bit << 1)) !== 0,
    stop,
    blockedBy,
    guarded,
    fixed: (stop === null || blockedBy !== null) && !canCapture(position, view.side, square),
    chain: guarded ? (guards ? 'link' : 'head') : guards ? 'base' : null,
    levers: leversOf(view, lane, rank),
  };
}

/** The ranks from the stop square up to the one level with the nearest neighbour. */
function wayToNeighbour(rank: number, neighbours: number): number {
  return at(AHEAD, rank) & at(UP_TO, at(REARMOST, neighbours));
}

function countSentries(enemy: Uint8Array, lane: number, ahead: number): number {
  return at(COUNT, at(enemy, lane - 1) & ahead) + at(COUNT, at(enemy, lane + 1) & ahead);
}

/** Whether the pawn can capture a man other than the king, or en passant, on the board as it stands. */
function canCapture(position: Position, side: Side, square: Square): boolean {
  const forward = side === 'white' ? 8 : -8;
  const file = square & 7;
  return (
    (file > 0 && capturable(position, side, square + forward - 1)) ||
    (file < 7 && capturable(position, side, square + forward + 1))
  );
}

function capturable(position: Position, side: Side, target: number): boolean {
  if (target === position.enPassant) return side === position.sideToMove;
  const man = manOf(position.board[target] ?? 0);
  return man !== null && man.side !== side && man.kind !== 'king';
}
