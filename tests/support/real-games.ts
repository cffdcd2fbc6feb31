/** Serious games: bare game scores, names removed. Read from the root of the repository, where tests and bench run. */
import { readFileSync } from 'node:fs';

/** The whole file, as text. */
export const REAL_GAMES_PGN = readFileSync('tests/support/games/real-1000.pgn', 'utf8');

const games = REAL_GAMES_PGN.split(/\n(?=\[Result)/).slice(1);

/** That many games as PGN, spread evenly over the 1,000. */
export function realGames(count: number): string[] {
  return Array.from({ length: count }, (_, index) => games[Math.floor((index * games.length) / count)] ?? '');
}
