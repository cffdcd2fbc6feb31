/** Attackers of every square for both sides against two rules libraries, chess.js and kokopu, on 20,000 positions of real games. */
import { Chess } from 'chess.js';
import { Position as KokopuPosition } from 'kokopu';
import { expect, it } from 'vitest';
import { attackersOf, attackMap, newAttackMap } from '@/engine/attacks';
import { SQUARES, squareName } from '@/engine/board';
import { SIDES, type SquareName } from '@/engine/types';
import { positionOf } from '../support/random';
import { realPositions } from '../support/real-positions';

const COLOURS = { white: 'w', black: 'b' } as const;

/** Asks a library for the attackers of a square: names in any order. */
type Asked = (square: SquareName, colour: 'w' | 'b') => readonly string[];

/** Squares and sides compared, and where the library differs. */
function disagreements(library: (fen: string) => Asked): { compared: number; wrong: string[] } {
  const map = newAttackMap();
  const wrong: string[] = [];
  let compared = 0;
  for (const fen of realPositions(20_000)) {
    attackMap(positionOf(fen), map);
    const asked = library(fen);
    for (const square of SQUARES) {
      const name = squareName(square);
      for (const side of SIDES) {
        compared++;
        const ours = attackersOf(map, side, square).map(squareName);
        const theirs = asked(name, COLOURS[side]);
        if (!isSameSet(ours, theirs)) wrong.push(`${fen} ${name} ${side}: ${ours.join()} for ${theirs.join()}`);
      }
    }
  }
  return { compared, wrong };
}

function isSameSet(ours: readonly string[], theirs: readonly string[]): boolean {
  return ours.length === theirs.length && ours.every((name) => theirs.includes(name));
}

const LIBRARIES: readonly (readonly [string, (fen: string) => Asked])[] = [
  [
    'chess.js',
    (fen) => {
      const chess = new Chess(fen);
      return (square, colour) => chess.attackers(square, colour);
    },
  ],
  [
    'kokopu',
    (fen) => {
      const position = new KokopuPosition(fen);
      return (square, colour) => position.getAttacks(square, colour);
    },
  ],
];

it.each(LIBRARIES)('%s names the same attackers', { timeout: 120_000 }, (name, library) => {
  const { compared, wrong } = disagreements(library);
  console.info(`attackers, ${name}: ${wrong.length} of ${compared} answers differ`);
  expect(compared).toBe(20_000 * 64 * 2);
  expect(wrong).toEqual([]);
});
