/** Comparisons, routes and exchange tests kept in a study: the same six calls for each. */
import { type z } from 'zod';
import { contract, json, NOTHING } from '../contract';
import { comparisonRequestSchema, exchangesRequestSchema } from '../schemas/compare';
import { EXAMPLE_FEN, EXAMPLE_IDS } from '../schemas/examples';
import { idParams } from '../schemas/page';
import {
  type ResultKind,
  resultChangeSchema,
  resultListSchema,
  resultParams,
  resultRequestSchema,
  resultSchema,
} from '../schemas/results';
import { routesRequestSchema } from '../schemas/routes';

const tag = 'Studies';
const inStudy = { id: EXAMPLE_IDS.study };

interface Kind<Name extends string, S extends z.ZodType> {
  /** As ids name it: `Comparison`. */
  readonly name: Name;
  readonly kind: ResultKind;
  /** As the path names many of it. */
  readonly path: string;
  /** As sentences name one and many of it. */
  readonly noun: string;
  readonly nouns: string;
  readonly request: S;
  readonly example: unknown;
}

function resultContracts<Name extends string, S extends z.ZodType>({
  name,
  kind,
  path,
  noun,
  nouns,
  request,
  example,
}: Kind<Name, S>) {
  const all = `/api/v1/studies/{id}/${path}` as const;
  const one = { id: EXAMPLE_IDS.study, resultId: EXAMPLE_IDS[kind] };
  const single = `${all}/{resultId}` as const;
  return {
    list: contract({
      id: `listStudy${name}s`,
      method: 'GET',
      path: all,
      tag,
      scope: 'studies:read',
      summary: `List the ${nouns} of a study`,
      description: `All ${nouns} kept in a study, the oldest first.`,
      params: idParams,
      reply: json(resultListSchema),
      errors: ['not-found'],
      example: { params: inStudy },
    }),
    create: contract({
      id: `createStudy${name}`,
      method: 'POST',
      path: all,
      tag,
      scope: 'studies:write',
      summary: `Compute a ${noun} and keep it`,
      description: 'Computes the request now, and keeps it with its result and the version of the engine.',
      params: idParams,
      body: { schema: resultRequestSchema(request, `Study${name}Request`), bytesMax: 131_072 },
      reply: json(resultSchema),
      status: 201,
      stores: true,
      errors: ['not-found', 'fen-refused'],
      example: { params: inStudy, body: { title: 'First try', request: example } },
    }),
    get: contract({
      id: `getStudy${name}`,
      method: 'GET',
      path: single,
      tag,
      scope: 'studies:read',
      summary: `Read a ${noun} of a study`,
      description: 'What was asked, what came out, and which engine said so.',
      params: resultParams,
      reply: json(resultSchema),
      cached: true,
      errors: ['not-found'],
      example: { params: one },
    }),
    change: contract({
      id: `changeStudy${name}`,
      method: 'PATCH',
      path: single,
      tag,
      scope: 'studies:write',
      summary: `Change the words of a ${noun}`,
      description: 'Changes title or note; request and result stay.',
      params: resultParams,
      body: { schema: resultChangeSchema, bytesMax: 131_072 },
      reply: json(resultSchema),
      guarded: true,
      errors: ['not-found'],
      example: { params: one, body: { note: 'Black is slower by one move.' } },
    }),
    remove: contract({
      id: `deleteStudy${name}`,
      method: 'DELETE',
      path: single,
      tag,
      scope: 'studies:write',
      summary: `Put a ${noun} into the trash`,
      description: 'It can be restored for thirty days.',
      params: resultParams,
      reply: NOTHING,
      status: 204,
      guarded: true,
      errors: ['not-found'],
      example: { params: one },
    }),
    restore: contract({
      id: `restoreStudy${name}`,
      method: 'POST',
      path: `${single}/restore` as const,
      tag,
      scope: 'studies:write',
      summary: `Take a ${noun} out of the trash`,
      description: 'It is as it was.',
      params: resultParams,
      reply: json(resultSchema),
      errors: ['not-found'],
      example: { params: one },
    }),
  } as const;
}

export const studyRoutes = resultContracts({
  name: 'Route',
  kind: 'route',
  path: 'routes',
  noun: 'route',
  nouns: 'routes',
  request: routesRequestSchema,
  example: { fen: EXAMPLE_FEN, man: 'f3', choicesMax: 2 },
});

export const studyComparisons = resultContracts({
  name: 'Comparison',
  kind: 'comparison',
  path: 'comparisons',
  noun: 'comparison',
  nouns: 'comparisons',
  request: comparisonRequestSchema,
  example: { subjects: [{ fen: EXAMPLE_FEN }, { fen: EXAMPLE_FEN, place: { from: 'f3', to: 'e5' } }] },
});

export const studyExchanges = resultContracts({
  name: 'Exchange',
  kind: 'exchange',
  path: 'exchanges',
  noun: 'exchange test',
  nouns: 'exchange tests',
  request: exchangesRequestSchema,
  example: { fen: EXAMPLE_FEN },
});
