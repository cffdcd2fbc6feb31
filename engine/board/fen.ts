/**
 * The FEN door (Portable Game Notation Specification, 12 March 1994, section 16.1): text in, position out,
 * every refusal coded. Nothing gets past it that the engine cannot read, and nothing throws.
 *
 * Forgiven: white space of any kind around and between fields, four fields instead of six (as in EPD, section 16.2:
 * `0 1` is added), EPD operations after the position, castling letters in any order.
 */
import { fail, ok, type Result } from '../result';
import { asFaults, type Fault, fault, type Faults } from './fault';
import { inWords, readBoard, writeBoard } from './fen-board';
import { readCastling, readCounter, readEnPassant, readSide, writeCastling } from './fen-fields';
import { castlingFaults, checkFaults, enPassantFaults, menFaults, soundRights } from './legality';
import type { Mode, Position } from './position';
import { squareName } from './squares';

/** Longest text that is looked at, in characters. */
export const FEN_LENGTH_MAX = 200;

/** A position that was admitted; in diagram mode with what strict mode would refuse. */
export interface Admitted {
  readonly position: Position;
  readonly warnings: readonly Fault[];
}

type Draft = Omit<Position, 'mode'>;

/**
 * Reads a FEN. `strict` takes legal positions only. `diagram` also takes what teachers draw: kings missing or
 * several of a side (the first from a1 on is then the one that checks are asked for), impossible counts, pawns on edge
 * ranks, a side in check that is not to move; what strict mode would refuse comes back as warnings, and castling and
 * en-passant rights that cannot be are dropped. More than 32 men of one side are refused in both modes.
 *
 * A refusal lists every fault of the fields that can be read, the most basic first.
 */
export function parseFen(text: string, mode: Mode = 'strict'): Result<Admitted, Faults> {
  const fields = fieldsOf(text);
  if (!fields.ok) return fields;
  const written: Fault[] = [];
  const draft = readFields(fields.value, written);
  const found = [...written, ...legalFaults(draft, written)];
  const refused = asFaults(mode === 'strict' ? found : found.filter((each) => !isDrawable(each)));
  if (refused) return fail(refused);

  const { board, sideToMove, castling, enPassant } = draft;
  const passed = enPassant !== null && enPassantFaults(board, sideToMove, enPassant).length === 0;
  const position: Position = {
    ...draft,
    mode,
    castling: soundRights(board, castling),
    enPassant: passed ? enPassant : null,
  };
  return ok({ position, warnings: found });
}

/** Writes all six fields. The square passed over is written after every double step, as the standard has it. */
export function formatFen(position: Position): string {
  const { board, sideToMove, castling, enPassant, halfmoves, fullmove } = position;
  return [
    writeBoard(board),
    sideToMove === 'white' ? 'w' : 'b',
    writeCastling(castling),
    enPassant === null ? '-' : squareName(enPassant),
    halfmoves,
    fullmove,
  ].join(' ');
}

type Fields = readonly [board: string, side: string, castling: string, enPassant: string, half: string, full: string];

/** Parts the fields and supplies missing counters. */
function fieldsOf(text: string): Result<Fields, Faults> {
  const refuse = (code: string, message: string) => fail([fault('text', code, message)] as const);
  if (text.length > FEN_LENGTH_MAX) {
    return refuse(
      'text-too-long',
      `The text has ${text.length} characters; a position needs at most ${FEN_LENGTH_MAX}.`,
    );
  }
  const parts = text.trim().split(/\s+/);
  if (parts[0] === '') return refuse('empty', 'There is no position in an empty text.');
  const odd = /[^\x21-\x7e\s]/u.exec(text)?.[0];
  if (odd !== undefined) {
    return refuse(
      'odd-character',
      `A position has plain letters, figures, "/" and "-" only; here stands ${shown(odd)}.`,
    );
  }
  const [board = '', side, castling, enPassant, half, full, operation] = parts;
  const count = inWords(parts.length);
  const wrongCount = `A position has six fields, or four without the counters; here ${parts.length === 1 ? 'is' : 'are'} ${count}.`;
  if (side === undefined || castling === undefined || enPassant === undefined) return refuse('field-count', wrongCount);
  if (half === undefined || (isOperation(half) && parts.length > 5)) {
    return ok([board, side, castling, enPassant, '0', '1']);
  }
  if (full === undefined) return refuse('field-count', wrongCount);
  if (operation !== undefined && !isOperation(operation)) {
    return refuse('field-count', `After the six fields stands "${operation}", which belongs to no position.`);
  }
  return ok([board, side, castling, enPassant, half, full]);
}

/** Whether a word can begin an operation of EPD, such as "bm". */
function isOperation(word: string): boolean {
  return /^[A-Za-z]\w+;?$/.test(word);
}

/** A character by its number, with itself before it where it can be printed. */
function shown(character: string): string {
  const point = character.codePointAt(0) ?? 0;
  const number = `U+${point.toString(16).toUpperCase().padStart(4, '0')}`;
  return /^[\p{L}\p{N}\p{P}\p{S}]$/u.test(character) ? `"${character}" (${number})` : number;
}

function readFields([board, side, castling, enPassant, half, full]: Fields, faults: Fault[]): Draft {
  return {
    board: readBoard(board, faults),
    sideToMove: readSide(side, faults),
    castling: readCastling(castling, faults),
    enPassant: readEnPassant(enPassant, faults),
    halfmoves: readCounter(half, 0, 'halfmove', faults),
    fullmove: readCounter(full, 1, 'fullmove', faults),
  };
}

/** What cannot have come from play, asked of those fields only that could be read. */
function legalFaults({ board, sideToMove, castling, enPassant }: Draft, written: readonly Fault[]): Fault[] {
  const unread = new Set(written.map(({ field }) => field));
  if (unread.has('board')) return [];
  const sideKnown = !unread.has('side');
  return [
    ...menFaults(board),
    ...(sideKnown ? checkFaults(board, sideToMove) : []),
    ...castlingFaults(board, castling),
    ...(sideKnown && enPassant !== null ? enPassantFaults(board, sideToMove, enPassant) : []),
  ];
}

/** Faults with which not even a diagram can be drawn: the others leave men on squares and a side to move. */
const UNDRAWABLE: ReadonlySet<string> = new Set([
  'rank-count',
  'rank-length',
  'digits-together',
  'unknown-letter',
  'side-form',
  'halfmove-form',
  'halfmove-range',
  'fullmove-form',
  'fullmove-range',
  'too-many-men',
]);

function isDrawable({ code }: Fault): boolean {
  return !UNDRAWABLE.has(code);
}
