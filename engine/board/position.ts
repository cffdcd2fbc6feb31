/** A position as a value. Never changed once made. */
import { KINDS, type Kind, type Man, type Side, type Square } from '../types';

/**
 * Code of a man in the mailbox: 0 empty; White 1 to 6 and Black 9 to 14 in the order of KINDS.
 * `code & 7` is the kind's place from 1, `code >> 3` is 0 for White, 1 for Black.
 */
export type ManCode = number;

/** Places of the kinds in a man's code (`code & 7`), in the order of KINDS. */
export const PAWN = 1;
export const KNIGHT = 2;
export const BISHOP = 3;
export const ROOK = 4;
export const QUEEN = 5;
export const KING = 6;

export interface CastlingRights {
  readonly whiteKing: boolean;
  readonly whiteQueen: boolean;
  readonly blackKing: boolean;
  readonly blackQueen: boolean;
}

/** How the position was admitted: `strict` is proven legal, `diagram` may be what teachers draw. */
export type Mode = 'strict' | 'diagram';

export interface Position {
  readonly mode: Mode;
  /** 64 man codes, a1 first. */
  readonly board: Readonly<Uint8Array>;
  readonly sideToMove: Side;
  readonly castling: CastlingRights;
  /** The square passed over by a pawn's double step just now, as the standard writes it: always after a double step. */
  readonly enPassant: Square | null;
  readonly halfmoves: number;
  readonly fullmove: number;
}

const MEN: readonly (Man | null)[] = Array.from({ length: 16 }, (_, code) => {
  const kind = KINDS[(code & 7) - 1];
  return kind ? { side: code >> 3 ? 'black' : 'white', kind } : null;
});

/** Code of a man for the mailbox. */
export function manCode(side: Side, kind: Kind): ManCode {
  return (side === 'white' ? 0 : 8) + KINDS.indexOf(kind) + 1;
}

/** The man of a code, null for an empty square. */
export function manOf(code: ManCode): Man | null {
  return MEN[code] ?? null;
}

/** The man on a square, or null. */
export function manOn(position: Position, square: Square): Man | null {
  return MEN[position.board[square] as ManCode] ?? null;
}

/**
 * The same board with some squares set anew (null clears): for 'what if' questions. Castling rights
 * and the en-passant square are dropped, and the result counts as a diagram, since nothing proves it legal.
 */
export function withMen(position: Position, changes: readonly { square: Square; man: Man | null }[]): Position {
  const board = Uint8Array.from(position.board);
  for (const { square, man } of changes) board[square] = man ? manCode(man.side, man.kind) : 0;
  return { ...position, mode: 'diagram', board, castling: NO_CASTLING, enPassant: null };
}

export const NO_CASTLING: CastlingRights = { whiteKing: false, whiteQueen: false, blackKing: false, blackQueen: false };
