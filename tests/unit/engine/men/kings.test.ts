/** Kings: shelter, luft and the back rank, each row with its reason. */
import { describe, expect, it } from 'vitest';
import { fileName, squareName } from '@/engine/board';
import { readValues } from '@/engine/reading';
import type { Side } from '@/engine/types';
import { positionOf } from '../../../support/random';

function kingOf(fen: string, side: Side) {
  const king = readValues(positionOf(fen)).kings[side];
  if (!king) throw new Error(`no ${side} king: ${fen}`);
  return {
    flights: king.flights.map(squareName).join(' '),
    luft: king.luft.map(squareName).join(' '),
    luftMoves: king.luftMoves.map(({ from, to }) => `${squareName(from)}-${squareName(to)}`).join(' '),
    shelter: king.shelter
      .map(({ file, pawn, advanced }) => `${fileName(file)}:${pawn === null ? '-' : squareName(pawn)}+${advanced}`)
      .join(' '),
    openBeside: king.openBeside.map(fileName).join(''),
    reachedBy: king.reachedBy.map(squareName).join(' '),
    guardedBy: king.guardedBy.map(squareName).join(' '),
    weakBackRank: king.weakBackRank,
  };
}

describe('a castled king behind its three pawns', () => {
  const fen = '3r2k1/5ppp/8/8/8/8/5PPP/6K1 w - - 0 1';

  it('has no luft; each pawn that is not hit gives it some, by one step or two', () => {
    expect(kingOf(fen, 'white')).toMatchObject({
      flights: 'f1 h1',
      luft: '',
      luftMoves: 'f2-f3 f2-f4 g2-g3 g2-g4 h2-h3 h2-h4',
      shelter: 'f:f2+0 g:g2+0 h:h2+0',
      openBeside: '',
    });
  });

  it('has a weak back rank while the enemy has a rook and it has none', () => {
    expect(kingOf(fen, 'white').weakBackRank).toBe(true);
    expect(kingOf(fen, 'black').weakBackRank).toBe(false);
    expect(kingOf('3r2k1/5ppp/8/8/8/8/5PPP/R5K1 w - - 0 1', 'white').weakBackRank).toBe(false);
    expect(kingOf('3n2k1/5ppp/8/8/8/8/5PPP/6K1 w - - 0 1', 'white').weakBackRank).toBe(false);
  });

  it('has luft after h2-h3, and then no weak back rank', () => {
    expect(kingOf('3r2k1/5ppp/8/8/8/7P/5PP1/6K1 w - - 0 1', 'white')).toMatchObject({
      luft: 'h2',
      luftMoves: '',
      shelter: 'f:f2+0 g:g2+0 h:h3+1',
      weakBackRank: false,
    });
  });
});

describe('luft', () => {
  it('is not given by a pawn whose square the enemy attacks', () => {
    // The bishop on d6 looks at h2, the one on a7 at f2.
    expect(kingOf('6k1/b7/3b4/8/8/8/5PPP/6K1 w - - 0 1', 'white').luftMoves).toBe('g2-g3 g2-g4');
  });

  it('is given by the pawn that a rook on its own file attacks: where it goes it shuts the file', () => {
    expect(kingOf('7r/6k1/8/8/8/8/5PPP/5RKR w - - 0 1', 'white').luftMoves).toContain('h2-h3');
  });

  it('is given by a pawn pinned along its own file, and not by one pinned along a diagonal', () => {
    expect(kingOf('k5r1/8/8/8/8/8/5PPP/5RKR w - - 0 1', 'white').luftMoves).toContain('g2-g3');
    expect(kingOf('k7/b7/8/8/8/8/5PPP/5RKR w - - 0 1', 'white').luftMoves).not.toContain('f2');
  });

  it('is not asked of a king in check, whose side has no time, nor of one off its back rank', () => {
    expect(kingOf('k2r4/8/8/8/8/8/5PPP/3r2K1 w - - 0 1', 'white').luftMoves).toBe('');
    expect(kingOf('k7/8/8/8/8/5PPP/6K1/8 w - - 0 1', 'white')).toMatchObject({ luft: '', luftMoves: '' });
  });
});

describe('flights', () => {
  it('stay off the squares that a slider sees through the king', () => {
    expect(kingOf('k7/8/8/8/8/8/8/r3K3 w - - 0 1', 'white').flights).toBe('d2 e2 f2');
  });

  it('take an enemy man that nobody guards, and leave one that is guarded', () => {
    expect(kingOf('k7/8/8/8/8/8/4q3/4K3 w - - 0 1', 'white').flights).toBe('e2');
    expect(kingOf('k3r3/8/8/8/8/8/4q3/4K3 w - - 0 1', 'white').flights).toBe('');
  });
});

describe('the zone', () => {
  it('is reached by enemy men that attack it and guarded by own men, the kings apart', () => {
    expect(kingOf('6k1/8/8/8/6n1/3B4/5PPP/R5K1 w - - 0 1', 'white')).toMatchObject({
      reachedBy: 'g4',
      guardedBy: 'd3 a1',
    });
  });

  it('lies open where no enemy pawn stands on a file beside', () => {
    expect(kingOf('6k1/p4p2/8/8/8/8/5P1P/6K1 w - - 0 1', 'white')).toMatchObject({
      openBeside: 'gh',
      shelter: 'f:f2+0 g:-+0 h:h2+0',
    });
  });
});

it('a diagram without a king has none', () => {
  expect(readValues(positionOf('8/pp6/8/8/8/8/PP6/4K3 w - - 0 1')).kings).toMatchObject({ black: null });
});
