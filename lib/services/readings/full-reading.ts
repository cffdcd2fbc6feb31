/** One FEN to its whole reading as a value, for what is drawn from it. */
import type { Reading } from '@/engine/reading/schema';
import type { Mode } from '@/openapi/schemas/ids';
import { computeReading } from './engine';
import { fenRefused } from './fen-refused';
import { Recent } from './recent';

/** How many readings are kept: a reading takes about a tenth of a megabyte, so some five in all. */
const KEPT_MAX = 50;
const recent = new Recent<Reading>(KEPT_MAX);

/** The reading of a FEN. Throws `fen-refused` with every fault that the engine found. */
export function fullReading({ fen, mode }: { readonly fen: string; readonly mode: Mode }): Reading {
  const key = `${mode} ${fen}`;
  const kept = recent.get(key);
  if (kept) return kept;
  const result = computeReading(fen, mode);
  if (!result.ok) throw fenRefused(result.fault);
  recent.set(key, result.value);
  return result.value;
}
