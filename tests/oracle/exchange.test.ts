/** The exchange, safety and the men behind, against plain search on a board of letters. */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { attackMap, fillBehind, newAttackMap, type SideIndex } from '@/engine/attacks';
import { exchangeOn, isSafeMove, isSafeOn, lossOn, safetyOf } from '@/engine/exchange';
import { slowBehind } from '../support/slow/behind';
import { codesOf, lettersOf, slowExchange, slowLoss } from '../support/slow/exchange';

const real = readFileSync(new URL('../support/positions/real-20000.fen', import.meta.url), 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'));
const sample = real.filter((_, index) => index % 40 === 0);
const map = newAttackMap();

describe('exchange equals a brute-force recapture search', () => {
  it('for the first capture on every square, by either side, on 500 positions of real games', () => {
    const wrong: string[] = [];
    for (const fen of sample) {
      const letters = lettersOf(fen);
      attackMap({ board: codesOf(letters) }, map);
      for (let square = 0; square < 64; square++) {
        for (const side of [0, 1] as const) {
          const fast = exchangeOn(map, side, square);
          const slow = slowExchange(letters, side === 0, square);
          if (fast !== slow) wrong.push(`${fen} ${square} ${side}: ${fast} for ${slow}`);
        }
      }
    }
    expect(sample.length).toBeGreaterThanOrEqual(500);
    expect(wrong).toEqual([]);
  });

  it('for every man put on every third square, taken off its origin', () => {
    const wrong: string[] = [];
    let asked = 0;
    for (const fen of sample) {
      const letters = lettersOf(fen);
      const board = codesOf(letters);
      attackMap({ board }, map);
      const safety = safetyOf(map);
      for (const [from, letter] of letters.entries()) {
        if (letter === '') continue;
        const code = board[from] ?? 0;
        const side = (code >> 3) as SideIndex;
        for (let to = from % 3; to < 64; to += 3) {
          const occupant = board[to] ?? 0;
          if (to === from || (occupant & 7) === 6 || (occupant !== 0 && occupant >> 3 === side)) continue;
          asked++;
          const slow = slowLoss(letters, letter, to, from);
          const fast = lossOn(map, side, code & 7, to, from);
          const safe = [isSafeOn(map, side, code & 7, to, from), isSafeMove(safety, from, to)];
          if (fast !== slow || safe.some((each) => each !== (slow === 0))) {
            wrong.push(`${fen} ${letter} ${from}-${to}: ${fast} ${safe} for ${slow}`);
          }
        }
      }
    }
    expect(asked).toBeGreaterThan(100_000);
    expect(wrong).toEqual([]);
  });

  it('knows that an undefended man is not always free to take: the capturing slider can uncover an enemy slider', () => {
    // The black queen can take the unguarded knight, but the white bishop behind her on the long diagonal
    // recaptures.
    const letters = lettersOf('6k1/8/8/8/3N4/8/1q6/B5K1 w - - 0 1');
    attackMap({ board: codesOf(letters) }, map);
    expect(exchangeOn(map, 1, 27)).toBe(3 - 9);
    expect(slowExchange(letters, false, 27)).toBe(3 - 9);
  });
});

describe('men behind', () => {
  it('are those that appear when the men in front are taken off', () => {
    const wrong: string[] = [];
    const masks = new Int32Array(128);
    for (const fen of sample) {
      const letters = lettersOf(fen);
      attackMap({ board: codesOf(letters) }, map);
      fillBehind(map, masks);
      for (let entry = 0; entry < 128; entry++) {
        const found: number[] = [];
        for (let number = 0; number < 32; number++) {
          if (((masks[entry] ?? 0) >>> number) & 1) found.push(map.squares[((entry >> 6) << 5) | number] ?? -1);
        }
        const expected = [...slowBehind(letters, entry < 64, entry & 63)];
        if (found.sort().join() !== expected.sort().join()) wrong.push(`${fen} ${entry}: ${found} for ${expected}`);
      }
    }
    expect(wrong).toEqual([]);
  });
});
