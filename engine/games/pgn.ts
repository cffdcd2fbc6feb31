/**
 * PGN read as text (Portable Game Notation Specification, 12 March 1994, section 8): tags, moves as written, comments,
 * glyphs and variations as a tree, with the line of each. Nothing is checked against the board here.
 *
 * An own reader, because the libraries for it in the registry read a hundred to a thousand games a second and drop
 * variations or lines; `tests/bench` prints the rates beside each other.
 */

/** A move as written. */
export interface PgnMove {
  readonly text: string;
  /** Line of the text, from 1. */
  readonly line: number;
  /** Numeric annotation glyphs. */
  readonly nags: readonly number[];
  /** Comments behind the move. */
  readonly comments: readonly string[];
  /** Lines that could be played instead of it. */
  readonly variations: readonly (readonly PgnMove[])[];
}

/** Why a game, or a part of it, could not be read. */
export interface PgnFault {
  readonly code: 'unclosed-comment' | 'unclosed-variation' | 'stray-bracket' | 'too-deep' | 'bad-tag';
  readonly line: number;
  readonly message: string;
}

/** A game as written. */
export interface PgnGame {
  /** From 1, in the order of the text. */
  readonly number: number;
  readonly line: number;
  readonly tags: Readonly<Record<string, string>>;
  /** Comments before the first move. */
  readonly comments: readonly string[];
  readonly moves: readonly PgnMove[];
  readonly result: '1-0' | '0-1' | '1/2-1/2' | '*';
  readonly fault: PgnFault | null;
}

/** Variations inside variations are read so deep. */
const DEPTH_MAX = 40;
const TAG_LENGTH_MAX = 1000;

const TOKEN =
  /\n|\{|;[^\n]*|\[|\(|\)|1-0|0-1|1\/2-1\/2|\*|\$\d+|[!?]{1,2}(?=\s|$|[(){};])|\d+\s*\.+|\.+|[^\s{};()[\]$]+/g;
const TAG = /\[\s*(\w+)\s*"((?:\\.|[^"\\\n])*)"\s*\]/y;
const RESULTS: ReadonlySet<string> = new Set(['1-0', '0-1', '1/2-1/2', '*']);
const GLYPHS: Readonly<Record<string, number>> = { '!': 1, '?': 2, '!!': 3, '??': 4, '!?': 5, '?!': 6 };

/** Bytes of a file as text: UTF-8, else the Latin alphabet of Western Europe that old files are in. */
export function pgnText(bytes: Uint8Array): string {
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder('windows-1252').decode(bytes);
  }
}

interface Building {
  text: string;
  line: number;
  nags: number[];
  comments: string[];
  variations: PgnMove[][];
}

/** The games of a text, one after the other; only one is held at a time. */
export function* pgnGames(text: string): Generator<PgnGame> {
  const clean = text
    .replace(/^\uFEFF/, '')
    .replace(/\r\n?/g, '\n')
    .replaceAll('\0', '');
  const reader = new Reader(clean);
  let number = 0;
  for (let game = reader.next(number + 1); game !== undefined; game = reader.next(number + 1)) {
    number++;
    yield game;
  }
}

class Reader {
  readonly #text: string;
  #at = 0;
  #line = 1;

  constructor(text: string) {
    this.#text = text;
  }

