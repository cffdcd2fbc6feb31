/** What the API says of itself: its list of addresses, its document, its problems. */
import { z } from 'zod';
import { contract, json } from '../contract';
import { problemCodeSchema } from '../schemas/problem';

const linkSchema = z
  .object({ id: z.string(), method: z.string(), href: z.string(), summary: z.string() })
  .meta({ id: 'Link', description: 'One call of the API.' });

export const getIndex = contract({
  id: 'getIndex',
  method: 'GET',
  path: '/api/v1',
  tag: 'About',
  scope: 'open',
  summary: 'List the calls',
  description: 'A small index: every call with its address, and where the document is.',
  reply: json(
    z.object({
      engine: z.string().describe('Version of the computations.'),
      document: z.string(),
      calls: z.array(linkSchema),
    }),
  ),
  cached: true,
  errors: [],
  example: {},
});

export const getDocument = contract({
  id: 'getDocument',
  method: 'GET',
  path: '/api/v1/openapi.json',
  tag: 'About',
  scope: 'open',
  summary: 'The OpenAPI document',
  description: 'This document, generated from the schemas that check requests and replies.',
  reply: json(
    z.object({ openapi: z.string(), info: z.looseObject({ title: z.string(), version: z.string() }) }).loose(),
  ),
  cached: true,
  errors: [],
  example: {},
});

export const problemKindSchema = z
  .object({ type: z.string(), code: problemCodeSchema, status: z.int(), title: z.string(), fix: z.string() })
  .meta({ id: 'ProblemKind', description: 'A kind of problem, and what to do about it.' });

export const getProblem = contract({
  id: 'getProblem',
  method: 'GET',
  path: '/api/v1/problems/{code}',
  tag: 'About',
  scope: 'open',
  summary: 'Explain a problem',
  description: 'The "type" of every problem is an address of this call.',
  params: z.strictObject({ code: z.string().max(64) }),
  reply: json(problemKindSchema),
  cached: true,
  errors: ['not-found'],
  example: { params: { code: 'fen-refused' } },
});
