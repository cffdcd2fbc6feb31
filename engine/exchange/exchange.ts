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
import { type AttackMap, firstMen, KING, PAWN, slidesAlong, type SideIndex } from '../attacks';
import { DIRECTION_TO } from '../board';

/** Worth by the kind's place in a man's code; the king's is never asked for. */
const WORTH_BY_PLACE: Readonly<Int8Array> = Int8Array.of(0, 1, 3, 3, 5, 9, 0, 0);

/** Worth of a man by its code, in pawns; 0 for a king or an empty square. */
export function worthOf(code: number): number {
  return WORTH_BY_PLACE[code & 7] as number;
}

// The state of one exchange. It lives in the module so that the search allocates nothing; nothing here
// survives a call. `gone` holds the men that have left their squares, one mask a side.
let map: AttackMap;
let lines: Readonly<Int8Array>;
let target = 0;
const available = new Int32Array(2);
const gone = new Int32Array(2);

function isGone(square: number): boolean {
  return (((gone[(map.board[square] as number) >> 3] as number) >>> (map.numbers[square] as number)) & 1) === 1;
}

/** First man from a square in a direction that has not left; -1 where there is none before the edge or the target. */
function nextMan(from: number, direction: number): number {
  let at = lines[(from << 3) | direction] as number;
  while (at >= 0 && at !== target && isGone(at)) at = lines[(at << 3) | direction] as number;
  return at;
}

/** Whether the side's man on `from` stands aside: leaving its square for the target would open a line to its king. */
function standsAside(side: number, from: number): boolean {
  const king = map.kings[side] as number;
  if (king < 0 || king === target) return false;
  const direction = DIRECTION_TO[(king << 6) | from] as number;
  if (direction < 0 || DIRECTION_TO[(king << 6) | target] === direction) return false;
  if (nextMan(king, direction) !== from) return false;
  const pinner = nextMan(from, direction);
  if (pinner < 0) return false;
  const code = map.board[pinner] as number;
  return code >> 3 !== side && slidesAlong(code, direction);
}

/** The man who leaves `from` is gone; the slider behind him on the line to the target, of either side, joins in. */
function leave(side: number, from: number): void {
  const bit = 1 << (map.numbers[from] as number);
  gone[side]! |= bit;
  available[side]! &= ~bit;
  const direction = DIRECTION_TO[(target << 6) | from] as number;
  if (direction < 0) return;
  const behind = nextMan(from, direction);
  if (behind < 0 || nextMan(target, direction) !== behind) return;
  const code = map.board[behind] as number;
  if (slidesAlong(code, direction)) available[code >> 3]! |= 1 << (map.numbers[behind] as number);
}

/** Whether the order among equals cannot matter for this man: no slider further back on his line, no king on a line with him. */
function isPlain(from: number): boolean {
  const direction = DIRECTION_TO[(target << 6) | from] as number;
  if (direction >= 0) {
    for (let at = lines[(from << 3) | direction]!; at >= 0; at = lines[(at << 3) | direction]!) {
      if (slidesAlong(map.board[at] as number, direction)) return false;
    }
  }
  const white = map.kings[0] as number;
  const black = map.kings[1] as number;
  return (
    (white < 0 || (DIRECTION_TO[(white << 6) | from] as number) < 0) &&
    (black < 0 || (DIRECTION_TO[(black << 6) | from] as number) < 0)
  );
}

/** No capture is possible: told apart from a capture that gains nothing. */
const NONE = -100;

/** Best gain of the side when it must make one capture of a man of that worth, NONE where it cannot. */
function forced(side: number, worth: number): number {
  let best = NONE;
  let price = -1;
  let plainTried = 0;
  for (let rest = available[side] as number; rest !== 0; rest &= rest - 1) {
    const number = 31 - Math.clz32(rest & -rest);
    const from = map.squares[(side << 5) | number] as number;
    const place = (map.board[from] as number) & 7;
    if (place === KING) {
      if (price >= 0) break;
    } else {
      const itsWorth = WORTH_BY_PLACE[place] as number;
      if (price >= 0 && itsWorth !== price) break;
      if (standsAside(side, from)) continue;
      if (price >= 0 || (rest & (rest - 1)) !== 0) {
        // Equals: pawns, or men of the same worth. Of those whose order cannot matter one is enough.
        if (isPlain(from)) {
          if (plainTried & (place === PAWN ? 1 : 2)) continue;
          plainTried |= place === PAWN ? 1 : 2;
        }
      }
      price = itsWorth;
    }
    const white = available[0] as number;
    const black = available[1] as number;
    const goneWhite = gone[0] as number;
    const goneBlack = gone[1] as number;
    leave(side, from);
    let gain: number;
    if (place === KING) {
      gain = available[side ^ 1] === 0 ? worth : NONE;
    } else {
      const reply = forced(side ^ 1, WORTH_BY_PLACE[place] as number);
      gain = worth - (reply > 0 ? reply : 0);
    }
    available[0] = white;
    available[1] = black;
    gone[0] = goneWhite;
    gone[1] = goneBlack;
    if (gain > best) best = gain;
  }
  return best;
}

function begin(from: AttackMap, square: number): void {
  map = from;
  lines = firstMen(from);
  target = square;
  available[0] = map.attackers[square] as number;
  available[1] = map.attackers[64 | square] as number;
  gone[0] = 0;
  gone[1] = 0;
}

/**
 * The exchange that the side begins by capturing what stands on the square, in pawns; the first capture
 * is made whatever it costs, so the figure can be negative. Null where the side cannot capture there:
 * an empty square, an own man, the enemy king, no attacker that may move.
 */
export function exchangeOn(attacks: AttackMap, side: SideIndex, square: number): number | null {
  const code = attacks.board[square] as number;
  if (code === 0 || code >> 3 === side || (code & 7) === KING) return null;
  begin(attacks, square);
  if (available[side] === 0) return null;
  const gain = forced(side, WORTH_BY_PLACE[code & 7] as number);
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
  const gain = forced(enemy, WORTH_BY_PLACE[place] as number);
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
  const worth = WORTH_BY_PLACE[place] as number;
  for (let rest = available[enemy] as number; rest !== 0; rest &= rest - 1) {
    const from = map.squares[(enemy << 5) | (31 - Math.clz32(rest & -rest))] as number;
    const attacker = (map.board[from] as number) & 7;
    if (attacker === KING || standsAside(enemy, from)) continue;
    if ((WORTH_BY_PLACE[attacker] as number) < worth) return false;
    break;
  }
  return forced(enemy, worth) <= 0;
}
