export { type Book, BOOKS } from './books';
export type { StructureSheet } from './sheet';
export { type SheetSide, type SheetTrade, sheetSides } from './sides';
export { LEVER_FAULTS, LEVER_STATES, type LeverValue } from './sheet-lever';
export {
  type KeySquareValue,
  POST_STATES,
  type PostValue,
  sheetOf,
  type SheetSideValue,
  type SheetValue,
  TRADE_STATES,
  type TradeValue,
} from './sheet-of';
export { SHEETS } from './table';
