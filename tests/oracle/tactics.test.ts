/** The small search against the same search on a rules library (chess.js). */
import { Chess } from 'chess.js';
import { expect, it } from 'vitest';
import { guardOf, MATE, searchGain } from '@/engine/tactics';
import { positionOf } from '../support/random';
import { realPositions } from '../support/real-positions';
import { slowGain } from '../support/slow/gain';

it('finds what plain search finds, with one quiet check, on 80 positions of real games', () => {
  const wrong: string[] = [];
  let gains = 0;
  for (const fen of realPositions(80)) {
    const { board, sideToMove, enPassant } = positionOf(fen);
    const found = searchGain(
      board,
      sideToMove === 'white' ? 0 : 1,
      { nodesMax: 100_000, checkPlies: 1 },
      enPassant ?? -1,
    );
    const expected = Math.max(-MATE, Math.min(MATE, slowGain(new Chess(fen))));
    if (found.gains > 0) gains++;
    if (!found.complete || found.gains !== expected) wrong.push(`${fen}: ${found.gains} for ${expected}`);
  }
  expect(gains).toBeGreaterThan(8);
  expect(wrong).toEqual([]);
}, 60_000);

it('shows a line that is legal and wins what it says', () => {
  const wrong: string[] = [];
  let lines = 0;
  for (const fen of realPositions(400)) {
    const { board, sideToMove } = positionOf(fen);
    const { verdict, line, loses } = guardOf(board, sideToMove === 'white' ? 0 : 1);
    if (verdict !== 'loses' || loses >= MATE / 2) continue;
    lines++;
    const chess = new Chess(fen);
    let won = 0;
    for (const [ply, { from, to, promoted }] of line.entries()) {
      const name = (square: number) => `${'abcdefgh'.charAt(square & 7)}${(square >> 3) + 1}`;
      const made = chess.move({
        from: name(from),
        to: name(to),
        ...(promoted ? { promotion: ' pnbrq'[promoted] } : {}),
      });
      const prize = { p: 1, n: 3, b: 3, r: 5, q: 9, k: 0 };
      const gain = (made.captured ? prize[made.captured] : 0) + (made.promotion ? prize[made.promotion] - 1 : 0);
      won += ply % 2 === 0 ? gain : -gain;
    }
    if (won !== loses) wrong.push(`${fen}: ${won} for ${loses}`);
  }
  expect(lines).toBeGreaterThan(40);
  expect(wrong).toEqual([]);
});
