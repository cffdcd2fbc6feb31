/** Men and kings against plain search on a board of letters, and their moves against a rules library (chess.js). */
import { Chess } from 'chess.js';
import { describe, expect, it } from 'vitest';
import { attackMap, attackersOf } from '@/engine/attacks';
import { squareName } from '@/engine/board';
import { safetyOf } from '@/engine/exchange';
import { heatMap } from '@/engine/men';
import { readValues } from '@/engine/reading';
import { SIDES, type Square } from '@/engine/types';
import { positionOf } from '../support/random';
import { realPositions } from '../support/real-positions';
import { codesOf, lettersOf, slowLoss } from '../support/slow/exchange';
import {
  moved,
  slowDuties,
  slowFlights,
  slowHeat,
  slowLuft,
  slowMoves,
  slowPinner,
  slowSafeMoves,
} from '../support/slow/men';

const name = (square: number): string => squareName(square as Square);
const named = (squares: readonly number[]): string => squares.map(name).join(' ');

/** The square on which the side may capture in passing, -1 for none. */
function passingFor(fen: string, white: boolean): number {
  const [, toMove, , passing = '-'] = fen.split(' ');
  if (passing === '-' || (toMove === 'w') !== white) return -1;
  return passing.charCodeAt(0) - 97 + 8 * (Number(passing[1]) - 1);
}

describe('every man of 400 positions of real games', () => {
  const read = realPositions(400).map((fen) => ({ fen, letters: lettersOf(fen), values: readValues(positionOf(fen)) }));

  it('has the moves, safe moves and pin that plain search finds', () => {
    const wrong: string[] = [];
    let asked = 0;
    for (const { fen, letters, values } of read) {
      for (const { square, side, moves, safeMoves, pinned } of values.men) {
        asked += moves.length;
        const passing = passingFor(fen, side === 'white');
        const slow = slowMoves(letters, square, passing);
        const slowSafe = slowSafeMoves(letters, square, passing);
        if (named(slow) !== named(moves)) wrong.push(`${fen} ${name(square)} moves ${named(moves)} for ${named(slow)}`);
        if (named(slowSafe) !== named(safeMoves)) {
          wrong.push(`${fen} ${name(square)} safe ${named(safeMoves)} for ${named(slowSafe)}`);
        }
        if ((slowPinner(letters, square) !== undefined) !== pinned)
          wrong.push(`${fen} ${name(square)} pinned ${pinned}`);
      }
    }
    expect(asked).toBeGreaterThan(20_000);
    expect(wrong).toEqual([]);
  });

  it('has the duties that taking it off the board shows', () => {
    const wrong: string[] = [];
    let duties = 0;
    for (const { fen, letters, values } of read) {
      for (const man of values.men) {
        const slow = [...slowDuties(letters, man.square)].map(([square, loses]) => `${name(square)} ${loses}`).join();
        const fast = man.duties.map(({ square, loses }) => `${name(square)} ${loses}`).join();
        duties += man.duties.length;
        if (fast !== slow) wrong.push(`${fen} ${name(man.square)}: ${fast} for ${slow}`);
      }
    }
    expect(duties).toBeGreaterThan(500);
    expect(wrong).toEqual([]);
  });

  it('has moves that the rules library allows, and where no check is given all of them', () => {
    const wrong: string[] = [];
    for (const { fen, values } of read) {
      const chess = new Chess(fen);
      const legal = new Set(chess.moves({ verbose: true }).map(({ from, to }) => `${from}${to}`));
      for (const { square, side, kind, moves, safeMoves } of values.men) {
        if ((side === 'white') !== (chess.turn() === 'w')) continue;
        // A pawn that captures in passing takes two men off one rank: the library sees what a pin cannot say.
        const passing = passingFor(fen, side === 'white');
        const ours = (kind === 'king' ? safeMoves : moves).filter((to) => kind !== 'pawn' || to !== passing);
        const theirs = [...legal].filter((move) => move.startsWith(name(square)));
        const missing = theirs.filter((move) => !moves.some((to) => move === name(square) + name(to)));
        const castling = kind === 'king' ? missing.filter((move) => /^e[18][cg][18]$/.test(move)) : [];
        if (missing.length > castling.length) wrong.push(`${fen} lacks ${missing.join()}`);
        if (chess.inCheck() && kind !== 'king') continue;
        const tooMany = ours.filter((to) => !legal.has(name(square) + name(to)));
        if (tooMany.length > 0) wrong.push(`${fen} ${name(square)} has ${named(tooMany)}`);
      }
    }
    expect(wrong).toEqual([]);
  });
});

