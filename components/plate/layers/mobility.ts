/** Mobility of one man: a tint of one hue and the figure itself in every square. */
import { squareName } from '@/engine/board';
import type { Square, SquareName } from '@/engine/types';
import { box, cornerOf } from '../place';
import type { BoardPlace, HeatCell, Mark } from '../types';

/** Tint under the men. Figures come over them with `mobilityFigures`. */
export function mobilityTints(heat: readonly HeatCell[], board: BoardPlace, man: SquareName | null): Mark[] {
  return asked(heat, man).flatMap(({ name, cell }): Mark[] => {
    if (!cell.safe || !isWithin(heat, cell)) return [];
    const { x, y } = cornerOf(board, name);
    return [
      {
        type: 'path',
        d: box(x, y, board.size, board.size),
        fill: 'heat',
        strength: { heat: Math.min(11, cell.safeMoves) },
      },
    ];
  });
}

/** Safe moves from each square; in brackets where the man itself would be lost. */
export function mobilityFigures(heat: readonly HeatCell[], board: BoardPlace, man: SquareName | null): Mark[] {
  return asked(heat, man).map(({ name, cell }): Mark => {
    const { x, y } = cornerOf(board, name);
    const own = name === man;
    const size = own ? 0.19 * board.size : cell.safe ? 0.36 * board.size : 0.27 * board.size;
    return {
      type: 'text',
      x: own ? x + 0.88 * board.size : x + board.size / 2,
      y: own ? y + 0.24 * board.size : y + board.size / 2 + size * 0.36,
      text: cell.safe ? String(cell.safeMoves) : `(${cell.safeMoves})`,
      size,
      weight: cell.safe && isWithin(heat, cell) ? (cell.safeMoves >= 5 ? 700 : 400) : 300,
      fill: cell.safe && isWithin(heat, cell) ? 'ink' : 'soft',
      anchor: 'middle',
      halo: 2,
    };
  });
}

/** Whether the man can get there; men whose ways are not looked for (kings, pawns) count as able. */
function isWithin(heat: readonly HeatCell[], cell: HeatCell): boolean {
  return cell.reached !== null || heat.every(({ reached }) => reached === null);
}

function asked(heat: readonly HeatCell[], man: SquareName | null): { name: SquareName; cell: HeatCell }[] {
  return heat
    .map((cell) => ({ name: squareName(cell.square as Square), cell }))
    .filter(({ name, cell }) => !cell.taken || name === man);
}
