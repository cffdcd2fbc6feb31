/** Duties: what falls if a man leaves its square. */
import { type AttackMap, firstMen, KING, type SideIndex, slidesAlong } from '../attacks';
import { OPPOSITE } from '../board';
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

const NONE: readonly Duty[] = [];

/**
 * The duties of the man on a square: friendly men (kings apart) on which the enemy would gain more by capturing
 * if this man were off the board. It guards them, directly or from behind, or it shuts an enemy slider's line.
 */
export function dutiesOf(map: AttackMap, table: SquareTable, from: Square): readonly Duty[] {
  const side = (map.board[from]! >> 3) as SideIndex;
  const enemyRow = (side ^ 1) << 6;
  const number = map.numbers[from]!;
  let duties: Duty[] | null = null;
  for (let other = 0; other < map.counts[side]!; other++) {
    const square = map.squares[(side << 5) | other]!;
    if (map.attackers[enemyRow | square] === 0 || square === from) continue;
    const entry = (side << 6) | square;
    if ((((map.attackers[entry]! | table.behind[entry]!) >>> number) & 1) === 0) continue;
    duties = withDuty(duties, map, table, side, from, square, 'guard');
  }
  const lines = firstMen(map);
  for (let direction = 0; direction < 8; direction++) {
    const slider = lines[(from << 3) | direction]!;
    if (slider < 0 || map.board[slider]! >> 3 === side || !slidesAlong(map.board[slider]!, direction)) continue;
    const square = lines[(from << 3) | OPPOSITE[direction]!]!;
    if (square < 0 || map.board[square]! >> 3 !== side) continue;
    const entry = (side << 6) | square;
    if ((((map.attackers[entry]! | table.behind[entry]!) >>> number) & 1) === 1) {
      // A guard that also shuts a line is weighed above already, unless nothing attacks the square yet.
      if (map.attackers[enemyRow | square] !== 0) continue;
    }
    duties = withDuty(duties, map, table, side, from, square, 'screen');
  }
  return duties === null ? NONE : duties.sort((a, b) => a.square - b.square);
}

function withDuty(
  duties: Duty[] | null,
  map: AttackMap,
  table: SquareTable,
  side: SideIndex,
  from: number,
  square: number,
  by: Duty['by'],
): Duty[] | null {
  const place = map.board[square]! & 7;
  if (place === KING) return duties;
  const now = Math.max(0, table.exchanges[((side ^ 1) << 6) | square]!);
  const loses = lossOn(map, side, place, square, from) - now;
  if (loses <= 0) return duties;
  const duty: Duty = { square: square as Square, loses, by };
  if (duties === null) return [duty];
  duties.push(duty);
  return duties;
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
