/** What all posts of a side in one position share: the pawns, which a piece that moves leaves as they are. */
import { sideIndex, type SideIndex } from '../attacks';
import { fileOf, type Position, relativeRank, SQUARES } from '../board';
import { type PawnMap, pawnHold, pawnMap, pawnReach, pawnValues } from '../pawns';
import { opponent, type Side, type Square } from '../types';

/** Stands for 'no pawn ever' in tables of pawn moves. */
export const NEVER = 99;

export interface Ground {
  readonly position: Position;
  readonly side: Side;
  readonly index: SideIndex;
  readonly pawns: PawnMap;
  /** Pawn moves until an enemy pawn attacks a square, NEVER where none can; a square each. */
  readonly hitBy: Uint8Array;
  /** Pawn moves until an own pawn guards a square, likewise. */
  readonly support: Uint8Array;
  /** 1 on weak squares of the enemy: his ranks 3 to 5, which none of his pawns can come to guard. */
  readonly weak: Uint8Array;
  /** 1 on the stop squares of enemy passed, isolated and backward pawns. */
  readonly blockades: Uint8Array;
  /** 1 right before an own centre pawn (files c to f) on its second or third rank that could otherwise advance. */
  readonly pawnsWay: Uint8Array;
  /** Enemy pawns that are isolated, backward or guarded by no pawn; and own ones. */
  readonly targets: readonly Square[];
  readonly ownWeak: readonly Square[];
  /** One entry a file: 1 where the side, or the enemy, has a pawn. */
  readonly ownOnFile: Uint8Array;
  readonly enemyOnFile: Uint8Array;
}

/** Reads the ground of a position for the side whose posts are asked. */
export function groundOf(position: Position, side: Side): Ground {
  const enemy = opponent(side);
  const pawns = pawnMap(position);
  const ground = {
    position,
    side,
    index: sideIndex(side),
    pawns,
    hitBy: new Uint8Array(64),
    support: new Uint8Array(64),
    weak: new Uint8Array(64),
    blockades: new Uint8Array(64),
    pawnsWay: new Uint8Array(64),
    targets: [] as Square[],
    ownWeak: [] as Square[],
    ownOnFile: new Uint8Array(8),
    enemyOnFile: new Uint8Array(8),
  };
  for (const square of SQUARES) {
    ground.hitBy[square] = pawnReach(pawns, enemy, square).soonest?.moves ?? NEVER;
    ground.support[square] = pawnReach(pawns, side, square).soonest?.moves ?? NEVER;
    const rank = relativeRank(square, enemy);
    const hold = pawnHold(pawns, enemy, square);
    const isPawn = (position.board[square]! & 7) === 1;
    if (rank >= 3 && rank <= 5 && !isPawn && (hold === 'permanent' || hold === 'fixed')) ground.weak[square] = 1;
  }
  for (const pawn of pawnValues(position, pawns).pawns) {
    const file = fileOf(pawn.square);
    const isWeak = pawn.isolated || pawn.backward || !pawn.guarded;
    if (pawn.side === side) {
      ground.ownOnFile[file] = 1;
      if (isWeak) ground.ownWeak.push(pawn.square);
      const unmoved = relativeRank(pawn.square, side) <= 3 && file >= 2 && file <= 5;
      if (unmoved && !pawn.rammed && pawn.stop !== null) ground.pawnsWay[pawn.stop] = 1;
    } else {
      ground.enemyOnFile[file] = 1;
      if (isWeak) ground.targets.push(pawn.square);
      if ((pawn.isolated || pawn.backward || pawn.passed) && pawn.stop !== null) ground.blockades[pawn.stop] = 1;
    }
  }
  return ground;
}
