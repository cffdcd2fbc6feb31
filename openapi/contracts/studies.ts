/** Studies as folders: list, make, read, change, trash, restore, history, sharing. */
import { contract, json, NOTHING } from '../contract';
import { EXAMPLE_IDS } from '../schemas/examples';
import { idParams, pageQuery, pageSchema } from '../schemas/page';
import {
  changeSchema,
  sharesSchema,
  studyChangeSchema,
  studyListQuery,
  studyRequestSchema,
  studySchema,
} from '../schemas/studies';
import { z } from 'zod';

const tag = 'Studies';
const params = { id: EXAMPLE_IDS.study };

export const listStudies = contract({
  id: 'listStudies',
  method: 'GET',
  path: '/api/v1/studies',
  tag,
  scope: 'studies:read',
  summary: 'List studies',
  description: 'The studies that the caller may read, the last changed first.',
  query: studyListQuery,
  reply: json(pageSchema(studySchema, 'StudyPage')),
  listed: true,
  errors: [],
  example: { query: { limit: '10' } },
});

export const createStudy = contract({
  id: 'createStudy',
  method: 'POST',
  path: '/api/v1/studies',
  tag,
  scope: 'studies:write',
  summary: 'Make a study',
  description: 'Makes an empty study in the workspace.',
  body: { schema: studyRequestSchema, bytesMax: 16_384 },
  reply: json(studySchema),
  status: 201,
  stores: true,
  errors: [],
  example: { body: { title: 'Knights against bad bishops', summary: 'Four positions, one idea.' } },
});

export const getStudy = contract({
  id: 'getStudy',
  method: 'GET',
  path: '/api/v1/studies/{id}',
  tag,
  scope: 'studies:read',
  summary: 'Read a study',
  description: 'A study with its version, which the ETag names. Its positions are a list of their own.',
  params: idParams,
  reply: json(studySchema),
  cached: true,
  errors: ['not-found'],
  example: { params },
});

export const changeStudy = contract({
  id: 'changeStudy',
  method: 'PATCH',
  path: '/api/v1/studies/{id}',
  tag,
  scope: 'studies:write',
  summary: 'Change a study',
  description: 'Changes title or summary.',
  params: idParams,
  body: { schema: studyChangeSchema, bytesMax: 16_384 },
  reply: json(studySchema),
  guarded: true,
  errors: ['not-found'],
  example: { params, body: { summary: 'Four positions, one idea: the bishop goes first.' } },
});

export const deleteStudy = contract({
  id: 'deleteStudy',
  method: 'DELETE',
  path: '/api/v1/studies/{id}',
  tag,
  scope: 'studies:write',
  summary: 'Put a study into the trash',
  description: 'Puts a study into the trash with all that is in it; it can be restored for thirty days.',
  params: idParams,
  reply: NOTHING,
  status: 204,
  guarded: true,
  errors: ['not-found'],
  example: { params },
});

export const restoreStudy = contract({
  id: 'restoreStudy',
  method: 'POST',
  path: '/api/v1/studies/{id}/restore',
  tag,
  scope: 'studies:write',
  summary: 'Take a study out of the trash',
  description: 'The study is as it was. One that is not in the trash stays as it is.',
  params: idParams,
  reply: json(studySchema),
  errors: ['not-found'],
  example: { params },
});

export const listChanges = contract({
  id: 'listChanges',
  method: 'GET',
  path: '/api/v1/studies/{id}/history',
  tag,
  scope: 'studies:write',
  summary: 'Read the history of a study',
  description: 'Every change with who, when, before and after, the newest first.',
  params: idParams,
  query: z.strictObject(pageQuery),
  reply: json(pageSchema(changeSchema, 'ChangePage')),
  listed: true,
  errors: ['not-found'],
  example: { params, query: { limit: '10' } },
});

export const getShares = contract({
  id: 'getShares',
  method: 'GET',
  path: '/api/v1/studies/{id}/shares',
  tag,
  scope: 'studies:write',
  summary: 'See with whom a study is shared',
  description: 'The students who may read it; owners, coaches and writers of the workspace may always.',
  params: idParams,
  reply: json(sharesSchema),
  errors: ['not-found'],
  example: { params },
});

export const putShares = contract({
  id: 'putShares',
  method: 'PUT',
  path: '/api/v1/studies/{id}/shares',
  tag,
  scope: 'studies:write',
  summary: 'Share a study',
  description: 'Shares a study with these students and with no others.',
  params: idParams,
  body: { schema: sharesSchema, bytesMax: 32_768 },
  reply: json(sharesSchema),
  errors: ['not-found'],
  example: { params, body: { students: [] } },
});
