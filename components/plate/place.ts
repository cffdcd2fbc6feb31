/** Where squares stand in the figure. */
import { FILES, type SquareName } from '@/engine/types';
import type { BoardPlace } from './types';

/** Width of the channel round the board in sides of a square, and of the double rule outside it, px. */
const CHANNEL = 0.34;
const RULES = 6;

/** Channel between board and rule, px. */
export function channel(size: number): number {
  return Math.max(14, CHANNEL * size);
}

/** Side of the whole framed board for a square's side. */
export function framedSide(size: number): number {
  return 8 * size + 2 * (channel(size) + RULES);
}

/** Side of a square for which the framed board is just as wide as given. */
export function sizeFor(side: number): number {
  const wide = (side - 2 * RULES) / (8 + 2 * CHANNEL);
  return wide * CHANNEL >= 14 ? wide : (side - 2 * RULES - 28) / 8;
}

/** Distance from the frame's outer edge to the board. */
export function frameInset(size: number): number {
  return channel(size) + RULES;
}

/** Column from the left and row from the top, 0 to 7, as the board is shown. */
export function cellOf({ flipped }: Pick<BoardPlace, 'flipped'>, square: SquareName): { column: number; row: number } {
  const file = FILES.indexOf(square.charAt(0) as (typeof FILES)[number]);
  const rank = Number(square.charAt(1)) - 1;
  return flipped ? { column: 7 - file, row: rank } : { column: file, row: 7 - rank };
}

/** Upper left corner of a square in the figure. */
export function cornerOf(board: BoardPlace, square: SquareName): { x: number; y: number } {
  const { column, row } = cellOf(board, square);
  return { x: board.x + column * board.size, y: board.y + row * board.size };
}

/** Whether a square is dark. */
export function isDark(square: SquareName): boolean {
  return (square.charCodeAt(0) - 97 + Number(square.charAt(1)) - 1) % 2 === 0;
}

/** A figure rounded for a path: two places are finer than any printer. */
export function n(value: number): string {
  return String(Math.round(value * 100) / 100);
}

/** A rectangle as a path. */
export function box(x: number, y: number, width: number, height: number): string {
  return `M${n(x)} ${n(y)}h${n(width)}v${n(height)}h${n(-width)}z`;
}
