/**
 * Safe or not, asked many times of one position. Prices of capturing are kept by square, and for each man a set of
 * squares where it would be safe, which is found as far as it is asked for; only squares where the answer hangs on the man's
 * own leaving are played out for it alone, by `isSafeOn`.
 */
import { type AttackMap, firstMen, pinnedMask, type SideIndex, slidesAlong } from '../attacks';
import { BISHOP, KING, LINE_WORDS, lowestSquare, PAWN, RAY_WORDS, ROOK } from '../board';
import { isSafeOn, priceOn, worthOf } from './exchange';

const UNASKED = -1;

/** An attack map with the answers found so far. Sets are two words, entry (… << 1 | word); a man is (side << 5 | number). */
export interface Safety {
  readonly map: AttackMap;
  /** What a side pays for capturing on a square, see `priceOn`: entry (side << 6 | square), UNASKED where not found yet. */
  readonly prices: Int8Array;
  /** By man: squares where it is safe, put there and taken off its own; of those not in `open` the answer is final. */
  readonly safe: Int32Array;
  /** By man: squares of which it is not known yet. */
  readonly open: Int32Array;
  /** By man: squares of `open` where its own leaving matters. */
  readonly alone: Int32Array;
  /** Men whose three sets are made: a mask a side. */
  readonly made: Int32Array;
  /** Squares that some unpinned man of a side attacks which is cheaper than a kind: entry ((side << 3 | place) << 1 | word). */
  readonly hits: Int32Array;
  /** By square of a man: one bit a direction, on squares that way the leaving man may uncover a slider behind it. */
  readonly uncovers: Uint8Array;
  /** By square of a man: 1 where its leaving may open or close a pin. */
  readonly touchesPin: Uint8Array;
  /** Whether the last three are filled. */
  aimed: boolean;
}

/** The safety of one position; `into` gives the tables to clear and use again. */
export function safetyOf(map: AttackMap, into?: Safety): Safety {
  if (!into || into.map !== map) {
    return {
      map,
      prices: new Int8Array(128).fill(UNASKED),
      safe: new Int32Array(128),
      open: new Int32Array(128),
      alone: new Int32Array(128),
      made: new Int32Array(2),
      hits: new Int32Array(32),
      uncovers: new Uint8Array(64),
      touchesPin: new Uint8Array(64),
      aimed: false,
    };
  }
  into.prices.fill(UNASKED);
  into.made[0] = 0;
  into.made[1] = 0;
  into.aimed = false;
  return into;
}

/** What the side pays for capturing on the square, found once: see `priceOn`. */
export function priceOf({ map, prices }: Safety, side: SideIndex, square: number): number {
  const entry = (side << 6) | square;
  const price = prices[entry]!;
  if (price !== UNASKED) return price;
  return (prices[entry] = priceOn(map, side, square));
}

/** Whether a man of the side and kind (by place in a code), put on the square from nowhere, is safe there. */
export function isSafeHere(safety: Safety, side: SideIndex, place: number, square: number): boolean {
  const enemy = (side ^ 1) as SideIndex;
  if (safety.map.attackers[(enemy << 6) | square] === 0) return true;
  return place !== KING && worthOf(place) <= priceOf(safety, enemy, square);
}

/**
 * Whether the man on `from` is safe on `to`, taken off its origin: `isSafeOn` with the man's own origin.
 * `from` must hold a man; what stands on `to` is taken to be gone.
 */
export function isSafeMove(safety: Safety, from: number, to: number): boolean {
  const { board, numbers } = safety.map;
  return safeAmong(safety, ((board[from]! >> 3) << 5) | numbers[from]!, to >> 5, 1 << (to & 31)) !== 0;
}

/** Those of the squares asked about, all of one word (`half` 0 or 1), where the man would be safe: see `isSafeMove`. */
export function safeAmong(safety: Safety, man: number, half: number, asked: number): number {
  if (((safety.made[man >> 5]! >>> (man & 31)) & 1) === 0) makeSets(safety, man);
  const entry = (man << 1) | half;
  const pending = safety.open[entry]! & asked;
  if (pending !== 0) settle(safety, man, half, pending);
  return safety.safe[entry]! & asked;
}

function settle(safety: Safety, man: number, half: number, pending: number): void {
  const { map, safe, open, alone } = safety;
  const entry = (man << 1) | half;
  const side = (man >> 5) as SideIndex;
  const enemy = (side ^ 1) as SideIndex;
  const from = map.squares[man]!;
  const place = map.board[from]! & 7;
  const worth = worthOf(place);
  open[entry]! &= ~pending;
  for (let rest = pending; rest !== 0; rest &= rest - 1) {
    const bit = rest & -rest;
    const to = lowestSquare(rest, half);
    const isSafe =
      (alone[entry]! & bit) !== 0 ? isSafeOn(map, side, place, to, from) : worth <= priceOf(safety, enemy, to);
    if (isSafe) safe[entry]! |= bit;
  }
}

