/**
 * The FEN door (Portable Game Notation Specification, 12 March 1994, section 16.1): text in, position out,
 * every refusal coded. Nothing gets past it that the engine cannot read, and nothing throws.
 *
 * Forgiven: white space around and between fields, four fields instead of six (as in EPD, section 16.2:
 * `0 1` is added), EPD operations after the position, castling letters in any order.
 */
import { fail, ok, type Result } from '../result';
import type { Side, Square } from '../types';
import { asFaults, type Fault, fault, type Faults } from './fault';
import { readBoard, writeBoard } from './fen-board';
import { castlingFaults, checkFaults, enPassantFaults, menFaults } from './legality';
import { type CastlingRights, type Mode, NO_CASTLING, type Position } from './position';
import { squareName, squareNamed } from './squares';

/** Longest text that is looked at, in characters. */
export const FEN_LENGTH_MAX = 200;
/** Highest move numbers that are read. */
const COUNTER_MAX = 9999;

/** A position that was admitted; in diagram mode with what strict mode would refuse. */
export interface Admitted {
  readonly position: Position;
  readonly warnings: readonly Fault[];
}

/**
 * Reads a FEN. `strict` takes legal positions only. `diagram` also takes what teachers draw: kings
 * missing, impossible counts, pawns on edge ranks, a side in check that is not to move; what strict mode would
 * refuse comes back as warnings, and castling and en-passant rights that cannot be are dropped.
 */
export function parseFen(text: string, mode: Mode = 'strict'): Result<Admitted, Faults> {
  const fields = fieldsOf(text);
  if (!fields.ok) return fields;
  const written: Fault[] = [];
  const draft = readFields(fields.value, written);
  const refused = asFaults(written);
  if (refused) return fail(refused);

  const { board, sideToMove, castling, enPassant } = draft;
  const men = menFaults(board);
  const castlingWrong = castlingFaults(board, castling);
  const passingWrong = enPassant === null ? [] : enPassantFaults(board, sideToMove, enPassant);
  const warnings = [...men, ...checkFaults(board, sideToMove), ...castlingWrong, ...passingWrong];
  const faults = asFaults(mode === 'strict' ? warnings : warnings.filter(({ code }) => code === 'too-many-men'));
  if (faults) return fail(faults);
  const position: Position = {
    ...draft,
    mode,
    castling: castlingWrong.length > 0 ? NO_CASTLING : castling,
    enPassant: passingWrong.length > 0 ? null : enPassant,
  };
  return ok({ position, warnings });
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
  if (text.length > FEN_LENGTH_MAX) {
    return fail([
      fault(
        'text',
        'text-too-long',
        `The text has ${text.length} characters; a position needs fewer than ${FEN_LENGTH_MAX}.`,
      ),
    ]);
  }
  const parts = text.trim().split(/\s+/);
  if (parts[0] === '') return fail([fault('text', 'empty', 'There is no position in an empty text.')]);
  const [board = '', side, castling, enPassant, half, full, operation] = parts;
  if (side === undefined || castling === undefined || enPassant === undefined) {
    return fail([
      fault(
        'text',
        'field-count',
        `A position has six fields, or four without the counters; here ${parts.length === 1 ? 'is one' : `are ${parts.length}`}.`,
      ),
    ]);
  }
  const isOperation = (word: string | undefined) => word !== undefined && /^[A-Za-z]\w+;?$/.test(word);
  if (half === undefined || (isOperation(half) && parts.length > 5))
    return ok([board, side, castling, enPassant, '0', '1']);
  if (full === undefined) {
    return fail([
      fault('text', 'field-count', 'A position has six fields, or four without the counters; here are five.'),
    ]);
  }
  if (operation !== undefined && !isOperation(operation)) {
    return fail([
      fault('text', 'field-count', `After the six fields stands "${operation}", which belongs to no position.`),
    ]);
  }
  return ok([board, side, castling, enPassant, half, full]);
}

function readFields([board, side, castling, enPassant, half, full]: Fields, faults: Fault[]): Omit<Position, 'mode'> {
  return {
    board: readBoard(board, faults),
    sideToMove: readSide(side, faults),
    castling: readCastling(castling, faults),
    enPassant: readEnPassant(enPassant, faults),
    halfmoves: readCounter(half, 0, 'halfmove', faults),
    fullmove: readCounter(full, 1, 'fullmove', faults),
  };
}

function readSide(field: string, faults: Fault[]): Side {
  if (field !== 'w' && field !== 'b') {
    faults.push(fault('side', 'side-form', `The side to move is "w" or "b", not "${field}".`));
  }
  return field === 'b' ? 'black' : 'white';
}

function readCastling(field: string, faults: Fault[]): CastlingRights {
  if (field === '-') return NO_CASTLING;
  if (!/^[KQkq]{1,4}$/.test(field) || new Set(field).size !== field.length) {
    faults.push(
      fault(
        'castling',
        'castling-form',
        `Castling is "-" or some of the letters K, Q, k, q, each once; not "${field}".`,
      ),
    );
    return NO_CASTLING;
  }
  return {
    whiteKing: field.includes('K'),
    whiteQueen: field.includes('Q'),
    blackKing: field.includes('k'),
    blackQueen: field.includes('q'),
  };
}

function writeCastling({ whiteKing, whiteQueen, blackKing, blackQueen }: CastlingRights): string {
  return `${whiteKing ? 'K' : ''}${whiteQueen ? 'Q' : ''}${blackKing ? 'k' : ''}${blackQueen ? 'q' : ''}` || '-';
}

function readEnPassant(field: string, faults: Fault[]): Square | null {
  if (field === '-') return null;
  const square = squareNamed(field);
  if (square === undefined) {
    faults.push(
      fault('enPassant', 'en-passant-form', `The square passed over is "-" or a square such as "e3", not "${field}".`),
    );
  }
  return square ?? null;
}

function readCounter(field: string, least: number, name: 'halfmove' | 'fullmove', faults: Fault[]): number {
  const label = name === 'halfmove' ? 'half-move counter' : 'move number';
  const count = /^\d{1,6}$/.test(field) ? Number(field) : Number.NaN;
  if (Number.isNaN(count)) {
    faults.push(fault(name, `${name}-form`, `The ${label} is a whole number, not "${field}".`));
    return least;
  }
  if (count < least || count > COUNTER_MAX) {
    faults.push(
      fault(name, `${name}-range`, `The ${label} lies between ${least} and ${COUNTER_MAX}; here it is ${count}.`),
    );
    return least;
  }
  return count;
}
