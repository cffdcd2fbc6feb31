/** The two mirrors of a position. */
import { mirrored, NO_CASTLING, parseFen, type Position } from '@/engine/board';
import type { Square } from '@/engine/types';

/** Colours swapped and the board turned over its middle: White's e4 becomes Black's e5. */
export function flipped(position: Position): Position {
  const board = new Uint8Array(64);
  position.board.forEach((code, square) => {
    board[mirrored(square as Square)] = code === 0 ? 0 : code ^ 8;
  });
  const { whiteKing, whiteQueen, blackKing, blackQueen } = position.castling;
  return {
    ...position,
    board,
    sideToMove: position.sideToMove === 'white' ? 'black' : 'white',
    castling: { whiteKing: blackKing, whiteQueen: blackQueen, blackKing: whiteKing, blackQueen: whiteQueen },
    enPassant: position.enPassant === null ? null : mirrored(position.enPassant),
  };
}

/** The a-file for the h-file; castling rights go. */
export function filesMirrored(position: Position): Position {
  const board = new Uint8Array(64);
  position.board.forEach((code, square) => {
    board[square ^ 7] = code;
  });
  const enPassant = position.enPassant === null ? null : ((position.enPassant ^ 7) as Square);
  return { ...position, board, castling: NO_CASTLING, enPassant };
}

/** The position of a FEN that is known to be right. */
export function positionOf(fen: string): Position {
  const admitted = parseFen(fen, 'diagram');
  if (!admitted.ok) throw new Error(`${fen}: ${admitted.fault[0].message}`);
  return admitted.value.position;
}
