/**
 * A page of bytes on which JSON is written, in UTF-8, as it is sent. Put down byte by byte, a reading needs no object and
 * no string of its own: a fifth of the time of building it as a value and asking JSON.stringify.
 */
import type { AttackMap } from '../attacks';
import { SQUARES, squareName } from '../board';
import type { BySide, Square } from '../types';

export interface Page {
  bytes: Uint8Array<ArrayBuffer>;
  /** The same bytes, to be written four at a time. */
  words: DataView<ArrayBuffer>;
  /** Bytes written so far. */
  length: number;
}

/** Text made once to be put down often: its bytes four to a word, the last filled up, and how many they are. */
export interface Fragment {
  readonly words: Uint32Array;
  readonly length: number;
}

/** Writes a value; the map says which men a mask means and who stands where. */
export type Write<V> = (page: Page, value: V, map: AttackMap) => void;

const PAGE_BYTES = 1 << 16;
const COMMA = 0x2c;
const OPEN = 0x5b;
const CLOSE = 0x5d;
const QUOTE = 0x22;
const BACKSLASH = 0x5c;

const encoder = new TextEncoder();

/** A page to write on, again and again. */
export function newPage(): Page {
  const bytes = new Uint8Array(PAGE_BYTES);
  return { bytes, words: new DataView(bytes.buffer), length: 0 };
}

/** What has been written, as bytes of their own; the page is empty again. */
export function torn(page: Page): Uint8Array<ArrayBuffer> {
  const written = page.bytes.slice(0, page.length);
  page.length = 0;
  return written;
}

/** A text as a fragment. */
export function fragment(text: string): Fragment {
  const bytes = encoder.encode(text);
  const view = new DataView(new ArrayBuffer((bytes.length + 3) & ~3));
  new Uint8Array(view.buffer).set(bytes);
  const words = Uint32Array.from({ length: view.byteLength >> 2 }, (_, index) => view.getUint32(index << 2, true));
  return { words, length: bytes.length };
}

/** Makes room for as many bytes more. */
function reserve(page: Page, count: number): void {
  if (page.length + count <= page.bytes.length) return;
  const larger = new Uint8Array(2 * (page.length + count));
  larger.set(page.bytes);
  page.bytes = larger;
  page.words = new DataView(larger.buffer);
}

/** Puts down a fragment. What fills up its last word is written over by what follows. */
export function put(page: Page, { words, length }: Fragment): void {
  reserve(page, length + 3);
  const to = page.words;
  let at = page.length;
  page.length = at + length;
  for (let index = 0; index < words.length; index++, at += 4) to.setUint32(at, words[index]!, true);
}

/** Puts down a text in quotes, or null. */
export function putText(page: Page, text: string | null): void {
  if (text === null) return put(page, NULL);
  const { length } = text;
  reserve(page, 3 * length + 2);
  const { bytes } = page;
  let at = page.length;
  bytes[at++] = QUOTE;
  for (let index = 0; index < length; index++) {
    const code = text.charCodeAt(index);
    if (code < 0x80) {
      if (code < 0x20 || code === QUOTE || code === BACKSLASH) return put(page, fragment(JSON.stringify(text)));
      bytes[at++] = code;
    } else if (code < 0x800 || (code >= 0xd800 && code < 0xe000)) {
      return put(page, fragment(JSON.stringify(text)));
    } else {
      // The apostrophe of our sentences and its like.
      bytes[at++] = 0xe0 | (code >> 12);
      bytes[at++] = 0x80 | ((code >> 6) & 0x3f);
      bytes[at++] = 0x80 | (code & 0x3f);
    }
  }
  bytes[at++] = QUOTE;
  page.length = at;
}

/** Puts down a finite number, or null. */
export function putNumber(page: Page, number: number | null): void {
  reserve(page, 24);
  if (number !== null && number >= 0 && number < 10 && Number.isInteger(number)) {
    page.bytes[page.length++] = 0x30 + number;
    return;
  }
  const text = `${number}`;
  for (let index = 0; index < text.length; index++) page.bytes[page.length++] = text.charCodeAt(index);
}

const NULL = fragment('null');
const TRUE = fragment('true');
const FALSE = fragment('false');

/** Puts down true or false. */
export function putFlag(page: Page, flag: boolean): void {
  put(page, flag ? TRUE : FALSE);
}

/** Quoted names of the squares: four bytes, so one word each. */
const SQUARE_WORDS = Uint32Array.from(SQUARES, (square) => fragment(`"${squareName(square)}"`).words[0]!);

/** Puts down a square's name, or null. */
export function putSquare(page: Page, square: number | null): void {
  if (square === null) return put(page, NULL);
  reserve(page, 4);
  page.words.setUint32(page.length, SQUARE_WORDS[square]!, true);
  page.length += 4;
}

/** Puts down the letter of a file, 0 = a. */
export const putFile: Write<number> = (page, file) => {
  reserve(page, 3);
  page.bytes[page.length++] = QUOTE;
  page.bytes[page.length++] = 0x61 + file;
  page.bytes[page.length++] = QUOTE;
};

function putByte(page: Page, byte: number): void {
  reserve(page, 1);
  page.bytes[page.length++] = byte;
}

/** Puts down values in brackets. */
export function putList<V>(page: Page, values: readonly V[], map: AttackMap, write: Write<V>): void {
  putByte(page, OPEN);
  for (let index = 0; index < values.length; index++) {
    if (index > 0) putByte(page, COMMA);
    write(page, values[index]!, map);
  }
  putByte(page, CLOSE);
}

/** Puts down texts in brackets. */
export function putTexts(page: Page, texts: readonly string[]): void {
  putByte(page, OPEN);
  for (let index = 0; index < texts.length; index++) {
    if (index > 0) putByte(page, COMMA);
    putText(page, texts[index]!);
  }
  putByte(page, CLOSE);
}

/** Puts down names of squares, in the order given. */
export const putSquares: Write<readonly Square[]> = (page, squares) => {
  putByte(page, OPEN);
  for (let index = 0; index < squares.length; index++) {
    if (index > 0) putByte(page, COMMA);
    putSquare(page, squares[index]!);
  }
  putByte(page, CLOSE);
};

/** Puts down the squares of the men in a mask of one side, cheapest first. `row` is 0 for White, 32 for Black. */
export function putMask(page: Page, { squares }: AttackMap, row: number, mask: number): void {
  putByte(page, OPEN);
  for (let rest = mask; rest !== 0; rest &= rest - 1) {
    if (rest !== mask) putByte(page, COMMA);
    putSquare(page, squares[row | (31 - Math.clz32(rest & -rest))]!);
  }
  putByte(page, CLOSE);
}

const WHITE = fragment('{"white":');
const BLACK = fragment(',"black":');
const END = fragment('}');

/** Puts down one value for each side. */
export function putSides<V>(page: Page, { white, black }: BySide<V>, map: AttackMap, write: Write<V>): void {
  put(page, WHITE);
  write(page, white, map);
  put(page, BLACK);
  write(page, black, map);
  put(page, END);
}

/** The writer of an object: each field of the promise, in this order. A field that is missing here does not compile. */
export function objectWriter<V, R>(fields: { readonly [Name in keyof R]-?: Write<V> }): Write<V> {
  const names = Object.keys(fields) as (keyof R & string)[];
  const before = names.map((name, index) => fragment(`${index === 0 ? '{' : ','}"${name}":`));
  const writers = names.map((name) => fields[name]);
  return (page, value, map) => {
    for (let index = 0; index < writers.length; index++) {
      put(page, before[index]!);
      writers[index]!(page, value, map);
    }
    put(page, END);
  };
}
