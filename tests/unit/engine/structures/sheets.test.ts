/**
 * Structure sheets: each structure has one that fits its own skeleton, and what is said to hold is found again by plain
 * code on a board of letters.
 */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { mirrored, sq, squareName } from '@/engine/board';
import { BOOKS, SHEETS, type SheetSide, sheetOf, sheetSides, STRUCTURES } from '@/engine/structures';
import type { StructureSide } from '@/engine/structures';
import { type Side, SIDES, type Square } from '@/engine/types';
import { turned } from '../../../support/pawn-boards';
import { positionOf as withPawns, soundBoardsOf, tokensOf } from '../../../support/structure-boards';

const CASES = STRUCTURES.map((model) => ({ id: model.id, model, sheet: SHEETS.find(({ id }) => id === model.id) }));

const parts = (token: string) => token.split('|');
const mayStand = (side: StructureSide, square: Square) =>
  tokensOf(side).some((token) =>
    parts(token).some((part) => part === squareName(square) || part === squareName(square).charAt(0)),
  );
const hasPawnOfFile = (side: StructureSide, square: Square) =>
  tokensOf(side).some((token) => token.charAt(0) === squareName(square).charAt(0));
const listed = (side: SheetSide) => [...side.keys, ...side.posts.map(({ square }) => square)];

describe('every structure has a sheet', () => {
  it('one each, in no other order than the table’s', () => {
    expect(STRUCTURES).toHaveLength(42);
    expect(SHEETS.map(({ id }) => id)).toEqual(STRUCTURES.map(({ id }) => id));
  });

  it.each(CASES)('$id: both sides have squares, posts, levers, trades and a plan, and a book', ({ sheet }) => {
    if (!sheet) throw new Error('no sheet');
    expect(sheet.books.length).toBeGreaterThan(0);
    for (const name of sheet.books) expect(BOOKS[name].year).toBeGreaterThan(1900);
    const written = sheetSides(sheet, false);
    for (const side of SIDES) {
      const { keys, posts, levers, wanted, unwanted, plan } = written[side];
      for (const list of [keys, posts, levers, [...wanted, ...unwanted]]) expect(list.length).toBeGreaterThan(0);
      expect(new Set(keys).size).toBe(keys.length);
      expect(new Set(posts.map(({ kind, square }) => `${kind}${square}`)).size).toBe(posts.length);
      expect(plan).toMatch(/^[A-Za-z][^.{}]+\.$/);
    }
  });
});

describe('sheets fit their skeleton', () => {
  it.each(CASES)('$id: no key square or post is a pawn’s fixed place', ({ model, sheet }) => {
    if (!sheet) throw new Error('no sheet');
    const fixed = [model.white, model.black].flatMap((side) => tokensOf(side)).filter((token) => token.length === 2);
    for (const side of SIDES) {
      const names = listed(sheetSides(sheet, false)[side]).map(squareName);
      expect(names.filter((name) => fixed.includes(name))).toEqual([]);
    }
  });

  it.each(CASES)('$id: each lever has its pawn and may have its target', ({ model, sheet }) => {
    if (!sheet) throw new Error('no sheet');
    for (const side of SIDES) {
      const enemy: Side = side === 'white' ? 'black' : 'white';
      const forward = side === 'white' ? 8 : -8;
      for (const { on, against } of sheetSides(sheet, false)[side].levers) {
        expect(hasPawnOfFile(model[side], on), squareName(on)).toBe(true);
        expect(mayStand(model[enemy], against), squareName(against)).toBe(true);
        expect([forward - 1, forward + 1]).toContain(against - on);
        expect(Math.abs((against % 8) - (on % 8))).toBe(1);
      }
    }
  });

  it.each(CASES)(
    '$id: turned over twice it is itself, and on a symmetric structure alike for both',
    ({ model, sheet }) => {
      if (!sheet) throw new Error('no sheet');
      const plain = sheetSides(sheet, false);
      const over = sheetSides(sheet, true);
      for (const side of SIDES) {
        const other: Side = side === 'white' ? 'black' : 'white';
        expect(over[other].keys.map(mirrored)).toEqual(plain[side].keys);
        expect(over[other].wanted.length).toBe(plain[side].wanted.length);
      }
      if (['exchange-french', 'symmetrical-english'].includes(model.id)) {
        expect(sorted(over.white)).toEqual(sorted(plain.white));
      }
    },
  );
});

/** A side without its words and the order of its lists. */
function sorted({ plan: _, ...lists }: SheetSide) {
  return Object.fromEntries(
    Object.entries(lists).map(([name, list]) => [name, list.map((each) => JSON.stringify(each)).sort()]),
  );
}

describe('on boards of the models', () => {
  it.each(CASES)('$id: its sheet is found, also with colours exchanged', ({ model }) => {
    fc.assert(
      fc.property(soundBoardsOf(model), (pawns) => {
        const position = withPawns(pawns);
        const found = sheetOf(position);
        const over = sheetOf(turned(position));
        expect(over?.structure.id).toBe(found?.structure.id);
        for (const side of SIDES) {
          const other: Side = side === 'white' ? 'black' : 'white';
          expect(over?.sides[other].levers.map(({ state, moves }) => [state, moves])).toEqual(
            found?.sides[side].levers.map(({ state, moves }) => [state, moves]),
          );
        }
      }),
      { numRuns: 20 },
    );
  });

  it('is none for pawns without a name', () => {
    expect(sheetOf(withPawns(['Pa2', 'pa7']))).toBeNull();
    expect(sq('a1')).toBe(0);
  });
});
