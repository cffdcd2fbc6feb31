/** The bare board: paper, hatching, rules, graticule ticks, coordinates. */
import { FILES, RANKS, type SquareName } from '@/engine/types';
import { box, channel, cornerOf, isDark, n } from './place';
import type { BoardPlace, Mark, Pattern } from './types';

const ALL: readonly SquareName[] = RANKS.flatMap((rank) => FILES.map((file): SquareName => `${file}${rank}`));

/** Pitch of the hatching of dark squares, px. */
function hatchPitch(size: number, print: boolean): number {
  return Math.max(3.4, size / (print ? 12 : 14.5));
}

/** The patterns that tints and hatchings use, anchored to the board so that lines run on from square to square. */
export function patterns(board: BoardPlace, id: string, print: boolean): Pattern[] {
  const pitch = hatchPitch(board.size, print);
  const cross = Math.max(4.5, board.size / 11);
  const at = { x: board.x, y: board.y };
  const level = print ? 4 : 3;
  return [
    {
      ...at,
      id: `${id}hatch`,
      size: pitch,
      turned: true,
      marks: [{ type: 'path', d: `M0 0V${n(pitch)}`, stroke: 'hatch', width: print ? 1.4 : 1.5 }],
    },
    {
      ...at,
      id: `${id}cross`,
      size: cross,
      turned: true,
      marks: [{ type: 'path', d: `M0 0V${n(cross)}M0 0H${n(cross)}`, stroke: 'cross', width: print ? 2 : 1.5 }],
    },
    {
      ...at,
      id: `${id}dots`,
      size: 5,
      turned: false,
      marks: [
        { type: 'circle', x: 1.25, y: 1.25, r: 0.8, fill: 'ochre', strength: print ? 1 : 0.6 },
        { type: 'circle', x: 3.75, y: 3.75, r: 0.8, fill: 'ochre', strength: print ? 1 : 0.6 },
      ],
    },
    {
      ...at,
      id: `${id}lines`,
      size: level,
      turned: false,
      marks: [{ type: 'path', d: `M0 ${level / 2}H${level}`, stroke: 'indigo', width: 0.7, strength: print ? 1 : 0.6 }],
    },
  ];
}

/** Paper and hatching under everything. */
export function ground(board: BoardPlace, id: string): Mark[] {
  const dark = ALL.filter(isDark)
    .map((square) => {
      const { x, y } = cornerOf(board, square);
      return box(x, y, board.size, board.size);
    })
    .join('');
  return [
    { type: 'path', d: box(board.x, board.y, 8 * board.size, 8 * board.size), fill: 'paper' },
    { type: 'path', d: dark, fill: { pattern: `${id}hatch` } },
  ];
}

/** Edge, graticule ticks, double rule and coordinates. */
export function frame(board: BoardPlace): Mark[] {
  const { x, y, size } = board;
  const side = 8 * size;
  const gap = channel(size);
  const ticks: string[] = [];
  for (let i = 0; i <= 8; i++) {
    const along = i * size;
    ticks.push(`M${n(x + along)} ${n(y - gap)}v5M${n(x + along)} ${n(y + side + gap)}v-5`);
    ticks.push(`M${n(x - gap)} ${n(y + along)}h5M${n(x + side + gap)} ${n(y + along)}h-5`);
  }
  const text = Math.min(14, Math.max(9.5, 0.19 * size));
  const files = board.flipped ? [...FILES].reverse() : FILES;
  const ranks = board.flipped ? RANKS : [...RANKS].reverse();
  const coordinate = { type: 'text', size: text, weight: 400, fill: 'soft', anchor: 'middle' } as const;
  return [
    { type: 'path', d: box(x, y, side, side), stroke: 'ink', width: 1, fill: 'none' },
    { type: 'path', d: ticks.join(''), stroke: 'ink', width: 0.75, fill: 'none' },
    {
      type: 'path',
      d: box(x - gap, y - gap, side + 2 * gap, side + 2 * gap),
      stroke: 'ink',
      width: 0.75,
      fill: 'none',
    },
    {
      type: 'path',
      d: box(x - gap - 4, y - gap - 4, side + 2 * gap + 8, side + 2 * gap + 8),
      stroke: 'ink',
      width: 1.75,
      fill: 'none',
    },
    ...files.map(
      (file, i): Mark => ({ ...coordinate, x: x + (i + 0.5) * size, y: y + side + gap / 2 + text * 0.42, text: file }),
    ),
    ...ranks.map(
      (rank, i): Mark => ({ ...coordinate, x: x - gap / 2 - 1, y: y + (i + 0.5) * size + text * 0.36, text: rank }),
    ),
  ];
}
