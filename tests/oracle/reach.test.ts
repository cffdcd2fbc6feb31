/** How soon men come to squares, against plain search on a board of letters. */
import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { attackMap } from '@/engine/attacks';
import { safetyOf } from '@/engine/exchange';
import { reachOf } from '@/engine/reach';
import { codesOf, lettersOf } from '../support/slow/exchange';
import { slowReach } from '../support/slow/reach';

const real = readFileSync(new URL('../support/positions/real-20000.fen', import.meta.url), 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'));

it('reach within three moves equals plain search for every piece of 100 positions of real games', () => {
  const wrong: string[] = [];
  let asked = 0;
  for (const fen of real.filter((_, index) => index % 200 === 0)) {
    const letters = lettersOf(fen);
    const map = attackMap({ board: codesOf(letters) });
    const { moves } = reachOf(safetyOf(map), 3);
    for (const [from, letter] of letters.entries()) {
      if (letter === '' || 'PpKk'.includes(letter)) continue;
      const slow = slowReach(letters, from, 3);
      const row = (((map.board[from] ?? 0) >> 3) << 5) | (map.numbers[from] ?? 0);
      for (let to = 0; to < 64; to++) {
        asked++;
        const fast = Math.max(-1, moves[(row << 6) | to] ?? -1);
        if (fast !== (slow.get(to) ?? -1)) wrong.push(`${fen} ${letter} ${from}-${to}: ${fast} for ${slow.get(to)}`);
      }
    }
  }
  expect(asked).toBeGreaterThan(40_000);
  expect(wrong).toEqual([]);
});
