/** Boards for tests of pawns: drawn as FEN placement, at random, turned over and mirrored. */
import fc from 'fast-check';
import { manCode, NO_CASTLING, type Position } from '@/engine/board';
import { KINDS, type Side, type Square } from '@/engine/types';

const LETTERS = 'pnbrqk';

/** A diagram from the text of a FEN: placement, and side to move and en-passant square where given. */
export function diagram(fen: string): Position {
  const [placement = '', side = 'w', , passed = '-'] = fen.split(' ');
  const board = new Uint8Array(64);
  placement.split('/').forEach((row, index) => {
    let file = 0;
    for (const letter of row) {
      const kind = KINDS[LETTERS.indexOf(letter.toLowerCase())];
      if (kind === undefined) file += Number(letter);
      else board[(7 - index) * 8 + file++] = manCode(letter === letter.toLowerCase() ? 'black' : 'white', kind);
    }
  });
  const enPassant = passed === '-' ? null : ((passed.charCodeAt(0) - 97 + 8 * (Number(passed[1]) - 1)) as Square);
  return onBoard(board, side === 'b' ? 'black' : 'white', enPassant);
}

function onBoard(board: Uint8Array, sideToMove: Side, enPassant: Square | null): Position {
  return { mode: 'diagram', board, sideToMove, castling: NO_CASTLING, enPassant, halfmoves: 0, fullmove: 1 };
}

/** The position with colours exchanged: turned over the middle line, the other side to move. */
export function turned(position: Position): Position {
  const board = Uint8Array.from(position.board, (_, square) => {
    const code = position.board[square ^ 56] ?? 0;
    return code === 0 ? 0 : code ^ 8;
  });
  const { enPassant } = position;
  const sideToMove = position.sideToMove === 'white' ? 'black' : 'white';
  return onBoard(board, sideToMove, enPassant === null ? null : ((enPassant ^ 56) as Square));
}

/** The position mirrored from the a- to the h-file. */
export function mirroredFiles(position: Position): Position {
  const board = Uint8Array.from(position.board, (_, square) => position.board[square ^ 7] ?? 0);
  const { enPassant } = position;
  return onBoard(board, position.sideToMove, enPassant === null ? null : ((enPassant ^ 7) as Square));
}

/**
 * Random boards: pawns of both sides, men here and there, crowded or empty. Pawns on the first and last
 * rank come too, as diagrams have them, on every third board or so.
 */
export const pawnBoards: fc.Arbitrary<Position> = fc
  .record({
    codes: fc.array(fc.constantFrom(0, 0, 0, 0, 1, 1, 9, 9, 2, 12), { minLength: 64, maxLength: 64 }),
    ends: fc.constantFrom(true, false, false),
    thin: fc.array(fc.boolean(), { minLength: 64, maxLength: 64 }),
    side: fc.constantFrom<Side>('white', 'black'),
  })
  .map(({ codes, ends, thin, side }) => {
    const board = Uint8Array.from(codes, (code, square) => {
      const atEnd = square < 8 || square >= 56;
      return (thin[square] ?? false) || (atEnd && !ends && (code & 7) === 1) ? 0 : code;
    });
    return onBoard(board, side, null);
  });
