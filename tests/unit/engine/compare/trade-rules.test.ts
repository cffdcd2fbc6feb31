/** Rules of the trade about differences and trades (common practice). Positions of our own, from opening theory. */
import { describe, expect, it } from 'vitest';
import { readPosition } from '@/engine';
import { sq } from '@/engine/board';
import { compare, exchangeTest, placed, without } from '@/engine/compare';
import { positionOf } from '../../../support/random';

/** After 1. e4 e6 2. d4 d5 3. e5 c5 4. c3 Nc6 5. Nf3 (French, Advance): Black's centre pawns stand on light squares. */
const FRENCH = 'r1bqkbnr/pp3ppp/2n1p3/2ppP3/3P4/2P2N2/PP3PPP/RNBQKB1R b KQkq - 2 5';

describe('the bishop of the centre’s colour', () => {
  it('is Black’s problem piece in the French chain', () => {
    const bishop = readPosition(positionOf(FRENCH)).men.find(({ square }) => square === 'c8');
    expect(bishop?.notes).toContain('bad-bishop');
  });

  it.each(['f1', 'b1', 'f3'])('helps Black when it is traded for the man on %s', (square) => {
    const cell = exchangeTest(positionOf(FRENCH)).exchanges.find(
      ({ white, black }) => white.square === square && black.square === 'c8',
    );
    expect(cell?.helps).toBe('black');
    expect(cell?.sentences.map(({ text }) => text)).toContain(
      'Black’s problem piece, the bishop on c8, is off the board.',
    );
  });
});

describe('a pawn advance that shuts a bishop in', () => {
  /** The b2-bishop looks down the long diagonal; d5-d4 would shut it. */
  const OPEN = '4r1k1/1b3p1p/p5p1/2pp4/8/1P2P3/PBP2PPP/R5K1 b - - 0 20';

  function advanced(fen: string) {
    const position = positionOf(fen);
    const after = placed(position, sq('d5'), sq('d4'));
    if (!after.ok) throw new Error(after.fault.message);
    return compare(readPosition(position), readPosition(after.value)).sentences;
  }

  it('is said of the bishop while it is there', () => {
    const said = advanced(OPEN).filter(({ id, squares }) => id === 'man-shut-in' && squares[0] === 'b2');
    expect(said).toHaveLength(1);
  });

  it('and not after the bishops are traded', () => {
    const traded = without(positionOf(OPEN), [sq('b2'), sq('b7')]);
    if (!traded.ok) throw new Error(traded.fault.message);
    const after = placed(traded.value, sq('d5'), sq('d4'));
    if (!after.ok) throw new Error(after.fault.message);
    const said = compare(readPosition(traded.value), readPosition(after.value)).sentences;
    expect(said.filter(({ squares }) => squares[0] === 'b2')).toEqual([]);
  });
});
