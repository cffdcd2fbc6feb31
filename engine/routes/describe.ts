/** What is said beside a route: each step's safety, the enemy's soonest challenge, the duties left behind. */
import { BISHOP, KING, PAWN } from '../board';
import { attackMap, attackersOf, isAttacked, kindOn, type SideIndex } from '../attacks';
import { exchangeOn, lossOn, safetyOf, worthOf } from '../exchange';
import { dutiesOf } from '../men';
import { type PawnMap, pawnReach } from '../pawns';
import { fillReach } from '../reach';
import type { SquareTable } from '../squares';
import { opponent, type Side, type Square } from '../types';
import { bears, mapOf, moved } from './boards';
import type { Field } from './placements';
import type { ChallengeValue, StepValue } from './values';

/** The enemy pawn that can hit a square soonest. */
export function pawnHitOn(pawns: PawnMap, side: Side, square: Square): StepValue['pawnHit'] {
  return pawnReach(pawns, opponent(side), square).soonest;
}

/** One step: the man of `from` standing on `to`, nothing else moved. */
export function stepOn({ map, ground }: Field, from: Square, to: Square): StepValue {
  const { index, side, pawns } = ground;
  const after = mapOf(moved(map.board, from, to));
  return {
    to,
    safe: lossOn(map, index, map.board[from]! & 7, to, from) === 0,
    attackedBy: attackersOf(after, opponent(side), to),
    guardedBy: attackersOf(after, side, to),
    pawnHit: pawnHitOn(pawns, side, to),
  };
}

/** How far enemy pieces are looked for, in their own moves. */
const CHALLENGE_MOVES = 3;

const reached = new Int8Array(64);

/**
 * How soon the enemy can dispute a post: a pawn that comes to attack it, a man not dearer than the one there, or any
 * man where nothing guards it. Kings are left aside, and the other side stands still. Of equally soon men the
 * cheapest is named.
 */
export function challengeOf(field: Field, from: Square, post: Square): ChallengeValue | null {
  const { index, side, pawns } = field.ground;
  const board = moved(field.map.board, from, post);
  const map = attackMap({ board });
  const safety = safetyOf(map);
  const enemy = (index ^ 1) as SideIndex;
  const guarded = isAttacked(map, side, post);
  const worth = worthOf(board[post]!);
  const hit = pawnHitOn(pawns, side, post);
  let soonest: ChallengeValue | null = hit && { by: hit.from, kind: 'pawn', moves: hit.moves };
  for (let number = 0; number < map.counts[enemy]!; number++) {
    const man = map.squares[(enemy << 5) | number]! as Square;
    const place = board[man]! & 7;
    if (place === PAWN || place === KING || (guarded && worthOf(place) > worth)) continue;
    const moves = movesToAttack(board, man, post, () => fillReach(safety, man, CHALLENGE_MOVES, reached, 0));
    if (moves !== null && (soonest === null || moves < soonest.moves)) {
      soonest = { by: man, kind: kindOn(map, man), moves };
    }
  }
  return soonest;
}

function movesToAttack(board: Readonly<Uint8Array>, man: Square, post: Square, fill: () => void): number | null {
  const place = board[man]! & 7;
  if (bears(board, place, man, post, -1)) return 0;
  // A bishop of the other colour never comes.
  if (place === BISHOP && ((man ^ (man >> 3) ^ post ^ (post >> 3)) & 1) === 1) return null;
  fill();
  let soonest: number | null = null;
  for (let at = 0; at < 64; at++) {
    const moves = reached[at]!;
    if (moves <= 0 || board[at] !== 0 || (soonest !== null && moves >= soonest)) continue;
    if (bears(board, place, at as Square, post, man)) soonest = moves;
  }
  return soonest;
}

/** Duties of the man that it no longer does from the post: own men on which the enemy then gains more than now. */
export function dropsOf(
  { map, ground: { index } }: Field,
  table: SquareTable,
  from: Square,
  post: Square,
): { square: Square; loses: number }[] {
  const duties = dutiesOf(map, table, from);
  if (duties.length === 0) return [];
  const after = mapOf(moved(map.board, from, post));
  const enemy = (index ^ 1) as SideIndex;
  const drops: { square: Square; loses: number }[] = [];
  for (const { square } of duties) {
    const loses = Math.max(0, exchangeOn(after, enemy, square) ?? 0) - Math.max(0, exchangeOn(map, enemy, square) ?? 0);
    if (loses > 0) drops.push({ square, loses });
  }
  return drops;
}

/** Squares of a side's men, cheapest first, equal ones from its own side on. */
export function menOf({ map, ground: { index } }: Field): Square[] {
  const flip = index === 0 ? 0 : 56;
  const men = Array.from(map.squares.subarray(index << 5, (index << 5) + map.counts[index]!), (at) => at as Square);
  return men.sort((a, b) => (map.board[a]! & 7) - (map.board[b]! & 7) || (a ^ flip) - (b ^ flip));
}
