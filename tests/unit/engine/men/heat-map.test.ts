/** The heat map on an empty board, with the numbers that handbooks print, and what it says of given men. */
import { describe, expect, it } from 'vitest';
import { attackMap } from '@/engine/attacks';
import { sq, squareName } from '@/engine/board';
import { safetyOf } from '@/engine/exchange';
import { type HeatCell, heatMap } from '@/engine/men';
import { type Kind, type Man, SIDES, type Square, type SquareName } from '@/engine/types';
import { positionOf } from '../../../support/random';

const EMPTY = '8/8/8/8/8/8/8/8 w - - 0 1';

function cells(fen: string, asked: { square: Square } | Man): HeatCell[] {
  return heatMap(safetyOf(attackMap(positionOf(fen))), asked) ?? [];
}

const cellOn = (all: readonly HeatCell[], name: SquareName) => all.find(({ square }) => squareName(square) === name);

/** How many squares of the empty board give each number of moves: common tables of the handbooks. */
const TABLES: readonly { kind: Kind; squares: Readonly<Record<number, number>> }[] = [
  { kind: 'knight', squares: { 2: 4, 3: 8, 4: 20, 6: 16, 8: 16 } },
  { kind: 'bishop', squares: { 7: 28, 9: 20, 11: 12, 13: 4 } },
  { kind: 'rook', squares: { 14: 64 } },
  { kind: 'queen', squares: { 21: 28, 23: 20, 25: 12, 27: 4 } },
  { kind: 'king', squares: { 3: 4, 5: 24, 8: 36 } },
];

describe('on an empty board', () => {
  for (const { kind, squares } of TABLES) {
    it(`a ${kind} has ${Object.keys(squares).join(', ')} moves, on as many squares as the tables say`, () => {
      for (const side of SIDES) {
        const counted: Record<number, number> = {};
        for (const { moves } of cells(EMPTY, { side, kind })) counted[moves] = (counted[moves] ?? 0) + 1;
        expect(counted).toEqual(squares);
      }
    });
  }

  it('the corner is the poorest square and the centre the richest for a knight', () => {
    const knight = cells(EMPTY, { side: 'white', kind: 'knight' });
    expect(cellOn(knight, 'a1')?.moves).toBe(2);
    expect(cellOn(knight, 'b1')?.moves).toBe(3);
    expect(cellOn(knight, 'a4')?.moves).toBe(4);
    expect(cellOn(knight, 'b4')?.moves).toBe(6);
    expect(cellOn(knight, 'e5')?.moves).toBe(8);
  });

  it('every square is safe, all moves are, and nothing is reached where no man was given', () => {
    for (const { moves, safeMoves, safe, taken, reached } of cells(EMPTY, { side: 'black', kind: 'queen' })) {
      expect({ safeMoves, safe, taken, reached }).toEqual({
        safeMoves: moves,
        safe: true,
        taken: false,
        reached: null,
      });
    }
  });

  it('a pawn steps one square, two from its second rank, and is never asked on the edge ranks', () => {
    const pawn = cells(EMPTY, { side: 'white', kind: 'pawn' });
    expect(cellOn(pawn, 'd2')?.moves).toBe(2);
    expect(cellOn(pawn, 'd4')?.moves).toBe(1);
    expect(cellOn(pawn, 'd1')?.taken).toBe(true);
    expect(cellOn(pawn, 'd8')?.taken).toBe(true);
  });
});

describe('a given man', () => {
  it('leaves its own square: a rook on a1 sees the whole rank from h1', () => {
    const rook = cells('8/8/8/8/8/8/8/R7 w - - 0 1', { square: sq('a1') });
    expect(cellOn(rook, 'h1')).toMatchObject({ moves: 14, taken: false });
    expect(cellOn(rook, 'a1')).toMatchObject({ moves: 14, taken: false, reached: 0 });
  });

  it('is reached in as many safe moves as it needs: the knight from g1 comes to e5 in two and g2 in four', () => {
    const knight = cells('8/8/8/8/8/8/8/6N1 w - - 0 1', { square: sq('g1') });
    expect(cellOn(knight, 'f3')?.reached).toBe(1);
    expect(cellOn(knight, 'e5')?.reached).toBe(2);
    expect(cellOn(knight, 'g2')?.reached).toBe(3);
  });

  it('is not safe where a pawn hits it, and squares of other men are not asked', () => {
    const knight = cells('4k3/3p4/8/8/8/8/8/4K1N1 w - - 0 1', { square: sq('g1') });
    expect(cellOn(knight, 'e6')?.safe).toBe(false);
    expect(cellOn(knight, 'e5')?.safe).toBe(true);
    expect(cellOn(knight, 'd7')).toMatchObject({ taken: true, moves: 0, reached: null });
  });

  it('is undefined where the square is empty', () => {
    expect(heatMap(safetyOf(attackMap(positionOf(EMPTY))), { square: sq('e4') })).toBeUndefined();
  });
});
