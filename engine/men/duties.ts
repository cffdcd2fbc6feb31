/** Duties: what falls if a man leaves its square. */
import { type AttackMap, firstMen, type SideIndex, slidesAlong } from '../attacks';
import { BISHOP, DIRECTION_TO, KING, lowestSquare } from '../board';
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

/** Duties by the square of the man who has them, each list in the order of its squares; while one search lasts. */
type DutyLists = (readonly Duty[])[];

/**
 * The duties of the man on a square: friendly men (kings apart) on which the enemy would gain more by capturing
 * if this man were off the board.
 */
export function dutiesOf(map: AttackMap, table: SquareTable, from: Square): readonly Duty[] {
  return allDuties(map, table)[from] ?? NONE;
}

/** The duties of all men, by square: 64 lists. Sought from the men that could fall, who are few. */
export function allDuties(map: AttackMap, table: SquareTable): readonly (readonly Duty[])[] {
  const lists: DutyLists = new Array<readonly Duty[]>(64).fill(NONE);
  for (let side = 0 as SideIndex; side < 2; side++) {
    const enemy = side ^ 1;
    pinLines.count = -1;
    for (let half = 0; half < 2; half++) {
      const attacked = map.men[(side << 1) | half]! & map.control[(enemy << 1) | half]!;
      for (let rest = attacked; rest !== 0; rest &= rest - 1) {
        const square = lowestSquare(rest, half);
        if ((map.board[square]! & 7) !== KING) dutiesTo(map, table, side, square, lists);
      }
    }
    screens(map, table, side, lists);
  }
  return lists;
}

/** Gives the duty to the man on `from` where the enemy gains on the other's square by his leaving. */
function giveDuty(
  lists: DutyLists,
  map: AttackMap,
  table: SquareTable,
  from: number,
  square: number,
  by: Duty['by'],
): void {
  const code = map.board[square]!;
  const side = (code >> 3) as SideIndex;
  const now = Math.max(0, table.exchanges[((side ^ 1) << 6) | square]!);
  const loses = lossOn(map, side, code & 7, square, from) - now;
  if (loses <= 0) return;
  const duty: Duty = { square: square as Square, loses, by };
  const before = lists[from]!;
  lists[from] = before.length === 0 ? [duty] : [...before, duty].sort((a, b) => a.square - b.square);
}

/**
 * Finds who has a duty to an attacked man: those that guard it, directly or from behind or through the men that attack it on the
 * same line; those that shut the line of an enemy slider; and those whose leaving opens or closes a pin of one that
 * bears on the square.
 */
function dutiesTo(map: AttackMap, table: SquareTable, side: SideIndex, square: number, lists: DutyLists): void {
  const white = map.attackers[square]! | table.behind[square]!;
  const black = map.attackers[64 | square]! | table.behind[64 | square]!;
  let bound = side === 0 ? white : black;
  for (let rest = bound; rest !== 0; rest &= rest - 1) {
    giveDuty(lists, map, table, map.squares[(side << 5) | lowestSquare(rest, 0)]!, square, 'guard');
  }
  const lines = firstMen(map);
  for (let direction = 0; direction < 8; direction++) {
    const first = lines[(square << 3) | direction]!;
    for (let at = first; at >= 0; at = lines[(at << 3) | direction]!) {
      const code = map.board[at]!;
      const bit = 1 << map.numbers[at]!;
      if (code >> 3 === side && (bound & bit) === 0) {
        const by = slidesAlong(code, direction)
          ? 'guard'
          : sliderBeyond(map, side, at, direction) < 0
            ? null
            : 'screen';
        if (by !== null) {
          bound |= bit;
          giveDuty(lists, map, table, at, square, by);
        }
      }
      // Beyond the first only where that one bears on the square itself.
      if (at === first && ((code >> 3 === 0 ? white : black) & bit) === 0) break;
    }
  }
  if (pinLines.count < 0) fillPinLines(map, side);
  for (let line = 0; line < pinLines.count; line++) {
    const man = pinLines.men[line]!;
    const bit = 1 << map.numbers[man]!;
    if (man === square || (bound & bit) !== 0) continue;
    if (((white & pinLines.white[line]!) | (black & pinLines.black[line]!)) === 0) continue;
    bound |= bit;
    giveDuty(lists, map, table, man, square, pinLines.holds[line] === 1 ? 'guard' : 'screen');
  }
}

/**
 * Men nothing attacks yet, behind whom on a line stands an enemy slider and before whom one man of their side alone: only
 * the line that this man keeps shut can change that.
 */
