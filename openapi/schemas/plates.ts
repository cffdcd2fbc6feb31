/** What a plate can be asked to show. */
import { z } from 'zod';
import { sideSchema, squareSchema } from '../../engine/reading/schema';
import { fenSchema, modeSchema } from './ids';

export const plateLayers = [
  'position',
  'control',
  'command',
  'weak',
  'outposts',
  'files',
  'mobility',
  'routes',
] as const;
export const plateNotes = ['margin', 'numbers', 'none'] as const;
export const plateThemes = ['light', 'dark', 'print'] as const;

/** Bounds of a plate's width, in pixels. */
export const plateWidthMin = 240;
export const plateWidthMax = 2400;

/** The longest caption, in characters: three lines under a plate of common width. */
export const plateCaptionMax = 240;

/** The query of both plate calls. */
const plateQueryShape = {
  fen: fenSchema,
  mode: modeSchema.default('diagram'),
  layer: z.enum(plateLayers).default('command').describe('What is drawn over the board.'),
  width: z.coerce
    .number()
    .int()
    .min(plateWidthMin)
    .max(plateWidthMax)
    .default(720)
    .describe('Width of the whole figure in pixels.'),
  theme: z.enum(plateThemes).default('light'),
  side: sideSchema.default('white').describe('The side at the foot of the board.'),
  man: squareSchema
    .optional()
    .describe(
      'For the layers "mobility" and "routes": the square of the man. Routes without one show the way that helps the side to move most.',
    ),
  post: squareSchema
    .optional()
    .describe('For the layer "routes": where the man is to stand. Left out: the post that helps most.'),
  caption: z
    .string()
    .max(plateCaptionMax)
    .optional()
    .describe('A line of text under the board, instead of the one from the reading.'),
  notes: z
    .enum(plateNotes)
    .default('none')
    .describe(
      'The leading statements: in the margin where there is room, as numbers with a list below, or not at all.',
    ),
};

export const plateQuerySchema = z.strictObject(plateQueryShape);
export type PlateQuery = z.infer<typeof plateQuerySchema>;
