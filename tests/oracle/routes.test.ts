/** Routes against plain search, and replayed by a rules library (chess.js) with the enemy passing. */
import { Chess } from 'chess.js';
import { describe, expect, it } from 'vitest';
import { attackMap } from '@/engine/attacks';
import { squareName } from '@/engine/board';
import { safetyOf } from '@/engine/exchange';
import { allWays, type RouteValue, routes, waysOf } from '@/engine/routes';
import type { Square } from '@/engine/types';
import { positionOf } from '../support/random';
import { realPositions } from '../support/real-positions';
import { codesOf, lettersOf } from '../support/slow/exchange';
import { slowWays } from '../support/slow/ways';

describe('ways', () => {
  it('are as long and as many as plain search finds, three moves deep, for the pieces of 60 positions of real games', () => {
    const wrong: string[] = [];
    let asked = 0;
    for (const fen of realPositions(60)) {
      const letters = lettersOf(fen);
      const safety = safetyOf(attackMap({ board: codesOf(letters) }));
      for (const [from, letter] of letters.entries()) {
        if (letter === '' || 'PpKk'.includes(letter)) continue;
        const slow = slowWays(letters, from, 3);
        const ways = waysOf(safety, from as Square, 3);
        for (let to = 0; to < 64; to++) {
          if (to === from) continue;
          asked++;
          const expected = slow.get(to) ?? { moves: -1, count: 0 };
          const listed = allWays(safety, ways, to as Square, 1000).length;
          if (ways.moves[to] !== expected.moves || ways.counts[to] !== expected.count || listed !== expected.count) {
            wrong.push(
              `${fen} ${letter} ${from}-${to}: ${ways.moves[to]} x${ways.counts[to]} (${listed}) for ${expected.moves} x${expected.count}`,
            );
          }
        }
      }
    }
    expect(asked).toBeGreaterThan(20_000);
    expect(wrong).toEqual([]);
  }, 60_000);
});

describe('routes', () => {
  it('are legal move by move and as long as said, on 20 positions of real games', () => {
    const faults: string[] = [];
    let steps = 0;
    for (const fen of realPositions(20)) {
      for (const choice of routes(positionOf(fen), { choicesMax: 20 }).choices) {
        const moves = movesOf(choice);
        steps += moves.length;
        if (choice.stops.length !== choice.moves || choice.stops.at(-1) !== choice.post) faults.push(`${fen}: length`);
        if (!isReplayed(fen, moves)) faults.push(`${fen}: ${moves.join(' ')}`);
      }
    }
    expect(steps).toBeGreaterThan(400);
    expect(faults).toEqual([]);
  }, 60_000);
});

function movesOf({ man, stops, needs }: RouteValue): string[] {
  const walk = [man, ...stops].map(squareName);
  const moves = walk.slice(1).map((to, index) => `${walk[index] ?? ''}${to}`);
  return needs === null ? moves : [squareName(needs.from) + squareName(needs.to), ...moves];
}

/** Plays the moves of one side in turn, the other passing each time; no move may capture. */
function isReplayed(fen: string, moves: readonly string[]): boolean {
  const turn = fen.split(' ')[1] ?? 'w';
  const chess = new Chess(fen);
  for (const move of moves) {
    try {
      if (chess.move({ from: move.slice(0, 2), to: move.slice(2) }).captured) return false;
    } catch {
      return false;
    }
    const fields = chess.fen().split(' ');
    fields[1] = turn;
    fields[3] = '-';
    chess.load(fields.join(' '), { skipValidation: true });
  }
  return true;
}
