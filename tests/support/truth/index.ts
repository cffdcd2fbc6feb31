/** Whether a statement is true: a checker for every fact id, and what every statement must keep besides. */
import { isDeepStrictEqual } from 'node:util';
import type { Fact, FactId } from '@/engine/explain';
import type { Checkers, Told } from './claim';
import { CONTROL } from './control';
import { FILES } from './files';
import { KING } from './king';
import { MEN } from './men';
import { OUTPOSTS } from './outposts';
import { type Scene, squareOf } from './scene';
import { SQUARES } from './squares';
import { STRUCTURE } from './structure';

/** What a reading shows of a statement. */
export interface Shown {
  readonly key: string;
  readonly id: string;
  readonly side: 'white' | 'black' | null;
  readonly head: string;
  readonly text: string;
  readonly squares: readonly string[];
  readonly men: readonly string[];
  readonly facts: Readonly<Record<string, unknown>>;
}

/** One checker for every fact id: a new id without one does not compile. */
export const CHECKERS: Checkers<Fact> & Readonly<Record<FactId, unknown>> = {
  ...STRUCTURE,
  ...SQUARES,
  ...OUTPOSTS,
  ...FILES,
  ...MEN,
  ...KING,
  ...CONTROL,
};

/** Null where the statement is true of the position and its words say its facts and no more; else what is wrong. */
export function isTrue(scene: Scene, { id, side, head, text, squares, men, facts }: Shown): string | null {
  const check = CHECKERS[id as FactId] as ((scene: Scene, fact: unknown) => Told) | undefined;
  if (!check) return 'nobody checks this id';
  const told = check(scene, { ...facts, id, side, squares, men });
  for (const [claim, holds] of Object.entries(told.claims ?? {})) if (!holds) return `not so: ${claim}`;
  for (const name of new Set([...Object.keys(facts), ...Object.keys(told.facts)])) {
    if (!isDeepStrictEqual(facts[name], told.facts[name]))
      return `${name}: ${JSON.stringify(facts[name])} for ${JSON.stringify(told.facts[name])}`;
  }
  if (text !== told.text) return `the words: should be '${told.text}'`;
  if (!text.startsWith(head) || !/^[.:]/.test(text.slice(head.length))) return 'the head does not begin the text';
  if (men.some((name) => scene.letter(squareOf(name)) === '')) return `points at a man on an empty square: ${men}`;
  return [...squares, ...men].every((name) => /^[a-h][1-8]$/.test(name)) ? null : 'points off the board';
}
