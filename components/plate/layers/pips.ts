/** Counts of attackers as pips: White's hollow along the lower edge, Black's solid along the upper. */
import type { Reading } from '@/engine/reading/schema';
import { cornerOf } from '../place';
import type { BoardPlace, Mark } from '../types';

/** Pips in a row before a figure takes their place. */
const PIPS_MAX = 5;

type SquareReading = Reading['squares'][number];

/** Pips of the squares given, a group a square; `where` stamps them with the board's place. */
export function pipMarks(squares: readonly SquareReading[], board: BoardPlace, where: string): Mark[] {
  const groups: Mark[] = [];
  for (const { square, attackers, behind } of squares) {
    const counts = [attackers.white.length, behind.white.length, attackers.black.length, behind.black.length] as const;
    if (counts[0] + counts[2] === 0) continue;
    const { x, y } = cornerOf(board, square);
    const marks: Mark[] = [];
    rowOfPips(marks, 'black', counts[2], counts[3], x, y + board.size * 0.1, board.size);
    rowOfPips(marks, 'white', counts[0], counts[1], x, y + board.size * 0.9, board.size);
    groups.push({ type: 'group', key: square, stamp: `${where} ${counts.join(' ')}`, marks });
  }
  return groups;
}

function rowOfPips(
  marks: Mark[],
  side: 'white' | 'black',
  direct: number,
  behind: number,
  x: number,
  y: number,
  size: number,
): void {
  if (direct + behind === 0) return;
  const paint = side === 'white' ? 'ochre' : 'indigo';
  if (direct + behind > PIPS_MAX) {
    const text = behind > 0 ? `${direct}+${behind}` : String(direct);
    const height = Math.max(8, 0.15 * size);
    marks.push({
      type: 'text',
      x: x + 0.06 * size,
      y: y + height * 0.36,
      text,
      size: height,
      weight: 700,
      fill: paint,
      halo: 2,
    });
    return;
  }
  const r = Math.max(1.7, 0.039 * size);
  let at = x + 0.1 * size;
  for (let i = 0; i < direct; i++, at += 2.75 * r) marks.push(pip(side, at, y, r));
  for (let i = 0; i < behind; i++, at += 2 * r) marks.push(pip(side, at - 0.2 * r, y, 0.55 * r));
}

function pip(side: 'white' | 'black', x: number, y: number, r: number): Mark {
  return side === 'white'
    ? { type: 'circle', x, y, r, fill: 'paper', stroke: 'ochre', width: Math.min(1.3, r * 0.75) }
    : { type: 'circle', x, y, r: r + 0.2, fill: 'indigo', stroke: 'paper', width: 0.6 };
}

/** Squares on ranks 3 to 6, where the command plate counts. */
export function isMiddle({ square }: SquareReading): boolean {
  const rank = Number(square.charAt(1));
  return rank >= 3 && rank <= 6;
}
