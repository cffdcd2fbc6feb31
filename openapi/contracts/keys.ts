/** Keys of a workspace, for its owners. */
import { contract, json, NOTHING } from '../contract';
import { keyListSchema, keyRequestSchema, newKeySchema, usageQuerySchema, usageSchema } from '../schemas/keys';
import { EXAMPLE_IDS } from '../schemas/examples';
import { idParams } from '../schemas/page';

export const listKeys = contract({
  id: 'listKeys',
  method: 'GET',
  path: '/api/v1/keys',
  tag: 'Keys',
  scope: 'workspace',
  summary: 'List the keys',
  description: 'All keys of the workspace, the newest first, those that are ended or expired too.',
  reply: json(keyListSchema),
  errors: [],
  example: {},
});

export const createKey = contract({
  id: 'createKey',
  method: 'POST',
  path: '/api/v1/keys',
  tag: 'Keys',
  scope: 'workspace',
  summary: 'Make a key',
  description: 'Makes a key with some scopes and an end. Its secret is in this answer and nowhere else.',
  body: { schema: keyRequestSchema, bytesMax: 4096 },
  reply: json(newKeySchema),
  status: 201,
  errors: [],
  example: { body: { name: 'The magazine’s figures', scopes: ['compute'], days: 30 } },
});

export const revokeKey = contract({
  id: 'revokeKey',
  method: 'DELETE',
  path: '/api/v1/keys/{id}',
  tag: 'Keys',
  scope: 'workspace',
  summary: 'End a key',
  description: 'Ends a key at once and for good. A key that is ended already stays so.',
  params: idParams,
  reply: NOTHING,
  status: 204,
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_IDS.key } },
});

export const getUsage = contract({
  id: 'getUsage',
  method: 'GET',
  path: '/api/v1/usage',
  tag: 'Keys',
  scope: 'workspace',
  summary: 'See what the keys have used',
  description: 'Counts of calls by key, day and call.',
  query: usageQuerySchema,
  reply: json(usageSchema),
  errors: [],
  example: { query: { days: '7' } },
});
