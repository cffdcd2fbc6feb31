/** Files, the seventh rank and diagonals, each row with its reason. */
import { describe, expect, it } from 'vitest';
import { fileName, squareName } from '@/engine/board';
import { readValues } from '@/engine/reading';
import type { FileName, Side } from '@/engine/types';
import { positionOf } from '../../../support/random';

function fileOn(fen: string, name: FileName) {
  const value = readValues(positionOf(fen)).files.find(({ file }) => fileName(file) === name);
  if (!value) throw new Error(`no ${name}-file`);
  const names = (side: Side) => value.entries[side].map(squareName).join(' ');
  return { ...value, entries: { white: names('white'), black: names('black') } };
}

describe('a file', () => {
  it('is open without pawns, half-open without own pawns, else closed', () => {
    const fen = '4k3/pp3ppp/4p3/8/8/8/P2P1PPP/4K3 w - - 0 1';
    expect(fileOn(fen, 'c')).toMatchObject({ status: 'open', halfOpenFor: null });
    expect(fileOn(fen, 'b')).toMatchObject({ status: 'half-open', halfOpenFor: 'white' });
    expect(fileOn(fen, 'd')).toMatchObject({ status: 'half-open', halfOpenFor: 'black' });
    expect(fileOn(fen, 'a')).toMatchObject({ status: 'closed', halfOpenFor: null });
  });

  it('is held by the side whose rook alone stands on it: the other has no safe square before that rook', () => {
    expect(fileOn('6k1/5ppp/8/8/8/8/5PPP/3R2K1 w - - 0 1', 'd')).toMatchObject({
      control: 'white',
      entries: { white: 'd7 d8', black: 'd1' },
    });
  });

  it('is nobody’s where no rook stands, shared where rooks guarded by their like face each other', () => {
    expect(fileOn('6k1/5ppp/8/8/8/8/5PPP/6K1 w - - 0 1', 'd').control).toBe('none');
    expect(fileOn('3r2k1/3r1ppp/8/8/8/8/3R1PPP/3R2K1 w - - 0 1', 'd').control).toBe('shared');
  });

  it('is nobody’s where every square beyond the middle is guarded by a pawn or a minor piece', () => {
    // c5, e5: pawns on b6 and d6 and f6; c6, c7, c8: the bishop and the knight.
    expect(fileOn('1n4k1/1b1n4/1p1p4/8/8/8/8/2R3K1 w - - 0 1', 'c')).toMatchObject({
      control: 'white',
      entries: { white: 'c7' },
    });
    expect(fileOn('6k1/1b1bn3/1p1p4/8/8/8/8/2R3K1 w - - 0 1', 'c').entries.white).toBe('c7');
    expect(fileOn('3b2k1/1b1bn3/1p1p4/8/8/8/8/2R3K1 w - - 0 1', 'c')).toMatchObject({
      control: 'none',
      entries: { white: '' },
    });
  });

  it('lets nobody past a pawn, nor past a man that a rook cannot take', () => {
    expect(fileOn('6k1/8/8/8/8/3p4/8/3R2K1 w - - 0 1', 'd').entries.white).toBe('');
    expect(fileOn('6k1/8/2p5/3n4/8/8/8/3R2K1 w - - 0 1', 'd').entries.white).toBe('');
    expect(fileOn('6k1/8/8/3n4/8/8/8/3R2K1 w - - 0 1', 'd').entries.white).toBe('d7 d8');
  });

  it('half-open bites on a pawn that is isolated or backward, and not on one that a pawn guards', () => {
    const why = (fen: string, file: FileName) =>
      fileOn(fen, file).targets.map(({ square, isolated, backward, guardedByPawn }) => [
        squareName(square),
        isolated,
        backward,
        guardedByPawn,
      ]);
    expect(why('4k3/8/8/3p4/8/8/8/3RK3 w - - 0 1', 'd')).toEqual([['d5', true, false, false]]);
    expect(why('4k3/2p5/1p6/1P6/3P4/8/8/2R1K3 w - - 0 1', 'c')).toEqual([['c7', false, true, false]]);
    expect(why('4k3/1p6/2p5/8/8/8/8/2R1K3 w - - 0 1', 'c')).toEqual([]);
  });

  it('is taken by the rook that gets there soonest', () => {
    const { takers } = fileOn('r5k1/5ppp/8/8/8/8/5PPP/R4RK1 w - - 0 1', 'e');
    const { white, black } = takers;
    expect(white && [squareName(white.rook), white.moves]).toEqual(['a1', 1]);
    expect(black && [squareName(black.rook), black.moves]).toEqual(['a8', 1]);
  });
});

describe('the seventh rank', () => {
  it('holds those who stand there and names those who can come, soonest first', () => {
    const { sevenths } = readValues(positionOf('6k1/R4ppp/8/8/8/8/5PPP/3Q2K1 w - - 0 1'));
    expect(sevenths.white.there.map(squareName)).toEqual(['a7']);
    expect(sevenths.white.comers.map(({ from, moves }) => [squareName(from), moves])).toEqual([['d1', 1]]);
    expect(sevenths.black).toEqual({ there: [], comers: [] });
  });
});

describe('a diagonal', () => {
  const from = (fen: string, square: string) =>
    readValues(positionOf(fen))
      .diagonals.filter((diagonal) => squareName(diagonal.from) === square)
      .map(({ direction, squares, stoppedBy, stopperFixed }) => [
        direction,
        squares.map(squareName).join(' '),
        stoppedBy === null ? null : squareName(stoppedBy),
        stopperFixed,
      ]);

  it('is seen to the edge, nearest square first', () => {
    expect(from('4k3/8/8/8/8/8/6B1/4K3 w - - 0 1', 'g2')).toContainEqual(['h1a8', 'f3 e4 d5 c6 b7 a8', null, false]);
  });

  it('ends on the man that stops it, who stays where two pawns stand head to head', () => {
    expect(from('4k3/8/4p3/3pP3/3P4/8/6B1/4K3 w - - 0 1', 'g2')).toContainEqual(['h1a8', 'f3 e4 d5', 'd5', true]);
    expect(from('4k3/8/4p3/3p4/8/8/6B1/4K3 w - - 0 1', 'g2')).toContainEqual(['h1a8', 'f3 e4 d5', 'd5', false]);
  });
});
