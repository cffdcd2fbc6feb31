/** Pawn readings equal their slow twins on random boards, pawns on end ranks and crowded files included. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { SQUARES } from '@/engine/board';
import { canEverAttack, newPawnMap, pawnMap, pawnReach, pawnValues } from '@/engine/pawns';
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
        expect(values.pawns.map(({ levers, ...claims }) => claims)).toEqual(expected);
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
        for (const side of SIDES) {
          for (const square of SQUARES) {
            const reach = pawnReach(map, side, square);
            const slow = slowReach(position, side, square);
            expect(reach.hold).toBe(slow.hold);
            expect(reach.attackedNow).toEqual(reach.hold === 'attacked' ? slow.attackedNow : []);
            expect(reach.soonest?.moves ?? null).toBe(slow.moves);
            expect(canEverAttack(map, side, square)).toBe(slow.moves !== null);
            expect(reach.stopped.length > 0).toBe(slow.hold === 'fixed');
          }
        }
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
