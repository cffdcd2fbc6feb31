export { BOOKS } from './books';
export { type SheetSide, sheetSides } from './sides';
export { LEVER_FAULTS, LEVER_STATES } from './sheet-lever';
export { POST_STATES, sheetOf, type SheetSideValue, type SheetValue, TRADE_STATES } from './sheet-of';
export { SHEETS } from './table';
