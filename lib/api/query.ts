/** Query and path parameters: strings to what the contract promises. */
import { z } from 'zod';
import { AppError } from '@/lib/errors';
import type { ProblemFault } from '@/openapi/schemas/problem';
import { faultsOf } from './faults';

/** The parsed query. A name given twice is refused, except for lists, which may also be written with commas. */
export function readQuery<S extends z.ZodType>(params: URLSearchParams, schema: S): z.output<S> {
  const given: Record<string, string | string[]> = {};
  const faults: ProblemFault[] = [];
  for (const name of new Set(params.keys())) {
    const values = params.getAll(name);
    if (isList(schema, name)) {
      given[name] = values.flatMap((value) => value.split(','));
      continue;
    }
    given[name] = values[0] ?? '';
    if (values.length > 1)
      faults.push({ in: 'query', path: `/${name}`, code: 'repeated', message: 'Give this parameter once.' });
  }
  return parsed(given, schema, 'query', faults);
}

/** The parsed path parameters. */
export function readParams<S extends z.ZodType>(params: unknown, schema: S): z.output<S> {
  return parsed(params, schema, 'path', []);
}

function parsed<S extends z.ZodType>(
  given: unknown,
  schema: S,
  place: 'query' | 'path',
  before: readonly ProblemFault[],
): z.output<S> {
  const result = schema.safeParse(given);
  const faults = result.success ? before : [...before, ...faultsOf(result.error, place)];
  const first = faults[0];
  if (result.success && !first) return result.data;
  throw new AppError('invalid-request', `At ${first?.path ?? 'the top'}: ${first?.message ?? 'Not as promised.'}`, {
    faults,
  });
}

function isList(schema: z.ZodType, name: string): boolean {
  if (!(schema instanceof z.ZodObject) || !Object.hasOwn(schema.shape, name)) return false;
  const field: unknown = schema.shape[name];
  return field instanceof z.ZodArray || (field instanceof z.ZodOptional && field.unwrap() instanceof z.ZodArray);
}
