/** Legal moves and attackers against two rules libraries: chess.js and kokopu. */
import { Chess, SQUARES } from 'chess.js';
import { Position as KokopuPosition } from 'kokopu';
import { describe, expect, it } from 'vitest';
import { attackersOf, attackMap, newAttackMap } from '@/engine/attacks';
import { squareName, squareNamed } from '@/engine/board';
import { legalMoves } from '@/engine/rules';
import { realPositions } from '../support/real-positions';
import { positionOf } from '../support/random';

describe('legal moves are those of the libraries', () => {
  it('on 1,500 positions of real games', () => {
    const wrong: string[] = [];
    for (const fen of realPositions(1500)) {
      const ours = legalMoves(positionOf(fen))
        .map(
          ({ from, to, promotion }) =>
            `${squareName(from)}${squareName(to)}${promotion === 'knight' ? 'n' : (promotion?.charAt(0) ?? '')}`,
        )
        .sort()
        .join();
      const theirs = new Chess(fen)
        .moves({ verbose: true })
        .map(({ lan }) => lan)
        .sort()
        .join();
      const others = new KokopuPosition(fen)
        .moves()
        .map((move) => `${move.from()}${move.to()}${move.isPromotion() ? move.promotion() : ''}`)
        .sort()
        .join();
      if (ours !== theirs || ours !== others) wrong.push(`${fen}: ${ours} / ${theirs} / ${others}`);
    }
    expect(wrong).toEqual([]);
  });
});

describe('attackers are those of the libraries', () => {
  const map = newAttackMap();

  it('chess.js, every square and both sides of 20,000 positions of real games', { timeout: 240_000 }, () => {
    const wrong: string[] = [];
    for (const fen of realPositions(20_000)) {
      attackMap(positionOf(fen), map);
      const chess = new Chess(fen);
      for (const name of SQUARES) {
        const square = squareNamed(name);
        if (square === undefined) continue;
        for (const [side, colour] of [
          ['white', 'w'],
          ['black', 'b'],
        ] as const) {
          const ours = attackersOf(map, side, square).map(squareName).sort().join();
          const theirs = chess.attackers(name, colour).sort().join();
          if (ours !== theirs) wrong.push(`${fen} ${name} ${side}: ${ours} for ${theirs}`);
        }
      }
    }
    expect(wrong).toEqual([]);
  });

  it('kokopu, every square and both sides of 4,000 of them', { timeout: 240_000 }, () => {
    const wrong: string[] = [];
    for (const fen of realPositions(4000)) {
      attackMap(positionOf(fen), map);
      const other = new KokopuPosition(fen);
      for (const name of SQUARES) {
        const square = squareNamed(name);
        if (square === undefined) continue;
        for (const [side, colour] of [
          ['white', 'w'],
          ['black', 'b'],
        ] as const) {
          const ours = attackersOf(map, side, square).map(squareName).sort().join();
          const theirs = other.getAttacks(name, colour).sort().join();
          if (ours !== theirs) wrong.push(`${fen} ${name} ${side}: ${ours} for ${theirs}`);
        }
      }
    }
    expect(wrong).toEqual([]);
  });
});
