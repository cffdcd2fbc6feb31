/** Small values that several calls take: a FEN, a mode, the parts of a reading. */
import { z } from 'zod';
import { FEN_LENGTH_MAX } from '../../engine/board';

export const fenSchema = z
  .string()
  .max(FEN_LENGTH_MAX)
  .meta({ id: 'Fen', description: 'A position in Forsyth-Edwards notation, with six fields or, as in EPD, four.' });

export const MODES = ['strict', 'diagram'] as const;
export type Mode = (typeof MODES)[number];
export const modeSchema = z.enum(MODES).meta({
  id: 'Mode',
  description: 'strict: legal positions only. diagram: also what teachers draw, the faults answered as warnings.',
});

/** The parts of a reading that a caller may pick. */
export const READING_PARTS = [
  'squares',
  'men',
  'pawns',
  'weakSquares',
  'outposts',
  'files',
  'diagonals',
  'colourComplexes',
  'kings',
  'totals',
  'statements',
  'lead',
] as const;
export type ReadingPart = (typeof READING_PARTS)[number];

export const readingPartSchema = z.enum(READING_PARTS).meta({ id: 'ReadingPart', description: 'A part of a reading.' });

export const includeSchema = z
  .array(readingPartSchema)
  .min(1)
  .max(READING_PARTS.length)
  .describe('Only these parts, beside the position itself. Left out: the whole reading.');
