/** PGN written in the export format (Portable Game Notation Specification, 12 March 1994, 8.2): lines below 80 letters. */
import type { PgnMove } from './pgn';

/** What a written game is made from. */
export interface WrittenGame {
  readonly tags: Readonly<Record<string, string>>;
  readonly comments: readonly string[];
  /** Moves in SAN; `text` is written as it stands. */
  readonly moves: readonly PgnMove[];
  readonly result: string;
  /** Number and side of the first move. */
  readonly first: { readonly fullmove: number; readonly side: 'white' | 'black' };
}

/** The seven tags that every game has, in their order. */
const ROSTER = ['Event', 'Site', 'Date', 'Round', 'White', 'Black', 'Result'] as const;
const UNKNOWN: Readonly<Record<string, string>> = { Date: '????.??.??', Result: '*' };
const LINE_LENGTH_MAX = 79;

/** A game as text, ending with an empty line. */
export function writePgn({ tags, comments, moves, result, first }: WrittenGame): string {
  const all = {
    ...Object.fromEntries(ROSTER.map((name) => [name, tags[name] ?? UNKNOWN[name] ?? '?'])),
    Result: result,
  };
  const others = Object.entries(tags).filter(([name]) => !(ROSTER as readonly string[]).includes(name));
  const head = [...Object.entries(all), ...others].map(([name, value]) => `[${name} "${escaped(value)}"]`);
  const words = [...comments.map(commentText), ...lineWords(moves, first), result];
  return `${head.join('\n')}\n\n${filled(words.flatMap((word) => word.split(' ')))}\n\n`;
}

function escaped(value: string): string {
  return value.replace(/[\r\n]+/g, ' ').replace(/(["\\])/g, '\\$1');
}

/** A comment cannot hold its own end; the standard has no way to escape it. */
function commentText(comment: string): string {
  return `{${comment.replaceAll('}', ')').replace(/\s+/g, ' ').trim()}}`;
}

function lineWords(moves: readonly PgnMove[], { fullmove, side }: WrittenGame['first']): string[] {
  const words: string[] = [];
  let number = fullmove;
  let mover = side;
  let numbered = true;
  for (const { text, nags, comments, variations } of moves) {
    if (mover === 'white') words.push(`${number}.`);
    else if (numbered) words.push(`${number}...`);
    words.push(text, ...nags.map((nag) => `$${nag}`), ...comments.map(commentText));
    for (const variation of variations)
      words.push(...bracketed(lineWords(variation, { fullmove: number, side: mover })));
    numbered = comments.length + variations.length > 0;
    if (mover === 'black') number++;
    mover = mover === 'white' ? 'black' : 'white';
  }
  return words;
}

function bracketed(words: readonly string[]): string[] {
  if (words.length === 0) return [];
  const line = [...words];
  line[0] = `(${line[0]}`;
  line[line.length - 1] += ')';
  return line;
}

function filled(words: readonly string[]): string {
  const lines: string[] = [];
  let line = '';
  for (const word of words) {
    if (line !== '' && line.length + 1 + word.length > LINE_LENGTH_MAX) {
      lines.push(line);
      // At the beginning of a line these two would be an escape and a tag, even inside a comment.
      line = word.startsWith('%') || word.startsWith('[') ? ` ${word}` : word;
    } else line = line === '' ? word : `${line} ${word}`;
  }
  return [...lines, line].join('\n');
}
