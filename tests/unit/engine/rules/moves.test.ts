/** What holds of moves on any board: symmetry, and diagrams that no game brings about. */
import fc from 'fast-check';
import { expect, it } from 'vitest';
import { mirrored, type Position, squareName } from '@/engine/board';
import { isInCheck, legalMoves, type Move, perft, play } from '@/engine/rules';
import { opponent } from '@/engine/types';
import { diagrams, filesMirrored, flipped, playedPositions, positionOf } from '../../../support/random';

function named(moves: readonly Move[]): string[] {
  return moves
    .map(
      ({ from, to, promotion, captured, special }) =>
        `${squareName(from)}${squareName(to)} ${promotion} ${captured} ${special}`,
    )
    .sort();
}

/** Whether no side has several kings. */
function hasOneKingAtMost({ board }: Position): boolean {
  return [6, 14].every((king) => board.indexOf(king) === board.lastIndexOf(king));
}

it('moves turn with colours and board', () => {
  fc.assert(
    fc.property(fc.oneof(playedPositions, diagrams), (position) => {
      const turned = legalMoves(position).map((move) => ({
        ...move,
        from: mirrored(move.from),
        to: mirrored(move.to),
      }));
      // Of several kings the first from a1 on counts, which turning the board changes.
      fc.pre(hasOneKingAtMost(position));
      expect(named(legalMoves(flipped(position)))).toEqual(named(turned));
    }),
    { numRuns: 400, seed: 1 },
  );
});

it('without castling as many moves on the board mirrored from a to h', () => {
  fc.assert(
    fc.property(playedPositions, (position) => {
      const bare = filesMirrored(filesMirrored(position));
      expect(perft(filesMirrored(position), 2)).toBe(perft(bare, 2));
    }),
    { numRuns: 60, seed: 2 },
  );
});

it('no move leaves the own king in check, takes a king, or changes the position it is made from', () => {
  fc.assert(
    fc.property(fc.oneof(playedPositions, diagrams), (position) => {
      const before = Uint8Array.from(position.board);
      const kings = position.board.filter((code) => (code & 7) === 6).length;
      for (const move of legalMoves(position)) {
        const after = play(position, move);
        expect(after.sideToMove).toBe(opponent(position.sideToMove));
        expect(after.board.filter((code) => (code & 7) === 6)).toHaveLength(kings);
        if (hasOneKingAtMost(position)) expect(isInCheck(after, position.sideToMove)).toBe(false);
      }
      expect(position.board).toEqual(before);
    }),
    { numRuns: 200, seed: 3 },
  );
});

it.each([
  ['kK6/8/8/8/8/8/8/8 w - - 0 1', 2, 'kings side by side do not take each other'],
  ['8/8/8/8/8/8/8/8 w - - 0 1', 0, 'an empty board'],
  ['P7/8/8/8/8/8/8/p7 w - - 0 1', 0, 'a pawn on the last rank has no move'],
  ['8/8/8/8/8/8/8/P7 w - - 0 1', 1, 'a pawn on its first rank has one step'],
  ['K7/8/8/8/8/8/8/6KR b - - 0 1', 0, 'no man of the side to move'],
])('%s has %i moves: %s', (fen, count) => {
  expect(legalMoves(positionOf(fen))).toHaveLength(count);
  expect(perft(positionOf(fen), 1)).toBe(count);
});

it('a board of queens has room for all its moves', () => {
  const position = positionOf('QqQqQqQq/8/QqQqQqQq/8/QqQqQqQq/8/QqQqQqQq/8 w - - 0 1');
  const replies = legalMoves(position).map((move) => perft(play(position, move), 1));
  expect(perft(position, 2)).toBe(replies.reduce((sum, count) => sum + count, 0));
});

it('a capture in passing is no move where the captured pawn covers the king', () => {
  const moves = legalMoves(positionOf('4k1b1/8/8/3pP3/8/1K6/8/8 w - d6 0 1'));
  expect(named(moves)).not.toContain('e5d6 null pawn en-passant');
  expect(named(moves)).toContain('e5e6 null null null');
});

it('of several kings the first stays the one to be covered, whichever moves are tried before', () => {
  const rook = legalMoves(positionOf('r3k3/8/8/8/8/8/R7/KK6 w - - 0 1')).filter(({ kind }) => kind === 'rook');
  expect(rook.map(({ to }) => squareName(to))).toEqual(['a3', 'a4', 'a5', 'a6', 'a7', 'a8']);
});
