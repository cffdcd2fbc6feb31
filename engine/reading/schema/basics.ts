/** Words that every schema of the engine's answers uses. Squares are names at this border. */
import { z } from 'zod';
import { FILES, KINDS, RANKS, SIDES, type SquareName } from '../../types';

const SQUARE_NAMES = RANKS.flatMap((rank) => FILES.map((file): SquareName => `${file}${rank}`));

export const squareSchema = z
  .enum(SQUARE_NAMES)
  .meta({ id: 'Square', description: 'A square by its name, "a1" to "h8".' });
export const sideSchema = z.enum(SIDES).meta({ id: 'Side', description: 'A side.' });
export const kindSchema = z.enum(KINDS).meta({ id: 'Kind', description: 'A kind of man.' });
export const fileSchema = z.enum(FILES).meta({ id: 'File', description: 'A file by its letter.' });
export const colourSchema = z.enum(['light', 'dark']).meta({ id: 'Colour', description: 'A colour of squares.' });

export const squaresSchema = z.array(squareSchema);
export const squaresBySideSchema = z.object({ white: squaresSchema, black: squaresSchema });

export const faultSchema = z
  .object({
    code: z.string().describe('Stable code of the fault, e.g. "rank-length".'),
    field: z
      .enum(['board', 'side', 'castling', 'enPassant', 'halfmove', 'fullmove', 'text'])
      .describe('The FEN field at fault; "text" when the fields cannot be told apart.'),
    message: z.string().describe('What is wrong, in a sentence.'),
    square: squareSchema.optional().describe('The square at fault, where there is one.'),
  })
  .meta({ id: 'Fault', description: 'Why a position was refused, or what a diagram lacks.' });

export type Fault = z.infer<typeof faultSchema>;
