/** Figures of the engine on one core: the attack map beside two rules libraries, values, and whole readings. */
import { attacks, type Color, makeSquare, SquareSet } from 'chessops';
import { parseFen as chessopsFen } from 'chessops/fen';
import { Chess, SQUARES } from 'chess.js';
import { newDesk, parseFen, type Position, writeFen, readValues } from '@/engine';
import { attackersOf, attackMap, newAttackMap } from '@/engine/attacks';
import { squareName, squareNamed } from '@/engine/board';
import type { Figure } from './figure';

/** Alternating rounds, so that whatever else the machine does falls on all alike. */
const ROUNDS = 9;

function positionsOf(fens: readonly string[]): Position[] {
  return fens.map((fen) => {
    const admitted = parseFen(fen);
    if (!admitted.ok) throw new Error(`${fen}: ${admitted.fault[0].message}`);
    return admitted.value.position;
  });
}

function median(values: readonly number[]): number {
  return [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;
}

/** Microseconds a position. */
function timed(count: number, work: () => void): number {
  const begun = performance.now();
  work();
  return ((performance.now() - begun) * 1000) / count;
}

/** All men of a side that attack a square, by the second library's own tables. */
function chessopsAttackers(board: ReturnType<typeof boardOf>, side: Color, square: number): number[] {
  const found: number[] = [];
  for (const from of board[side]) {
    const piece = board.get(from);
    if (piece && attacks(piece, from, board.occupied).has(square)) found.push(from);
  }
  return found;
}

function boardOf(fen: string) {
  return chessopsFen(fen).unwrap().board;
}

/** The attack map of all 64 squares for both sides: microseconds, and times faster than two libraries. Equal answers first. */
export function attackMapFigures(fens: readonly string[]): Figure[] {
  const positions = positionsOf(fens);
  const games = fens.map((fen) => new Chess(fen));
  const boards = fens.map(boardOf);
  const map = newAttackMap();
  positions.slice(0, 200).forEach((position, index) => {
    attackMap(position, map);
    for (const name of SQUARES) {
      const square = squareNamed(name);
      const board = boards[index];
      if (square === undefined || !board) continue;
      for (const [side, colour] of [
        ['white', 'w'],
        ['black', 'b'],
      ] as const) {
        const ours = attackersOf(map, side, square).map(squareName).sort().join();
        const theirs = games[index]?.attackers(name, colour).sort().join();
        const others = chessopsAttackers(board, side, square).map(makeSquare).sort().join();
        if (ours !== theirs || ours !== others) throw new Error(`attackers differ on ${name}: ${fens[index]}`);
      }
    }
  });

  const rows: { ours: number; chessjs: number; chessops: number }[] = [];
  for (let round = 0; round < ROUNDS; round++) {
    const repeats = 20;
    const ours = timed(positions.length * repeats, () => {
      for (let i = 0; i < repeats; i++) for (const position of positions) attackMap(position, map);
    });
    const chessjs = timed(games.length, () => {
      for (const game of games) {
        for (const square of SQUARES) {
          game.attackers(square, 'w');
          game.attackers(square, 'b');
        }
      }
    });
    const chessops = timed(boards.length, () => {
      for (const board of boards) scatterAttacks(board);
    });
    rows.push({ ours, chessjs, chessops });
  }
  const us = median(rows.map(({ ours }) => ours));
  const figures = (name: 'chessjs' | 'chessops'): Figure => ({
    name: `attack-map-vs-${name}`,
    value: Number(median(rows.map((row) => row[name] / row.ours)).toFixed(1)),
    unit: 'times faster',
    beside: `${us.toFixed(2)} µs against ${median(rows.map((row) => row[name])).toFixed(1)} µs a position, ${ROUNDS} alternating rounds`,
  });
  return [figures('chessjs'), figures('chessops')];
}

/** The same map by the second library's quickest way: each man's attacks, scattered over the squares. */
function scatterAttacks(board: ReturnType<typeof boardOf>): SquareSet[] {
  const map = Array.from({ length: 128 }, () => SquareSet.empty());
  for (const side of ['white', 'black'] as const) {
    for (const from of board[side]) {
      const piece = board.get(from);
      if (!piece) continue;
      for (const to of attacks(piece, from, board.occupied)) {
        const entry = (side === 'white' ? 0 : 64) + to;
        map[entry] = (map[entry] ?? SquareSet.empty()).with(from);
      }
    }
  }
  return map;
}

/** Readings a second: as engine values, and whole, from FEN to the bytes of the JSON that HTTP sends, sentences included. */
export function readingFigures(fens: readonly string[]): Figure[] {
  const positions = positionsOf(fens);
  const desk = newDesk();
  const values: number[] = [];
  const whole: number[] = [];
  let bytes = 0;
  for (let round = 0; round < ROUNDS; round++) {
    values.push(
      timed(positions.length, () => {
        for (const position of positions) readValues(position, desk);
      }),
    );
    bytes = 0;
    whole.push(
      timed(fens.length, () => {
        for (const fen of fens) {
          const reading = writeFen(fen, 'strict', undefined, desk);
          if (reading.ok) bytes += reading.value.json.length;
        }
      }),
    );
  }
  return [
    {
      name: 'readings-values-per-second',
      value: Math.round(1e6 / median(values)),
      unit: 'readings/s and core',
      beside: `${median(values).toFixed(1)} µs a position, no sentences, no JSON`,
    },
    {
      name: 'readings-json-per-second',
      value: Math.round(1e6 / median(whole)),
      unit: 'readings/s and core',
      beside: `${median(whole).toFixed(0)} µs a position, ${Math.round(bytes / fens.length)} bytes each`,
    },
  ];
}
