/** Comparisons: nothing differs from itself, there and back is the same, and the figures are those of two separate readings. */
import { describe, expect, it } from 'vitest';
import { readPosition } from '@/engine';
import { sq } from '@/engine/board';
import { compare, type Difference, exchangeTest, placed } from '@/engine/compare';
import { comparisonSchema, exchangeTestSchema } from '@/engine/reading/schema/compare';
import type { Reading } from '@/engine/reading/schema';
import { positionOf } from '../../../support/random';
import { realPositions } from '../../../support/real-positions';

const readings = realPositions(400).map((fen) => readPosition(positionOf(fen)));
const pairs = readings.slice(1).map((reading, place) => [readings[place]!, reading] as const);

/** The same figures, read off the two readings one by one. */
function slowSquares(a: Reading, b: Reading): string[] {
  const line = (reading: Reading, place: number): string => {
    const { square, occupant, attackers, command } = reading.squares[place]!;
    const weak = ['white', 'black'].map(
      (side) => reading.weakSquares.find((each) => each.square === square && each.side === side)?.hold ?? '-',
    );
    const posts = ['white', 'black'].map((side) =>
      reading.outposts.some((each) => each.square === square && each.side === side && each.rank === 'outpost'),
    );
    const man = occupant ? `${occupant.side} ${occupant.kind}` : '-';
    return [square, man, attackers.white.length, attackers.black.length, command, ...weak, ...posts].join(' ');
  };
  return a.squares.flatMap((_, place) => {
    const [before, after] = [line(a, place), line(b, place)];
    return before === after ? [] : [`${before} > ${after}`];
  });
}

function squaresText({ squares }: Difference): string[] {
  return squares.map(({ square, occupant, attackers, command, weakFor, outpostFor }) => {
    const side = (at: 'a' | 'b'): string =>
      [
        square,
        occupant[at] ? `${occupant[at].side} ${occupant[at].kind}` : '-',
        attackers.white[at],
        attackers.black[at],
        command[at],
        weakFor.white[at] ?? '-',
        weakFor.black[at] ?? '-',
        outpostFor.white[at],
        outpostFor.black[at],
      ].join(' ');
    return `${side('a')} > ${side('b')}`;
  });
}

describe('compare', () => {
  it('finds nothing between a reading and itself', () => {
    for (const reading of readings.slice(0, 100)) {
      const { squares, men, gained, lost, sentences, balance } = compare(reading, reading);
      expect([squares, men, gained, lost, sentences]).toEqual([[], [], [], [], []]);
      expect(balance.every(({ white, black }) => white.a === white.b && black.a === black.b)).toBe(true);
    }
  });

  it('agrees with two separate readings on every square, and on what is said, of 399 pairs', () => {
    for (const [a, b] of pairs) {
      const found = compare(a, b);
      expect(squaresText(found)).toEqual(slowSquares(a, b));
      const said = (reading: Reading) => reading.statements.map(({ key, text }) => `${key} ${text}`);
      expect(found.gained.map(({ key, text }) => `${key} ${text}`)).toEqual(
        said(b).filter((each) => !said(a).includes(each)),
      );
      expect(found.lost.map(({ key, text }) => `${key} ${text}`)).toEqual(
        said(a).filter((each) => !said(b).includes(each)),
      );
      expect(found.unchanged).toBe(a.statements.length - found.lost.length);
      for (const { counts, white, black } of found.balance) {
        if (counts !== 'safe moves') continue;
        expect([white.a, white.b, black.a, black.b]).toEqual([
          a.totals.white.safeMoves,
          b.totals.white.safeMoves,
          a.totals.black.safeMoves,
          b.totals.black.safeMoves,
        ]);
      }
    }
  });

  it('there and back is the same with before and after exchanged', () => {
    for (const [a, b] of pairs.slice(0, 100)) {
      const [there, back] = [compare(a, b), compare(b, a)];
      expect(back.squares.map(({ square }) => square)).toEqual(there.squares.map(({ square }) => square));
      expect(back.gained).toEqual(there.lost);
      expect(back.lost).toEqual(there.gained);
      const text = (at: 'a' | 'b') => (man: Difference['men'][number]) =>
        `${man.side} ${man.kind} ${man.squares[at]} ${JSON.stringify(man.counts[at])}`;
      expect(back.men.map(text('b')).sort()).toEqual(there.men.map(text('a')).sort());
    }
  });

  it('speaks only of what the two readings bear out', () => {
    let checked = 0;
    for (const [a, b] of pairs) {
      for (const { id, side, good, squares, facts } of compare(a, b).sentences) {
        const square = squares[0];
        // What is of both sides is the name of the structure, which has no side to look at.
        if (side === null) continue;
        if (id === 'weak-square-made')
          expect([holdOf(a, square, side), holdOf(b, square, side) !== undefined]).toEqual([undefined, true]);
        else if (id === 'now-en-prise') expect(b.men.find((man) => man.square === square)?.enPrise).toBe(facts.loses);
        else if (id === 'last-guard-gone')
          expect(b.squares.find((each) => each.square === square)?.attackers[side]).toEqual([]);
        else if (id === 'command-taken') expect(b.squares.find((each) => each.square === square)?.command).toBe(side);
        else if (id === 'man-freed' || id === 'man-shut-in') {
          const moves = facts.safeMoves as { a: number; b: number };
          expect(moves.b > moves.a).toBe(good);
          expect(b.men.find((man) => man.square === square)?.safeMoves).toHaveLength(moves.b);
        } else if (id === 'flight-gained') expect(b.kings[side]?.flights.length).toBeGreaterThan(0);
        else if (id === 'bishop-pair-won')
          expect(b.men.filter((man) => man.side === side && man.kind === 'bishop')).toHaveLength(2);
        else continue;
        checked++;
      }
    }
    expect(checked).toBeGreaterThan(1000);
  });
});

