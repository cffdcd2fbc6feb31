/** What comparisons and exchange tests take. */
import { z } from 'zod';
import { squareSchema } from '../../engine/reading/schema';
import { fenSchema, modeSchema } from './ids';

/** Most subjects of one comparison. */
export const SUBJECTS_MAX = 4;
const LABEL_LENGTH_MAX = 80;

export const comparisonRequestSchema = z
  .strictObject({
    subjects: z
      .array(
        z.strictObject({
          fen: fenSchema,
          place: z
            .strictObject({ from: squareSchema, to: squareSchema })
            .optional()
            .describe('One man put elsewhere, whether or not it could move there.'),
          label: z.string().trim().max(LABEL_LENGTH_MAX).optional(),
        }),
      )
      .min(2)
      .max(SUBJECTS_MAX)
      .describe('Positions or placements; the first is the one the others are held against.'),
    mode: modeSchema.default('diagram'),
  })
  .meta({ id: 'ComparisonRequest', description: 'Two to four positions or placements.' });
export type ComparisonRequest = z.infer<typeof comparisonRequestSchema>;

export const exchangesRequestSchema = z
  .strictObject({ fen: fenSchema, mode: modeSchema.default('diagram') })
  .meta({ id: 'ExchangesRequest', description: 'A position whose trades are to be tested.' });
export type ExchangesRequest = z.infer<typeof exchangesRequestSchema>;
