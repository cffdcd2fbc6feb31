/** The reader behind `pgnGames`: one pass over the text, a character at a time, with the line of everything. */
import { GLYPHS } from './glyphs';
import type { PgnFault, PgnGame, PgnMove } from './pgn';

/** Variations inside variations are read so deep. */
export const VARIATION_DEPTH_MAX = 40;

const TAG = /\[\s*([^\s"\]]+)\s*"((?:\\.|[^"\\\n])*)"\s*\]/y;
/** Tags as they should not be but are: quotes inside the value, the last quote missing. */
const LOOSE_TAG = /\[\s*([^\s"\]]+)\s*"([^\n]*?)"?\s*\][^\S\n]*(?=\n|$)/y;
/** A tag on a line of its own, at its beginning. Inside a comment it says that the comment was never ended. */
const TAG_LINE = /\n\[\w+ "[^\n]*"\][^\S\n]*(?=\n|$)/g;
const NOT_MOVES: ReadonlySet<string> = new Set(['ep', 'e.p.', 'e.p', 'ch', 'ch.', 'mate', 'dbl', 'dis', 'N', 'D']);

const NEWLINE = 10;
const EXCLAIM = 33;
const DOLLAR = 36;
const PERCENT = 37;
const OPEN = 40;
const CLOSE = 41;
const STAR = 42;
const DOT = 46;
const ZERO = 48;
const NINE = 57;
const SEMICOLON = 59;
const QUESTION = 63;
const BRACKET = 91;
const BRACKET_END = 93;
const BRACE = 123;
const BRACE_END = 125;

/** One entry a character below 128: 1 where it ends a word. */
const ENDS_WORD: Readonly<Uint8Array> = Uint8Array.from({ length: 128 }, (_, code) =>
  code <= 32 || '{};()[]$*'.includes(String.fromCharCode(code)) ? 1 : 0,
);

interface Building extends PgnMove {
  readonly nags: number[];
  readonly comments: string[];
  readonly variations: Building[][];
}

/** A game being read. */
class Draft {
  line = 0;
  readonly tags: Record<string, string> = {};
  readonly comments: string[] = [];
  readonly moves: Building[] = [];
  /** The lines that are open, the main line first. */
  readonly lines: Building[][] = [this.moves];
  /** The line of the ( of each open variation. */
  readonly openedOn: number[] = [];
  result: PgnGame['result'] = '*';
  fault: PgnFault | null = null;

  get hasTags(): boolean {
    for (const _ in this.tags) return true;
    return false;
  }

  get last(): Building | undefined {
    const line = this.lines[this.lines.length - 1]!;
    return line[line.length - 1];
  }

  refuse(code: PgnFault['code'], line: number, message: string): void {
    this.fault ??= { code, line, message };
  }
}

export class PgnReader {
  readonly #text: string;
  #at = 0;
  #line: number;
  /** Whether the last game had an end of its own: a result, or the tags of the next. */
  ended = false;

  /** Reads a text whose line ends are plain newlines; `line` is the number of its first line. */
  constructor(text: string, line = 1) {
    this.#text = text;
    this.#line = line;
  }

  /** How far the text is read, and the line there. */
  get place(): { readonly at: number; readonly line: number } {
    return { at: this.#at, line: this.#line };
  }

  /** The next game, with the number it shall have; undefined at the end. Results and remarks outside games are left out. */
  next(number: number): PgnGame | undefined {
    for (;;) {
      const draft = new Draft();
      this.ended = this.#read(draft);
      if (draft.line === 0) return undefined;
      const { line, tags, comments, moves, result, fault, openedOn } = draft;
      if (moves.length === 0 && !fault && !draft.hasTags) continue;
      const open = openedOn[0];
      if (open !== undefined) draft.refuse('unclosed-variation', open, 'A variation that begins with ( never ends.');
      return { number, line, tags, comments, moves, result, fault: draft.fault };
    }
  }

  /** Reads to the end of a game. */
  #read(draft: Draft): boolean {
    const text = this.#text;
    for (;;) {
      this.#skipSpace();
      if (this.#at >= text.length) return false;
      const code = text.charCodeAt(this.#at);
      if (code === PERCENT && (this.#at === 0 || text.charCodeAt(this.#at - 1) === NEWLINE)) {
        this.#at = this.#lineEnd();
        continue;
      }
      if (code === BRACKET) {
        // Tags behind moves are those of the next game.
        if (draft.moves.length > 0 || draft.openedOn.length > 0) return true;
        draft.line ||= this.#line;
        this.#tag(draft);
        continue;
      }
      draft.line ||= this.#line;
      if (code === BRACE || code === SEMICOLON) {
        if (!this.#comment(draft, code)) return true;
      } else if (code === OPEN || code === CLOSE) this.#bracket(draft, code);
      else if (code === DOLLAR) this.#glyph(draft);
      else if (code === STAR) {
        this.#at++;
        return true;
      } else if (code === DOT || code === BRACKET_END || code === BRACE_END) this.#at++;
      else if (this.#word(draft, code)) return true;
    }
  }

  #skipSpace(): void {
    const text = this.#text;
    for (; this.#at < text.length; this.#at++) {
      const code = text.charCodeAt(this.#at);
      if (code === NEWLINE) this.#line++;
      else if (code > 32 && code !== 0xa0 && code !== 0xfeff) return;
    }
  }

  #lineEnd(): number {
    const end = this.#text.indexOf('\n', this.#at);
    return end < 0 ? this.#text.length : end;
  }

  #tag(draft: Draft): void {
    TAG.lastIndex = LOOSE_TAG.lastIndex = this.#at;
    const strict = TAG.exec(this.#text);
    const found = strict ?? LOOSE_TAG.exec(this.#text);
    if (found) {
      const value = found[2]!;
      draft.tags[found[1]!] = strict && value.includes('\\') ? value.replace(/\\(["\\])/g, '$1') : value;
      this.#at += found[0].length;
    } else {
      draft.refuse('bad-tag', this.#line, 'A tag is written [Name "value"].');
      this.#at = this.#lineEnd();
    }
  }

  /** False where the comment never ends; then reading goes on at the next tags. */
  #comment(draft: Draft, code: number): boolean {
    const begin = this.#at + 1;
    const closing = code === SEMICOLON ? this.#lineEnd() : this.#text.indexOf('}', begin);
    const found = this.#text.slice(begin, closing < 0 ? undefined : closing);
    if (code === BRACE) {
      TAG_LINE.lastIndex = 0;
      const tag = found.includes('\n') ? TAG_LINE.exec(found) : null;
      if (tag || closing < 0) {
        draft.refuse('unclosed-comment', this.#line, 'A comment that begins with { never ends.');
        const length = tag ? tag.index + 1 : found.length;
        this.#line += newlines(found.slice(0, length));
        this.#at = begin + length;
        return false;
      }
      this.#line += newlines(found);
    }
    this.#at = closing + (code === BRACE ? 1 : 0);
    (draft.last?.comments ?? draft.comments).push(found.replace(/\s+/g, ' ').trim());
    return true;
  }

  #bracket(draft: Draft, code: number): void {
    this.#at++;
    if (code === CLOSE) {
      if (draft.lines.length === 1) draft.refuse('stray-bracket', this.#line, 'A ) ends no variation.');
      else {
        draft.lines.pop();
        draft.openedOn.pop();
      }
      return;
    }
    if (draft.lines.length > VARIATION_DEPTH_MAX)
      draft.refuse('too-deep', this.#line, `Variations are read ${VARIATION_DEPTH_MAX} deep.`);
    const last = draft.last;
    if (!last) draft.refuse('stray-bracket', this.#line, 'A variation stands before the move it could replace.');
    const variation: Building[] = [];
    last?.variations.push(variation);
    draft.lines.push(variation);
    draft.openedOn.push(this.#line);
  }

  #glyph(draft: Draft): void {
    let glyph = 0;
    let code = this.#text.charCodeAt(++this.#at);
    for (; code >= ZERO && code <= NINE; code = this.#text.charCodeAt(++this.#at))
      glyph = Math.min(1000, glyph * 10 + code - ZERO);
    // The standard has glyphs up to 255.
    if (glyph < 256) draft.last?.nags.push(glyph);
  }

  /** A move, its number, a glyph in letters, or the result; true where it is the result. */
  #word(draft: Draft, first: number): boolean {
    const text = this.#text;
    const begin = this.#at;
    let end = begin + 1;
    for (; end < text.length; end++) {
      const code = text.charCodeAt(end);
      if (code < 128 ? ENDS_WORD[code] === 1 : code === 0xa0) break;
    }
    this.#at = end;
    let start = begin;
    if (first >= ZERO && first <= NINE) {
      const word = text.slice(begin, end);
      const result = resultOf(word);
      if (result) {
        draft.result = result;
        return true;
      }
      let code = first;
      while (start < end && code >= ZERO && code <= NINE) code = text.charCodeAt(++start);
      if (start < end && code !== DOT) start = begin;
      else while (start < end && text.charCodeAt(start) === DOT) start++;
      if (start === end) return false;
    }
    let stop = end;
    while (stop > start && isGlyphSign(text.charCodeAt(stop - 1))) stop--;
    const move = text.slice(start, stop);
    const sign = stop < end ? GLYPHS.get(text.slice(stop, Math.min(end, stop + 2))) : undefined;
    const glyph = GLYPHS.get(move);
    if (glyph !== undefined) draft.last?.nags.push(glyph);
    else if (move !== '' && !NOT_MOVES.has(move)) {
      const nags = sign === undefined ? [] : [sign];
      draft.lines[draft.lines.length - 1]!.push({ text: move, line: this.#line, nags, comments: [], variations: [] });
      return false;
    }
    if (sign !== undefined) draft.last?.nags.push(sign);
    return false;
  }
}

function isGlyphSign(code: number): boolean {
  return code === EXCLAIM || code === QUESTION;
}

/** The result that a word says; the draw also as "1/2". */
function resultOf(word: string): PgnGame['result'] | null {
  if (word === '1-0' || word === '0-1') return word;
  return word === '1/2-1/2' || word === '1/2' ? '1/2-1/2' : null;
}

function newlines(text: string): number {
  let count = 0;
  for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) count++;
  return count;
}
