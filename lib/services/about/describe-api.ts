/** What the API says of itself. */
import { AppError } from '@/lib/errors';
import { contractList } from '@/openapi/contracts';
import { apiDocument } from '@/openapi/document';
import { PROBLEMS, type ProblemCode, problemType } from '@/openapi/schemas/problem';
import { engineVersion } from '../readings/engine';

/** The OpenAPI document, made once a process. */
export const openApiDocument = once(apiDocument);

/** Every call with its address. */
export const apiIndex = once(() => ({
  engine: engineVersion,
  document: '/api/v1/openapi.json',
  calls: contractList.map(({ id, method, path, summary }) => ({ id, method, href: path, summary })),
}));

/** A kind of problem by its code. Throws `not-found` for a code that there is not. */
export function problemKind(code: string) {
  if (!isProblemCode(code)) throw new AppError('not-found', `There is no problem of the code "${code}".`);
  return { type: problemType(code), code, ...PROBLEMS[code] };
}

function isProblemCode(code: string): code is ProblemCode {
  return Object.hasOwn(PROBLEMS, code);
}

function once<V>(make: () => V): () => V {
  let made: V | undefined;
  return () => {
    made ??= make();
    return made;
  };
}
