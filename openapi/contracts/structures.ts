/** Structure sheets: all, one, and what of it holds in a position. */
import { z } from 'zod';
import { sheetAnswerSchema, structureSheetSchema, structuresAnswerSchema } from '../../engine/reading/schema/sheets';
import { contract, json } from '../contract';
import { EXAMPLE_FEN } from '../schemas/examples';
import { fenSchema, modeSchema } from '../schemas/ids';

/** No id of a structure is longer. */
const ID_LENGTH_MAX = 64;

export const listStructures = contract({
  id: 'listStructures',
  method: 'GET',
  path: '/api/v1/structures',
  tag: 'Structures',
  scope: 'compute',
  summary: 'List the structure sheets',
  description:
    'Handbook knowledge about every named pawn structure: key squares, usual posts, levers, trades and plans of both sides.',
  reply: json(structuresAnswerSchema, 'sampled'),
  cached: true,
  errors: [],
  example: {},
});

export const getStructure = contract({
  id: 'getStructure',
  method: 'GET',
  path: '/api/v1/structures/{id}',
  tag: 'Structures',
  scope: 'compute',
  summary: 'Read a structure sheet',
  description: 'The sheet of one structure, in the colours as the books draw it.',
  params: z.strictObject({ id: z.string().max(ID_LENGTH_MAX) }),
  reply: json(structureSheetSchema),
  cached: true,
  errors: ['not-found'],
  example: { params: { id: 'carlsbad' } },
});

export const getSheet = contract({
  id: 'getSheet',
  method: 'GET',
  path: '/api/v1/sheets',
  tag: 'Structures',
  scope: 'compute',
  summary: 'Hold a structure sheet against a position',
  description:
    'Names the position’s structure and says of each key square, post, lever and trade of its sheet whether it is to be had. The sheet is null where the pawns have no name.',
  query: z.strictObject({ fen: fenSchema, mode: modeSchema.default('strict') }),
  reply: json(sheetAnswerSchema, 'sampled'),
  cached: true,
  errors: ['fen-refused'],
  example: { query: { fen: EXAMPLE_FEN } },
});
