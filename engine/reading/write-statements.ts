/** Statements as JSON on a page. Their facts are JSON as they stand; what the statement itself says is left out of them. */
import type { Fact, StatementValue } from '../explain';
import { fragment, type Fragment, objectWriter, type Page, put, putFlag, putNumber, putText, putTexts } from './page';
import type { Reading } from './schema';

const [OPEN, COMMA, CLOSE, LIST, LIST_END] = [
  fragment('{'),
  fragment(','),
  fragment('}'),
  fragment('['),
  fragment(']'),
];

/** Names of fields with what stands before their value: `,"name":`. There are a few dozen in all. */
const NAMES = new Map<string, Fragment>();

function putName(page: Page, name: string, isFirst: boolean): void {
  let piece = NAMES.get(name);
  if (!piece) NAMES.set(name, (piece = fragment(`${JSON.stringify(name)}:`)));
  put(page, isFirst ? OPEN : COMMA);
  put(page, piece);
}

/** Puts down a plain value: what facts are made of. */
function putPlain(page: Page, value: unknown): void {
  if (typeof value === 'string' || value === null) putText(page, value);
  else if (typeof value === 'number') putNumber(page, value);
  else if (typeof value === 'boolean') putFlag(page, value);
  else if (Array.isArray(value)) putItems(page, value);
  else putFields(page, value as Readonly<Record<string, unknown>>);
}

function putItems(page: Page, items: readonly unknown[]): void {
  put(page, LIST);
  for (let index = 0; index < items.length; index++) {
    if (index > 0) put(page, COMMA);
    putPlain(page, items[index]);
  }
  put(page, LIST_END);
}

function putFields(page: Page, fields: Readonly<Record<string, unknown>>): void {
  let isFirst = true;
  for (const name in fields) {
    putName(page, name, isFirst);
    putPlain(page, fields[name]);
    isFirst = false;
  }
  put(page, isFirst ? EMPTY : CLOSE);
}

const EMPTY = fragment('{}');

/** What a fact says beside what stands in the statement itself. */
function putFacts(page: Page, fact: Fact): void {
  let isFirst = true;
  for (const name in fact) {
    if (name === 'id' || name === 'side' || name === 'squares' || name === 'men') continue;
    putName(page, name, isFirst);
    putPlain(page, fact[name as keyof Fact]);
    isFirst = false;
  }
  put(page, isFirst ? EMPTY : CLOSE);
}

/** A statement. */
export const statementJson = objectWriter<StatementValue, Reading['statements'][number]>({
  key: (page, { key }) => putText(page, key),
  id: (page, { id }) => putText(page, id),
  theme: (page, { theme }) => putText(page, theme),
  side: (page, { side }) => putText(page, side),
  weight: (page, { weight }) => putNumber(page, weight),
  head: (page, { head }) => putText(page, head),
  text: (page, { text }) => putText(page, text),
  squares: (page, { squares }) => putTexts(page, squares),
  men: (page, { men }) => putTexts(page, men),
  facts: (page, { fact }) => putFacts(page, fact),
});
