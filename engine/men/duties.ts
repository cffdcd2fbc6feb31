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
  /** By guarding it (or holding an attacker of it pinned), or by standing in the way of an enemy slider. */
  readonly by: 'guard' | 'screen';
}

const NONE: readonly Duty[] = [];

/**
 * The duties of the man on a square: friendly men (kings apart) on which the enemy would gain more by capturing
 * if this man were off the board.
 */
export function dutiesOf(map: AttackMap, table: SquareTable, from: Square): readonly Duty[] {
  const side = (map.board[from]! >> 3) as SideIndex;
  const enemyRow = (side ^ 1) << 6;
  let duties: Duty[] | null = null;
  for (let other = 0; other < map.counts[side]!; other++) {
    const square = map.squares[(side << 5) | other]!;
    const place = map.board[square]! & 7;
    if (square === from || place === KING) continue;
    const isAttacked = map.attackers[enemyRow | square] !== 0;
    const by = isAttacked ? bond(map, table, side, from, square) : shutsLine(map, side, from, square) ? 'screen' : null;
    if (by === null) continue;
    const loses = lossOn(map, side, place, square, from) - Math.max(0, table.exchanges[enemyRow | square]!);
    if (loses <= 0) continue;
    const duty: Duty = { square: square as Square, loses, by };
    if (duties === null) duties = [duty];
    else duties.push(duty);
  }
  return duties === null ? NONE : duties.sort((a, b) => a.square - b.square);
}

/** Whether the man alone keeps an enemy slider from attacking the own man on a square. */
function shutsLine(map: AttackMap, side: SideIndex, from: number, square: number): boolean {
  const direction = DIRECTION_TO[(square << 6) | from]!;
  if (direction < 0) return false;
  const lines = firstMen(map);
  const slider = lines[(from << 3) | direction]!;
  return isEnemySlider(map, side, slider, direction) && lines[(square << 3) | direction] === from;
}

/**
 * How the man on `from` can matter to an attacked own man on a square: it guards it, directly, from behind or through the men
 * that attack it on the same line; it shuts the line of an enemy slider; or it takes part in a pin. Null where
 * it does nothing of these, so that the exchange need not be played out.
 */
function bond(map: AttackMap, table: SquareTable, side: SideIndex, from: number, square: number): Duty['by'] | null {
  if (bears(map, table, from, square)) return 'guard';
  const direction = DIRECTION_TO[(square << 6) | from]!;
  if (direction >= 0) {
    const first = firstMen(map)[(square << 3) | direction]!;
    if (first === from || bears(map, table, first, square)) {
      if (slidesAlong(map.board[from]!, direction)) return 'guard';
      if (sliderBeyond(map, side, from, direction) >= 0) return 'screen';
    }
  }
  return pinBond(map, table, side, from, square);
}

/** Whether the man attacks the square or stands behind one of its side that does. */
function bears({ attackers, board, numbers }: AttackMap, table: SquareTable, man: number, square: number): boolean {
  const entry = ((board[man]! >> 3) << 6) | square;
  return (((attackers[entry]! | table.behind[entry]!) >>> numbers[man]!) & 1) === 1;
}

/**
 * Pins: the man looks at the enemy king past one that bears on the square, and so may hold that one; or it shuts a line
 * to its own king on which a guard of the square also stands, who may be held in its stead.
 */
function pinBond(map: AttackMap, table: SquareTable, side: SideIndex, from: number, square: number): Duty['by'] | null {
  const enemyKing = map.kings[side ^ 1]!;
  const toEnemy = enemyKing < 0 ? -1 : DIRECTION_TO[(from << 6) | enemyKing]!;
  if (toEnemy >= 0 && slidesAlong(map.board[from]!, toEnemy)) {
    if (someBears(map, table, from, toEnemy, enemyKing, square)) return 'guard';
  }
  const king = map.kings[side]!;
  const outwards = king < 0 ? -1 : DIRECTION_TO[(king << 6) | from]!;
  if (outwards < 0) return null;
  const slider = sliderBeyond(map, side, from, outwards);
  return slider >= 0 && someBears(map, table, king, outwards, slider, square) ? 'screen' : null;
}

/** Whether a man between two squares, met going in the direction, bears on a third. */
function someBears(
  map: AttackMap,
  table: SquareTable,
  from: number,
  way: number,
  end: number,
  square: number,
): boolean {
  const lines = firstMen(map);
  for (let at = lines[(from << 3) | way]!; at >= 0 && at !== end; at = lines[(at << 3) | way]!) {
    if (bears(map, table, at, square)) return true;
  }
  return false;
}

/** The nearest enemy slider beyond the man on a line, in whose way it is; -1 where there is none. */
function sliderBeyond(map: AttackMap, side: SideIndex, from: number, direction: number): number {
  const lines = firstMen(map);
  for (let at = lines[(from << 3) | direction]!; at >= 0; at = lines[(at << 3) | direction]!) {
    if (isEnemySlider(map, side, at, direction)) return at;
  }
  return -1;
}

function isEnemySlider({ board }: AttackMap, side: SideIndex, at: number, direction: number): boolean {
  return at >= 0 && board[at]! >> 3 !== side && slidesAlong(board[at]!, direction);
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
