/**
 * Static exchange: what a side gains, in pawns, when captures on one square are played out.
 *
 * Rules, as the handbooks count (Edward Lasker, Chess Strategy, 1915, counts attackers and the men behind
 * them): the cheapest man captures first, either side may stop when going on costs it something, men behind
 * join in once the man in front has captured, a man whose leaving would lay its own king open to a slider
 * stands aside as long as that is so, and a king never captures into a remaining attacker (a pinned man is
 * one: FIDE Laws, 3.1). Among equally cheap men the side takes the one that serves it best, so that the
 * result does not hang on the order of squares. Left out: promotion by capturing, captures in passing, and
 * checks given elsewhere.
 */
import { type AttackMap, firstMen, slidesAlong, type SideIndex } from '../attacks';
import { DIRECTION_TO, KING } from '../board';

/** Worth by the kind's place in a man's code; the king's is never asked for. */
const WORTH_BY_PLACE: Readonly<Int8Array> = Int8Array.of(0, 1, 3, 3, 5, 9, 0, 0);

/** Worth of a man by its code, in pawns; 0 for a king or an empty square. */
export function worthOf(code: number): number {
  return WORTH_BY_PLACE[code & 7]!;
}

// The state of one exchange. It lives in the module so that the search allocates nothing; nothing here
// survives a call. `gone` holds the men that have left their squares, one mask a side.
let map: AttackMap;
let lines: Readonly<Int8Array>;
let target = 0;
const available = new Int32Array(2);
const gone = new Int32Array(2);

function isGone(square: number): boolean {
  return ((gone[map.board[square]! >> 3]! >>> map.numbers[square]!) & 1) === 1;
}

/** First man from a square in a direction that has not left; -1 where there is none before the edge or the target. */
function nextMan(from: number, direction: number): number {
  let at = lines[(from << 3) | direction]!;
  while (at >= 0 && at !== target && isGone(at)) at = lines[(at << 3) | direction]!;
  return at;
}

/** Whether the side's man on `from` stands aside: leaving its square for the target would open a line to its king. */
function standsAside(side: number, from: number): boolean {
  const king = map.kings[side]!;
  if (king < 0 || king === target) return false;
  const direction = DIRECTION_TO[(king << 6) | from]!;
  if (direction < 0 || DIRECTION_TO[(king << 6) | target] === direction) return false;
  if (nextMan(king, direction) !== from) return false;
  const pinner = nextMan(from, direction);
  // A king that has left its square is not laid open.
  if (pinner < 0 || isGone(king)) return false;
  const code = map.board[pinner]!;
  return code >> 3 !== side && slidesAlong(code, direction);
}

/** The man who leaves `from` is gone; the slider behind him on the line to the target, of either side, joins in. */
function leave(side: number, from: number): void {
  const bit = 1 << map.numbers[from]!;
  gone[side]! |= bit;
  available[side]! &= ~bit;
  const direction = DIRECTION_TO[(target << 6) | from]!;
  if (direction < 0) return;
  const behind = nextMan(from, direction);
  if (behind < 0 || nextMan(target, direction) !== behind) return;
  const code = map.board[behind]!;
  if (slidesAlong(code, direction)) available[code >> 3]! |= 1 << map.numbers[behind]!;
}

/** Whether the order among equals cannot matter for this man: no slider further back on his line, no king on a line with him. */
function isPlain(from: number): boolean {
  const direction = DIRECTION_TO[(target << 6) | from]!;
  if (direction >= 0) {
    for (let at = lines[(from << 3) | direction]!; at >= 0; at = lines[(at << 3) | direction]!) {
      if (slidesAlong(map.board[at]!, direction)) return false;
    }
  }
  const white = map.kings[0]!;
  const black = map.kings[1]!;
  return (white < 0 || DIRECTION_TO[(white << 6) | from]! < 0) && (black < 0 || DIRECTION_TO[(black << 6) | from]! < 0);
}

/** No capture is possible: told apart from a capture that gains nothing. */
const NONE = -100;

/** Best gain of the side when it must make one capture of a man of that worth, NONE where it cannot. */
function forced(side: number, worth: number): number {
  let best = NONE;
  let price = -1;
  let plainTried = false;
  for (let rest = available[side]!; rest !== 0; rest &= rest - 1) {
    const from = map.squares[(side << 5) | (31 - Math.clz32(rest & -rest))]!;
    const place = map.board[from]! & 7;
    if (place === KING) return price >= 0 ? best : kingCaptures(side, from, worth);
    const itsWorth = WORTH_BY_PLACE[place]!;
    if (price >= 0 && itsWorth !== price) break;
    if (standsAside(side, from)) continue;
    if (price >= 0 || nextIsEqual(side, rest, itsWorth)) {
      // Of equals whose order cannot matter one is enough.
      if (isPlain(from)) {
        if (plainTried) continue;
        plainTried = true;
      }
    }
    price = itsWorth;
    const white = available[0]!;
    const black = available[1]!;
    const goneWhite = gone[0]!;
    const goneBlack = gone[1]!;
    leave(side, from);
    const reply = forced(side ^ 1, itsWorth);
    available[0] = white;
    available[1] = black;
    gone[0] = goneWhite;
    gone[1] = goneBlack;
    const gain = worth - (reply > 0 ? reply : 0);
    if (gain > best) best = gain;
    if (best === worth) break;
  }
  return best;
}

