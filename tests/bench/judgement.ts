/**
 * How well the recommended placements judge: their first moves, in order, against the best move of test positions or
 * the move that a strong player chose. `npx tsx tests/bench/judgement.ts FILE`.
 *
 * Only quiet moves of knights, bishops, rooks and queens are asked for. A placement that needs a preparation begins
 * with it, and counts only where that is such a move.
 */
import { pathToFileURL } from 'node:url';
import { type Position, squareName } from '@/engine';
import { type RouteValue, routes } from '@/engine/routes';
import { type JudgedPosition, judgedPositions } from './judgement-data';

/** Choices asked for: enough that five different first moves are among them. */
const CHOICES = 60;

/** Each so many positions one is timed, with the choices that are given when no number is said. */
const TIMED_EVERY = 8;

/** The different first moves that the routes of the side to move recommend, best first, as "g1f3". */
export function firstMoves(position: Position): string[] {
  const moves = routes(position, { choicesMax: CHOICES }).choices.flatMap((choice) => firstMove(choice) ?? []);
  return [...new Set(moves)];
}

function firstMove({ man, stops, needs }: RouteValue): string | null {
  if (needs !== null) return needs.kind === 'pawn' ? null : squareName(needs.from) + squareName(needs.to);
  const stop = stops[0];
  return stop === undefined ? null : squareName(man) + squareName(stop);
}

/** Place of the best move among the first moves, from 1; Infinity where it is not among them. */
function placeOf({ position, best }: JudgedPosition): number {
  const place = firstMoves(position).findIndex((move) => best.includes(move));
  return place < 0 ? Number.POSITIVE_INFINITY : place + 1;
}

interface Judged {
  readonly theme: string | null;
  readonly man: string;
  readonly place: number;
}

function share(judged: readonly Judged[], most: number): string {
  const hits = judged.filter(({ place }) => place <= most).length;
  return `${((100 * hits) / judged.length).toFixed(1)} %`.padStart(8);
}

function line(name: string, judged: readonly Judged[]): string {
  return `${name.padEnd(40)} ${String(judged.length).padStart(6)} ${share(judged, 1)} ${share(judged, 3)} ${share(judged, 5)}`;
}

const MEN: Readonly<Record<string, string>> = { n: 'knight', b: 'bishop', r: 'rook', q: 'queen' };

/** Prints how often the best move is the first, among three, among five: all, by theme, by kind of man. */
export function judgement(file: string): void {
  const positions = judgedPositions(file);
  const judged = positions.map((each): Judged => ({ theme: each.theme, man: each.man, place: placeOf(each) }));
  const times = positions
    .filter((_, index) => index % TIMED_EVERY === 0)
    .map(({ position }) => {
      const begin = process.cpuUsage().user;
      routes(position);
      return (process.cpuUsage().user - begin) / 1000;
    });
  const print = (text: string) => process.stdout.write(`${text}\n`);
  print(
    `${''.padEnd(40)} ${'number'.padStart(6)} ${'first'.padStart(8)} ${'of three'.padStart(8)} ${'of five'.padStart(8)}`,
  );
  print(line('all positions', judged));
  const themes = [...new Set(judged.flatMap(({ theme }) => theme ?? []))].sort();
  for (const theme of themes)
    print(
      line(
        `  ${theme}`,
        judged.filter((each) => each.theme === theme),
      ),
    );
  for (const [letter, name] of Object.entries(MEN)) {
    const ofKind = judged.filter(({ man }) => man === letter);
    if (ofKind.length > 0) print(line(`  ${name}`, ofKind));
  }
  times.sort((a, b) => a - b);
  print(`routes of a side as they are answered: ${times[times.length >> 1]?.toFixed(1)} ms of one core at the median`);
}

if (process.argv[1] !== undefined && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const file = process.argv[2];
  if (file === undefined) {
    process.stderr.write('usage: npx tsx tests/bench/judgement.ts FILE\n');
    process.exitCode = 2;
  } else judgement(file);
}
