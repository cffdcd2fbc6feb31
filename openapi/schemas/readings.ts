/** What the calls that read positions take and answer. */
import { z } from 'zod';
import { faultSchema, readingSchema } from '../../engine/reading/schema';
import { fenSchema, includeSchema, modeSchema, READING_PARTS, type ReadingPart } from './ids';

const everyPart = Object.fromEntries(READING_PARTS.map((part) => [part, true])) as Record<ReadingPart, true>;

/** A reading of which the caller asked for some parts only. */
export const readingPartsSchema = readingSchema
  .partial(everyPart)
  .meta({ id: 'ReadingParts', description: 'A reading with the parts that were asked for.' });

export const readingAnswerSchema = z.union([readingSchema, readingPartsSchema]);

export const readingRequestSchema = z
  .strictObject({ fen: fenSchema, mode: modeSchema.default('strict'), include: includeSchema.optional() })
  .meta({ id: 'ReadingRequest', description: 'One position to read.' });
export type ReadingRequest = z.infer<typeof readingRequestSchema>;

/** The most FENs of one batch. */
export const BATCH_FENS_MAX = 1000;

export const batchRequestSchema = z
  .strictObject({
    fens: z.array(z.string()).min(1).max(BATCH_FENS_MAX).describe('FENs, answered in this order, one a line.'),
    mode: modeSchema.default('strict'),
    include: includeSchema.optional(),
  })
  .meta({ id: 'BatchRequest', description: 'Positions to read.' });
export type BatchRequest = z.infer<typeof batchRequestSchema>;

export const badLineSchema = z
  .object({ error: faultSchema, line: z.int().min(1).describe('The number of the FEN, from 1.') })
  .meta({ id: 'BadLine', description: 'Stands in the place of a reading that could not be made.' });

export const batchLineSchema = z.union([readingSchema, badLineSchema, readingPartsSchema]);
export type BatchLine = z.infer<typeof batchLineSchema>;
