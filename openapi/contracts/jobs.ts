/** Long work: begun, watched, cancelled, tried again. */
import { z } from 'zod';
import { contract, events, json } from '../contract';
import { EXAMPLE_ENDING, EXAMPLE_FEN, EXAMPLE_IDS } from '../schemas/examples';
import { IMPORT_TEXT_MAX, jobItemsQuery, jobItemsSchema, jobRequestSchema, jobSchema } from '../schemas/jobs';
import { idParams, pageQuery, pageSchema } from '../schemas/page';

const tag = 'Jobs';
const params = { id: EXAMPLE_IDS.job };

export const listJobs = contract({
  id: 'listJobs',
  method: 'GET',
  path: '/api/v1/jobs',
  tag,
  scope: 'studies:write',
  summary: 'List jobs',
  description: 'The jobs of the workspace, the newest first.',
  query: z.strictObject(pageQuery),
  reply: json(pageSchema(jobSchema, 'JobPage')),
  listed: true,
  errors: [],
  example: { query: { limit: '10' } },
});

export const createJob = contract({
  id: 'createJob',
  method: 'POST',
  path: '/api/v1/jobs',
  tag,
  scope: 'studies:write',
  summary: 'Begin long work',
  description:
    'Up to ten thousand positions to be read, a list of FENs or a PGN to be imported into a study, or a study to be computed anew by the present engine. It goes on when the caller goes away, and after a crash.',
  body: { schema: jobRequestSchema, bytesMax: IMPORT_TEXT_MAX * 2 },
  reply: json(jobSchema),
  status: 202,
  stores: true,
  errors: ['not-found'],
  example: { body: { kind: 'readings', fens: [EXAMPLE_FEN, EXAMPLE_ENDING] } },
});

export const getJob = contract({
  id: 'getJob',
  method: 'GET',
  path: '/api/v1/jobs/{id}',
  tag,
  scope: 'studies:write',
  summary: 'See how far a job is',
  description: 'Counts of items done and refused.',
  params: idParams,
  reply: json(jobSchema),
  errors: ['not-found'],
  example: { params },
});

export const watchJob = contract({
  id: 'watchJob',
  method: 'GET',
  path: '/api/v1/jobs/{id}/events',
  tag,
  scope: 'studies:write',
  summary: 'Watch a job',
  description: 'Server-sent events: the job at once, at each change, and when it has ended; then the stream ends.',
  params: idParams,
  reply: events(jobSchema),
  errors: ['not-found'],
  example: { params },
});

export const listJobItems = contract({
  id: 'listJobItems',
  method: 'GET',
  path: '/api/v1/jobs/{id}/items',
  tag,
  scope: 'studies:write',
  summary: 'Read what became of the items',
  description: 'Each item in the order of the request: what was made of it, or why it was refused.',
  params: idParams,
  query: jobItemsQuery,
  reply: json(jobItemsSchema),
  errors: ['not-found'],
  example: { params, query: { limit: '10' } },
});

export const cancelJob = contract({
  id: 'cancelJob',
  method: 'DELETE',
  path: '/api/v1/jobs/{id}',
  tag,
  scope: 'studies:write',
  summary: 'Cancel a job',
  description: 'Ends a job; what is done stays done. One that has ended stays as it is.',
  params: idParams,
  reply: json(jobSchema),
  errors: ['not-found'],
  example: { params },
});

export const retryJob = contract({
  id: 'retryJob',
  method: 'POST',
  path: '/api/v1/jobs/{id}/retry',
  tag,
  scope: 'studies:write',
  summary: 'Try a job again',
  description: 'Puts a job that failed, was cancelled, or has refused items back into the queue. Done items stay done.',
  params: idParams,
  reply: json(jobSchema),
  errors: ['not-found', 'conflict'],
  example: { params },
});