/** A king captures only where no enemy attacker is left, those whom its leaving uncovers included. */
function kingCaptures(side: number, from: number, worth: number): number {
  const white = available[0]!;
  const black = available[1]!;
  const gones = gone[side]!;
  leave(side, from);
  const free = available[side ^ 1] === 0;
  available[0] = white;
  available[1] = black;
  gone[side] = gones;
  return free ? worth : NONE;
}

/** Whether the attacker after the first of the mask costs as much. */
function nextIsEqual(side: number, rest: number, worth: number): boolean {
  const others = rest & (rest - 1);
  if (others === 0) return false;
  const next = map.board[map.squares[(side << 5) | (31 - Math.clz32(others & -others))]!]!;
  return (next & 7) !== KING && WORTH_BY_PLACE[next & 7] === worth;
}

/** Whether the side can gain at least `need` (1 or more) by capturing a man of that worth. */
function gainsAtLeast(side: number, worth: number, need: number): boolean {
  if (worth < need) return false;
  let price = -1;
  let plainTried = false;
  for (let rest = available[side]!; rest !== 0; rest &= rest - 1) {
    const from = map.squares[(side << 5) | (31 - Math.clz32(rest & -rest))]!;
    const place = map.board[from]! & 7;
    if (place === KING) return price < 0 && kingCaptures(side, from, worth) !== NONE;
    const itsWorth = WORTH_BY_PLACE[place]!;
    if (price >= 0 && itsWorth !== price) return false;
    if (standsAside(side, from)) continue;
    if (worth - itsWorth >= need) return true;
    if (price >= 0 || nextIsEqual(side, rest, itsWorth)) {
      if (isPlain(from)) {
        if (plainTried) continue;
        plainTried = true;
      }
    }
    price = itsWorth;
    const white = available[0]!;
    const black = available[1]!;
    const goneWhite = gone[0]!;
    const goneBlack = gone[1]!;
    leave(side, from);
    const answered = gainsAtLeast(side ^ 1, itsWorth, worth - need + 1);
    available[0] = white;
    available[1] = black;
    gone[0] = goneWhite;
    gone[1] = goneBlack;
    if (!answered) return true;
  }
  return false;
}

function begin(from: AttackMap, square: number): void {
  map = from;
  lines = firstMen(from);
  target = square;
  available[0] = map.attackers[square]!;
  available[1] = map.attackers[64 | square]!;
  gone[0] = 0;
  gone[1] = 0;
}

/** The price of capturing where the side cannot capture at all. */
export const NO_PRICE = 127;

/**
 * What the side pays, in pawns, for capturing on the square: the first capture's gain is the worth of the man taken less
 * this, whatever stands there, since the captures that follow do not hang on it. NO_PRICE where it cannot capture.
 */
export function priceOn(attacks: AttackMap, side: SideIndex, square: number): number {
  begin(attacks, square);
  if (available[side] === 0) return NO_PRICE;
  const gain = forced(side, 0);
  return gain === NONE ? NO_PRICE : -gain;
}

/**
 * The exchange that the side begins by capturing what stands on the square, in pawns; the first capture
 * is made whatever it costs, so the figure can be negative. Null where the side cannot capture there:
 * an empty square, an own man, the enemy king, no attacker that may move.
 */
export function exchangeOn(attacks: AttackMap, side: SideIndex, square: number): number | null {
  const code = attacks.board[square]!;
  if (code === 0 || code >> 3 === side || (code & 7) === KING) return null;
  begin(attacks, square);
  if (available[side] === 0) return null;
  const gain = forced(side, WORTH_BY_PLACE[code & 7]!);
  return gain === NONE ? null : gain;
}

/**
 * What the enemy gains by capturing a man of the side and kind (by its place in a code) put on the square:
 * 0 where nothing. `origin` is the square which the man leaves for it, -1 for a man from nowhere. Whatever
 * stands on the square is taken to be gone. A king put where the enemy attacks is lost: Infinity.
 */
export function lossOn(attacks: AttackMap, side: SideIndex, place: number, square: number, origin: number): number {
  begin(attacks, square);
  if (origin >= 0) leave(side, origin);
  const enemy = side ^ 1;
  if (available[enemy] === 0) return 0;
  if (place === KING) return Number.POSITIVE_INFINITY;
  const gain = forced(enemy, WORTH_BY_PLACE[place]!);
  return gain > 0 ? gain : 0;
}

/**
 * Whether a man of the side and kind is safe on the square, put there and taken off its origin: the enemy
 * gains nothing by capturing it. The same as `lossOn(…) === 0`, but mostly without playing the captures out.
 */
export function isSafeOn(attacks: AttackMap, side: SideIndex, place: number, square: number, origin: number): boolean {
  begin(attacks, square);
  if (origin >= 0) leave(side, origin);
  const enemy = side ^ 1;
  if (available[enemy] === 0) return true;
  if (place === KING) return false;
  return !gainsAtLeast(enemy, WORTH_BY_PLACE[place]!, 1);
}
