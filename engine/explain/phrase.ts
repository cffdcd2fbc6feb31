/** What a phrase gives: the claim, and what bears it out. */

export interface Phrase {
  /** The claim alone, no full stop. */
  readonly head: string;
  /** What follows the colon; further sentences may follow in `more`. No full stops. */
  readonly body?: string | undefined;
  readonly more?: readonly (string | null | undefined)[] | undefined;
}

/** The member of a union that may bear the id. */
type Bearing<F, Id> = F extends { readonly id: infer Ids } ? (Id extends Ids ? F : never) : never;

/** One phrase a fact: a union member without its phrase does not compile. */
export type Phrases<F extends { readonly id: string }> = {
  readonly [Id in F['id']]: (fact: Bearing<F, Id>) => Phrase;
};

/** The whole text of a phrase: 'head: body. more. more.' */
export function phraseText({ head, body, more }: Phrase): string {
  let text = body ? `${head}: ${body}.` : `${head}.`;
  if (more) for (const sentence of more) if (sentence) text += ` ${sentence}.`;
  return text;
}
