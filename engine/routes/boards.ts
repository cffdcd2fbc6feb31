/** 'What if' boards of routes: a man put elsewhere, the enemy standing still. */
import { type AttackMap, attackMap, newAttackMap } from '../attacks';
import { between, BISHOP, DIRECTION_TO, KNIGHT, KNIGHT_LEAPS, LEAP_ROW, QUEEN, ROOK } from '../board';
import type { Square } from '../types';

/** The board with the man on `from` put on `to`; what stood there is gone. */
export function moved(board: Readonly<Uint8Array>, from: Square, to: Square): Uint8Array {
  const after = Uint8Array.from(board);
  after[from] = 0;
  after[to] = board[from]!;
  return after;
}

/** Whether a piece of the kind's place on `from` attacks `to`; `vacant` counts as empty. */
export function bears(
  board: Readonly<Uint8Array>,
  place: number,
  from: Square,
  to: Square,
  vacant: Square | -1,
): boolean {
  if (place === KNIGHT) {
    for (let at = from * LEAP_ROW, next = KNIGHT_LEAPS[at]!; next >= 0; next = KNIGHT_LEAPS[++at]!) {
      if (next === to) return true;
    }
    return false;
  }
  const direction = DIRECTION_TO[(from << 6) | to]!;
  if (direction < 0 || !(place === QUEEN || place === (direction < 4 ? ROOK : BISHOP))) return false;
  return between(from, to).every((square) => board[square] === 0 || square === vacant);
}

const scratch = newAttackMap();

/** The attack map of a 'what if' board; holds until the next call. */
export function mapOf(board: Readonly<Uint8Array>): AttackMap {
  return attackMap({ board }, scratch);
}

/** Whether the side's king is attacked on a map; never for a side without one. */
export function isKingAttacked(map: AttackMap, side: number): boolean {
  const king = map.kings[side]!;
  return king >= 0 && map.attackers[((side ^ 1) << 6) | king] !== 0;
}
