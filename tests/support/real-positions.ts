/** Positions of serious games: bare game scores, names removed. */
import { readFileSync } from 'node:fs';

const lines = readFileSync(new URL('./positions/real-20000.fen', import.meta.url), 'utf8')
  .split('\n')
  .filter((line) => line !== '' && !line.startsWith('#'));

/** That many FENs, spread evenly over the 20,000. */
export function realPositions(count: number): string[] {
  return Array.from({ length: count }, (_, index) => lines[Math.floor((index * lines.length) / count)] ?? '');
}
