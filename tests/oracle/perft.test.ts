/** The move generator against published node counts (public-domain EPD collections; the usual positions' counts are common knowledge). */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { perft } from '@/engine/rules';
import { NAMED } from '../support/positions';
import { positionOf } from '../support/random';

const STANDARD = [
  ['start', 5, 4_865_609],
  ['castlingBothWays', 4, 4_085_603],
  ['passingInPin', 4, 43_238],
  // The collection stops at depth 3 for this one; 422,333 is the usual table's count (from memory), equal by chess.js.
  ['promotionsInCheck', 4, 422_333],
  ['promotionByCapture', 4, 2_103_487],
  ['middlegame', 4, 3_894_594],
] as const;

describe('node counts equal the published ones', { timeout: 300_000 }, () => {
  it.each(STANDARD)('%s to depth %i', { timeout: 120_000 }, (name, depth, count) => {
    expect(perft(positionOf(NAMED[name]), depth)).toBe(count);
  });

  it('300 positions of the tables, each as deep as 60,000 nodes', { timeout: 120_000 }, () => {
    const lines = readFileSync(new URL('../support/positions/perft-300.epd', import.meta.url), 'utf8').split('\n');
    const wrong: string[] = [];
    let counted = 0;
    for (const line of lines) {
      if (line === '' || line.startsWith('#')) continue;
      const [fen = '', ...counts] = line.split(';');
      for (const entry of counts) {
        const [, depth, count] = /D(\d+) (\d+)/.exec(entry) ?? [];
        if (Number(count) > 60_000) break;
        counted++;
        const found = perft(positionOf(fen.trim()), Number(depth));
        if (found !== Number(count)) wrong.push(`${fen} depth ${depth}: ${found} for ${count}`);
      }
    }
    console.info(`node counts: ${wrong.length} of ${counted} differ`);
    expect(counted).toBeGreaterThan(400);
    expect(wrong).toEqual([]);
  });
});
