/**
 * The main line of the first game of a PGN text (Portable Game Notation Specification, 12 March 1994, section 8): the
 * tag that sets a position up and the moves as written, without comments, variations, glyphs and numbers.
 */

/** What a game says, nothing of it checked yet. */
export interface MainLine {
  /** Text of the FEN tag; null where the game starts from the first position. */
  readonly fen: string | null;
  /** The moves as written. */
  readonly moves: readonly string[];
}

/**
 * In the order of trying: brace comment, comment to the end of the line, escaped line, tag, variation's begin and end,
 * result, numeric glyph, move number, word. An open comment or tag runs to the end of the text or line.
 */
const TOKEN =
  /\{[^}]*\}?|;[^\n]*|(?<=^|\n)%[^\n]*|\[[^\]"\n]*(?:"(?:\\.|[^"\\\n])*"?)?[^\]\n]*\]?|[()]|1-0|0-1|1\/2-1\/2|\*|\$\d*|\d+\.+|[^\s{};()[\]$*]+/g;

const TAG = /^\[\s*(\w+)\s+"((?:\\.|[^"\\])*)"/;
const RESULT = /^(1-0|0-1|1\/2-1\/2|\*)$/;

/** Reads the first game of a text; stops at its result or at the tags of the next one. */
export function mainLine(text: string): MainLine {
  const moves: string[] = [];
  let fen: string | null = null;
  let begun = false;
  let depth = 0;
  for (const [token] of text.replaceAll('\r', '').matchAll(TOKEN)) {
    const first = token.charAt(0);
    if (first === '{' || first === ';' || first === '%' || first === '$') continue;
    if (first === '[') {
      if (begun) break;
      const [, name = '', value = ''] = TAG.exec(token) ?? [];
      if (name.toUpperCase() === 'FEN') fen = value;
      continue;
    }
    begun = true;
    if (first === '(') depth++;
    else if (first === ')') depth = Math.max(0, depth - 1);
    else if (depth === 0) {
      if (RESULT.test(token)) break;
      const move = token.replace(/[!?]+$/, '');
      if (!/^[\d.…]*$/.test(move)) moves.push(move);
    }
  }
  return { fen, moves };
}
