/** Studies and what is in them: positions, results, games, history, sharing. */
import { z } from 'zod';
import { squareSchema } from '../../engine/reading/schema';
import { fenSchema } from './ids';
import { plateLayers } from './plates';
import { momentSchema, pageQuery, uuidSchema, versionSchema } from './page';

export const TITLE_LENGTH_MAX = 200;
export const SUMMARY_LENGTH_MAX = 2000;
export const NOTE_LENGTH_MAX = 20_000;
export const MARKS_MAX = 64;
/** Most positions of one study. */
export const STUDY_POSITIONS_MAX = 10_000;

const titleSchema = z.string().trim().min(1).max(TITLE_LENGTH_MAX);
const noteSchema = z.string().max(NOTE_LENGTH_MAX).describe('Markdown.');

export const studyRequestSchema = z
  .strictObject({ title: titleSchema, summary: z.string().max(SUMMARY_LENGTH_MAX).default('') })
  .meta({ id: 'StudyRequest', description: 'A study to be made.' });
export type StudyRequest = z.infer<typeof studyRequestSchema>;

export const studyChangeSchema = z
  .strictObject({ title: titleSchema.optional(), summary: z.string().max(SUMMARY_LENGTH_MAX).optional() })
  .meta({ id: 'StudyChange', description: 'The fields that change; the others stay.' });
export type StudyChange = z.infer<typeof studyChangeSchema>;

export const studySchema = z
  .object({
    id: uuidSchema,
    title: z.string(),
    summary: z.string(),
    positions: z.int().min(0).describe('How many positions it has.'),
    version: versionSchema,
    createdAt: momentSchema,
    updatedAt: momentSchema,
    deletedAt: momentSchema.nullable().describe('Set: in the trash.'),
  })
  .meta({ id: 'Study', description: 'A folder of positions, games and results on one subject.' });
export type StudyAnswer = z.infer<typeof studySchema>;

export const studyListQuery = z.strictObject({
  ...pageQuery,
  trash: z
    .enum(['true', 'false'])
    .default('false')
    .describe('true: those in the trash, from where they can be restored.'),
});

export const markSchema = z
  .strictObject({
    square: squareSchema,
    to: squareSchema.optional().describe('Given: a trail from the square to this one; else a ring on the square.'),
    text: z.string().max(80).optional(),
  })
  .meta({ id: 'Mark', description: 'Something a person marks on a plate.' });

const layerSchema = z.enum(plateLayers).nullable().describe('The layer its plate shows; null: the reader’s choice.');

const positionFields = {
  fen: fenSchema,
  title: z.string().trim().max(TITLE_LENGTH_MAX).default(''),
  note: noteSchema.default(''),
  marks: z.array(markSchema).max(MARKS_MAX).default([]),
  layer: layerSchema.default(null),
  man: squareSchema.nullable().default(null).describe('The man whose layer is shown.'),
};

export const positionRequestSchema = z
  .strictObject({
    ...positionFields,
    after: uuidSchema
      .nullable()
      .optional()
      .describe('The position it is put behind; null: at the beginning; left out: at the end.'),
  })
  .meta({ id: 'PositionRequest', description: 'A position to be kept in a study.' });
export type PositionRequest = z.infer<typeof positionRequestSchema>;

export const positionChangeSchema = z
  .strictObject({
    fen: fenSchema.optional(),
    title: z.string().trim().max(TITLE_LENGTH_MAX).optional(),
    note: noteSchema.optional(),
    marks: z.array(markSchema).max(MARKS_MAX).optional(),
    layer: layerSchema.optional(),
    man: squareSchema.nullable().optional(),
    after: uuidSchema.nullable().optional(),
  })
  .meta({ id: 'PositionChange', description: 'The fields that change; the others stay.' });
export type PositionChange = z.infer<typeof positionChangeSchema>;

export const positionSchema = z
  .object({
    id: uuidSchema,
    fen: z.string(),
    title: z.string(),
    note: z.string(),
    marks: z.array(markSchema),
    layer: layerSchema,
    man: squareSchema.nullable(),
    version: versionSchema,
    createdAt: momentSchema,
    updatedAt: momentSchema,
  })
  .meta({ id: 'StudyPosition', description: 'A position in a study.' });
export type PositionAnswer = z.infer<typeof positionSchema>;

export const changeSchema = z
  .object({
    id: uuidSchema,
    entity: z.enum(['study', 'position', 'result', 'game']),
    entityId: uuidSchema,
    version: versionSchema,
    kind: z.enum(['create', 'update', 'delete', 'restore']),
    at: momentSchema,
    by: z.string().nullable().describe('The name of the person or key; null: gone.'),
    before: z.record(z.string(), z.unknown()).nullable(),
    after: z.record(z.string(), z.unknown()).nullable(),
  })
  .meta({ id: 'Change', description: 'What was changed in a study, by whom and when.' });

export const restoreRequestSchema = z
  .strictObject({
    version: versionSchema.optional().describe('The version to go back to; left out: out of the trash as it was.'),
  })
  .meta({ id: 'RestoreRequest', description: 'What to restore.' });

export const sharesSchema = z
  .strictObject({ students: z.array(uuidSchema).max(500).describe('Ids of the students who may read the study.') })
  .meta({ id: 'Shares', description: 'With whom a study is shared.' });

export const positionParams = z.strictObject({ id: uuidSchema, positionId: uuidSchema });
export type ChangeAnswer = z.infer<typeof changeSchema>;