describe('both kings of 1,500 positions of real games', () => {
  it('have the flights and the luft that stepping there shows, and moves that truly give luft', () => {
    const wrong: string[] = [];
    let lufts = 0;
    for (const fen of realPositions(1500)) {
      const letters = lettersOf(fen);
      const { kings, map } = readValues(positionOf(fen));
      for (const side of SIDES) {
        const king = kings[side];
        if (!king) continue;
        const white = side === 'white';
        const inCheck = attackersOf(map, white ? 'black' : 'white', king.square).length > 0;
        const flights = slowFlights(letters, white);
        const luft = slowLuft(letters, white);
        if (named(king.flights) !== named(flights)) wrong.push(`${fen} ${side} flights ${named(king.flights)}`);
        if (named(king.luft) !== named(luft)) wrong.push(`${fen} ${side} luft ${named(king.luft)}`);
        const home = king.square >> 3 === (white ? 0 : 7);
        const givers: string[] = [];
        for (const from of home && luft.length === 0 && !inCheck ? letters.keys() : []) {
          const beside = Math.abs((from & 7) - (king.square & 7)) <= 1 && from >> 3 === (white ? 1 : 6);
          if (!beside || letters[from] !== (white ? 'P' : 'p')) continue;
          for (const to of slowMoves(letters, from, -1)) {
            const isStep = (to & 7) === (from & 7);
            if (isStep && slowLuft(moved(letters, from, to), white).includes(from)) givers.push(name(from) + name(to));
          }
        }
        lufts += givers.length;
        const ours = king.luftMoves.map(({ from, to }) => name(from) + name(to));
        if (ours.join() !== givers.join()) wrong.push(`${fen} ${side} luft moves ${ours.join()} for ${givers.join()}`);
      }
    }
    expect(lufts).toBeGreaterThan(500);
    expect(wrong).toEqual([]);
  });

  it('are reached and guarded by the men that attack a square of the zone', () => {
    const wrong: string[] = [];
    for (const fen of realPositions(300)) {
      const { kings, map } = readValues(positionOf(fen));
      for (const side of SIDES) {
        const king = kings[side];
        if (!king) continue;
        const zone = [...Array(64).keys()].filter(
          (at) => Math.max(Math.abs((at & 7) - (king.square & 7)), Math.abs((at >> 3) - (king.square >> 3))) <= 1,
        );
        for (const other of SIDES) {
          const expected = new Set(zone.flatMap((at) => attackersOf(map, other, at as Square)));
          const bearing = [...expected].filter((at) => (map.board[at] ?? 0) % 8 !== 6).sort((a, b) => a - b);
          const ours = [...(other === side ? king.guardedBy : king.reachedBy)].sort((a, b) => a - b);
          if (named(ours) !== named(bearing)) wrong.push(`${fen} ${side}: ${named(ours)} for ${named(bearing)}`);
        }
      }
    }
    expect(wrong).toEqual([]);
  });
});

it('the heat map of every piece of 12 positions asks the man on every square, as plain search does', () => {
  const wrong: string[] = [];
  let cells = 0;
  for (const fen of realPositions(12)) {
    const letters = lettersOf(fen);
    const safety = safetyOf(attackMap({ board: codesOf(letters) }));
    for (const [from, letter] of letters.entries()) {
      if (letter === '') continue;
      const pawn = letter.toLowerCase() === 'p';
      for (const cell of heatMap(safety, { square: from as Square }) ?? []) {
        const { square, moves, safeMoves, safe, taken } = cell;
        const shut = (square !== from && letters[square] !== '') || (pawn && (square < 8 || square > 55));
        const slow = shut ? [0, 0] : slowHeat(letters, letter, square, from);
        const expected = [...slow, !shut && slowLoss(letters, letter, square, from) === 0, shut];
        cells++;
        if ([moves, safeMoves, safe, taken].join() !== expected.join()) {
          wrong.push(`${fen} ${name(from)} on ${name(square)}: ${[moves, safeMoves, safe, taken]} for ${expected}`);
        }
      }
    }
  }
  expect(cells).toBeGreaterThan(10_000);
  expect(wrong).toEqual([]);
});
