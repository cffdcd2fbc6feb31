/**
 * Refusals as every caller sees them: RFC 9457 problem details, and the one table of code to status.
 *
 * The table stands here and not in lib/, because the document promises it; `AppError` in lib/errors.ts
 * takes its status from it.
 */
import { z } from 'zod';
import { squareSchema } from '../../engine/reading/schema';

interface ProblemKind {
  readonly status: number;
  /** The same for every occurrence (RFC 9457, 3.1.3). */
  readonly title: string;
  /** What the caller can do. */
  readonly fix: string;
}

/** Every problem the API can answer, by its stable code. */
export const PROBLEMS = {
  'not-json': {
    status: 400,
    title: 'The body is not JSON.',
    fix: 'Send one JSON value in UTF-8.',
  },
  'not-signed-in': {
    status: 401,
    title: 'This call needs a key that is good, or a person who is signed in.',
    fix: 'Send the header "Authorization: Bearer <key>" with a key that is neither expired nor ended.',
  },
  'not-allowed': {
    status: 403,
    title: 'The key’s scopes, or the person’s role, do not allow this call.',
    fix: 'Use a key with the scope that the call names, or ask an owner of the workspace.',
  },
  'not-found': {
    status: 404,
    title: 'There is nothing at this address.',
    fix: 'Compare the address with the list at /api/v1 or with /api/v1/openapi.json.',
  },
  'method-not-allowed': {
    status: 405,
    title: 'This address does not take this method.',
    fix: 'Use one of the methods named in the Allow header.',
  },
  conflict: {
    status: 409,
    title: 'What is there already does not go with the request.',
    fix: 'Read what is there, and send a request that fits it.',
  },
  'idempotency-busy': {
    status: 409,
    title: 'The first request with this Idempotency-Key is still at work.',
    fix: 'Send the same request again in a moment.',
  },
  'version-lost': {
    status: 412,
    title: 'Somebody else has changed this first.',
    fix: 'Read it again, and send your change with the new ETag in If-Match.',
  },
  'body-too-large': {
    status: 413,
    title: 'The body is larger than this call takes.',
    fix: 'Send less at once; the bound is named in "bound".',
  },
  'unsupported-media-type': {
    status: 415,
    title: 'The body is of a type that this call does not take.',
    fix: 'Send the header "Content-Type: application/json".',
  },
  'invalid-request': {
    status: 422,
    title: 'The request does not have the promised shape.',
    fix: 'Mend the places listed in "faults".',
  },
  'fen-refused': {
    status: 422,
    title: 'The FEN is not a position that can be read.',
    fix: 'Mend the FEN fields listed in "faults", or send "mode": "diagram" to read what teachers draw.',
  },
  'pgn-refused': {
    status: 422,
    title: 'The text holds no game that can be read.',
    fix: 'Mend the places listed in "faults".',
  },
  'idempotency-mismatch': {
    status: 422,
    title: 'This Idempotency-Key was used with another request.',
    fix: 'Use a new key for each new request.',
  },
  'version-needed': {
    status: 428,
    title: 'This call needs to know which version it changes.',
    fix: 'Send the header If-Match with the ETag that reading it gave you.',
  },
  'too-many-requests': {
    status: 429,
    title: 'The allowance is used up for now.',
    fix: 'Wait as many seconds as the Retry-After header says.',
  },
  internal: {
    status: 500,
    title: 'Something went wrong on our side.',
    fix: 'Try again later; when reporting it, name the request id.',
  },
} as const satisfies Record<string, ProblemKind>;

export type ProblemCode = keyof typeof PROBLEMS;

/** All problem codes, in the order of their status. */
export const PROBLEM_CODES = Object.keys(PROBLEMS) as [ProblemCode, ...ProblemCode[]];

export const problemCodeSchema = z
  .enum(PROBLEM_CODES)
  .meta({ id: 'ProblemCode', description: 'A stable code of a problem.' });

/** The stable `type` of a problem: an address of this API that explains it. */
export function problemType(code: ProblemCode): string {
  return `/api/v1/problems/${code}`;
}

export const problemFaultSchema = z
  .object({
    in: z.enum(['body', 'query', 'path']).describe('The part of the request at fault.'),
    path: z.string().describe('JSON pointer (RFC 6901) to the value at fault inside that part, e.g. "/fens/3".'),
    code: z.string().describe('Stable code of the fault, e.g. "unknown-field" or, for a FEN, "rank-length".'),
    message: z.string().describe('What is wrong, in a sentence.'),
    field: z.string().optional().describe('For a FEN: its field at fault.'),
    square: squareSchema.optional().describe('For a FEN: the square at fault, where there is one.'),
  })
  .meta({ id: 'ProblemFault', description: 'One place of a request that was refused.' });

export type ProblemFault = z.infer<typeof problemFaultSchema>;

export const boundSchema = z
  .object({ name: z.string(), max: z.number() })
  .meta({ id: 'Bound', description: 'A bound that was passed: its name and the most that is taken.' });

export type Bound = z.infer<typeof boundSchema>;

export const problemSchema = z
  .object({
    type: z.string().describe('Stable address of the kind of problem.'),
    title: z.string().describe('The kind of problem in a sentence, the same each time.'),
    status: z.int(),
    detail: z.string().describe('What is wrong this time.'),
    instance: z.string().describe('The address that was called.'),
    code: problemCodeSchema,
    requestId: z.string().describe('Also in the X-Request-Id header and in our log.'),
    fix: z.string().describe('What to do.'),
    path: z.string().optional().describe('The path of the first fault.'),
    bound: boundSchema.optional(),
    faults: z.array(problemFaultSchema).optional(),
  })
  .meta({ id: 'Problem', description: 'Problem details (RFC 9457).' });

export type Problem = z.infer<typeof problemSchema>;
