/** Good and bad bishops, with the sources named in rows. */
import { describe, expect, it } from 'vitest';
import { sq, squareName } from '@/engine/board';
import { readValues } from '@/engine/reading';
import type { SquareName } from '@/engine/types';
import { positionOf } from '../../../support/random';

function bishopOn(fen: string, name: SquareName) {
  const bishop = readValues(positionOf(fen)).bishops.find(({ square }) => square === sq(name));
  if (!bishop) throw new Error(`no bishop on ${name}: ${fen}`);
  return bishop;
}

describe('a bishop', () => {
  it('is bad behind its fixed centre pawns (Edward Lasker, Chess Strategy, 1915, diagram 133)', () => {
    const bishop = bishopOn('r4rk1/3bqppp/2n1p3/p2pP3/1ppP1P2/2P2NP1/PPBQ3P/4RRK1 w - - 0 1', 'd7');
    expect(bishop).toMatchObject({ bad: true, outside: false });
    expect(bishop.fixedCentre.map(squareName)).toEqual(['c4', 'd5', 'e6']);
  });

  const french = 'rnbqkbnr/pp3ppp/4p3/2ppP3/3P4/8/PPP2PPP/RNBQKBNR w KQkq - 0 4';

  it('is the French one: its pawns stand on its colour, and the lever against d4 or e5 is what frees it', () => {
    const { bad, remedy } = bishopOn('rnbqkbnr/pp3ppp/4p3/3pP3/3P4/8/PP3PPP/RNBQKBNR b KQkq - 0 5', 'c8');
    expect(bad).toBe(true);
    expect(remedy?.tradeable).toBe(true);
    expect(remedy?.lever && `${squareName(remedy.lever.from)} against ${squareName(remedy.lever.against)}`).toBe(
      'f7 against e5',
    );
  });

  it('counts no pawn that can take: c5 may take on d4, so nothing fixed stands on the other bishop’s colour', () => {
    expect(bishopOn(french, 'c8').fixedCentre.map(squareName)).toEqual(['d5', 'e6']);
    expect(bishopOn(french, 'f8').fixedCentre).toEqual([]);
    expect(bishopOn(french, 'f8').bad).toBe(false);
  });

  it('is bad but active outside the chain: the same pawns, the bishop on g4', () => {
    const inside = '4k3/5ppp/2b1p3/3pP3/3P4/8/5PPP/4K3 w - - 0 1';
    const outside = '4k3/5ppp/4p3/3pP3/3P2b1/8/5PPP/4K3 w - - 0 1';
    expect(bishopOn(inside, 'c6')).toMatchObject({ bad: true, outside: false });
    expect(bishopOn(outside, 'g4')).toMatchObject({ bad: true, outside: true, remedy: null });
  });

  it('can be brought outside in one move; of two such squares the one nearer the a-file is named', () => {
    const { remedy } = bishopOn('4k3/5ppp/2b1p3/3pP3/3P4/8/5PPP/4K3 w - - 0 1', 'c6');
    expect(remedy?.outside && [squareName(remedy.outside.square), remedy.outside.moves]).toEqual(['a4', 1]);
    expect(remedy?.tradeable).toBe(false);
  });

  it('is not bad for a centre pawn that only a piece stands before: the piece will go', () => {
    expect(bishopOn('4k3/8/8/3N4/3p4/3P4/4B3/4K3 w - - 0 1', 'e2').bad).toBe(true);
    expect(bishopOn('4k3/8/8/3p4/3n4/3P4/4B3/4K3 w - - 0 1', 'e2').bad).toBe(false);
  });

  it('is not bad for a pawn that can step up beside its neighbour’s guard: f7-f6 is a lever, not a fixed pawn', () => {
    expect(bishopOn('4k3/5pp1/8/4P1P1/8/8/4b3/4K3 w - - 0 1', 'e2').fixedCentre).toEqual([]);
    expect(bishopOn('4k3/5p2/8/4P1P1/8/8/4b3/4K3 w - - 0 1', 'e2').fixedCentre.map(squareName)).toEqual(['f7']);
  });

  it('is not bad where fewer than half of the pawns stand on its colour', () => {
    expect(bishopOn('4k3/8/8/8/3p4/3P4/P3B1P1/4K3 w - - 0 1', 'e2')).toMatchObject({ ownPawns: 3, bad: true });
    expect(bishopOn('4k3/8/8/8/3p4/3P4/1P2B2P/4K3 w - - 0 1', 'e2')).toMatchObject({ ownPawns: 3, bad: false });
  });
});
