/** Engine values and their statements as the JSON of a reading. */
import { type Fault, formatFen } from '../board';
import type { StatementValue } from '../explain';
import type { ReadingValues } from '../explain';
import { encodeDiagonals, encodeFiles, encodeKing, encodeMen } from './encode-men';
import { encodeComplexes, encodeOutposts, encodePawns, encodeSquares, encodeWeakSquares } from './encode-squares';
import type { Reading, Statement } from './schema';
import { ENGINE_VERSION } from './version';

/** The reading as JSON. `statements` come heaviest first, `lead` names those that matter most. */
export function encodeReading(
  values: ReadingValues,
  statements: readonly StatementValue[],
  lead: readonly string[],
  warnings: readonly Fault[],
): Reading {
  const { position, map, table } = values;
  return {
    engine: ENGINE_VERSION,
    fen: formatFen(position),
    mode: position.mode,
    warnings: [...warnings],
    sideToMove: position.sideToMove,
    squares: encodeSquares(position, map, table),
    men: encodeMen(map, values.men),
    pawns: encodePawns(values.pawns, values.structure),
    weakSquares: encodeWeakSquares(map, values.weakSquares),
    outposts: encodeOutposts(map, values.outposts),
    files: encodeFiles(values.files),
    diagonals: encodeDiagonals(values.diagonals),
    colourComplexes: encodeComplexes(values.complexes),
    kings: { white: encodeKing(values.kings.white), black: encodeKing(values.kings.black) },
    totals: values.totals,
    statements: statements.map(encodeStatement),
    lead: [...lead],
  };
}

function encodeStatement({ key, theme, weight, head, text, fact }: StatementValue): Statement {
  const { id, side, squares, men, ...facts } = fact;
  return { key, id, theme, side, weight, head, text, squares: [...squares], men: [...men], facts };
}
