/**
 * Naming a structure: the model that fits the pawns best, for either assignment of colours.
 *
 * The core of a model must stand and its bare files be bare. Then the pawns that differ are counted: usual pawns
 * that are not on their place, and pawns of a side beyond the number of the model. Up to DIFFERS_MAX the
 * name holds. Of several, the one with the most telling core less its differences is taken, then the one that
 * differs least, then the one led by the side to move, then the first in the table.
 */
import type { Position } from '../board';
import type { Side } from '../types';
import type { PawnWords, PreparedStructure, SideDemands, StructureModel } from './model';
import { PREPARED } from './table';

/** Pawns that may differ from a model before it loses its name. Picked by eye on positions of real games. */
export const DIFFERS_MAX = 2;

export interface StructureMatch {
  readonly id: string;
  readonly name: string;
  /** The side that has the leading part; in a structure that is alike for both, the side to move. */
  readonly side: Side;
  /** Pawns that differ from the model, 0 to DIFFERS_MAX. */
  readonly differs: number;
  /** The colours are exchanged against the model as the books draw it. */
  readonly reversed: boolean;
  readonly model: StructureModel;
}

/** The named structure of a position, or null where no model fits. */
export function nameStructure(position: Position): StructureMatch | null {
  readWords(position);
  let best: PreparedStructure | undefined;
  let bestDiffers = 0;
  for (const structure of PREPARED) {
    if (!standsOn(structure.white, white) || !standsOn(structure.black, black)) continue;
    const differs = differences(structure.white, white, whiteMen) + differences(structure.black, black, blackMen);
    if (differs > DIFFERS_MAX) continue;
    if (best === undefined || isBetter(structure, differs, best, bestDiffers, position.sideToMove)) {
      best = structure;
      bestDiffers = differs;
    }
  }
  if (best === undefined) return null;
  const { model, symmetric, reversed } = best;
  const side = symmetric ? position.sideToMove : best.leader;
  // A structure that is alike for both is seen from the side to move.
  const turned = symmetric ? side === 'black' : reversed;
  return { id: model.id, name: model.name, side, differs: bestDiffers, reversed: turned, model };
}

function isBetter(
  a: PreparedStructure,
  aDiffers: number,
  b: PreparedStructure,
  bDiffers: number,
  toMove: Side,
): boolean {
  const fit = a.specificity - aDiffers - (b.specificity - bDiffers);
  if (fit !== 0) return fit > 0;
  if (aDiffers !== bDiffers) return aDiffers < bDiffers;
  return a.model === b.model && a.leader === toMove && b.leader !== toMove;
}

/** The pawns of the position being named. Scratch, filled by `readWords`. */
const white: PawnWords = { low: 0, high: 0 };
const black: PawnWords = { low: 0, high: 0 };
let whiteMen = 0;
let blackMen = 0;

function readWords({ board }: Position): void {
  white.low = white.high = black.low = black.high = whiteMen = blackMen = 0;
  for (let square = 0; square < 64; square++) {
    const code = board[square] as number;
    if ((code & 7) !== 1) continue;
    const words = code >> 3 ? black : white;
    if (code >> 3) blackMen++;
    else whiteMen++;
    if (square < 32) words.low |= 1 << square;
    else words.high |= 1 << (square - 32);
  }
}

function standsOn(side: SideDemands, pawns: PawnWords): boolean {
  const { core, bare } = side;
  if ((pawns.low & core.low) !== core.low || (pawns.high & core.high) !== core.high) return false;
  if (((pawns.low & bare.low) | (pawns.high & bare.high)) !== 0) return false;
  for (const choice of side.either) if (!meets(choice, pawns)) return false;
  return true;
}

function differences(side: SideDemands, pawns: PawnWords, men: number): number {
  let differs = men > side.men ? men - side.men : 0;
  for (const choice of side.usual) if (!meets(choice, pawns)) differs++;
  return differs;
}

function meets(choice: PawnWords, pawns: PawnWords): boolean {
  return ((choice.low & pawns.low) | (choice.high & pawns.high)) !== 0;
}
