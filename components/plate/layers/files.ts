/** Files in the channel above and below the board, and entry squares as ticks from their owner's edge. */
import type { Reading } from '@/engine/reading/schema';
import { FILES } from '@/engine/types';
import { cornerOf, n } from '../place';
import type { BoardPlace, Mark } from '../types';

/** Rules for open and half-open files. */
export function fileMarks(reading: Reading, board: BoardPlace): Mark[] {
  const side = 8 * board.size;
  const thick = Math.max(1.8, board.size * 0.042);
  return reading.files.flatMap(({ file, status, halfOpenFor }): Mark[] => {
    if (status === 'closed') return [];
    const index = FILES.indexOf(file);
    const column = board.flipped ? 7 - index : index;
    const x = board.x + (column + 0.14) * board.size;
    const rule = (y: number, width: number, paint: 'ink' | 'ochre' | 'indigo'): Mark => ({
      type: 'path',
      d: `M${n(x)} ${n(y)}h${n(0.72 * board.size)}`,
      stroke: paint,
      width,
      fill: 'none',
    });
    const above = board.y - 3.5;
    const below = board.y + side + 3.5;
    if (status === 'open')
      return [
        rule(above, 1.2, 'ink'),
        rule(above - 3, 1.2, 'ink'),
        rule(below, 1.2, 'ink'),
        rule(below + 3, 1.2, 'ink'),
      ];
    const atFoot = (halfOpenFor === 'white') !== board.flipped;
    return [rule(atFoot ? below : above, thick, halfOpenFor === 'white' ? 'ochre' : 'indigo')];
  });
}

/** Entry squares of both sides, and targets as a small notch under the pawn. */
export function entryMarks(reading: Reading, board: BoardPlace): Mark[] {
  const marks: Mark[] = [];
  for (const { entries, targets } of reading.files) {
    for (const side of ['white', 'black'] as const) {
      for (const square of entries[side]) {
        const { x, y } = cornerOf(board, square);
        const fromBelow = (side === 'white') !== board.flipped;
        const edge = fromBelow ? y + board.size : y;
        const tick = (at: number, length: number) =>
          `M${n(x + at * board.size)} ${n(edge)}v${n((fromBelow ? -1 : 1) * length * board.size)}`;
        marks.push({
          type: 'path',
          d: tick(0.39, 0.14) + tick(0.5, 0.2) + tick(0.61, 0.14),
          stroke: side === 'white' ? 'ochre' : 'indigo',
          width: Math.max(1.4, board.size * 0.026),
          fill: 'none',
        });
      }
    }
    for (const { square, side } of targets) {
      const { x, y } = cornerOf(board, square);
      const s = board.size;
      marks.push({
        type: 'path',
        d: `M${n(x + 0.06 * s)} ${n(y + 0.24 * s)}V${n(y + 0.06 * s)}H${n(x + 0.24 * s)}M${n(x + 0.76 * s)} ${n(y + 0.06 * s)}H${n(x + 0.94 * s)}V${n(y + 0.24 * s)}M${n(x + 0.94 * s)} ${n(y + 0.76 * s)}V${n(y + 0.94 * s)}H${n(x + 0.76 * s)}M${n(x + 0.24 * s)} ${n(y + 0.94 * s)}H${n(x + 0.06 * s)}V${n(y + 0.76 * s)}`,
        stroke: side === 'white' ? 'indigo' : 'ochre',
        width: Math.max(1.2, s * 0.022),
        fill: 'none',
      });
    }
  }
  return marks;
}
