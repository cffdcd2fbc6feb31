/** Reading one position, by POST or by an address that caches may keep. */
import { z } from 'zod';
import { contract, json } from '../contract';
import { EXAMPLE_FEN } from '../schemas/examples';
import { fenSchema, includeSchema, modeSchema } from '../schemas/ids';
import { readingAnswerSchema, readingRequestSchema } from '../schemas/readings';

/*
 * Replies are checked by sampling in production: a reading is made by the engine alone, from the FEN alone, so
 * nothing private can slip into it, and a full check costs as much as a third of the computing. Tests check each.
 */
const reading = json(readingAnswerSchema, 'sampled');

export const createReading = contract({
  id: 'createReading',
  method: 'POST',
  path: '/api/v1/readings',
  tag: 'Readings',
  scope: 'compute',
  summary: 'Read a position',
  description:
    'Computes the reading of one position: every square, every man, pawns, weak squares, outposts, files, kings, and what follows from them in sentences.',
  body: { schema: readingRequestSchema, bytesMax: 4096 },
  reply: reading,
  errors: ['fen-refused'],
  example: { body: { fen: EXAMPLE_FEN, include: ['statements', 'lead'] } },
});

export const getReading = contract({
  id: 'getReading',
  method: 'GET',
  path: '/api/v1/readings',
  tag: 'Readings',
  scope: 'compute',
  summary: 'Read a position, cacheable',
  description: 'The same reading at an address of its own, with a strong ETag: it changes only when the engine does.',
  query: z.strictObject({ fen: fenSchema, mode: modeSchema.default('strict'), include: includeSchema.optional() }),
  reply: reading,
  cached: true,
  errors: ['fen-refused'],
  example: { query: { fen: EXAMPLE_FEN, include: 'statements,lead' } },
});
