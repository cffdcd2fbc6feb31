/** All sheets, by the id of their structure. */
import { INDIAN_SHEETS } from './indian';
import { KINGS_PAWN_SHEETS } from './kings-pawn';
import { QUEENS_PAWN_SHEETS } from './queens-pawn';
import type { StructureSheet } from './sheet';
import { SICILIAN_SHEETS } from './sicilian';

/**
 * The sheets in the order of the table of structures; a test holds that each structure has one. Marked as pure, so that
 * pages which show no sheet do not load them.
 */
export const SHEETS: readonly StructureSheet[] = /* @__PURE__ */ [
  QUEENS_PAWN_SHEETS,
  INDIAN_SHEETS,
  SICILIAN_SHEETS,
  KINGS_PAWN_SHEETS,
].flat();
