/** A study taken along: PGN, CSV, JSON. */
import { z } from 'zod';
import { contract, json } from '../contract';
import { EXAMPLE_IDS } from '../schemas/examples';
import { idParams } from '../schemas/page';
import { resultSchema } from '../schemas/results';
import { positionSchema, studySchema } from '../schemas/studies';

const common = {
  method: 'GET',
  tag: 'Studies',
  scope: 'studies:read',
  params: idParams,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_IDS.study } },
} as const;

export const exportStudyPgn = contract({
  ...common,
  id: 'exportStudyPgn',
  path: '/api/v1/studies/{id}/export.pgn',
  summary: 'Export a study as PGN',
  description:
    'Each position is a game without moves that begins there, its note a comment; then the games of the study.',
  reply: { form: 'text', media: 'application/vnd.chess-pgn' },
});

export const exportStudyCsv = contract({
  ...common,
  id: 'exportStudyCsv',
  path: '/api/v1/studies/{id}/export.csv',
  summary: 'Export the positions of a study as CSV',
  description: 'One line a position: place, title, FEN, layer, man, note (RFC 4180).',
  reply: { form: 'text', media: 'text/csv' },
});

export const studyExportSchema = z
  .object({
    study: studySchema,
    positions: z.array(positionSchema),
    results: z.array(resultSchema),
    games: z.array(z.string()),
  })
  .meta({ id: 'StudyExport', description: 'Everything in a study; games as PGN.' });

export const exportStudyJson = contract({
  ...common,
  id: 'exportStudyJson',
  path: '/api/v1/studies/{id}/export.json',
  summary: 'Export a study as JSON',
  description: 'Everything in a study, as the other calls answer it.',
  reply: json(studyExportSchema),
});
