/**
 * A reading as JSON, written straight from engine values: what is sent and stored. `encode.ts` makes the
 * same reading as a value, for what is drawn from it; tests hold the two to each other and to the schema, character by
 * character.
 */
import { type Fault, formatFen } from '../board';
import { explain, type Explanation, type ReadingValues } from '../explain';
import { fragment, newPage, type Page, put, putList, putSides, putText, putTexts, torn } from './page';
import type { Reading } from './schema';

import { ENGINE_VERSION } from './version';
import { diagonalJson, fileJson, kingJson, manJson, totalsJson } from './write-men';
import { complexJson, outpostJson, pawnsJson, putBoard, weakSquareJson } from './write-squares';
import { statementJson } from './write-statements';

/** The parts of a reading that may be left out; the others say which position it is. */
export type ReadingPart = Exclude<keyof Reading, 'engine' | 'fen' | 'mode' | 'warnings' | 'sideToMove'>;

/** Each part from the values; sentences are worked out only where they are asked for. */
const PARTS: { readonly [Part in ReadingPart]: (page: Page, values: ReadingValues, said: () => Explanation) => void } =
  {
    squares: putBoard,
    men: (page, { men, map }) => putList(page, men, map, manJson),
    pawns: (page, values) => pawnsJson(page, values, values.map),
    weakSquares: (page, { weakSquares, map }) => putList(page, weakSquares, map, weakSquareJson),
    outposts: (page, { outposts, map }) => putList(page, outposts, map, outpostJson),
    files: (page, { files, map }) => putList(page, files, map, fileJson),
    diagonals: (page, { diagonals, map }) => putList(page, diagonals, map, diagonalJson),
    colourComplexes: (page, { complexes, map }) => putList(page, complexes, map, complexJson),
    kings: (page, { kings, map }) => putSides(page, kings, map, kingJson),
    totals: (page, { totals, map }) => putSides(page, totals, map, totalsJson),
    statements: (page, { map }, said) => putList(page, said().statements, map, statementJson),
    lead: (page, _, said) => putTexts(page, said().lead),
  };

const NAMES = Object.keys(PARTS) as ReadingPart[];
const BEFORE = NAMES.map((name) => fragment(`,"${name}":`));
const ENGINE_AND_FEN = fragment(`{"engine":${JSON.stringify(ENGINE_VERSION)},"fen":`);
const MODE = fragment(',"mode":');
const NO_WARNINGS = fragment(',"warnings":[],"sideToMove":');
const END = fragment('}');

/** One page serves all readings: each is torn off before the next begins. */
const page = newPage();

/** The JSON of a reading in UTF-8, its parts in the order of the schema; `include` picks some of them. */
export function writeReading(
  values: ReadingValues,
  warnings: readonly Fault[],
  include: readonly ReadingPart[] = NAMES,
): Uint8Array<ArrayBuffer> {
  const { position } = values;
  let made: Explanation | undefined;
  const said = () => (made ??= explain(values));
  page.length = 0;
  put(page, ENGINE_AND_FEN);
  putText(page, formatFen(position));
  put(page, MODE);
  putText(page, position.mode);
  put(page, warnings.length === 0 ? NO_WARNINGS : fragment(`,"warnings":${JSON.stringify(warnings)},"sideToMove":`));
  putText(page, position.sideToMove);
  for (let index = 0; index < NAMES.length; index++) {
    const name = NAMES[index]!;
    if (!include.includes(name)) continue;
    put(page, BEFORE[index]!);
    PARTS[name](page, values, said);
  }
  put(page, END);
  return torn(page);
}
