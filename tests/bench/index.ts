/**
 * `npm run bench`: prints figures from one run, asserts none. `--json` prints one object a line. Needs a build
 * (`npm run build`). `--only engine|games|http|page` runs a part. `judgement FILE` ranks the positions of a file instead.
 */
import { realPositions } from '../support/real-positions';
import { attackMapFigures, readingFigures } from './engine';
import type { Figure } from './figure';
import { gameFigures, pgnFigures } from './games';
import { httpFigures, startBuiltServer } from './http';
import { judgement } from './judgement';
import { pageFigures } from './page';

const args = process.argv.slice(2);
if (args[0] === 'judgement') {
  const file = args[1];
  if (file === undefined) throw new Error('npm run bench -- judgement FILE');
  judgement(file);
  process.exit(0);
}
const asJson = args.includes('--json');
const only = args.includes('--only') ? args[args.indexOf('--only') + 1] : undefined;
const wants = (part: string) => only === undefined || only === part;

function print(figures: readonly Figure[]): void {
  for (const figure of figures) {
    const { name, value, unit, beside } = figure;
    process.stdout.write(
      asJson
        ? `${JSON.stringify(figure)}\n`
        : `${name.padEnd(34)} ${String(value).padStart(9)} ${unit}${beside ? `\n${' '.repeat(45)}(${beside})` : ''}\n`,
    );
  }
}

if (wants('engine')) {
  print(attackMapFigures(realPositions(600)));
  print(readingFigures(realPositions(2500)));
}
if (wants('games')) {
  print(gameFigures());
  print(pgnFigures());
}
if (wants('http') || wants('page')) {
  const server = await startBuiltServer();
  try {
    if (wants('page')) print(await pageFigures(server.url));
    if (wants('http')) {
      print(await httpFigures(server.url, { fens: realPositions(4000), rounds: 5, roundSeconds: 3, connections: 16 }));
    }
  } finally {
    await server.stop();
  }
}
