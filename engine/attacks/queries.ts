/** Questions to the attack map in the words of the game. Lists run cheapest man first. */
import { KINDS, type Kind, type Side, type Square } from '../types';
import { type AttackMap, isHeldFrom, pinnedMask, type SideIndex } from './attack-map';

/** 0 for White, 1 for Black. */
export function sideIndex(side: Side): SideIndex {
  return side === 'white' ? 0 : 1;
}

/** Squares of the men in a mask of one side, cheapest first. */
export function menOfMask(map: AttackMap, side: Side, mask: number): Square[] {
  const row = sideIndex(side) << 5;
  const squares: Square[] = [];
  for (let rest = mask; rest !== 0; rest &= rest - 1)
    squares.push(map.squares[row | (31 - Math.clz32(rest & -rest))] as Square);
  return squares;
}

/** Men of a side that attack the square, pinned men included. */
export function attackersOf(map: AttackMap, side: Side, square: Square): Square[] {
  return menOfMask(map, side, attackerMask(map, side, square));
}

/** Mask of the men of a side that attack the square. */
export function attackerMask(map: AttackMap, side: Side, square: Square): number {
  return map.attackers[(sideIndex(side) << 6) | square] as number;
}

/** Whether the side attacks the square. */
export function isAttacked(map: AttackMap, side: Side, square: Square): boolean {
  return attackerMask(map, side, square) !== 0;
}

/** Attackers of the square that an absolute pin keeps from capturing there. */
export function heldFrom(map: AttackMap, side: Side, square: Square): Square[] {
  const index = sideIndex(side);
  const pinned = attackerMask(map, side, square) & pinnedMask(map, index);
  return pinned === 0 ? [] : menOfMask(map, side, pinned).filter((from) => isHeldFrom(map, index, from, square));
}

/** Whether the man on the square is absolutely pinned. */
export function isPinned(map: AttackMap, square: Square): boolean {
  const code = map.board[square] as number;
  return code !== 0 && ((pinnedMask(map, (code >> 3) as SideIndex) >>> (map.numbers[square] as number)) & 1) === 1;
}

/** Kind of the man on an occupied square. Throws on an empty one: the caller knows who stands where. */
export function kindOn(map: AttackMap, square: Square): Kind {
  const kind = KINDS[((map.board[square] as number) & 7) - 1];
  if (!kind) throw new Error(`no man on square ${square}`);
  return kind;
}

/** Side of the man on an occupied square; undefined for an empty one. */
export function sideOn(map: AttackMap, square: Square): Side | undefined {
  const code = map.board[square] as number;
  return code === 0 ? undefined : code >> 3 ? 'black' : 'white';
}
