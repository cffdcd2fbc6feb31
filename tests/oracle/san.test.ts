/** Our SAN held against an outside rules library (chess.js 1.4.0): written the same, read the same, on real positions. */
import { Chess } from 'chess.js';
import { describe, expect, it } from 'vitest';
import { strictPositionOf } from '../support/random';
import { realPositions } from '../support/real-positions';
import { Walk } from '@/engine/rules';

describe('SAN', () => {
  it('of every legal move of 150 real positions is written as the library writes it, and read back to the same square', () => {
    let moves = 0;
    for (const fen of realPositions(150)) {
      const position = strictPositionOf(fen);
      for (const { san, from, to, promotion } of new Chess(fen).moves({ verbose: true })) {
        const walk = new Walk(position);
        const step = walk.step(san);
        if (typeof step === 'string') throw new Error(`${fen} ${san}: ${step}`);
        expect(step.san, fen).toBe(san);
        expect(step.from, san).toBe('abcdefgh'.indexOf(from.charAt(0)) + (Number(from.charAt(1)) - 1) * 8);
        expect(step.to, san).toBe('abcdefgh'.indexOf(to.charAt(0)) + (Number(to.charAt(1)) - 1) * 8);
        expect(step.promoted > 0).toBe(promotion !== undefined);
        moves++;
      }
    }
    expect(moves).toBeGreaterThan(3000);
  });

  it.each(['e5', 'Ke2', 'Nd2', 'O-O-O', 'Bb5', 'exd5', 'Qh5', 'e9', '', 'Nf3xe5', '1', 'a7a8=Q'])(
    'refuses "%s" where the library does, from the first position',
    (text) => {
      const first = strictPositionOf('rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1');
      expect(() => new Chess().move(text)).toThrow();
      expect(new Walk(first).step(text)).toBeTypeOf('string');
    },
  );
});
