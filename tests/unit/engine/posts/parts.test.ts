/** Parts of posts, recomputed by plain code on a board of letters, and the table's own promises. */
import { describe, expect, it } from 'vitest';
import { attackMap } from '@/engine/attacks';
import { countParts, groundOf, PARTS, PLACE, type PartName } from '@/engine/posts';
import { positionOf } from '../../../support/random';
import { realPositions } from '../../../support/real-positions';
import { attacks, lettersOf, slowExchange } from '../../../support/slow/exchange';

const file = (square: number) => square % 8;
const rank = (square: number) => Math.floor(square / 8);
const isWhite = (letter: string) => letter !== '' && letter === letter.toUpperCase();

/** Some of the counts for White and the man on `at`, from the letters alone. */
function plainCounts(letters: readonly string[], at: number): Partial<Record<PartName, number>> {
  const squares = [...letters.keys()];
  const on = (letter: string) => squares.filter((square) => letters[square] === letter);
  const rooks = on('R');
  const heavy = [...rooks, ...on('Q')];
  const pieces = [...on('N'), ...on('B'), ...heavy];
  const pawnOn = (letter: string, of: number) => on(letter).some((pawn) => file(pawn) === of);
  const steps = (from: number, to: number) =>
    Math.max(Math.abs(file(from) - file(to)), Math.abs(rank(from) - rank(to)));
  const struck = (square: number, by: readonly number[]) => by.filter((from) => attacks(letters, from, square)).length;
  const equals: Record<string, readonly string[]> = { N: ['n', 'b'], B: ['n', 'b'], R: ['r'], Q: ['q'] };
  const worth: Record<string, number> = { p: 1, n: 3, b: 3, r: 5, q: 9, k: 100 };
  const price = (square: number) => worth[(letters[square] ?? '').toLowerCase()] ?? 0;
  const enemies = squares.filter((square) => letters[square] !== '' && !isWhite(letters[square] ?? ''));
  const fromRim = (line: number) => Math.min(line, 7 - line);
  return {
    hanging: squares
      .filter((square) => isWhite(letters[square] ?? '') && letters[square] !== 'K')
      .reduce((sum, square) => sum + Math.max(0, slowExchange(letters, false, square) ?? 0), 0),
    openFile: rooks.filter((rook) => !pawnOn('P', file(rook)) && !pawnOn('p', file(rook))).length,
    halfOpenFile: rooks.filter((rook) => !pawnOn('P', file(rook)) && pawnOn('p', file(rook))).length,
    doubled: [0, 1, 2, 3, 4, 5, 6, 7].reduce(
      (sum, each) => sum + Math.max(0, heavy.filter((man) => file(man) === each).length - 1),
      0,
    ),
    seventh: heavy.filter((man) => rank(man) === 6).length,
    joined: rooks.filter((rook) => rooks.some((other) => other !== rook && attacks(letters, other, rook))).length,
    centre: [27, 28, 35, 36].reduce((sum, square) => sum + struck(square, pieces), 0),
    enemyHalf: squares.filter((square) => rank(square) >= 4 && struck(square, pieces) > 0).length,
    atHome: [...on('N'), ...on('B')].filter((man) => rank(man) === 0).length,
    knightCentre: letters[at] === 'N' ? fromRim(file(at)) + fromRim(rank(at)) : 0,
    fromOwnKing: steps(at, on('K')[0] ?? at),
    fromEnemyKing: steps(at, on('k')[0] ?? at),
    check:
      struck(
        on('k')[0] ?? at,
        squares.filter((square) => isWhite(letters[square] ?? '')),
      ) > 0
        ? 1
        : 0,
    underCheaper: pieces.filter((man) =>
      enemies.some((from) => price(from) < price(man) && attacks(letters, from, man)),
    ).length,
    facesEqual: pieces.filter((man) =>
      squares.some((from) => equals[letters[man] ?? '']?.includes(letters[from] ?? '') && attacks(letters, from, man)),
    ).length,
  };
}

describe('counts', () => {
  it('equal plain ones for every white piece of 100 positions of real games', () => {
    const wrong: string[] = [];
    let asked = 0;
    for (const fen of realPositions(100)) {
      const position = positionOf(fen);
      const ground = groundOf(position, 'white');
      const letters = lettersOf(fen);
      const row = new Float64Array(PARTS.length);
      for (const [at, letter] of letters.entries()) {
        if (letter === '' || !'NBRQ'.includes(letter)) continue;
        countParts(ground, attackMap(position), at, row);
        for (const [name, count] of Object.entries(plainCounts(letters, at))) {
          asked++;
          if (row[PLACE[name as PartName]] !== count) {
            wrong.push(`${fen} ${letter} ${at} ${name}: ${row[PLACE[name as PartName]]} for ${count}`);
          }
        }
      }
    }
    expect(asked).toBeGreaterThan(4000);
    expect(wrong).toEqual([]);
  }, 60_000);

  it.each([
    ['a supported square that no pawn can attack', '4k3/8/4p3/3N4/2P1P3/8/8/4K3 w - - 0 1', 'pawnHit', 1],
    ['the same with the enemy pawn gone', '4k3/8/8/3N4/2P1P3/8/8/4K3 w - - 0 1', 'outpost', 1],
    ['no pawn support, no outpost', '4k3/8/8/3N4/8/8/8/4K3 w - - 0 1', 'outpost', 0],
    ['before an isolated pawn', '4k3/8/8/3p4/3N4/8/8/4K3 w - - 0 1', 'blockade', 1],
  ] as const)('%s', (_reason, fen, name, count) => {
    const position = positionOf(fen);
    const row = new Float64Array(PARTS.length);
    countParts(
      groundOf(position, 'white'),
      attackMap(position),
      fen.includes('3N4/2P1P3') || !fen.includes('3p4') ? 35 : 27,
      row,
    );
    expect(row[PLACE[name]]).toBe(count);
  });

  it('count men in the way of castling only while its right is left', () => {
    const between = (fen: string) => {
      const position = positionOf(fen);
      const row = new Float64Array(PARTS.length);
      countParts(groundOf(position, 'white'), attackMap(position), 5, row);
      return [row[PLACE.betweenToCastle], row[PLACE.castlingKept]];
    };
    expect(between('4k3/8/8/8/8/8/8/4KBNR w K - 0 1')).toEqual([2, 1]);
    expect(between('4k3/8/8/8/8/8/8/4KBNR w - - 0 1')).toEqual([0, 0]);
  });
});

describe('the table of weights', () => {
  it('names each part once and gives each a count and a reason in words', () => {
    expect(new Set(PARTS.map(({ name }) => name)).size).toBe(PARTS.length);
    for (const { name, counts, reason, weight } of PARTS) {
      expect(counts.length, name).toBeGreaterThan(10);
      expect(reason, name).toMatch(/^[A-Z].*\.$/);
      expect(Number.isFinite(weight), name).toBe(true);
    }
  });
});
