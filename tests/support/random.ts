/** Positions at random, from seeds that fast-check prints, and the two mirrors of a position. */
import fc from 'fast-check';
import { mirrored, NO_CASTLING, parseFen, type Position } from '@/engine/board';
import { legalMoves, play } from '@/engine/rules';
import type { Side, Square } from '@/engine/types';
import { NAMED } from './positions';

/** Positions that came about by up to 60 legal moves from a named one. */
export const playedPositions: fc.Arbitrary<Position> = fc
  .tuple(fc.constantFrom(...Object.values(NAMED)), fc.array(fc.nat({ max: 999 }), { maxLength: 60 }))
  .map(([fen, choices]) => {
    let position = strictPositionOf(fen);
    for (const choice of choices) {
      const moves = legalMoves(position);
      const move = moves[choice % moves.length];
      if (!move) break;
      position = play(position, move);
    }
    return position;
  });

/** Boards that no game brings about: men anywhere, none to 32 a side, kings missing or several, pawns on edge ranks. */
export const diagrams: fc.Arbitrary<Position> = fc
  .record({
    codes: fc.array(fc.constantFrom(1, 2, 3, 4, 5, 6, 9, 10, 11, 12, 13, 14), { minLength: 64, maxLength: 64 }),
    empty: fc.array(fc.nat({ max: 99 }), { minLength: 64, maxLength: 64 }),
    share: fc.nat({ max: 90 }),
    sideToMove: fc.constantFrom<Side>('white', 'black'),
  })
  .map(({ codes, empty, share, sideToMove }): Position => {
    const counts = [0, 0];
    const board = Uint8Array.from(codes, (code, square) => {
      const side = code >> 3;
      if ((empty[square] ?? 0) >= share || (counts[side] ?? 0) >= 32) return 0;
      counts[side] = (counts[side] ?? 0) + 1;
      return code;
    });
    return { mode: 'diagram', board, sideToMove, castling: NO_CASTLING, enPassant: null, halfmoves: 0, fullmove: 1 };
  });

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

/** The position of a FEN that is known to be legal. */
export function strictPositionOf(fen: string): Position {
  const admitted = parseFen(fen);
  if (!admitted.ok) throw new Error(`${fen}: ${admitted.fault[0].message}`);
  return admitted.value.position;
}

/** The position of a FEN that is known to be right, as a diagram. */
export function positionOf(fen: string): Position {
  const admitted = parseFen(fen, 'diagram');
  if (!admitted.ok) throw new Error(`${fen}: ${admitted.fault[0].message}`);
  return admitted.value.position;
}
