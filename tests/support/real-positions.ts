/** Positions of serious games: bare game scores, names removed. Read from the root of the repository, where tests and bench run. */
import { readFileSync } from 'node:fs';

const lines = readFileSync('tests/support/positions/real-20000.fen', 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'));

/** That many FENs, spread evenly over the 20,000. */
export function realPositions(count: number): string[] {
  return Array.from({ length: count }, (_, index) => lines[Math.floor((index * lines.length) / count)] ?? '');
}
