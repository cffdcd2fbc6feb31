/** Statements as the text of their JSON. Their facts are JSON as they stand; what the statement says beside them is left out. */
import type { Fact, StatementValue } from '../explain';
import type { Reading } from './schema';
import { objectText, textOf, wordsText, wordText } from './text';

/** The fields of a fact that stand in the statement itself. */
const SAID = new Set(['id', 'side', 'squares', 'men']);

/** Plain values as JSON: what facts are made of. */
function plainJson(value: unknown): string {
  if (typeof value === 'string') return textOf(value);
  if (typeof value !== 'object' || value === null) return `${value as number | boolean | null}`;
  if (Array.isArray(value)) {
    let items = '';
    for (const item of value as readonly unknown[]) items += (items === '' ? '' : ',') + plainJson(item);
    return `[${items}]`;
  }
  return fieldsJson(value, null);
}

function fieldsJson(object: object, without: ReadonlySet<string> | null): string {
  let fields = '';
  for (const name of Object.keys(object)) {
    if (without?.has(name)) continue;
    fields += `${fields === '' ? '' : ','}"${name}":${plainJson((object as Readonly<Record<string, unknown>>)[name])}`;
  }
  return `{${fields}}`;
}

const factsJson = (fact: Fact): string => fieldsJson(fact, SAID);

/** A statement. */
export const statementJson = objectText<StatementValue, Reading['statements'][number]>({
  key: ({ key }) => wordText(key),
  id: ({ id }) => wordText(id),
  theme: ({ theme }) => wordText(theme),
  side: ({ side }) => wordText(side),
  weight: ({ weight }) => `${weight}`,
  head: ({ head }) => textOf(head),
  text: ({ text }) => textOf(text),
  squares: ({ squares }) => wordsText(squares),
  men: ({ men }) => wordsText(men),
  facts: ({ fact }) => factsJson(fact),
});
