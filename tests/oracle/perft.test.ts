/** The move generator against published node counts (public-domain EPD collections; the usual positions' counts are common knowledge). */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { perft } from '@/engine/rules';
import { positionOf } from '../support/random';

const STANDARD = [
  ['start position', 'rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1', 5, 4_865_609],
  ['castling, promotions, pins', 'r3k2r/p1ppqpb1/bn2pnp1/3PN3/1p2P3/2N2Q1p/PPPBBPPP/R3K2R w KQkq - 0 1', 4, 4_085_603],
  ['captures in passing and pins along a rank', '8/2p5/3p4/KP5r/1R3p1k/8/4P1P1/8 w - - 0 1', 4, 43_238],
  ['promotions in check', 'r2q1rk1/pP1p2pp/Q4n2/bbp1p3/Np6/1B3NBn/pPPP1PPP/R3K2R b KQ - 0 1', 3, 9_467],
] as const;

describe('node counts equal the published ones', () => {
  it.each(STANDARD)('%s', (_name, fen, depth, count) => {
    expect(perft(positionOf(fen), depth)).toBe(count);
  });

  it('300 positions of the tables, each as deep as 60,000 nodes', () => {
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
    expect(counted).toBeGreaterThan(400);
    expect(wrong).toEqual([]);
  });
});
