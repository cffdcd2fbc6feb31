/** Duties: what falls if a man leaves its square. */
import { type AttackMap, firstMen, type SideIndex, slidesAlong } from '../attacks';
import { DIRECTION_TO, KING, OPPOSITE } from '../board';
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
  const pins = isOnPinLine(map, side, from);
  let duties: Duty[] | null = null;
  for (let other = 0; other < map.counts[side]!; other++) {
    const square = map.squares[(side << 5) | other]!;
    if (map.attackers[enemyRow | square] === 0 || square === from) continue;
    const by = bond(map, table, side, from, square) ?? (pins ? pinBond(map, table, side, from, square) : null);
    if (by !== null) duties = withDuty(duties, map, table, from, square, by);
  }
  // Men that nothing attacks yet: only the line that this man alone keeps shut can change that.
  const lines = firstMen(map);
  for (let direction = 0; direction < 8; direction++) {
    if (!isEnemySlider(map, side, lines[(from << 3) | direction]!, direction)) continue;
    const square = lines[(from << 3) | OPPOSITE[direction]!]!;
    if (square < 0 || map.board[square]! >> 3 !== side || map.attackers[enemyRow | square] !== 0) continue;
    duties = withDuty(duties, map, table, from, square, 'screen');
  }
  return duties === null ? NONE : duties.sort((a, b) => a.square - b.square);
}

/** Adds the duty to the own man on a square where the enemy gains there by the man's leaving. */
function withDuty(
  duties: Duty[] | null,
  map: AttackMap,
  table: SquareTable,
  from: Square,
  square: number,
  by: Duty['by'],
): Duty[] | null {
  const code = map.board[square]!;
  const side = (code >> 3) as SideIndex;
  const place = code & 7;
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
 * How the man on `from` can matter to an attacked own man on a square: it guards it, directly, from behind or through the men
 * that attack it on the same line; or it shuts the line of an enemy slider. Null where it does neither.
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
  return null;
}

/** Whether the man attacks the square or stands behind one of its side that does. */
function bears({ attackers, board, numbers }: AttackMap, table: SquareTable, man: number, square: number): boolean {
  const entry = ((board[man]! >> 3) << 6) | square;
  return (((attackers[entry]! | table.behind[entry]!) >>> numbers[man]!) & 1) === 1;
}

/** Whether the man can take part in a pin at all: it looks along a line at the enemy king, or stands on one with its own. */
function isOnPinLine({ board, kings }: AttackMap, side: SideIndex, from: number): boolean {
  const king = kings[side]!;
  if (king >= 0 && DIRECTION_TO[(king << 6) | from]! >= 0) return true;
  const enemyKing = kings[side ^ 1]!;
  const direction = enemyKing < 0 ? -1 : DIRECTION_TO[(from << 6) | enemyKing]!;
  return direction >= 0 && slidesAlong(board[from]!, direction);
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
