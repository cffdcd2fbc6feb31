/** Men, kings, files, diagonals and totals as JSON on a page. */
import type { DiagonalValue, FileValue } from '../files';
import type { Duty, KingValue, ManValue } from '../men';
import type { SquareTotals } from '../squares';
import type { Reading } from './schema';
import {
  objectWriter,
  putFile,
  putFlag,
  putList,
  putMask,
  putNumber,
  putSides,
  putSquare,
  putSquares,
  putText,
  putTexts,
  type Write,
} from './page';

/** The row of a side's own men, or of the enemy's, in a map's list of squares. */
const rowOf = (side: 'white' | 'black') => (side === 'white' ? 0 : 32);

const dutyJson = objectWriter<Duty, Reading['men'][number]['duties'][number]>({
  square: (page, { square }) => putSquare(page, square),
  loses: (page, { loses }) => putNumber(page, loses),
  by: (page, { by }) => putText(page, by),
});

/** A man. */
export const manJson = objectWriter<ManValue, Reading['men'][number]>({
  square: (page, { square }) => putSquare(page, square),
  side: (page, { side }) => putText(page, side),
  kind: (page, { kind }) => putText(page, kind),
  moves: (page, { moves }, map) => putSquares(page, moves, map),
  safeMoves: (page, { safeMoves }, map) => putSquares(page, safeMoves, map),
  sees: (page, { sees }) => putNumber(page, sees),
  seesAhead: (page, { seesAhead }) => putNumber(page, seesAhead),
  pinned: (page, { pinned }) => putFlag(page, pinned),
  enPrise: (page, { enPrise }) => putNumber(page, enPrise),
  attackers: (page, { side, attackers }, map) => putMask(page, map, rowOf(side) ^ 32, attackers),
  defenders: (page, { side, defenders }, map) => putMask(page, map, rowOf(side), defenders),
  duties: (page, { duties }, map) => putList(page, duties, map, dutyJson),
  trapped: (page, { trapped }) => putFlag(page, trapped),
  notes: (page, { notes }) => putTexts(page, notes),
});

const targetJson = objectWriter<FileValue['targets'][number], Reading['files'][number]['targets'][number]>({
  square: (page, { square }) => putSquare(page, square),
  side: (page, { side }) => putText(page, side),
});

/** A file. */
export const fileJson = objectWriter<FileValue, Reading['files'][number]>({
  file: (page, { file }, map) => putFile(page, file, map),
  status: (page, { status }) => putText(page, status),
  halfOpenFor: (page, { halfOpenFor }) => putText(page, halfOpenFor),
  heavy: (page, { heavy }, map) => putSides(page, heavy, map, putSquares),
  control: (page, { control }) => putText(page, control),
  entries: (page, { entries }, map) => putSides(page, entries, map, putSquares),
  targets: (page, { targets }, map) => putList(page, targets, map, targetJson),
});

/** A diagonal. */
export const diagonalJson = objectWriter<DiagonalValue, Reading['diagonals'][number]>({
  from: (page, { from }) => putSquare(page, from),
  direction: (page, { direction }) => putText(page, direction),
  squares: (page, { squares }, map) => putSquares(page, squares, map),
  stoppedBy: (page, { stoppedBy }) => putSquare(page, stoppedBy),
  stopperFixed: (page, { stopperFixed }) => putFlag(page, stopperFixed),
});

type King = NonNullable<Reading['kings']['white']>;

const shelterJson = objectWriter<KingValue['shelter'][number], King['shelter'][number]>({
  file: (page, { file }, map) => putFile(page, file, map),
  pawn: (page, { pawn }) => putSquare(page, pawn),
  advanced: (page, { advanced }) => putNumber(page, advanced),
});

const moveJson = objectWriter<KingValue['luftMoves'][number], King['luftMoves'][number]>({
  from: (page, { from }) => putSquare(page, from),
  to: (page, { to }) => putSquare(page, to),
});

const presentKing = objectWriter<KingValue, King>({
  square: (page, { square }) => putSquare(page, square),
  shelter: (page, { shelter }, map) => putList(page, shelter, map, shelterJson),
  openBeside: (page, { openBeside }, map) => putList(page, openBeside, map, putFile),
  reachedBy: (page, { reachedBy }, map) => putSquares(page, reachedBy, map),
  guardedBy: (page, { guardedBy }, map) => putSquares(page, guardedBy, map),
  flights: (page, { flights }, map) => putSquares(page, flights, map),
  luft: (page, { luft }, map) => putSquares(page, luft, map),
  luftMoves: (page, { luftMoves }, map) => putList(page, luftMoves, map, moveJson),
  weakBackRank: (page, { weakBackRank }) => putFlag(page, weakBackRank),
});

/** A king, null where a diagram has none. */
export const kingJson: Write<KingValue | null> = (page, king, map) =>
  king ? presentKing(page, king, map) : putText(page, null);

/** The counts of a side. */
export const totalsJson = objectWriter<SquareTotals, Reading['totals']['white']>({
  controlled: (page, { controlled }) => putNumber(page, controlled),
  commanded: (page, { commanded }) => putNumber(page, commanded),
  enemyHalf: (page, { enemyHalf }) => putNumber(page, enemyHalf),
  centre: (page, { centre }) => putNumber(page, centre),
  extendedCentre: (page, { extendedCentre }) => putNumber(page, extendedCentre),
  safeMoves: (page, { safeMoves }) => putNumber(page, safeMoves),
});
