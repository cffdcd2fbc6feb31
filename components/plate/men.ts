/**
 * Our men, drawn for this project on one grid of 48 with one slab foot for all six. `body` is a closed outline, `cut` the
 * inner lines in the opposite tone, left out when small. The knight looks left for both sides and is never mirrored.
 */
import type { Kind, Side } from '@/engine/types';
import type { Mark } from './types';

/** Units of the grid on which the men are drawn. */
export const MEN_GRID = 48;

export const MEN: Readonly<Record<Kind, { readonly body: string; readonly cut: string }>> = {
  pawn: {
    body: 'M24 9.5A8 8 0 0 1 28.8 24C29.2 31 31 36 36 39H39V44H9V39H12C17 36 18.8 31 19.2 24A8 8 0 0 1 24 9.5Z',
    cut: 'M12.5 39H35.5',
  },
  knight: {
    body: 'M20 3L23.6 7.8C33.5 8.2 38.5 16 38.5 27C38.5 32 37.5 36 36.5 39H39V44H9V39H11.5C11.5 31.5 21.5 31 22.6 23.4C20 25.8 17 25.6 14.8 28.8L10.4 28.4L7 24C7.8 19.4 14 16 15.8 10.6Z',
    cut: 'M12 39H36M19 14.9L21.4 13.3M28.6 13.4C32.2 16.6 33.6 22 32.8 30.5M11.2 23.4L12 24.6',
  },
  bishop: {
    body: 'M24 3C26.8 5.4 29 7.8 30.6 10L24.6 20.4L33.4 15.6C33.9 17.2 34.2 18.9 34 20.5C33.6 24.6 30.5 27.2 28 28.5C28.6 33 31 36.8 36 39H39V44H9V39H12C17 36.8 19.4 33 20 28.5C17.5 27.2 14.4 24.6 14 20.5C13.5 15 17 9 24 3Z',
    cut: 'M12.5 39H35.5',
  },
  rook: {
    body: 'M9.5 6H16.5V11H20.5V6H27.5V11H31.5V6H38.5V18.5H33C30.5 18.5 30 20 30 23C30 31 31.5 36.5 36 39H39V44H9V39H12C16.5 36.5 18 31 18 23C18 20 17.5 18.5 15 18.5H9.5Z',
    cut: 'M12.5 39H35.5M15 18.5H33',
  },
  queen: {
    body: 'M24 4.5L28.4 17.5L34 7.5L34.6 19.5L42 12.5L34.5 30C32 31 31.6 33 32 34C33 36.6 34.6 38.2 36 39H39V44H9V39H12C13.4 38.2 15 36.6 16 34C16.4 33 16 31 13.5 30L6 12.5L13.4 19.5L14 7.5L19.6 17.5Z',
    cut: 'M12.5 39H35.5M14.5 30H33.5',
  },
  king: {
    body: 'M21.3 2.5H26.7V6H31V11H26.7V15.6C32.5 15.8 37 16.8 39.5 19L34.5 30C32 31 31.6 33 32 34C33 36.6 34.6 38.2 36 39H39V44H9V39H12C13.4 38.2 15 36.6 16 34C16.4 33 16 31 13.5 30L8.5 19C11 16.8 15.5 15.8 21.3 15.6V11H17V6H21.3Z',
    cut: 'M12.5 39H35.5M14.5 30H33.5',
  },
};

/** Stroke of the outline in grid units, by the man's size in px: thicker when small, so that it stays crisp. */
function strokeFor(px: number): number {
  return px >= 40 ? 2 : px >= 28 ? 2.3 : px >= 22 ? 2.5 : 2.9;
}

/** The marks of a man on a square whose corner is given; `size` is the side of the square. */
export function manMarks(side: Side, kind: Kind, x: number, y: number, size: number): Mark[] {
  const px = size * 0.75;
  const scale = px / MEN_GRID;
  const move = { x: x + (size - px) / 2, y: y + (size - px) / 2, scale };
  const { body, cut } = MEN[kind];
  const stroke = strokeFor(px);
  const halo = stroke + 3.1 / scale / 1.5;
  const tone = side === 'white' ? 'w' : 'b';
  const marks: Mark[] = [
    { type: 'path', d: body, move, stroke: 'paper', width: halo, join: 'round', fill: 'paper' },
    {
      type: 'path',
      d: body,
      move,
      fill: `${tone}-fill`,
      stroke: `${tone}-line`,
      width: stroke,
      join: 'miter',
      miter: 3,
    },
  ];
  if (px >= 22)
    marks.push({
      type: 'path',
      d: cut,
      move,
      fill: 'none',
      stroke: `${tone}-cut`,
      width: px >= 40 ? 1.7 : 2,
      cap: 'butt',
    });
  return marks;
}
