/** Exchanging the colours exchanges the sides of a reading; mirroring the files mirrors it; both change nothing else. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { SQUARES } from '@/engine/board';
import {
  type Lever,
  type PawnMap,
  type PawnSideValue,
  type PawnValues,
  pawnMap,
  pawnReach,
  pawnValues,
  type Wing,
} from '@/engine/pawns';
import { opponent, SIDES, type Side, type Square } from '@/engine/types';
import { mirroredFiles, pawnBoards, turned } from '../../../support/pawn-boards';

interface Exchange {
  readonly square: (square: Square) => Square;
  readonly side: (side: Side) => Side;
  readonly wing: (wing: Wing) => Wing;
}

const TURN: Exchange = { square: (square) => (square ^ 56) as Square, side: opponent, wing: (wing) => wing };
const MIRROR: Exchange = {
  square: (square) => (square ^ 7) as Square,
  side: (side) => side,
  wing: (wing) => (wing === 'queenside' ? 'kingside' : wing === 'kingside' ? 'queenside' : wing),
};
const SAME: Exchange = { square: (square) => square, side: (side) => side, wing: (wing) => wing };

/** A reading as sorted plain text, carried over by an exchange: lists whose order follows squares become sets. */
function carried(values: PawnValues, by: Exchange) {
  const orNull = (square: Square | null) => (square === null ? null : by.square(square));
  const set = (items: readonly unknown[]) => items.map((item) => JSON.stringify(item)).sort();
  const squares = (list: readonly Square[]) => list.map(by.square).sort((a, b) => a - b);
  const lever = (one: Lever) => ({
    ...one,
    side: by.side(one.side),
    from: by.square(one.from),
    against: by.square(one.against),
    on: by.square(one.on),
  });
  const sideValue = (value: PawnSideValue, colours: readonly [number, number]) => ({
    pawns: squares(value.pawns),
    islands: set(value.islands.map(squares)),
    isolated: squares(value.isolated),
    doubled: squares(value.doubled),
    backward: squares(value.backward),
    passed: squares(value.passed),
    protectedPassed: squares(value.protectedPassed),
    candidates: squares(value.candidates),
    majorities: value.majorities.map(by.wing).sort(),
    crippled: value.crippledMajorities.map(by.wing).sort(),
    colours,
    hanging: squares(value.hangingPawns ?? []),
    minority: set(value.minorityAttacks.map(({ wing, lever: one }) => ({ wing: by.wing(wing), lever: lever(one) }))),
  });
  // Both exchanges turn light squares into dark ones.
  const colours = (value: PawnSideValue): [number, number] =>
    by === SAME ? [value.onLight, value.onDark] : [value.onDark, value.onLight];
  return {
    pawns: set(
      values.pawns.map((pawn) => ({
        ...pawn,
        square: by.square(pawn.square),
        side: by.side(pawn.side),
        stop: orNull(pawn.stop),
        blockedBy: orNull(pawn.blockedBy),
        levers: set(pawn.levers.map(lever)),
      })),
    ),
    white: sideValue(values[by.side('white')], colours(values[by.side('white')])),
    black: sideValue(values[by.side('black')], colours(values[by.side('black')])),
    rams: set(
      values.rams.map((ram) => ({ white: by.square(ram[by.side('white')]), black: by.square(ram[by.side('black')]) })),
    ),
    fixedness: values.fixedness,
  };
}

describe('pawn values', () => {
  it('exchange with the colours', () => {
    fc.assert(
      fc.property(pawnBoards, (position) => {
        expect(carried(pawnValues(turned(position)), SAME)).toEqual(carried(pawnValues(position), TURN));
      }),
      { numRuns: 300 },
    );
  });

  it('mirror with the files', () => {
    fc.assert(
      fc.property(pawnBoards, (position) => {
        expect(carried(pawnValues(mirroredFiles(position)), SAME)).toEqual(carried(pawnValues(position), MIRROR));
      }),
      { numRuns: 300 },
    );
  });
});

describe('pawn reach', () => {
  it('names the same soonest pawn with colours exchanged and with files mirrored', () => {
    fc.assert(
      fc.property(pawnBoards, (position) => {
        const map = pawnMap(position);
        const turnedMap = pawnMap(turned(position));
        const mirroredMap = pawnMap(mirroredFiles(position));
        const squares = SIDES.flatMap((side) => SQUARES.map((square) => [side, square] as const));
        const over = (carry: Exchange) =>
          squares.map(([side, square]) => {
            const { hold, soonest } = pawnReach(map, side, square);
            return { hold, soonest: soonest && { ...soonest, from: carry.square(soonest.from) } };
          });
        const reachIn = (other: PawnMap, carry: Exchange) =>
          squares.map(([side, square]) => {
            const { hold, soonest } = pawnReach(other, carry.side(side), carry.square(square));
            return { hold, soonest };
          });
        expect(reachIn(turnedMap, TURN)).toEqual(over(TURN));
        expect(reachIn(mirroredMap, MIRROR)).toEqual(over(MIRROR));
      }),
      { numRuns: 100 },
    );
  });
});
