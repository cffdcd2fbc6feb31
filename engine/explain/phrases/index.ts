/** One phrase for every fact: a fact without its phrase does not compile. */
import type { Fact, FactId } from '../fact';
import type { Phrase, Phrases } from '../phrase';
import { CONTROL_PHRASES } from './control';
import { FILES_PHRASES } from './files';
import { KING_PHRASES } from './king';
import { MEN_PHRASES } from './men';
import { OUTPOSTS_PHRASES } from './outposts';
import { SQUARES_PHRASES } from './squares';
import { STRUCTURE_PHRASES } from './structure';

export const PHRASES: Phrases<Fact> = {
  ...STRUCTURE_PHRASES,
  ...SQUARES_PHRASES,
  ...OUTPOSTS_PHRASES,
  ...FILES_PHRASES,
  ...MEN_PHRASES,
  ...KING_PHRASES,
  ...CONTROL_PHRASES,
};

/** The phrase of a fact. */
export function phraseOf(fact: Fact): Phrase {
  // The table gives each id the phrase for its own facts; the compiler cannot follow that through a union.
  const render = PHRASES[fact.id as FactId] as (fact: Fact) => Phrase;
  return render(fact);
}
