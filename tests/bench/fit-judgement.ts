/**
 * Fits the table of weights (engine/posts/weights.ts) to files of judged positions and prints it, with figures by
 * cross-validation: `npx tsx tests/bench/fit-judgement.ts TEST.json GAMES.ndjson`.
 *
 * Each candidate is a placement one move away, counted and guarded as the ranking does it. Positions of the first
 * file count three times each, being few and chosen by hand. Signs are those of the table: a weight that would turn
 * against its reason becomes 0.
 */
import { PARTS } from '@/engine/posts';
import { fieldOf, guardPlacement, lookAgain, merit, piecesOf, placementsOf } from '@/engine/routes';
import { squareName } from '@/engine';
import { type ChoiceData, fitChoice, placeUnder } from './conditional-logit';
import { type JudgedPosition, judgedPositions } from './judgement-data';

const FOLDS = 5;
const TEST_IMPORTANCE = 3;
const SECOND_LOOKS = 8;
const STEPS = 400;
const RIDGE = 5;

interface Candidate {
  readonly row: Float64Array;
  readonly right: boolean;
}

/** The candidates of a position as the ranking sees them. */
function candidatesOf({ position, best }: JudgedPosition): Candidate[] {
  const field = fieldOf(position, position.sideToMove);
  const placements = piecesOf(field).flatMap((man) => placementsOf(field, man, 1));
  for (const placement of placements) guardPlacement(placement);
  placements.sort((a, b) => merit(b) - merit(a));
  for (const placement of placements.slice(0, SECOND_LOOKS)) lookAgain(placement);
  return placements.map(({ man, post, now, there }) => ({
    row: there.map((count, place) => count - now[place]!),
    right: best.includes(squareName(man) + squareName(post)),
  }));
}

/** Positions whose right move is among the candidates; those where it is not cannot teach. */
function choiceData(
  files: readonly { file: string; importance: number }[],
): ChoiceData & { file: number[]; missing: number[] } {
  const rows: Float64Array[] = [];
  const right: number[] = [];
  const starts = [0];
  const importance: number[] = [];
  const file: number[] = [];
  const missing = files.map(() => 0);
  for (const [index, each] of files.entries()) {
    for (const judged of judgedPositions(each.file)) {
      const candidates = candidatesOf(judged);
      if (!candidates.some((candidate) => candidate.right)) {
        missing[index]!++;
        continue;
      }
      for (const candidate of candidates) {
        rows.push(candidate.row);
        right.push(candidate.right ? 1 : 0);
      }
      starts.push(rows.length);
      importance.push(each.importance);
      file.push(index);
    }
  }
  const width = PARTS.length;
  const flat = new Float64Array(rows.length * width);
  rows.forEach((row, index) => flat.set(row, index * width));
  return { width, rows: flat, starts, right: Uint8Array.from(right), importance, file, missing };
}

/** A fold for each position, without chance: consecutive positions of one game stay together. */
function foldOf(position: number): number {
  return Math.floor(position / 20) % FOLDS;
}

function main(files: readonly string[]): void {
  const data = choiceData(files.map((file, index) => ({ file, importance: index === 0 ? TEST_IMPORTANCE : 1 })));
  // A part that the table leaves out is offered again as something good; 'lost' and the like keep their sign.
  const signs = PARTS.map(({ weight }) => (weight === 0 ? 1 : Math.sign(weight)));
  const all = data.importance.map((_, index) => index);
  const places: number[] = [];
  for (let fold = 0; fold < FOLDS; fold++) {
    const positions = all.filter((position) => foldOf(position) !== fold);
    const weights = fitChoice(data, { positions, signs, steps: STEPS, ridge: RIDGE });
    for (const position of all) if (foldOf(position) === fold) places[position] = placeUnder(data, weights, position);
  }
  for (const [index, file] of files.entries()) {
    const own = all.filter((position) => data.file[position] === index);
    const count = own.length + data.missing[index]!;
    const share = (most: number) => ((100 * own.filter((each) => places[each]! <= most).length) / count).toFixed(1);
    process.stdout.write(`${file}: ${share(1)} / ${share(3)} / ${share(5)} % of ${count}, each fold by the others\n`);
  }
  const weights = fitChoice(data, { positions: all, signs, steps: STEPS, ridge: RIDGE });
  for (const [place, { name, weight }] of PARTS.entries()) {
    process.stdout.write(`${name.padEnd(18)} ${weights[place]!.toFixed(3).padStart(8)}   in the table ${weight}\n`);
  }
}

main(process.argv.slice(2));
