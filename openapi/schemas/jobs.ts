/** Long work: what is asked, and how far it is. */
import { z } from 'zod';
import { momentSchema, uuidSchema } from './page';

/** Most items of one job. */
export const JOB_ITEMS_MAX = 10_000;
const FEN_TEXT_MAX = 200;
/** Most characters of a text to be imported. */
export const IMPORT_TEXT_MAX = 8_000_000;

export const jobRequestSchema = z
  .discriminatedUnion('kind', [
    z.strictObject({
      kind: z.literal('readings'),
      fens: z
        .array(z.string().max(FEN_TEXT_MAX))
        .min(1)
        .max(JOB_ITEMS_MAX)
        .describe('Positions to be read; each reading is kept, so that asking for it later answers at once.'),
    }),
    z.strictObject({
      kind: z.literal('import'),
      study: uuidSchema,
      format: z.enum(['fens', 'pgn']).describe('fens: one a line, a title may follow a tab. pgn: games.'),
      text: z.string().min(1).max(IMPORT_TEXT_MAX),
    }),
    z.strictObject({
      kind: z.literal('recompute'),
      study: uuidSchema.describe('Readings and results of this study that an older engine made are made anew.'),
    }),
  ])
  .meta({ id: 'JobRequest', description: 'Long work to be done.' });
export type JobRequest = z.infer<typeof jobRequestSchema>;

export const jobSchema = z
  .object({
    id: uuidSchema,
    kind: z.string(),
    state: z.enum(['queued', 'running', 'done', 'failed', 'cancelled']),
    total: z.int().min(0).describe('Items in all: positions or games.'),
    done: z.int().min(0),
    failed: z.int().min(0).describe('Items that were refused; each says why.'),
    error: z.string().nullable(),
    createdAt: momentSchema,
    startedAt: momentSchema.nullable(),
    endedAt: momentSchema.nullable(),
  })
  .meta({ id: 'Job', description: 'How far long work is.' });
export type JobAnswer = z.infer<typeof jobSchema>;

export const jobItemSchema = z
  .object({
    number: z.int().min(1).describe('From 1, in the order of the request.'),
    state: z.enum(['queued', 'done', 'failed']),
    output: z.unknown().describe('What was made, or {"error": …} saying why it was refused.'),
  })
  .meta({ id: 'JobItem', description: 'One item of long work.' });

export const jobItemsQuery = z.strictObject({
  limit: z.coerce.number().int().min(1).max(1000).default(100),
  after: z.coerce.number().int().min(0).default(0).describe('The number behind which the page begins.'),
});

export const jobItemsSchema = z
  .object({
    items: z.array(jobItemSchema),
    next: z.int().nullable().describe('"after" of the next page; null at the end.'),
  })
  .meta({ id: 'JobItems', description: 'Items of a job, in order.' });
