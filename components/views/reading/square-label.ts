/** A square in words: what stands on it and what the layer shows there. */
import type { Layer } from '@/components/plate/types';
import type { Reading } from '@/engine/reading/schema';
import type { Side, SquareName } from '@/engine/types';

const COUNTS = ['never', 'once', 'twice'];
const SIDES = { white: 'White', black: 'Black' } as const;

/** Names of all 64 squares for a screen reader, by square. */
export function squareLabels(reading: Reading, layer: Layer): ReadonlyMap<SquareName, string> {
  const kinds = new Map(reading.men.map((man) => [man.square, man.kind]));
  const attack = (side: Side, squares: readonly SquareName[]) => {
    const count = COUNTS[squares.length] ?? `${squares.length} times`;
    const men = squares.map((square) => `${kinds.get(square) ?? 'man'} ${square}`).join(', ');
    return `by ${SIDES[side]} ${count}${men ? `: ${men}` : ''}`;
  };
  return new Map(
    reading.squares.map(({ square, occupant, attackers, command }) => {
      const parts = [occupant ? `${occupant.side} ${occupant.kind}` : 'empty'];
      if (layer === 'command')
        parts.push(command === 'white' || command === 'black' ? `${SIDES[command]} commands it` : command);
      if (layer === 'weak' || layer === 'command') {
        for (const weak of reading.weakSquares) {
          if (weak.square === square) parts.push(`${weak.hold} weak square of ${SIDES[weak.side]}`);
        }
      }
      if (layer === 'outposts' || layer === 'command') {
        for (const post of reading.outposts) {
          if (post.square === square && (post.rank === 'outpost' || post.occupant)) {
            parts.push(`${post.rank === 'outpost' ? 'outpost' : 'advanced post'} of ${SIDES[post.side]}`);
          }
        }
      }
      if (layer === 'files') {
        for (const file of reading.files) {
          for (const side of ['white', 'black'] as const) {
            if (file.entries[side].includes(square)) parts.push(`entry square of ${SIDES[side]}`);
          }
          if (file.targets.some((target) => target.square === square)) parts.push('target');
        }
      }
      return [
        square,
        `${square}, ${parts.join(', ')}; attacked ${attack('white', attackers.white)}; ${attack('black', attackers.black)}`,
      ];
    }),
  );
}
