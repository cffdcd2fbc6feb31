/**
 * PGN read as text (Portable Game Notation Specification, 12 March 1994, section 8): tags, moves as written, comments,
 * glyphs and variations as a tree, with the line of each. Nothing is checked against the board here.
 *
 * An own reader, because the libraries for it in the registry read a hundred to a thousand games a second and drop
 * variations or lines; `tests/bench` prints the rates beside each other.
 */
import { PgnReader } from './pgn-reader';

/** A move as written. */
export interface PgnMove {
  /** Without its number and its glyphs. */
  readonly text: string;
  /** Line of the text, from 1. */
  readonly line: number;
  /** Numeric annotation glyphs, 0 to 255; signs as "!?" come as their numbers. */
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

/**
 * Bytes of a file as text: UTF-8, UTF-16 where its mark says so, else the Latin alphabet of Western Europe that old
 * files are in. Never throws.
 */
export function pgnText(bytes: Uint8Array): string {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return new TextDecoder('utf-16le').decode(bytes);
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return new TextDecoder('utf-16be').decode(bytes);
  try {
    return new TextDecoder('utf-8', { fatal: true }).decode(bytes);
  } catch {
    return new TextDecoder('windows-1252').decode(bytes);
  }
}

/** The games of a text, one after the other; only one is held at a time. */
export function* pgnGames(text: string): Generator<PgnGame> {
  const reader = new PgnReader(plainLines(text));
  for (let number = 1, game = reader.next(1); game; game = reader.next(++number)) yield game;
}

/** A text with plain line ends, without byte-order mark and the stray bytes of old files: zeros and the end mark of DOS. */
export function plainLines(text: string): string {
  const bare = text.charCodeAt(0) === 0xfeff ? text.slice(1) : text;
  const lines = bare.includes('\r') ? bare.replace(/\r\n?/g, '\n') : bare;
  return lines.replaceAll('\0', '').replaceAll('\x1a', '');
}
