/** Contracts to an OpenAPI 3.1 document. */
import { z } from 'zod';
import { type Contract, problemsOf } from './contract';
import { contractList } from './contracts';
import { PROBLEMS, type ProblemCode, problemSchema, problemType } from './schemas/problem';

/** JSON as the document holds it. */
export type Json = null | boolean | number | string | readonly Json[] | { readonly [key: string]: Json };
type JsonObject = { [key: string]: Json };

/** An OpenAPI document: what its readers rely on by name, and the rest. */
export interface ApiDocument {
  readonly [key: string]: Json;
  readonly openapi: string;
  readonly info: { readonly title: string; readonly version: string; readonly [key: string]: Json };
}

const API_VERSION = '1.0.0';
const LOCAL = '#/$defs/';
const SHARED = '#/components/schemas/';

/** The whole document, made anew at each call. */
export function apiDocument(): ApiDocument {
  const components = new Components();
  const paths: { [path: string]: JsonObject } = {};
  for (const call of contractList) {
    const item = paths[call.path] ?? {};
    item[call.method.toLowerCase()] = operation(call, components);
    paths[call.path] = item;
  }
  return {
    openapi: '3.1.0',
    info: {
      title: 'Waypost',
      version: API_VERSION,
      license: { name: 'MIT', identifier: 'MIT' },
      description:
        'Reads chess positions: who controls each square, weak squares, outposts, pawn structure, and sentences that can be checked on the board. Fields may be added to answers; none is renamed or given another meaning within v1.',
    },
    servers: [{ url: '/' }],
    tags: [
      { name: 'Readings', description: 'Positions to readings.' },
      { name: 'Routes', description: 'Where men belong and how they get there.' },
      { name: 'Comparisons', description: 'Positions, placements and trades held against each other.' },
      { name: 'Games', description: 'Whole games: timeline, journeys, commitments.' },
      { name: 'Plates', description: 'Positions to figures.' },
      { name: 'Studies', description: 'What a workspace keeps.' },
      { name: 'Jobs', description: 'Long work.' },
      { name: 'Keys', description: 'Keys of a workspace and what they use.' },
      { name: 'About', description: 'What the API says of itself.' },
    ],
    paths,
    components: {
      schemas: components.sorted(),
      securitySchemes: {
        key: { type: 'http', scheme: 'bearer', description: 'A key of a workspace, made by its owners.' },
        session: { type: 'apiKey', in: 'cookie', name: SESSION_COOKIE, description: 'A person, by the browser.' },
      },
    },
  };
}

/** Collects the schemas that have a name of their own, so that each is said once. */
class Components {
  readonly #schemas = new Map<string, Json>();

  /** The schema as JSON Schema; named parts are moved to the components and referred to. */
  of(schema: z.ZodType): Json {
    const made = JSON.parse(JSON.stringify(z.toJSONSchema(schema, { io: 'input' }))) as JsonObject;
    const { $defs, id, ...own } = without('$schema', moved(made) as JsonObject);
    if ($defs)
      for (const [name, part] of Object.entries($defs as JsonObject))
        this.#schemas.set(name, without('id', part as JsonObject));
    if (typeof id !== 'string') return own;
    this.#schemas.set(id, own);
    return { $ref: SHARED + id };
  }

  sorted(): JsonObject {
    return Object.fromEntries([...this.#schemas].sort(([a], [b]) => (a < b ? -1 : 1)));
  }
}

/** Points local references at the components. */
function moved(value: Json): Json {
  if (Array.isArray(value)) return value.map(moved);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value as JsonObject).map(([key, part]) => [
      key,
      key === '$ref' && typeof part === 'string' ? part.replace(LOCAL, SHARED) : moved(part),
    ]),
  );
}

function without(name: string, object: JsonObject): JsonObject {
  return Object.fromEntries(Object.entries(object).filter(([key]) => key !== name));
}

function operation(call: Contract, components: Components): JsonObject {
  const parameters = [
    ...fields(call.params, 'path', call.example.params, components),
    ...fields(call.query, 'query', call.example.query, components),
    ...(call.stores ? [IDEMPOTENCY_KEY] : []),
    ...(call.guarded ? [IF_MATCH] : []),
  ];
  return {
    operationId: call.id,
    summary: call.summary,
    description: call.description,
    tags: [call.tag],
    ...securityOf(call),
    ...(parameters.length > 0 && { parameters }),
    ...(call.body && { requestBody: requestBody(call.body, call.example.body, components) }),
    responses: { ...success(call, components), ...refusals(call, components) },
  };
}

/** The cookie that a signed-in browser sends. */
const SESSION_COOKIE = 'next-auth.session-token';

/** Who may call, in the document's words. A computing call takes a key, but needs none. */
function securityOf({ scope }: Contract): JsonObject {
  switch (scope) {
    case 'open':
      return {};
    case 'compute':
      return { security: [{}, { key: [] }] };
    case 'workspace':
    case 'person':
      return { security: [{ session: [] }] };
    default:
      return { security: [{ key: [] }, { session: [] }], 'x-scope': scope };
  }
}