function screens(map: AttackMap, table: SquareTable, side: SideIndex, lists: DutyLists): void {
  const enemy = side ^ 1;
  const lines = firstMen(map);
  for (let number = map.counts[enemy]! - 1; number >= 0; number--) {
    const slider = map.squares[(enemy << 5) | number]!;
    const code = map.board[slider]!;
    if ((code & 7) < BISHOP) break;
    for (let direction = 0; direction < 8; direction++) {
      if (!slidesAlong(code, direction)) continue;
      const from = lines[(slider << 3) | direction]!;
      if (from < 0 || map.board[from]! >> 3 !== side) continue;
      const square = lines[(from << 3) | direction]!;
      if (square < 0 || map.board[square]! >> 3 !== side || (map.board[square]! & 7) === KING) continue;
      if (map.attackers[(enemy << 6) | square] === 0) giveDuty(lists, map, table, from, square, 'screen');
    }
  }
}

/**
 * Men of one side that can take part in a pin, and which others the pin would concern. `holds` 1: the man looks at the enemy
 * king past those, and so may hold one of them. 0: it shuts a line to its own king on which those stand, who
 * may be held in its stead. Scratch of one search; -1: not filled.
 */
const pinLines = {
  count: -1,
  men: new Uint8Array(64),
  holds: new Uint8Array(64),
  white: new Int32Array(64),
  black: new Int32Array(64),
};

function fillPinLines(map: AttackMap, side: SideIndex): void {
  const { board, squares, counts, kings } = map;
  pinLines.count = 0;
  const king = kings[side]!;
  const enemyKing = kings[side ^ 1]!;
  // All that hold come before any that shut: of two reasons the first is given.
  for (let number = counts[side]! - 1; enemyKing >= 0 && number >= 0; number--) {
    const from = squares[(side << 5) | number]!;
    const code = board[from]!;
    if ((code & 7) < BISHOP) break;
    const direction = DIRECTION_TO[(from << 6) | enemyKing]!;
    if (direction >= 0 && slidesAlong(code, direction)) addPinLine(map, from, 1, from, direction, enemyKing);
  }
  if (king < 0) return;
  const lines = firstMen(map);
  for (let direction = 0; direction < 8; direction++) {
    for (let at = lines[(king << 3) | direction]!; at >= 0; at = lines[(at << 3) | direction]!) {
      if (board[at]! >> 3 !== side) continue;
      const slider = sliderBeyond(map, side, at, direction);
      if (slider < 0) break;
      addPinLine(map, at, 0, king, direction, slider);
    }
  }
}

/** Adds a man with the men between two squares, met going in the direction. */
function addPinLine(map: AttackMap, man: number, holds: 0 | 1, from: number, direction: number, end: number): void {
  const lines = firstMen(map);
  let white = 0;
  let black = 0;
  for (let at = lines[(from << 3) | direction]!; at >= 0 && at !== end; at = lines[(at << 3) | direction]!) {
    if (map.board[at]! >> 3 === 0) white |= 1 << map.numbers[at]!;
    else black |= 1 << map.numbers[at]!;
  }
  if ((white | black) === 0) return;
  const line = pinLines.count++;
  pinLines.men[line] = man;
  pinLines.holds[line] = holds;
  pinLines.white[line] = white;
  pinLines.black[line] = black;
}

/** The nearest enemy slider beyond the man on a line, in whose way it is; -1 where there is none. */
function sliderBeyond(map: AttackMap, side: SideIndex, from: number, direction: number): number {
  const lines = firstMen(map);
  for (let at = lines[(from << 3) | direction]!; at >= 0; at = lines[(at << 3) | direction]!) {
    const code = map.board[at]!;
    if (code >> 3 !== side && slidesAlong(code, direction)) return at;
  }
  return -1;
}

/**
 * Overloaded: two men that it guards by duty can be attacked by different enemy men, so that both duties can be
 * called at once.
 */
export function isOverloaded(map: AttackMap, side: SideIndex, duties: readonly Duty[]): boolean {
  const row = (side ^ 1) << 6;
  for (let i = 0; i < duties.length; i++) {
    const first = map.attackers[row | duties[i]!.square]!;
    if (first === 0 || duties[i]!.by !== 'guard') continue;
    for (let j = i + 1; j < duties.length; j++) {
      const second = map.attackers[row | duties[j]!.square]!;
      const both = first | second;
      if (second !== 0 && duties[j]!.by === 'guard' && (both & (both - 1)) !== 0) return true;
    }
  }
  return false;
}
