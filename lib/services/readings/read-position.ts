/** One FEN to its reading. */
import type { Fault, Reading } from '@/engine/reading/schema';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import type { Mode } from '@/openapi/schemas/ids';
import { computeReading } from './engine';
import { recentReadings } from './recent';

/** The reading of a FEN. Throws `fen-refused` with every fault that the engine found. */
export async function readPosition(
  _ctx: Context,
  { fen, mode }: { readonly fen: string; readonly mode: Mode },
): Promise<Reading> {
  const key = `${mode} ${fen}`;
  const kept = recentReadings.get(key);
  if (kept) return kept;
  const result = computeReading(fen, mode);
  if (!result.ok) throw fenRefused(result.fault);
  recentReadings.set(key, result.value);
  return result.value;
}

function fenRefused(faults: readonly [Fault, ...Fault[]]): AppError {
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
