/** One sentence of a reading, with the facts it says. */
import { z } from 'zod';
import { THEMES } from '../../types';
import { sideSchema, squaresSchema } from './basics';

export const statementSchema = z
  .object({
    key: z.string().describe('Unique in the reading.'),
    id: z.string().describe('The template.'),
    theme: z.enum(THEMES),
    side: sideSchema.nullable().describe('The side it speaks of; null for both.'),
    weight: z.number().describe('Orders the statements; nothing else.'),
    head: z.string().describe('The claim alone: always the beginning of the text.'),
    text: z.string().describe('The whole sentence or sentences.'),
    squares: squaresSchema,
    men: squaresSchema,
    facts: z.record(z.string(), z.unknown()).describe('What the text says, as data.'),
  })
  .meta({ id: 'Statement', description: 'One sentence of a reading.' });

export type Statement = z.infer<typeof statementSchema>;
