/** Pawn readings equal their slow twins on random boards, pawns on end ranks and crowded files included. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { SQUARES } from '@/engine/board';
import { newPawnMap, pawnHold, pawnMap, pawnReach, pawnValues } from '@/engine/pawns';
import { SIDES } from '@/engine/types';
import { pawnBoards } from '../../../support/pawn-boards';
import { slowLevers, slowPawn, slowPawns, slowReach } from '../../../support/slow/pawns';

const RUNS = { numRuns: 400 };
const order = (lever: { moves: number; against: number }) => lever.moves * 64 + lever.against;
const sorted = <T extends { moves: number; against: number }>(levers: readonly T[]) =>
  [...levers].sort((a, b) => order(a) - order(b));

describe('pawn readings', () => {
  it('say of every pawn what the plain definitions say', () => {
    fc.assert(
      fc.property(pawnBoards, (position) => {
        const values = pawnValues(position);
        const expected = SQUARES.flatMap((square) =>
          SIDES.filter((side) => slowPawns(position, side).includes(square)).map((side) =>
            slowPawn(position, side, square),
          ),
        );
        expect(values.pawns.map(({ levers: _levers, ...claims }) => claims)).toEqual(expected);
      }),
      RUNS,
    );
  });

  it('find the levers that walking each pawn forward finds', () => {
    fc.assert(
      fc.property(pawnBoards, (position) => {
        const values = pawnValues(position);
        for (const pawn of values.pawns) {
          expect(sorted(pawn.levers)).toEqual(sorted(slowLevers(position, pawn.side, pawn.square)));
        }
        expect(values.levers).toEqual(values.pawns.flatMap((pawn) => pawn.levers));
      }),
      RUNS,
    );
  });

  it('hold every square against the pawns as plain walking does', () => {
    const map = newPawnMap();
    fc.assert(
      fc.property(pawnBoards, (position) => {
        pawnMap(position, map);
        const squares = SIDES.flatMap((side) => SQUARES.map((square) => [side, square] as const));
        // One comparison a board: an assertion for each square made this test slower than all others together.
        const found = squares.map(([side, square]) => {
          const { hold, attackedNow, soonest, stopped } = pawnReach(map, side, square);
          const ever = ['attacked', 'open'].includes(pawnHold(map, side, square));
          return {
            side,
            square,
            hold,
            attackedNow,
            moves: soonest?.moves ?? null,
            ever,
            anyStopped: stopped.length > 0,
          };
        });
        const expected = squares.map(([side, square]) => {
          const { hold, attackedNow, moves } = slowReach(position, side, square);
          return { side, square, hold, attackedNow, moves, ever: moves !== null, anyStopped: hold === 'fixed' };
        });
        expect(found).toEqual(expected);
      }),
      RUNS,
    );
  });
});

describe('a pawn map', () => {
  it('filled again holds nothing of the board before', () => {
    const map = newPawnMap();
    fc.assert(
      fc.property(pawnBoards, pawnBoards, (first, second) => {
        pawnMap(first, map);
        expect(pawnMap(second, map)).toEqual(pawnMap(second));
      }),
      { numRuns: 50 },
    );
  });
});