const IDEMPOTENCY_KEY: Json = {
  name: 'Idempotency-Key',
  in: 'header',
  required: false,
  description:
    'A text of your own; the same request sent again with it stores nothing twice and answers the same for a day.',
  schema: { type: 'string', minLength: 1, maxLength: 128 },
};

const IF_MATCH: Json = {
  name: 'If-Match',
  in: 'header',
  required: true,
  description: 'The ETag that reading gave. Where somebody else was first, the answer is 412 and nothing is changed.',
  schema: { type: 'string' },
};

function fields(
  schema: z.ZodType | undefined,
  place: 'path' | 'query',
  example: Readonly<Record<string, string>> | undefined,
  components: Components,
): Json[] {
  if (!(schema instanceof z.ZodObject)) return [];
  return Object.entries(schema.shape as Record<string, z.ZodType>).map(([name, field]) => {
    const made = components.of(field);
    const isList =
      field instanceof z.ZodArray || (field instanceof z.ZodOptional && field.unwrap() instanceof z.ZodArray);
    const sample = example?.[name];
    return {
      name,
      in: place,
      required: place === 'path' || !field.safeParse(undefined).success,
      ...(field.description && { description: field.description }),
      schema: made,
      ...(isList && { style: 'form', explode: false }),
      ...(sample !== undefined && { example: isList ? sample.split(',') : exampleOf(field, sample) }),
    };
  });
}

/** An example is written as a string in the contract; a number's is shown as a number. */
function exampleOf(field: z.ZodType, sample: string): Json {
  const parsed = field.safeParse(sample);
  return parsed.success && typeof parsed.data === 'number' ? parsed.data : sample;
}

function requestBody(body: NonNullable<Contract['body']>, example: unknown, components: Components): JsonObject {
  return {
    required: true,
    description: `At most ${body.bytesMax} bytes.`,
    content: { 'application/json': { schema: components.of(body.schema), example: example as Json } },
  };
}

const REQUEST_ID: Json = { description: 'The id of this request.', schema: { type: 'string' } };

function success(call: Contract, components: Components): JsonObject {
  const { reply, status = 200 } = call;
  if (reply.form === 'none')
    return { [status]: { description: call.summary, headers: { 'X-Request-Id': REQUEST_ID } } };
  const schema = 'schema' in reply ? components.of(reply.schema) : { type: 'string' };
  const headers: JsonObject = { 'X-Request-Id': REQUEST_ID };
  if (call.cached) headers.ETag = { description: 'Changes only when the answer does.', schema: { type: 'string' } };
  if (call.guarded || call.stores) headers.ETag = { description: 'Names this version.', schema: { type: 'string' } };
  if (call.listed) headers.Link = { description: 'rel="next": the next page (RFC 8288).', schema: { type: 'string' } };
  if (call.scope !== 'open') Object.assign(headers, LIMIT_HEADERS);
  const about = ABOUT[reply.form] ?? call.summary;
  const unchanged: JsonObject = call.cached
    ? { 304: { description: 'The copy named by If-None-Match is still good.', headers } }
    : {};
  return { [status]: { description: about, headers, content: { [reply.media]: { schema } } }, ...unchanged };
}

const ABOUT: Readonly<Partial<Record<Contract['reply']['form'], string>>> = {
  lines: 'One JSON value a line; the schema is that of a line.',
  events: 'Server-sent events; the schema is that of the data of an event.',
};

const LIMIT_HEADERS: JsonObject = {
  RateLimit: { description: 'What is left of the allowance, and for how many seconds.', schema: { type: 'string' } },
  'RateLimit-Policy': {
    description: 'The allowance: so many requests in so many seconds.',
    schema: { type: 'string' },
  },
};

/** One response a status; the codes it may carry are its examples. */
function refusals(call: Contract, components: Components): JsonObject {
  const schema = components.of(problemSchema);
  const byStatus = new Map<number, ProblemCode[]>();
  for (const code of problemsOf(call)) {
    const { status } = PROBLEMS[code];
    byStatus.set(status, [...(byStatus.get(status) ?? []), code]);
  }
  return Object.fromEntries(
    [...byStatus].map(([status, codes]) => [
      status,
      {
        description: codes.map((code) => `${code}: ${PROBLEMS[code].title}`).join(' '),
        headers: { 'X-Request-Id': REQUEST_ID },
        content: {
          'application/problem+json': {
            schema,
            examples: Object.fromEntries(codes.map((code) => [code, { value: problemExample(code, call) }])),
          },
        },
      },
    ]),
  );
}

function problemExample(code: ProblemCode, call: Contract): Json {
  const { status, title, fix } = PROBLEMS[code];
  return {
    type: problemType(code),
    title,
    status,
    detail: title,
    instance: call.path,
    code,
    requestId: 'a1b2c3d4',
    fix,
  };
}
