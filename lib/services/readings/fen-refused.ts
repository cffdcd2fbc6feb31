/** The engine's faults of a FEN as the refusal of a request. */
import type { Fault } from '@/engine/reading/schema';
import { AppError } from '@/lib/errors';

/** The refusal that names every fault of a request's FEN; `path` is the JSON pointer to it. */
export function fenRefused(faults: readonly [Fault, ...Fault[]], path = '/fen'): AppError {
  return new AppError('fen-refused', faults.map((fault) => fault.message).join(' '), {
    faults: faults.map(({ code, field, message, square }) => ({
      path,
      code,
      field,
      message,
      ...(square && { square }),
    })),
  });
}
