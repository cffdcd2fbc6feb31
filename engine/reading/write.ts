/**
 * A reading as the text of its JSON, written straight from engine values: what is sent and stored. `encode.ts` makes the
 * same reading as a value, for what is drawn from it; tests hold the two to each other and to the schema, character by
 * character.
 */
import { type Fault, formatFen } from '../board';
import { explain, type Explanation, type ReadingValues } from '../explain';
import type { Reading } from './schema';
import { listText, sidesText, textOf, wordsText, wordText } from './text';
import { ENGINE_VERSION } from './version';
import { diagonalJson, fileJson, kingJson, manJson, totalsJson } from './write-men';
import { complexJson, outpostJson, pawnsJson, squaresJson, weakSquareJson } from './write-squares';
import { statementJson } from './write-statements';

/** The parts of a reading that may be left out; the others say which position it is. */
export type ReadingPart = Exclude<keyof Reading, 'engine' | 'fen' | 'mode' | 'warnings' | 'sideToMove'>;

/** Each part from the values; sentences are worked out only where they are asked for. */
const PARTS: { readonly [Part in ReadingPart]: (values: ReadingValues, said: () => Explanation) => string } = {
  squares: squaresJson,
  men: ({ men, map }) => listText(men, map, manJson),
  pawns: ({ pawns, structure, map }) => pawnsJson({ pawns, structure }, map),
  weakSquares: ({ weakSquares, map }) => listText(weakSquares, map, weakSquareJson),
  outposts: ({ outposts, map }) => listText(outposts, map, outpostJson),
  files: ({ files, map }) => listText(files, map, fileJson),
  diagonals: ({ diagonals, map }) => listText(diagonals, map, diagonalJson),
  colourComplexes: ({ complexes, map }) => listText(complexes, map, complexJson),
  kings: ({ kings, map }) => sidesText(kings, map, kingJson),
  totals: ({ totals, map }) => sidesText(totals, map, totalsJson),
  statements: ({ map }, said) => listText(said().statements, map, statementJson),
  lead: (_, said) => wordsText(said().lead),
};

const NAMES = Object.keys(PARTS) as ReadingPart[];

/** The JSON of a reading, its parts in the order of the schema; `include` picks some of them. */
export function writeReading(
  values: ReadingValues,
  warnings: readonly Fault[],
  include: readonly ReadingPart[] = NAMES,
): string {
  const { position } = values;
  let made: Explanation | undefined;
  const said = () => (made ??= explain(values));
  let text =
    `{"engine":${textOf(ENGINE_VERSION)},"fen":${textOf(formatFen(position))},"mode":${wordText(position.mode)}` +
    `,"warnings":${JSON.stringify(warnings)},"sideToMove":${wordText(position.sideToMove)}`;
  for (const name of NAMES) if (include.includes(name)) text += `,"${name}":${PARTS[name](values, said)}`;
  return `${text}}`;
}
