/** Positions in a study. */
import { z } from 'zod';
import { contract, json, NOTHING } from '../contract';
import { EXAMPLE_FEN, EXAMPLE_IDS } from '../schemas/examples';
import { idParams } from '../schemas/page';
import {
  positionChangeSchema,
  positionParams,
  positionRequestSchema,
  positionSchema,
  restoreRequestSchema,
} from '../schemas/studies';

const tag = 'Studies';
const params = { id: EXAMPLE_IDS.study, positionId: EXAMPLE_IDS.position };
const bytesMax = 131_072;

export const listPositions = contract({
  id: 'listPositions',
  method: 'GET',
  path: '/api/v1/studies/{id}/positions',
  tag,
  scope: 'studies:read',
  summary: 'List the positions of a study',
  description: 'All positions of a study in their order.',
  params: idParams,
  reply: json(z.object({ items: z.array(positionSchema) }).meta({ id: 'PositionList' })),
  errors: ['not-found'],
  example: { params: { id: EXAMPLE_IDS.study } },
});

export const createPosition = contract({
  id: 'createPosition',
  method: 'POST',
  path: '/api/v1/studies/{id}/positions',
  tag,
  scope: 'studies:write',
  summary: 'Keep a position in a study',
  description: 'Keeps a position with its title, note, marks and chosen layer. Diagrams without kings are taken too.',
  params: idParams,
  body: { schema: positionRequestSchema, bytesMax },
  reply: json(positionSchema),
  status: 201,
  stores: true,
  errors: ['not-found', 'fen-refused', 'conflict'],
  example: {
    params: { id: EXAMPLE_IDS.study },
    body: { fen: EXAMPLE_FEN, title: 'Before the minority attack', note: 'Where does the a1 rook belong?' },
  },
});

export const getPosition = contract({
  id: 'getPosition',
  method: 'GET',
  path: '/api/v1/studies/{id}/positions/{positionId}',
  tag,
  scope: 'studies:read',
  summary: 'Read a position of a study',
  description: 'A position with its version, which the ETag names.',
  params: positionParams,
  reply: json(positionSchema),
  cached: true,
  errors: ['not-found'],
  example: { params },
});

export const changePosition = contract({
  id: 'changePosition',
  method: 'PATCH',
  path: '/api/v1/studies/{id}/positions/{positionId}',
  tag,
  scope: 'studies:write',
  summary: 'Change a position of a study',
  description: 'Changes the fields that are given: board, words, marks, layer, place.',
  params: positionParams,
  body: { schema: positionChangeSchema, bytesMax },
  reply: json(positionSchema),
  guarded: true,
  errors: ['not-found', 'fen-refused'],
  example: { params, body: { note: 'It belongs on b1, behind the lever b4-b5.' } },
});

export const deletePosition = contract({
  id: 'deletePosition',
  method: 'DELETE',
  path: '/api/v1/studies/{id}/positions/{positionId}',
  tag,
  scope: 'studies:write',
  summary: 'Put a position into the trash',
  description: 'It can be restored for thirty days.',
  params: positionParams,
  reply: NOTHING,
  status: 204,
  guarded: true,
  errors: ['not-found'],
  example: { params },
});

export const restorePosition = contract({
  id: 'restorePosition',
  method: 'POST',
  path: '/api/v1/studies/{id}/positions/{positionId}/restore',
  tag,
  scope: 'studies:write',
  summary: 'Restore a position',
  description: 'Takes a position out of the trash, or back to what it was at a version of its history.',
  params: positionParams,
  body: { schema: restoreRequestSchema, bytesMax: 1024 },
  reply: json(positionSchema),
  errors: ['not-found'],
  example: { params, body: {} },
});
