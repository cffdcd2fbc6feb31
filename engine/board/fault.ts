/** Why a position is refused, or what a diagram lacks: coded, placed in its field, and said in a sentence. */
import type { SquareName } from '../types';

/** FEN fields; `text` where the fields cannot be told apart. */
export const FEN_FIELDS = ['board', 'side', 'castling', 'enPassant', 'halfmove', 'fullmove', 'text'] as const;
export type FenField = (typeof FEN_FIELDS)[number];

export interface Fault {
  /** Stable code, e.g. "rank-length". */
  readonly code: string;
  readonly field: FenField;
  readonly message: string;
  readonly square?: SquareName;
}

/** One fault or more, the most basic first. */
export type Faults = readonly [Fault, ...Fault[]];

/** The list as faults where it holds any, else null. */
export function asFaults(list: readonly Fault[]): Faults | null {
  const [first, ...others] = list;
  return first ? [first, ...others] : null;
}

/** A fault of a field. */
export function fault(field: FenField, code: string, message: string, square?: SquareName): Fault {
  return square ? { code, field, message, square } : { code, field, message };
}
