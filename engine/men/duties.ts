/** Duties: what falls if a man leaves its square. */
import { type AttackMap, firstMen, KING, type SideIndex, slidesAlong } from '../attacks';
import { DIRECTION_TO } from '../board';
import { lossOn } from '../exchange';
import type { SquareTable } from '../squares';
import type { Square } from '../types';

export interface Duty {
  /** The friendly man that falls. */
  readonly square: Square;
  /** Pawns lost there once the man has left, beyond what is lost there already. */
  readonly loses: number;
  /** By guarding it, or by standing in the way of an enemy slider. */
  readonly by: 'guard' | 'screen';
}

/**
 * The duties of the man on a square: friendly men (kings apart) on which the enemy would gain more by capturing
 * if this man were off the board. It guards them, directly or from behind, or it shuts an enemy slider's line.
 */
export function dutiesOf(map: AttackMap, table: SquareTable, from: Square): Duty[] {
  const side = (map.board[from]! >> 3) as SideIndex;
  const enemy = side ^ 1;
  const number = map.numbers[from]!;
  const duties: Duty[] = [];
  for (let other = 0; other < map.counts[side]!; other++) {
    const square = map.squares[(side << 5) | other]!;
    const place = map.board[square]! & 7;
    if (square === from || place === KING) continue;
    const entry = (side << 6) | square;
    const guards = ((map.attackers[entry]! | table.behind[entry]!) >>> number) & 1;
    const screens = guards === 0 && shutsLine(map, side, from, square);
    if (!screens && (guards === 0 || map.attackers[(enemy << 6) | square] === 0)) continue;
    const now = Math.max(0, table.exchanges[(enemy << 6) | square]!);
    const loses = lossOn(map, side, place, square, from) - now;
    if (loses > 0) duties.push({ square: square as Square, loses, by: screens ? 'screen' : 'guard' });
  }
  return duties.length > 1 ? duties.sort((a, b) => a.square - b.square) : duties;
}

/** Whether the man on `from` is the first from the square on its line and an enemy slider stands next behind it. */
function shutsLine(map: AttackMap, side: SideIndex, from: number, square: number): boolean {
  const direction = DIRECTION_TO[(square << 6) | from]!;
  if (direction < 0) return false;
  const lines = firstMen(map);
  if (lines[(square << 3) | direction] !== from) return false;
  const slider = lines[(from << 3) | direction]!;
  return slider >= 0 && map.board[slider]! >> 3 !== side && slidesAlong(map.board[slider]!, direction);
}

/**
 * Overloaded: two men that it guards by duty can be attacked by different enemy men, so that both duties can be
 * called at once.
 */
export function isOverloaded(map: AttackMap, side: SideIndex, duties: readonly Duty[]): boolean {
  const guarded = duties.filter(({ by }) => by === 'guard');
  return guarded.some((first, index) =>
    guarded.slice(index + 1).some((second) => {
      const enemies = (square: Square) => map.attackers[((side ^ 1) << 6) | square]!;
      const both = enemies(first.square) | enemies(second.square);
      return (both & (both - 1)) !== 0 && enemies(first.square) !== 0 && enemies(second.square) !== 0;
    }),
  );
}
