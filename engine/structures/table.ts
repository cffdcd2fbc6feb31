/** The table of named structures: models by family, and the same prepared for both assignments of colours. */
import { type PreparedStructure, prepared, type StructureModel } from './model';
import { INDIAN } from './tables/indian';
import { KINGS_PAWN } from './tables/kings-pawn';
import { QUEENS_PAWN } from './tables/queens-pawn';
import { SICILIAN } from './tables/sicilian';

/** All models; where two fit a position equally well, the earlier names it. */
export const STRUCTURES: readonly StructureModel[] = [...QUEENS_PAWN, ...INDIAN, ...SICILIAN, ...KINGS_PAWN];

export const PREPARED: readonly PreparedStructure[] = STRUCTURES.flatMap(prepared);
