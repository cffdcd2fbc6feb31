/** The public surface of the engine, in reading order. */
export * from './types';
export * from './result';
export {
  type Fault,
  type Faults,
  formatFen,
  type Mode,
  parseFen,
  type Position,
  squareName,
  squareNamed,
} from './board';
export { type HeatCell, heatMap } from './men';
export {
  type Desk,
  ENGINE_VERSION,
  heatMapIn,
  heatMapOf,
  newDesk,
  readFen,
  readPosition,
  readValues,
  type Reading,
  type Statement,
} from './reading';
export { checkRoute, routes } from './routes';
export { encodeCheck, encodeRoutes } from './reading/encode-routes';
export { type ReadingBytes, writeFen } from './reading/write-fen';
export { sheetOf } from './structures';
export { encodeSheet, encodeSheets } from './reading/encode-sheets';
