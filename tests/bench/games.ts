/** Figures of games on one core: PGN read and replayed beside other readers, and one game of 80 half-moves read whole. */
import { spawnSync } from 'node:child_process';
import { existsSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Chess } from 'chess.js';
import { pgnRead } from 'kokopu';
import { pgnGames, readGame, replayGame, type ReplayedGame } from '@/engine/games';
import { REAL_GAMES_PGN, realGames } from '../support/real-games';
import type { Figure } from './figure';

/** Alternating rounds, so that whatever else the machine does falls on all alike. */
const ROUNDS = 5;
/** The thousand games of the tests, so many times: a file of ten thousand. */
const COPIES = 10;
/** Of the slow library so many games are timed. */
const SLOW_GAMES = 60;
const PLIES = 80;
const NATIVE = '/usr/games/pgn-extract';

function median(values: readonly number[]): number {
  return [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? Number.NaN;
}

function seconds(work: () => void): number {
  const begun = performance.now();
  work();
  return (performance.now() - begun) / 1000;
}

/** Games a second, read and replayed with all their variations; the same number of games is asked of every reader. */
export function pgnFigures(): Figure[] {
  const text = `${REAL_GAMES_PGN}\n`.repeat(COPIES);
  const count = 1000 * COPIES;
  const sample = realGames(SLOW_GAMES);
  // One library knows no escaped lines.
  const unescaped = text.replaceAll(/^%.*$/gm, '');
  const folder = mkdtempSync(join(tmpdir(), 'games-'));
  const file = join(folder, 'games.pgn');
  writeFileSync(file, unescaped);
  const rates = { ours: [] as number[], kokopu: [] as number[], chessjs: [] as number[], native: [] as number[] };
  try {
    for (let round = 0; round < ROUNDS; round++) {
      rates.ours.push(count / seconds(() => expectGames(replayAll(text), count)));
      rates.chessjs.push(SLOW_GAMES / seconds(() => sample.forEach((pgn) => new Chess().loadPgn(pgn))));
      if (round === 0) rates.kokopu.push(count / seconds(() => expectGames(kokopuAll(unescaped), count)));
      if (existsSync(NATIVE)) rates.native.push(count / seconds(() => expectGames(nativeAll(file), count)));
    }
  } finally {
    rmSync(folder, { recursive: true });
  }
  const native =
    rates.native.length > 0 ? `${NATIVE} ${Math.round(median(rates.native))}` : `${NATIVE} is not on this machine`;
  return [
    {
      name: 'pgn-games-per-second',
      value: Math.round(median(rates.ours)),
      unit: 'games/s and core',
      beside: `${count} games, every move legal, SAN written; kokopu ${Math.round(median(rates.kokopu))}, chess.js ${Math.round(median(rates.chessjs))}, ${native}`,
    },
  ];
}

function expectGames(found: number, count: number): void {
  if (found !== count) throw new Error(`${found} games of ${count}`);
}

function replayAll(text: string): number {
  let good = 0;
  for (const game of pgnGames(text)) if (replayGame(game).ok) good++;
  return good;
}

function kokopuAll(text: string): number {
  const database = pgnRead(text);
  let good = 0;
  for (let index = 0; index < database.gameCount(); index++) {
    database.game(index).finalPosition();
    good++;
  }
  return good;
}

/** The native tool checks every move as it writes the games anew; what it wrote is counted. */
function nativeAll(file: string): number {
  const { status, stdout } = spawnSync(NATIVE, ['-s', file], { encoding: 'utf8', maxBuffer: 1 << 28 });
  if (status !== 0) throw new Error(`${NATIVE} ended with ${status}`);
  return stdout.match(/^\[Result /gm)?.length ?? 0;
}

/** Milliseconds for the timeline, journeys, commitments and origins of a game of 80 half-moves. */
export function gameFigures(): Figure[] {
  const games = [...pgnGames(REAL_GAMES_PGN)].flatMap((game): ReplayedGame[] => {
    const replayed = replayGame({ ...game, moves: game.moves.slice(0, PLIES) });
    return replayed.ok && replayed.value.steps.length === PLIES ? [replayed.value] : [];
  });
  const times = games.slice(0, 60).map((game) => seconds(() => readGame(game)) * 1000);
  return [
    {
      name: 'game-80-half-moves',
      value: Number(median(times).toFixed(1)),
      unit: 'ms',
      beside: `median of ${times.length} games; the first in a fresh process ${times[0]!.toFixed(0)} ms, the slowest of the others ${Math.max(...times.slice(1)).toFixed(0)} ms`,
    },
  ];
}
