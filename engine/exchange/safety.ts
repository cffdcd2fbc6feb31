/**
 * Safe or not, asked many times of one position. Most answers follow from the attackers alone, most others
 * do not hang on where the man comes from and are kept; the rest are played out by `isSafeOn`.
 */
import { type AttackMap, firstMen, pinnedMask, type SideIndex, slidesAlong } from '../attacks';
import { DIRECTION_TO, KING, OPPOSITE } from '../board';
import { isSafeOn, worthOf } from './exchange';

/** An attack map with the answers found so far. */
export interface Safety {
  readonly map: AttackMap;
  /** Entry (side << 9 | kind's place << 6 | square): 0 not asked yet, 1 safe, 2 not. */
  readonly known: Uint8Array;
  /** By the square of a man that was asked about: 1 once the next two are found. */
  readonly aimed: Uint8Array;
  /** One bit a direction: on squares that way the leaving man may uncover a slider behind it. */
  readonly uncovers: Uint8Array;
  /** 1 where its leaving may open or close a pin, so that nothing kept is of use. */
  readonly touchesPin: Uint8Array;
}

/** The safety of one position; `into` gives the tables to clear and use again. */
export function safetyOf(map: AttackMap, into?: Safety): Safety {
  if (!into || into.map !== map) {
    return {
      map,
      known: new Uint8Array(1024),
      aimed: new Uint8Array(64),
      uncovers: new Uint8Array(64),
      touchesPin: new Uint8Array(64),
    };
  }
  into.known.fill(0);
  into.aimed.fill(0);
  return into;
}

/** Whether a man of the side and kind (by place in a code), put on the square from nowhere, is safe there. */
export function isSafeHere({ map, known }: Safety, side: SideIndex, place: number, square: number): boolean {
  const enemies = map.attackers[((side ^ 1) << 6) | square]!;
  if (enemies === 0) return true;
  const entry = (side << 9) | (place << 6) | square;
  const answer = known[entry]!;
  if (answer !== 0) return answer === 1;
  const safe = !isHitByCheaper(map, side, place, enemies) && isSafeOn(map, side, place, square, -1);
  known[entry] = safe ? 1 : 2;
  return safe;
}

/**
 * Whether the man on `from` is safe on `to`, taken off its origin: `isSafeOn` with the man's own origin.
 * `from` must hold a man; what stands on `to` is taken to be gone.
 */
export function isSafeMove(safety: Safety, from: number, to: number): boolean {
  const { map } = safety;
  if (safety.aimed[from] === 0) aim(safety, from);
  const code = map.board[from]!;
  const side = (code >> 3) as SideIndex;
  const place = code & 7;
  const direction = DIRECTION_TO[(from << 6) | to]!;
  const uncovers = direction >= 0 && ((safety.uncovers[from]! >>> direction) & 1) === 1;
  if (uncovers) return isSafeOn(map, side, place, to, from);
  const enemies = map.attackers[((side ^ 1) << 6) | to]!;
  if (enemies === 0) return true;
  if (place === KING) return false;
  if (safety.touchesPin[from] === 1) return isSafeOn(map, side, place, to, from);
  if (isHitByCheaper(map, side, place, enemies)) return false;
  // The man must not be counted as a guard of its own square, now or from behind.
  const bears = ((map.attackers[(side << 6) | to]! >>> map.numbers[from]!) & 1) === 1;
  if (bears || (direction >= 0 && slidesAlong(code, direction))) return isSafeOn(map, side, place, to, from);
  return isSafeHere(safety, side, place, to);
}

/** Whether the cheapest of the enemy attackers may capture and costs less than the man: then the man is lost there. */
function isHitByCheaper(map: AttackMap, side: SideIndex, place: number, enemies: number): boolean {
  const enemy = (side ^ 1) as SideIndex;
  const cheapest = enemies & -enemies;
  if (pinnedMask(map, enemy) & cheapest) return false;
  const code = map.board[map.squares[(enemy << 5) | (31 - Math.clz32(cheapest))]!]!;
  return (code & 7) !== KING && worthOf(code) < worthOf(place);
}

/** Finds what the man's leaving can change: sliders behind it in each direction, and pins it stands in. */
function aim(safety: Safety, from: number): void {
  const { map } = safety;
  const lines = firstMen(map);
  let uncovers = 0;
  for (let direction = 0; direction < 8; direction++) {
    const back = OPPOSITE[direction]!;
    for (let at = lines[(from << 3) | back]!; at >= 0; at = lines[(at << 3) | back]!) {
      if (!slidesAlong(map.board[at]!, back)) continue;
      uncovers |= 1 << direction;
      break;
    }
  }
  safety.aimed[from] = 1;
  safety.uncovers[from] = uncovers;
  safety.touchesPin[from] = touchesPinOf(map, 0, from) || touchesPinOf(map, 1, from) ? 1 : 0;
}

/** Whether the man stands on a line from the side's king with an enemy slider further out, or is such a slider itself. */
function touchesPinOf(map: AttackMap, side: number, from: number): boolean {
  const king = map.kings[side]!;
  if (king < 0) return false;
  const direction = DIRECTION_TO[(king << 6) | from]!;
  if (direction < 0) return false;
  const lines = firstMen(map);
  for (let at = from; at >= 0; at = lines[(at << 3) | direction]!) {
    const code = map.board[at]!;
    if (code >> 3 !== side && slidesAlong(code, direction)) return true;
  }
  return false;
}
