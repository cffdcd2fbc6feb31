/** Results kept in a study: what was asked and what came out. */
import { z } from 'zod';
import { momentSchema, uuidSchema, versionSchema } from './page';
import { NOTE_LENGTH_MAX, TITLE_LENGTH_MAX } from './studies';

export const RESULT_KINDS = ['comparison', 'route', 'exchange'] as const;
export type ResultKind = (typeof RESULT_KINDS)[number];

const words = {
  title: z.string().trim().max(TITLE_LENGTH_MAX).default(''),
  note: z.string().max(NOTE_LENGTH_MAX).default('').describe('Markdown.'),
};

/** The request of a computing call, kept with its result. */
export function resultRequestSchema<S extends z.ZodType>(request: S, id: string) {
  return z
    .strictObject({ ...words, request: request.describe('The request of the computing call; its answer is kept.') })
    .meta({ id, description: 'Something to be computed and kept.' });
}

export const resultChangeSchema = z
  .strictObject({ title: words.title.optional(), note: words.note.optional() })
  .meta({ id: 'ResultChange', description: 'The words that change; request and result stay.' });
export type ResultChange = z.infer<typeof resultChangeSchema>;

export const resultSchema = z
  .object({
    id: uuidSchema,
    kind: z.enum(RESULT_KINDS),
    title: z.string(),
    note: z.string(),
    request: z.unknown().describe('As it was sent.'),
    result: z.unknown().describe('As it was answered.'),
    engine: z.string().describe('The version that computed it.'),
    current: z.boolean().describe('Whether that is the present version.'),
    version: versionSchema,
    computedAt: momentSchema,
    createdAt: momentSchema,
    updatedAt: momentSchema,
  })
  .meta({ id: 'StudyResult', description: 'A comparison, route or exchange test kept in a study.' });
export type ResultAnswer = z.infer<typeof resultSchema>;

export const resultListSchema = z
  .object({ items: z.array(resultSchema) })
  .meta({ id: 'StudyResults', description: 'All results of a kind.' });

export const resultParams = z.strictObject({ id: uuidSchema, resultId: uuidSchema });
