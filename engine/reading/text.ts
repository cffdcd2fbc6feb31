/**
 * Pieces of JSON text, made once or put together with `+`: what the writers of a reading are made from. Written so, a
 * reading needs no object of its own and is several times quicker than building one and asking JSON.stringify.
 */
import type { AttackMap } from '../attacks';
import { SQUARES, squareName } from '../board';
import { type BySide, FILES, KINDS, SIDES, type Square } from '../types';

/** Writes a value; the map says which men a mask means and who stands where. */
export type Write<V> = (value: V, map: AttackMap) => string;

const SQUARE_TEXTS: readonly string[] = SQUARES.map((square) => `"${squareName(square)}"`);
const FILE_TEXTS: readonly string[] = FILES.map((file) => `"${file}"`);

/** Men by their code in the mailbox, null for an empty square. */
export const MAN_TEXTS: readonly string[] = Array.from({ length: 16 }, (_, code) => {
  const kind = KINDS[(code & 7) - 1];
  return kind ? `{"side":"${SIDES[code >> 3]}","kind":"${kind}"}` : 'null';
});

/** What JSON has to write in another way than it is: quotes, backslashes, control characters, halves of characters. */
const ODD = /["\\\u0000-\u001f\ud800-\udfff]/;

/** Any text. */
export function textOf(text: string): string {
  return ODD.test(text) ? JSON.stringify(text) : `"${text}"`;
}

/** Words of ours (a side, a status, a sentence), or null: nothing in them is written in another way, as tests hold. */
export function wordText(word: string | null): string {
  return word === null ? 'null' : `"${word}"`;
}

/** Words of a closed list, square names among them, in their order. */
export function wordsText(words: readonly string[]): string {
  const { length } = words;
  if (length === 0) return '[]';
  let text = `["${words[0]}"`;
  for (let index = 1; index < length; index++) text += `,"${words[index]}"`;
  return `${text}]`;
}

/** A square's name, or null. */
export function squareText(square: Square | null): string {
  return square === null ? 'null' : SQUARE_TEXTS[square]!;
}

/** The letter of a file, 0 = a. */
export function fileText(file: number): string {
  return FILE_TEXTS[file]!;
}

/** Names of squares, in the order given. */
export function squaresText(squares: readonly Square[]): string {
  const { length } = squares;
  if (length === 0) return '[]';
  let text = `[${SQUARE_TEXTS[squares[0]!]!}`;
  for (let index = 1; index < length; index++) text += `,${SQUARE_TEXTS[squares[index]!]!}`;
  return `${text}]`;
}

/** Squares of the men in a mask of one side, cheapest first. `row` is 0 for White, 32 for Black. */
export function maskText({ squares }: AttackMap, row: number, mask: number): string {
  if (mask === 0) return '[]';
  let text = `[${SQUARE_TEXTS[squares[row | (31 - Math.clz32(mask & -mask))]!]!}`;
  for (let rest = mask & (mask - 1); rest !== 0; rest &= rest - 1)
    text += `,${SQUARE_TEXTS[squares[row | (31 - Math.clz32(rest & -rest))]!]!}`;
  return `${text}]`;
}

/** Values in brackets. */
export function listText<V>(values: readonly V[], map: AttackMap, write: Write<V>): string {
  const { length } = values;
  if (length === 0) return '[]';
  let text = `[${write(values[0]!, map)}`;
  for (let index = 1; index < length; index++) text += `,${write(values[index]!, map)}`;
  return `${text}]`;
}

/** One value for each side. */
export function sidesText<V>({ white, black }: BySide<V>, map: AttackMap, write: Write<V>): string {
  return `{"white":${write(white, map)},"black":${write(black, map)}}`;
}

/** The writer of an object: a text for each field of the promise, in this order. A field that is missing here does not compile. */
export function objectText<V, R>(fields: { readonly [Name in keyof R]-?: Write<V> }): Write<V> {
  const names = Object.keys(fields) as (keyof R & string)[];
  const before = names.map((name, index) => `${index === 0 ? '{' : ','}"${name}":`);
  const writers = names.map((name) => fields[name]);
  return (value, map) => {
    let text = '';
    for (let index = 0; index < writers.length; index++) text += before[index]! + writers[index]!(value, map);
    return `${text}}`;
  };
}
