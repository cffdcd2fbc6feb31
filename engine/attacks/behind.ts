/** Batteries: the men that stand behind an attacker on its line. */
import { BISHOP, EDGES, KING, PAWN, ROOK, STRIDES } from '../board';
import { type AttackMap, firstMen, slidesAlong } from './attack-map';

/**
 * Marks who stands behind: sliders that would attack a square once the friendly sliders, or the one pawn, in
 * front of them on the same line have captured there. `into` is filled by (side << 6 | square) with masks.
 *
 * Found from the rear: from each slider past the friends that attack along its line.
 */
export function fillBehind(map: AttackMap, into: Int32Array): void {
  const { board, counts, squares } = map;
  into.fill(0);
  for (let side = 0; side < 2; side++) {
    for (let number = counts[side]! - 1; number >= 0; number--) {
      const from = squares[(side << 5) | number]!;
      const kind = board[from]! & 7;
      if (kind < BISHOP) break;
      if (kind === KING) continue;
      const last = kind === ROOK ? 4 : 8;
      for (let direction = kind === BISHOP ? 4 : 0; direction < last; direction++) {
        markBehind(map, into, side, from, direction, 1 << number);
      }
    }
  }
}

function markBehind(
  map: AttackMap,
  into: Int32Array,
  side: number,
  from: number,
  direction: number,
  bit: number,
): void {
  const { board } = map;
  const lines = firstMen(map);
  const stride = STRIDES[direction]!;
  for (let front = lines[(from << 3) | direction]!; front >= 0; ) {
    const code = board[front]!;
    if (code >> 3 !== side) return;
    if ((code & 7) === PAWN) {
      const next = front + stride;
      if (direction >= 4 && stride > 0 === (side === 0) && front !== EDGES[(front << 3) | direction]) {
        into[(side << 6) | next]! |= bit;
      }
      return;
    }
    if (!slidesAlong(code, direction)) return;
    const next = lines[(front << 3) | direction]!;
    const end = next < 0 ? EDGES[(front << 3) | direction]! : next;
    for (let to = front; to !== end; ) {
      to += stride;
      into[(side << 6) | to]! |= bit;
    }
    front = next;
  }
}
