/** All that is read of the pawns of a position. Start here. */
import type { Position } from '../board';
import type { Square } from '../types';
import type { Lever } from './levers';
import { type PawnMap, pawnMap } from './pawn-map';
import { type PawnReading, pawnReading } from './pawn-reading';
import { type PawnSideValue, pawnSide } from './pawn-sides';
import { at } from './rank-masks';

/** Two pawns head to head: each stands on the other's stop square. */
export interface Ram {
  readonly white: Square;
  readonly black: Square;
}

/**
 * Fixedness: the share of pawns, 0 to 1, which can neither move nor capture now; null where there are no such
 * pawns. `centre` looks at the pawns of both sides on the files c to f.
 */
export interface Fixedness {
  readonly all: number | null;
  readonly centre: number | null;
}

export interface PawnValues {
  /** One a pawn of either side, in square order. */
  readonly pawns: readonly PawnReading[];
  readonly white: PawnSideValue;
  readonly black: PawnSideValue;
  /** In the order of the white pawns' squares. */
  readonly rams: readonly Ram[];
  /** Those of all pawns, in the order of `pawns`, each pawn's soonest first. */
  readonly levers: readonly Lever[];
  readonly fixedness: Fixedness;
}

/** Reads the pawns of a position; `map` hands down its pawn map where that is made already. */
export function pawnValues(position: Position, map: PawnMap = pawnMap(position)): PawnValues {
  const pawns: PawnReading[] = [];
  const white: PawnReading[] = [];
  const black: PawnReading[] = [];
  const rams: Ram[] = [];
  const levers: Lever[] = [];
  for (let square = 0; square < 64; square++) {
    const code = at(position.board, square);
    if ((code & 7) !== 1) continue;
    const side = code >> 3 ? 'black' : 'white';
    const view = map[side];
    const pawn = pawnReading(position, view, (square & 7) + 1, (square ^ view.flip) >> 3);
    pawns.push(pawn);
    if (side === 'white') {
      white.push(pawn);
      if (pawn.rammed && pawn.stop !== null) rams.push({ white: pawn.square, black: pawn.stop });
    } else black.push(pawn);
    for (const lever of pawn.levers) levers.push(lever);
  }
  return {
    pawns,
    white: pawnSide(map.white, white),
    black: pawnSide(map.black, black),
    rams,
    levers,
    fixedness: fixedness(pawns),
  };
}

/** The reading of the pawn on a square, or undefined where none stands. */
export function pawnOn(values: PawnValues, square: Square): PawnReading | undefined {
  return values.pawns.find((pawn) => pawn.square === square);
}

function fixedness(pawns: readonly PawnReading[]): Fixedness {
  let fixed = 0;
  let central = 0;
  let centralFixed = 0;
  for (const pawn of pawns) {
    const file = pawn.square & 7;
    const isCentral = file >= 2 && file <= 5;
    if (isCentral) central++;
    if (pawn.fixed) {
      fixed++;
      if (isCentral) centralFixed++;
    }
  }
  return { all: pawns.length > 0 ? fixed / pawns.length : null, centre: central > 0 ? centralFixed / central : null };
}
