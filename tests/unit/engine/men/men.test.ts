/** What is said of single men: each row a small position, the man, and the trait with its reason. */
import { describe, expect, it } from 'vitest';
import { sq, squareName } from '@/engine/board';
import type { Note } from '@/engine/men';
import { readValues } from '@/engine/reading';
import type { SquareName } from '@/engine/types';
import { positionOf } from '../../../support/random';

function manOn(fen: string, name: SquareName) {
  const man = readValues(positionOf(fen)).men.find(({ square }) => square === sq(name));
  if (!man) throw new Error(`nobody on ${name}: ${fen}`);
  return man;
}

const ROWS: readonly { why: string; fen: string; man: SquareName; has?: readonly Note[]; lacks?: readonly Note[] }[] = [
  {
    why: 'a knight on the a-file stands on the rim (common practice)',
    fen: '4k3/8/8/8/N7/8/8/4K3 w - - 0 1',
    man: 'a4',
    has: ['rim', 'loose'],
  },
  {
    why: 'a knight on its first rank has not moved yet and is not on the rim',
    fen: '4k3/8/8/8/8/8/8/1N2K3 w - - 0 1',
    man: 'b1',
    lacks: ['rim'],
  },
  {
    why: 'the bishop that took on a7 is shut in by b6 and hit by the king: the old trap (common practice)',
    fen: '8/Bk6/1p6/8/8/8/8/4K3 w - - 0 1',
    man: 'a7',
    has: ['trapped', 'en-prise'],
  },
  {
    why: 'with the king a file further off it takes on b6 and is out',
    fen: '2k5/B7/1p6/8/8/8/8/4K3 w - - 0 1',
    man: 'a7',
    lacks: ['trapped', 'en-prise'],
  },
  {
    why: 'the knight in the corner is hit, b6 is guarded, and c7 gives one pawn for it: trapped',
    fen: 'Nk6/p1p5/8/8/8/8/8/4K3 w - - 0 1',
    man: 'a8',
    has: ['trapped'],
  },
  {
    why: 'the same knight takes a bishop on c7 and has its price: not trapped',
    fen: 'Nk6/p1b5/8/8/8/8/8/4K3 w - - 0 1',
    man: 'a8',
    lacks: ['trapped'],
  },
  {
    why: 'the same knight has no safe move, and nobody attacks it: not trapped yet',
    fen: 'N7/p1pk4/8/8/8/8/8/4K3 w - - 0 1',
    man: 'a8',
    lacks: ['trapped'],
  },
  {
    why: 'a man on the line between its king and an enemy rook is pinned',
    fen: '4r1k1/8/8/8/4N3/8/8/4K3 w - - 0 1',
    man: 'e4',
    has: ['pinned'],
  },
  {
    why: 'two own men in between: no pin',
    fen: '4r1k1/8/8/4P3/4N3/8/8/4K3 w - - 0 1',
    man: 'e4',
    lacks: ['pinned'],
  },
  {
    why: 'a bishop behind its own unmoved pawns sees nothing else',
    fen: 'rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1',
    man: 'c1',
    has: ['blocked-in'],
  },
  {
    why: 'a knight leaps out, so it is not blocked in',
    fen: 'rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1',
    man: 'b1',
    lacks: ['blocked-in'],
  },
  {
    why: 'one rook guards a bishop to either side, and each is hit by a rook of its own: overloaded (common practice)',
    fen: '1r5r/8/8/k7/8/4K3/8/1B2R2B w - - 0 1',
    man: 'e1',
    has: ['overloaded'],
  },
  {
    why: 'one king guards both attacked knights, each by another rook: overloaded',
    fen: '2r1r2k/8/8/8/8/2N1N3/3K4/8 w - - 0 1',
    man: 'd2',
    has: ['overloaded'],
  },
  {
    why: 'attacked by one rook only, the two can be called one after the other, not at once',
    fen: '7k/8/8/8/8/r1N1N3/3K4/8 w - - 0 1',
    man: 'd2',
    lacks: ['overloaded'],
  },
];

describe('notes', () => {
  for (const { why, fen, man, has = [], lacks = [] } of ROWS) {
    it(`${man}: ${why}`, () => {
      const { notes } = manOn(fen, man);
      for (const note of has) expect(notes).toContain(note);
      for (const note of lacks) expect(notes).not.toContain(note);
    });
  }
});

describe('moves', () => {
  const names = (fen: string, man: SquareName, safe = false) =>
    manOn(fen, man)[safe ? 'safeMoves' : 'moves'].map(squareName).join(' ');

  it('a pawn captures in passing while it may, and only the side to move may', () => {
    expect(names('4k3/8/8/3pP3/8/8/8/4K3 w - d6 0 2', 'e5')).toBe('d6 e6');
    expect(names('4k3/8/8/3pP3/8/8/8/4K3 w - - 0 2', 'e5')).toBe('e6');
  });

  it('a pinned rook keeps to the line of its pin, the pinner included', () => {
    expect(names('4r1k1/8/8/8/8/4R3/8/4K3 w - - 0 1', 'e3')).toBe('e2 e4 e5 e6 e7 e8');
  });

  it('a king does not step along the line of the rook that gives check', () => {
    expect(names('k3r3/8/8/8/8/8/4K3/8 w - - 0 1', 'e2', true)).toBe('d1 f1 d2 f2 d3 f3');
  });

  it('castling is left out', () => {
    expect(names('4k3/8/8/8/8/8/8/4K2R w K - 0 1', 'e1')).toBe('d1 f1 d2 e2 f2');
  });

  it('a capture that costs more than it brings is a move, and not a safe one', () => {
    expect(names('4k3/2p5/3p4/8/8/8/8/3QK3 w - - 0 1', 'd1')).toContain('d6');
    expect(names('4k3/2p5/3p4/8/8/8/8/3QK3 w - - 0 1', 'd1', true)).not.toContain('d6');
  });
});

describe('duties', () => {
  const duties = (fen: string, man: SquareName) =>
    manOn(fen, man).duties.map(({ square, loses, by }) => `${squareName(square)} ${loses} ${by}`);

  it('a knight that alone guards an attacked rook', () => {
    expect(duties('3r3k/8/8/8/3B4/1N6/8/7K w - - 0 1', 'b3')).toEqual(['d4 3 guard']);
  });

  it('nothing, where another guard is enough', () => {
    expect(duties('3r3k/8/8/8/3B4/1N6/5N2/6K1 w - - 0 1', 'f2')).toEqual([]);
    expect(duties('3r3k/8/8/8/3BP3/1N6/8/B5K1 w - - 0 1', 'b3')).toEqual([]);
  });

  it('a pawn that shuts a rook’s line to a queen', () => {
    expect(duties('3r3k/8/8/8/3P4/8/8/3Q3K w - - 0 1', 'd4')).toEqual(['d1 9 screen']);
  });

  it('a rook that guards through the enemy rook that attacks', () => {
    expect(duties('7k/8/8/8/P7/r7/8/R6K w - - 0 1', 'a1')).toEqual(['a4 1 guard']);
  });

  it('a rook that holds the attacking pawn pinned to its king', () => {
    expect(duties('6rk/8/8/5p2/6P1/8/8/6K1 w - - 0 1', 'g8')).toEqual(['f5 1 guard']);
  });

  it('a king that leaves is not thought to lay itself open: the rook it freed guards in its stead', () => {
    const fen = 'R4rk1/2pqppbp/2n3p1/1p2P3/1B1P4/2P5/2PNQ1PP/5RK1 b - - 0 20';
    expect(duties(fen, 'g8')).not.toContain('f7 1 guard');
  });
});
