/** Legal moves of a position and the position after one. */
import type { CastlingRights, Position } from '../board';
import { KINDS, type Side, type Square } from '../types';
import { countMoves, isLegal, pseudoMoves } from './generate';
import type { Move } from './move';
import { inCheck as boardInCheck, make, MOVES_MAX, newUndo, type ScratchBoard, scratchBoard } from './scratch-board';

const SPECIALS = [null, 'double-step', 'en-passant', 'castle-king', 'castle-queen'] as const;

/**
 * All legal moves of the side to move, by the square of the man, then as generated. A king is never captured, not even
 * in diagrams where it could be.
 */
export function legalMoves(position: Position): Move[] {
  const board = scratchBoard(position);
  const packed = new Int32Array(MOVES_MAX);
  const end = pseudoMoves(board, packed, 0);
  const checked = boardInCheck(board, board.side);
  const undo = newUndo();
  const moves: Move[] = [];
  for (let at = 0; at < end; at++) {
    if (isLegal(board, packed[at]!, checked, undo)) moves.push(unpacked(board, packed[at]!));
  }
  return moves;
}

function unpacked({ men, side }: ScratchBoard, move: number): Move {
  const from = (move & 63) as Square;
  const to = ((move >> 6) & 63) as Square;
  const special = SPECIALS[(move >> 16) & 7] ?? null;
  const taken = special === 'en-passant' ? (side << 3) ^ 9 : men[to]!;
  return {
    from,
    to,
    kind: KINDS[(men[from]! & 7) - 1]!,
    captured: taken === 0 ? null : KINDS[(taken & 7) - 1]!,
    promotion: ((move >> 12) & 15) === 0 ? null : KINDS[((move >> 12) & 15) - 1]!,
    special,
  };
}

function packedMove({ from, to, promotion, special }: Move): number {
  const place = promotion === null ? 0 : KINDS.indexOf(promotion) + 1;
  return from | (to << 6) | (place << 12) | (SPECIALS.indexOf(special) << 16);
}

/** The position after a legal move, all six fields right. The square passed over is set after every double step. */
export function play(position: Position, move: Move): Position {
  const board = scratchBoard(position);
  make(board, packedMove(move), newUndo());
  return {
    mode: position.mode,
    board: board.men,
    sideToMove: board.side === 0 ? 'white' : 'black',
    castling: rightsOf(board.rights),
    enPassant: board.passing < 0 ? null : (board.passing as Square),
    halfmoves: move.kind === 'pawn' || move.captured !== null ? 0 : position.halfmoves + 1,
    fullmove: position.fullmove + (position.sideToMove === 'black' ? 1 : 0),
  };
}

function rightsOf(bits: number): CastlingRights {
  return {
    whiteKing: (bits & 1) !== 0,
    whiteQueen: (bits & 2) !== 0,
    blackKing: (bits & 4) !== 0,
    blackQueen: (bits & 8) !== 0,
  };
}

/** Whether the side's king is attacked; never where it has none. */
export function isInCheck(position: Position, side: Side): boolean {
  return boardInCheck(scratchBoard(position), side === 'white' ? 0 : 1);
}

/** Number of legal move sequences of the depth (0 to 16): published counts prove the generator. */
export function perft(position: Position, depth: number): number {
  return countMoves(scratchBoard(position), depth);
}