function holdOf(reading: Reading, square: string | undefined, side: string): string | undefined {
  return reading.weakSquares.find((weak) => weak.square === square && weak.side === side)?.hold;
}

describe('placements', () => {
  const start = positionOf('r1bqkb1r/pp1n1ppp/2n1p3/2ppP3/3P4/2P2N2/PP1B1PPP/RN1QKB1R w KQkq - 0 7');

  it('put a man on an empty square', () => {
    const there = placed(start, sq('f3'), sq('f4'));
    expect(there.ok && compare(readPosition(start), readPosition(there.value)).sentences.map(({ id }) => id)).toContain(
      'man-placed',
    );
  });

  it.each([
    ['f4', 'f5', 'no-man'],
    ['f3', 'f3', 'same-square'],
    ['f3', 'd2', 'taken'],
    ['a2', 'a8', 'taken'],
  ] as const)('refuse %s to %s: %s', (from, to, code) => {
    const there = placed(start, sq(from), sq(to));
    expect(!there.ok && there.fault.code).toBe(code);
  });

  it('refuse a pawn on the last rank', () => {
    const there = placed(positionOf('4k3/8/8/8/8/8/P7/4K3 w - - 0 1'), sq('a2'), sq('a8'));
    expect(!there.ok && there.fault.code).toBe('pawn-rank');
  });
});

describe('the exchange test', () => {
  it('has a cell for every pair of like worth, as its schema says', () => {
    for (const fen of realPositions(20)) {
      const position = positionOf(fen);
      const test = exchangeTest(position);
      const like = (kind: string): string => (kind === 'knight' || kind === 'bishop' ? 'minor' : kind);
      const pairs_ = test.white.flatMap((own) => test.black.filter((other) => like(other.kind) === like(own.kind)));
      expect(test.exchanges).toHaveLength(pairs_.length);
      const answer = { engine: '1', fen, ...test };
      expect(exchangeTestSchema.parse(JSON.parse(JSON.stringify(answer)))).toEqual(answer);
    }
  });

  it('offers a trade now exactly where one of the men attacks the other', () => {
    for (const fen of realPositions(20)) {
      const position = positionOf(fen);
      const reading = readPosition(position);
      const attacks = (from: string, on: string): boolean => {
        const { attackers } = reading.squares.find(({ square }) => square === on)!;
        return [...attackers.white, ...attackers.black].some((square) => square === from);
      };
      for (const { white, black, offers } of exchangeTest(position).exchanges) {
        expect(offers.white === 0, `${fen} ${white.square} ${black.square}`).toBe(attacks(white.square, black.square));
        expect(offers.black === 0, `${fen} ${black.square} ${white.square}`).toBe(attacks(black.square, white.square));
      }
    }
  });

  it('is what a comparison with both men gone says', () => {
    const [fen] = realPositions(1);
    const before = readPosition(positionOf(fen!));
    for (const cell of exchangeTest(positionOf(fen!)).exchanges) {
      const after = readPosition(positionOf(cell.fen));
      expect(compare(before, after).balance).toEqual(cell.balance);
    }
  });

  it('its comparison is as the schema says', () => {
    const [a, b] = pairs[0]!;
    const answer = { engine: '1', subjects: [], differences: [compare(a, b)] };
    expect(comparisonSchema.parse(JSON.parse(JSON.stringify(answer)))).toEqual(JSON.parse(JSON.stringify(answer)));
  });
});
