/** Statements as the text of their JSON. Their facts are JSON as they stand; what the statement says beside them is left out. */
import type { Fact, StatementValue } from '../explain';
import type { Reading } from './schema';
import { objectText, wordsText, wordText } from './text';

/** Plain values as JSON: what facts are made of. Their words are ours, square names among them: see `wordText`. */
function plainJson(value: unknown): string {
  if (typeof value === 'string') return `"${value}"`;
  if (typeof value !== 'object' || value === null) return `${value as number | boolean | null}`;
  let text = '';
  if (Array.isArray(value)) {
    for (const item of value as readonly unknown[]) text += text === '' ? `[${plainJson(item)}` : `,${plainJson(item)}`;
    return text === '' ? '[]' : `${text}]`;
  }
  for (const name in value)
    text += `${text === '' ? '{"' : ',"'}${name}":${plainJson((value as Readonly<Record<string, unknown>>)[name])}`;
  return text === '' ? '{}' : `${text}}`;
}

/** What a fact says beside what stands in the statement itself. */
function factsJson(fact: Fact): string {
  let text = '';
  for (const name in fact) {
    if (name === 'id' || name === 'side' || name === 'squares' || name === 'men') continue;
    text += `${text === '' ? '{"' : ',"'}${name}":${plainJson(fact[name as keyof Fact])}`;
  }
  return text === '' ? '{}' : `${text}}`;
}

/** A statement. */
export const statementJson = objectText<StatementValue, Reading['statements'][number]>({
  key: ({ key }) => wordText(key),
  id: ({ id }) => wordText(id),
  theme: ({ theme }) => wordText(theme),
  side: ({ side }) => wordText(side),
  weight: ({ weight }) => `${weight}`,
  head: ({ head }) => wordText(head),
  text: ({ text }) => wordText(text),
  squares: ({ squares }) => wordsText(squares),
  men: ({ men }) => wordsText(men),
  facts: ({ fact }) => factsJson(fact),
});
