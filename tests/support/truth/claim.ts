/**
 * What a checker gives: the facts and the sentence as the board has them, written anew. A statement is true where both
 * are the same as what the reading shows.
 */
import type { Fact } from '@/engine/explain';
import type { Scene } from './scene';

/** The member of a union that may bear the id. */
type Bearing<F, Id> = F extends { readonly id: infer Ids } ? (Id extends Ids ? F : never) : never;

export type FactOf<Id extends Fact['id']> = Bearing<Fact, Id>;

export interface Told {
  /** The facts of the statement, recomputed; those that only point (squares, men) are checked elsewhere. */
  readonly facts: Readonly<Record<string, unknown>>;
  /** The whole text that these facts allow. */
  readonly text: string;
  /** Claims of the words that no fact carries, and whether they hold. */
  readonly claims?: Readonly<Record<string, boolean>>;
}

/** One checker a fact id: an id without one does not compile. */
export type Checkers<F extends { readonly id: Fact['id'] }> = {
  readonly [Id in F['id']]: (scene: Scene, fact: Bearing<F, Id>) => Told;
};