/**
 * Makes a man's three sets. Safe at once is all that the enemy does not attack, lost all that an unpinned cheaper man of
 * his attacks; but where the man may uncover a slider, or opens or closes a pin, nothing is taken for granted. Its own
 * leaving matters there, and on its own lines and strikes: it must not be counted as a guard of its own square, now or
 * from behind.
 */
function makeSets(safety: Safety, man: number): void {
  if (!safety.aimed) aim(safety);
  const { map, safe, open, alone, hits } = safety;
  const side = man >> 5;
  const enemy = side ^ 1;
  const from = map.squares[man]!;
  const place = map.board[from]! & 7;
  const touchesPin = place !== KING && safety.touchesPin[from] === 1;
  safety.made[side]! |= 1 << (man & 31);
  for (let half = 0; half < 2; half++) {
    const entry = (man << 1) | half;
    const controlled = map.control[(enemy << 1) | half]!;
    const hit = touchesPin ? 0 : hits[(((enemy << 3) | place) << 1) | half]!;
    const bears =
      place >= BISHOP && place < KING
        ? LINE_WORDS[((((place - BISHOP) << 6) | from) << 1) | half]!
        : map.sights[entry]!;
    let own = touchesPin ? controlled : bears & controlled & ~hit;
    if (safety.uncovers[from] !== 0) own |= uncovered(safety, from, half, controlled) & ~hit;
    alone[entry] = own;
    open[entry] = own | (place === KING ? 0 : controlled & ~hit);
    safe[entry] = ~controlled & ~own;
  }
}

/** Squares, of one word, on which a man's going may let in a slider from behind it: in its sight, or attacked already. */
function uncovered({ map, uncovers }: Safety, from: number, half: number, controlled: number): number {
  const lines = firstMen(map);
  let squares = 0;
  for (let rest = uncovers[from]!; rest !== 0; rest &= rest - 1) {
    const row = (from << 3) | (31 - Math.clz32(rest & -rest));
    const ray = RAY_WORDS[(row << 1) | half]!;
    const first = lines[row]!;
    const beyond = first < 0 ? 0 : RAY_WORDS[(((first << 3) | (row & 7)) << 1) | half]!;
    squares |= ray & (~beyond | controlled);
  }
  return squares;
}

/** Finds what the leaving of each man can change, and what cheap men strike. */
function aim(safety: Safety): void {
  safety.uncovers.fill(0);
  safety.touchesPin.fill(0);
  for (let side = 0; side < 2; side++) {
    for (let number = safety.map.counts[side]! - 1; number >= 0; number--) {
      const from = safety.map.squares[(side << 5) | number]!;
      const place = safety.map.board[from]! & 7;
      if (place < BISHOP) break;
      if (place !== KING) markUncovering(safety, from, place);
    }
    markPins(safety, side);
    fillHits(safety, side as SideIndex);
  }
  safety.aimed = true;
}

/** All men on the lines of a slider have it behind them. */
function markUncovering({ map, uncovers }: Safety, slider: number, place: number): void {
  const lines = firstMen(map);
  const last = place === ROOK ? 4 : 8;
  for (let direction = place === BISHOP ? 4 : 0; direction < last; direction++) {
    for (let at = lines[(slider << 3) | direction]!; at >= 0; at = lines[(at << 3) | direction]!) {
      uncovers[at]! |= 1 << direction;
    }
  }
}

/** Men on a line from a side's king with an enemy slider further out, and such sliders themselves. */
function markPins({ map, touchesPin }: Safety, side: number): void {
  const king = map.kings[side]!;
  if (king < 0) return;
  const lines = firstMen(map);
  for (let direction = 0; direction < 8; direction++) {
    let last = -1;
    for (let at = lines[(king << 3) | direction]!; at >= 0; at = lines[(at << 3) | direction]!) {
      const code = map.board[at]!;
      if (code >> 3 !== side && slidesAlong(code, direction)) last = at;
    }
    if (last < 0) continue;
    touchesPin[last] = 1;
    for (let at = lines[(king << 3) | direction]!; at !== last; at = lines[(at << 3) | direction]!) touchesPin[at] = 1;
  }
}

/** Men are numbered by worth, so that the union of what they attack grows from kind to kind. */
function fillHits({ map, hits }: Safety, side: SideIndex): void {
  const { board, squares, counts, sights } = map;
  const pinned = pinnedMask(map, side);
  const row = side << 3;
  let low = 0;
  let high = 0;
  let number = 0;
  let cheaperLow = 0;
  let cheaperHigh = 0;
  for (let place = PAWN; place < KING; place++) {
    // A bishop is worth a knight: what knights attack does not hit it.
    if (place !== BISHOP) {
      cheaperLow = low;
      cheaperHigh = high;
    }
    hits[(row | place) << 1] = cheaperLow;
    hits[((row | place) << 1) | 1] = cheaperHigh;
    for (; number < counts[side]! && (board[squares[(side << 5) | number]!]! & 7) === place; number++) {
      if ((pinned >>> number) & 1) continue;
      low |= sights[((side << 5) | number) << 1]!;
      high |= sights[(((side << 5) | number) << 1) | 1]!;
    }
  }
  hits[(row | KING) << 1] = 0;
  hits[((row | KING) << 1) | 1] = 0;
}
