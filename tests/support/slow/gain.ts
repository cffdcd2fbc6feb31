/**
 * The small search once more, on a rules library (chess.js) instead of our own board: captures, promotions to queen and
 * knight, every answer to a check, and quiet checks on the first ply. A cut where a side has enough, and no other.
 */
import type { Chess, Move } from 'chess.js';

const WORTH: Readonly<Record<string, number>> = { p: 1, n: 3, b: 3, r: 5, q: 9, k: 0 };

function prize({ captured, promotion }: Move): number {
  return (captured ? (WORTH[captured] ?? 0) : 0) + (promotion ? (WORTH[promotion] ?? 0) - 1 : 0);
}

/** Pawns that the side to move gains; 200 stands for mate. */
export function slowGain(chess: Chess, alpha = -201, beta = 201, ply = 0): number {
  const checked = chess.inCheck();
  let best = checked ? -200 : 0;
  if (best >= beta) return best;
  const moves = chess
    .moves({ verbose: true })
    .filter(({ promotion, san }) => (!promotion || 'qn'.includes(promotion)) && !san.startsWith('O-O'))
    .filter((move) => checked || prize(move) > 0 || (ply === 0 && /[+#]$/.test(move.san)))
    .sort((a, b) => prize(b) - prize(a));
  for (const move of moves) {
    const won = prize(move);
    const floor = Math.max(alpha, best);
    chess.move(move);
    const value = won - slowGain(chess, won - beta, won - floor, ply + 1);
    chess.undo();
    if (value > best) best = value;
    if (best >= beta) break;
  }
  return best;
}
