/** Men, kings, files, diagonals and totals as the text of their JSON. */
import type { DiagonalValue, FileValue } from '../files';
import type { Duty, KingValue, ManValue } from '../men';
import type { SquareTotals } from '../squares';
import type { Square } from '../types';
import type { Reading } from './schema';
import {
  fileText,
  listText,
  maskText,
  objectText,
  sidesText,
  squaresText,
  squareText,
  type Write,
  wordsText,
  wordText,
} from './text';

/** The row of a side's own men, or of the enemy's, in a map's list of squares. */
const rowOf = (side: 'white' | 'black') => (side === 'white' ? 0 : 32);

const dutyJson: Write<Duty> = ({ square, loses, by }) =>
  `{"square":${squareText(square)},"loses":${loses},"by":"${by}"}`;

/** A man. */
export const manJson = objectText<ManValue, Reading['men'][number]>({
  square: ({ square }) => squareText(square),
  side: ({ side }) => wordText(side),
  kind: ({ kind }) => wordText(kind),
  moves: ({ moves }) => squaresText(moves),
  safeMoves: ({ safeMoves }) => squaresText(safeMoves),
  sees: ({ sees }) => `${sees}`,
  seesAhead: ({ seesAhead }) => `${seesAhead}`,
  pinned: ({ pinned }) => `${pinned}`,
  enPrise: ({ enPrise }) => `${enPrise}`,
  attackers: ({ side, attackers }, map) => maskText(map, rowOf(side) ^ 32, attackers),
  defenders: ({ side, defenders }, map) => maskText(map, rowOf(side), defenders),
  duties: ({ duties }, map) => listText(duties, map, dutyJson),
  trapped: ({ trapped }) => `${trapped}`,
  notes: ({ notes }) => wordsText(notes),
});

const bothSquares: Write<readonly Square[]> = (squares) => squaresText(squares);

/** A file. */
export const fileJson = objectText<FileValue, Reading['files'][number]>({
  file: ({ file }) => fileText(file),
  status: ({ status }) => wordText(status),
  halfOpenFor: ({ halfOpenFor }) => wordText(halfOpenFor),
  heavy: ({ heavy }, map) => sidesText(heavy, map, bothSquares),
  control: ({ control }) => wordText(control),
  entries: ({ entries }, map) => sidesText(entries, map, bothSquares),
  targets: ({ targets }, map) =>
    listText(targets, map, ({ square, side }) => `{"square":${squareText(square)},"side":"${side}"}`),
});

/** A diagonal. */
export const diagonalJson = objectText<DiagonalValue, Reading['diagonals'][number]>({
  from: ({ from }) => squareText(from),
  direction: ({ direction }) => wordText(direction),
  squares: ({ squares }) => squaresText(squares),
  stoppedBy: ({ stoppedBy }) => squareText(stoppedBy),
  stopperFixed: ({ stopperFixed }) => `${stopperFixed}`,
});

const presentKing = objectText<KingValue, NonNullable<Reading['kings']['white']>>({
  square: ({ square }) => squareText(square),
  shelter: ({ shelter }, map) =>
    listText(
      shelter,
      map,
      ({ file, pawn, advanced }) => `{"file":${fileText(file)},"pawn":${squareText(pawn)},"advanced":${advanced}}`,
    ),
  openBeside: ({ openBeside }, map) => listText(openBeside, map, fileText),
  reachedBy: ({ reachedBy }) => squaresText(reachedBy),
  guardedBy: ({ guardedBy }) => squaresText(guardedBy),
  flights: ({ flights }) => squaresText(flights),
  luft: ({ luft }) => squaresText(luft),
  luftMoves: ({ luftMoves }, map) =>
    listText(luftMoves, map, ({ from, to }) => `{"from":${squareText(from)},"to":${squareText(to)}}`),
  weakBackRank: ({ weakBackRank }) => `${weakBackRank}`,
});

/** A king, null where a diagram has none. */
export const kingJson: Write<KingValue | null> = (king, map) => (king ? presentKing(king, map) : 'null');

/** The counts of a side. */
export const totalsJson = objectText<SquareTotals, Reading['totals']['white']>({
  controlled: ({ controlled }) => `${controlled}`,
  commanded: ({ commanded }) => `${commanded}`,
  enemyHalf: ({ enemyHalf }) => `${enemyHalf}`,
  centre: ({ centre }) => `${centre}`,
  extendedCentre: ({ extendedCentre }) => `${extendedCentre}`,
  safeMoves: ({ safeMoves }) => `${safeMoves}`,
});