  /** The next game; undefined at the end. */
  next(number: number): PgnGame | undefined {
    const tags: Record<string, string> = {};
    const intro: string[] = [];
    const main: Building[] = [];
    const open: Building[][] = [main];
    let result: PgnGame['result'] = '*';
    let fault: PgnFault | null = null;
    let line = 0;
    const refuse = (code: PgnFault['code'], message: string): void => {
      fault ??= { code, line: this.#line, message };
    };
    for (;;) {
      const start = this.#at;
      const token = this.#token();
      if (token === undefined) break;
      if (token === '[') {
        // Tags behind moves are those of the next game.
        if (main.length > 0 || open.length > 1) {
          this.#at = start;
          break;
        }
        line ||= this.#line;
        if (!this.#tag(start, tags)) refuse('bad-tag', 'A tag is written [Name "value"].');
        continue;
      }
      if (token.startsWith(';') || token === '{') {
        const comment = token === '{' ? this.#comment() : token.slice(1).trim();
        if (comment === undefined) {
          refuse('unclosed-comment', 'A comment that begins with { never ends.');
          break;
        }
        line ||= this.#line;
        const last = open[open.length - 1]!;
        (last[last.length - 1]?.comments ?? intro).push(comment);
        continue;
      }
      line ||= this.#line;
      if (RESULTS.has(token)) {
        result = token as PgnGame['result'];
        if (open.length > 1) refuse('unclosed-variation', 'A variation that begins with ( never ends.');
        break;
      }
      this.#move(token, open, refuse);
    }
    if (line === 0) return undefined;
    if (open.length > 1)
      fault ??= { code: 'unclosed-variation', line: this.#line, message: 'A variation that begins with ( never ends.' };
    return { number, line, tags, comments: intro, moves: main, result, fault };
  }

  /** The next token, lines counted; escaped lines (%) are left out. */
  #token(): string | undefined {
    for (;;) {
      if (this.#text.charAt(this.#at) === '%' && (this.#at === 0 || this.#text.charAt(this.#at - 1) === '\n')) {
        const end = this.#text.indexOf('\n', this.#at);
        this.#at = end < 0 ? this.#text.length : end;
      }
      TOKEN.lastIndex = this.#at;
      const found = TOKEN.exec(this.#text);
      if (!found) return undefined;
      this.#at = TOKEN.lastIndex;
      if (found[0] !== '\n') return found[0];
      this.#line++;
    }
  }

  /** A tag from its bracket on; a bad one is left behind with its line. */
  #tag(start: number, tags: Record<string, string>): boolean {
    const bracket = this.#text.indexOf('[', start);
    TAG.lastIndex = bracket;
    const found = TAG.exec(this.#text);
    if (!found || found[0].length > TAG_LENGTH_MAX) {
      const end = this.#text.indexOf('\n', bracket);
      this.#at = end < 0 ? this.#text.length : end;
      return false;
    }
    this.#at = TAG.lastIndex;
    tags[found[1]!] = found[2]!.replace(/\\(["\\])/g, '$1');
    return true;
  }

  #comment(): string | undefined {
    const end = this.#text.indexOf('}', this.#at);
    if (end < 0) return undefined;
    const comment = this.#text.slice(this.#at, end);
    this.#at = end + 1;
    for (let at = comment.indexOf('\n'); at >= 0; at = comment.indexOf('\n', at + 1)) this.#line++;
    return comment.replace(/\s+/g, ' ').trim();
  }

  #move(token: string, open: Building[][], refuse: (code: PgnFault['code'], message: string) => void): void {
    const current = open[open.length - 1]!;
    const last = current[current.length - 1];
    if (token === '(') {
      if (open.length >= DEPTH_MAX) refuse('too-deep', `Variations are read ${DEPTH_MAX} deep.`);
      if (!last) refuse('stray-bracket', 'A variation stands before the move it could replace.');
      const variation: Building[] = [];
      last?.variations.push(variation);
      open.push(variation);
    } else if (token === ')') {
      if (open.length === 1) refuse('stray-bracket', 'A ) ends no variation.');
      else open.pop();
    } else if (token.startsWith('$')) last?.nags.push(Number(token.slice(1)));
    else if (token in GLYPHS) last?.nags.push(GLYPHS[token]!);
    else if (!/^\d*\s*\.*$/.test(token) && !/^\.+$/.test(token) && !/^(?:e\.?p\.?|ch|mate)$/i.test(token)) {
      const [, move = token, sign = ''] = /^(.*?)([!?]{1,2})?$/.exec(token) ?? [];
      const nags = sign === '' ? [] : [GLYPHS[sign]!];
      current.push({ text: move.replace(/^\d+\.+/, ''), line: this.#line, nags, comments: [], variations: [] });
    }
  }
}
