/** Legal moves, the positions after them and their SAN against two rules libraries: chess.js and kokopu. */
import { Chess } from 'chess.js';
import { Position as KokopuPosition } from 'kokopu';
import { expect, it } from 'vitest';
import { formatFen, squareName } from '@/engine/board';
import { legalMoves, type Move, play } from '@/engine/rules';
import { fromSan, toSan } from '@/engine/rules/notation';
import { strictPositionOf } from '../support/random';
import { realPositions } from '../support/real-positions';

const LETTERS = { pawn: 'p', knight: 'n', bishop: 'b', rook: 'r', queen: 'q', king: 'k' } as const;

function squaresOf({ from, to, promotion }: Move): string {
  return `${squareName(from)}${squareName(to)}${promotion === null ? '' : LETTERS[promotion]}`;
}

it('legal moves are those of both libraries, on 2,400 positions of real games', { timeout: 120_000 }, () => {
  const wrong: string[] = [];
  let compared = 0;
  for (const fen of realPositions(2400)) {
    const ours = legalMoves(strictPositionOf(fen)).map(squaresOf).sort();
    const theirs = new Chess(fen)
      .moves({ verbose: true })
      .map(({ lan }) => lan)
      .sort();
    const others = new KokopuPosition(fen)
      .moves()
      .map((move) => `${move.from()}${move.to()}${move.isPromotion() ? move.promotion() : ''}`)
      .sort();
    compared += ours.length;
    if (ours.join() !== theirs.join() || ours.join() !== others.join()) {
      wrong.push(`${fen}: ${ours.join()} / ${theirs.join()} / ${others.join()}`);
    }
  }
  console.info(`legal moves: ${wrong.length} of 2,400 positions differ, ${compared} moves compared`);
  expect(compared).toBeGreaterThan(60_000);
  expect(wrong).toEqual([]);
});

/** A FEN without the square passed over, which the libraries write only where a capture is legal. */
function withoutPassing(fen: string): string {
  const fields = fen.split(' ');
  fields[3] = '-';
  return fields.join(' ');
}

it('what a move does and what it is called are as chess.js says, on 150 positions', { timeout: 60_000 }, () => {
  for (const fen of realPositions(150)) {
    const position = strictPositionOf(fen);
    const theirs = new Map(new Chess(fen).moves({ verbose: true }).map((move) => [move.lan, move]));
    for (const move of legalMoves(position)) {
      const their = theirs.get(squaresOf(move));
      expect(withoutPassing(formatFen(play(position, move)))).toBe(withoutPassing(their?.after ?? ''));
      expect(move.captured === null ? undefined : LETTERS[move.captured]).toBe(their?.captured);
      expect(move.special === 'en-passant').toBe(their?.isEnPassant());
      expect(move.special === 'castle-king').toBe(their?.isKingsideCastle());
      expect(move.special === 'castle-queen').toBe(their?.isQueensideCastle());
      expect(move.special === 'double-step').toBe(their?.isBigPawn());
      const name = toSan(position, move);
      expect(name).toBe(their?.san);
      expect(fromSan(position, name)).toEqual({ ok: true, value: move });
    }
  }
});
