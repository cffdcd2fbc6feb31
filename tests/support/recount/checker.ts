/** How a checker says what is wrong with a statement. */
import type { Statement } from '@/engine';
import type { SideName, SlowBoard } from './board';

/** The facts of a statement, to be read by a checker that knows its id. */
export interface Claims {
  readonly side: SideName;
  readonly text: string;
  /** A fact that is a text. */
  readonly word: (key: string) => string;
  readonly words: (key: string) => string[];
  readonly count: (key: string) => number;
  readonly flag: (key: string) => boolean;
  /** A fact of any shape, to be taken apart by the checker. */
  readonly fact: <T>(key: string) => T;
}

/** Lists what the statement says that does not hold; empty when it is true. */
export type Checker = (board: SlowBoard, claims: Claims) => (string | false)[];

export function claimsOf({ side, text, facts }: Statement): Claims {
  return {
    side: side ?? 'white',
    text,
    word: (key) => String(facts[key]),
    words: (key) => facts[key] as string[],
    count: (key) => Number(facts[key]),
    flag: (key) => Boolean(facts[key]),
    fact: <T>(key: string) => facts[key] as T,
  };
}

export const same = (a: readonly string[], b: readonly string[]): boolean =>
  [...a].sort().join() === [...b].sort().join();
