/** The engine's faults of a FEN as the refusal of a request. */
import type { Fault } from '@/engine/reading/schema';
import { AppError } from '@/lib/errors';

/** The refusal that names every fault of a request's FEN. */
export function fenRefused(faults: readonly [Fault, ...Fault[]]): AppError {
  return new AppError('fen-refused', faults.map((fault) => fault.message).join(' '), {
    faults: faults.map(({ code, field, message, square }) => ({
      path: '/fen',
      code,
      field,
      message,
      ...(square && { square }),
    })),
  });
}
