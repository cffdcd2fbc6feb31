/** The one place that writes problem+json (RFC 9457). */
import { AppError } from '@/lib/errors';
import { PROBLEMS, type Problem, type ProblemFault, problemSchema, problemType } from '@/openapi/schemas/problem';
import type { Contract } from '@/openapi/contract';
import { commonHeaders } from './headers';

/** Where the refusal happened. */
export interface ProblemPlace {
  readonly request: Request;
  readonly requestId: string;
  /** The part of the request that holds a fault which does not say so itself. */
  readonly faultsIn: ProblemFault['in'];
  /** The call that refused, where the address has one. */
  readonly call?: Contract;
}

/** The answer to a refused request. Anything but an AppError is our own mistake, and is answered blankly. */
export function problemResponse(error: unknown, { request, requestId, faultsIn, call }: ProblemPlace): Response {
  const refusal = error instanceof AppError ? error : new AppError('internal', 'The request could not be answered.');
  const { status, title, fix } = PROBLEMS[refusal.code];
  const faults = refusal.faults.map((fault) => ({ in: faultsIn, ...fault }));
  const first = faults[0];
  const problem: Problem = problemSchema.parse({
    type: problemType(refusal.code),
    title,
    status,
    detail: refusal.message,
    instance: new URL(request.url).pathname,
    code: refusal.code,
    requestId,
    fix,
    ...(first && { path: first.path, faults }),
    ...(refusal.bound && { bound: refusal.bound }),
  });
  return new Response(JSON.stringify(problem), {
    status,
    headers: {
      ...commonHeaders(requestId, call),
      'Content-Type': 'application/problem+json',
      'Cache-Control': 'no-store',
      ...refusal.headers,
    },
  });
}
