/** The fields of a FEN after the board: side to move, castling, the square passed over, the two counters. */
import type { Side, Square } from '../types';
import { type Fault, fault } from './fault';
import { type CastlingRights, NO_CASTLING } from './position';
import { squareNamed } from './squares';

/** Highest move numbers that are read. */
const COUNTER_MAX = 9999;

/** Side to move; White where the field is at fault. */
export function readSide(field: string, faults: Fault[]): Side {
  if (field !== 'w' && field !== 'b') {
    faults.push(fault('side', 'side-form', `The side to move is "w" or "b", not "${field}".`));
  }
  return field === 'b' ? 'black' : 'white';
}

/** Castling rights, letters in any order; none where the field is at fault. */
export function readCastling(field: string, faults: Fault[]): CastlingRights {
  if (field === '-') return NO_CASTLING;
  if (!/^[KQkq]{1,4}$/.test(field) || new Set(field).size !== field.length) {
    const letters = 'Castling is "-" or some of the letters K, Q, k, q, each once';
    const message = /^[A-Ha-hKQkq]+$/.test(field)
      ? /[A-Ha-h]/.test(field)
        ? `${letters}; "${field}" names files of rooks, as games with shuffled back ranks do, and those are not read.`
        : `${letters}; "${field}" says one twice.`
      : `${letters}; not "${field}".`;
    faults.push(fault('castling', 'castling-form', message));
    return NO_CASTLING;
  }
  return {
    whiteKing: field.includes('K'),
    whiteQueen: field.includes('Q'),
    blackKing: field.includes('k'),
    blackQueen: field.includes('q'),
  };
}

/** The castling field, letters in the standard's order. */
export function writeCastling({ whiteKing, whiteQueen, blackKing, blackQueen }: CastlingRights): string {
  return `${whiteKing ? 'K' : ''}${whiteQueen ? 'Q' : ''}${blackKing ? 'k' : ''}${blackQueen ? 'q' : ''}` || '-';
}

/** The square passed over; null for none and where the field is at fault. */
export function readEnPassant(field: string, faults: Fault[]): Square | null {
  if (field === '-') return null;
  const square = squareNamed(field);
  if (square === undefined) {
    faults.push(
      fault('enPassant', 'en-passant-form', `The square passed over is "-" or a square such as "e3", not "${field}".`),
    );
  }
  return square ?? null;
}

/** A counter from `least` to 9999; `least` where the field is at fault. */
export function readCounter(field: string, least: number, name: 'halfmove' | 'fullmove', faults: Fault[]): number {
  const label = name === 'halfmove' ? 'half-move counter' : 'move number';
  if (!/^\d+$/.test(field)) {
    faults.push(fault(name, `${name}-form`, `The ${label} is a whole number, not "${field}".`));
    return least;
  }
  const count = Number(field);
  if (count < least || count > COUNTER_MAX) {
    faults.push(
      fault(name, `${name}-range`, `The ${label} lies between ${least} and ${COUNTER_MAX}; here it is ${field}.`),
    );
    return least;
  }
  return count;
}
