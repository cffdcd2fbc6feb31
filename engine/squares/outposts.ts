/**
 * Outposts and advanced posts: squares of a side's ranks 4 to 6 which no enemy pawn attacks.
 *
 * An outpost is safe from pawns for good (`permanent`, or `fixed` while the pawns that could come are
 * stopped) and has a pawn's support now or in one move; so Nimzowitsch, My System (from memory), who asks for
 * pawn support, but not his open file. All else is an advanced post, listed where a man of
 * the side stands on it or can come within three moves. Squares on which a pawn stands are no homes and are left out. On the 7th rank no pawn can ever challenge: a square there is listed, as `deep`,
 * where a pawn supports it now or in one move; the others are entry squares and belong to the files.
 */
import { colourOf, KNIGHT, KNIGHT_LEAPS, LEAP_ROW, relativeRank } from '../board';
import { type PawnMap, pawnHold, pawnReach } from '../pawns';
import { type Reach, type User, usersOf } from '../reach';
import { bySide, type Colour, opponent, type Side, SIDES, type Square } from '../types';
import { hasBishop } from './weak-squares';

export interface OutpostValue {
  readonly square: Square;
  /** The side that may use it. */
  readonly side: Side;
  readonly rank: 'outpost' | 'advanced';
  readonly deep: boolean;
  readonly hold: 'permanent' | 'fixed' | 'open';
  /** The soonest enemy pawn that can attack it, where it is open. */
  readonly challenge: { readonly from: Square; readonly moves: number } | null;
  /** The soonest own pawn that can guard it; 0 moves: it does now. */
  readonly support: { readonly pawn: Square; readonly moves: number } | null;
  /** The square itself when a piece of the side stands there. */
  readonly occupant: Square | null;
  readonly users: readonly User[];
  /**
   * The enemy has a minor piece that can trade itself for the occupant: a bishop of the square's colour, or a
   * knight that attacks it now or after one safe move.
   */
  readonly tradable: boolean;
}

/** Outposts and advanced posts of both sides, in square order, White's before Black's on one square. */
export function outposts(pawns: PawnMap, reach: Reach): OutpostValue[] {
  const found: OutpostValue[] = [];
  const challengers = bySide((side) => minorChallengers(reach, side));
  for (let square = 8; square < 56; square++) {
    for (const side of SIDES) {
      const post = outpost(pawns, reach, side, square as Square, challengers[opponent(side)]);
      if (post) found.push(post);
    }
  }
  return found;
}

function outpost(
  pawns: PawnMap,
  reach: Reach,
  side: Side,
  square: Square,
  challengers: MinorChallengers,
): OutpostValue | null {
  const rank = relativeRank(square, side);
  if (rank < 4 || rank > 7) return null;
  const code = reach.safety.map.board[square]!;
  if ((code & 7) === 1) return null;
  const enemy = opponent(side);
  const hold = pawnHold(pawns, enemy, square);
  if (hold === 'attacked') return null;
  const own = code !== 0 && code >> 3 === (side === 'white' ? 0 : 1);
  const users = usersOf(reach, side, square);
  const inUse = own || users.length > 0;
  // What nobody can use and no pawn can make an outpost is not listed at all.
  if (!inUse && hold === 'open') return null;
  const { soonest } = pawnReach(pawns, side, square);
  const supported = soonest !== null && soonest.moves <= 1;
  if (!supported && (rank === 7 || !inUse)) return null;
  return {
    square,
    side,
    rank: hold !== 'open' && supported ? 'outpost' : 'advanced',
    deep: rank === 7,
    hold,
    challenge: hold === 'open' ? pawnReach(pawns, enemy, square).soonest : null,
    support: soonest && { pawn: soonest.from, moves: soonest.moves },
    occupant: own ? square : null,
    users,
    tradable: challengers.bishops[colourOf(square)] || challengers.knights[square] === 1,
  };
}

/** The minor pieces of a side that could trade themselves for a man on a square. */
interface MinorChallengers {
  readonly bishops: Readonly<Record<Colour, boolean>>;
  /** One entry a square: 1 where a knight attacks it now or after one safe move. */
  readonly knights: Uint8Array;
}

function minorChallengers({ safety: { map }, moves }: Reach, side: Side): MinorChallengers {
  const knights = new Uint8Array(64);
  const row = side === 'white' ? 0 : 32;
  for (let number = 0; number < map.counts[row >> 5]!; number++) {
    const man = row | number;
    const from = map.squares[man]!;
    if ((map.board[from]! & 7) !== KNIGHT) continue;
    markLeaps(from, knights);
    for (let at = from * LEAP_ROW, to = KNIGHT_LEAPS[at]!; to >= 0; to = KNIGHT_LEAPS[++at]!) {
      if (moves[(man << 6) | to] === 1) markLeaps(to, knights);
    }
  }
  return { bishops: { light: hasBishop(map.board, side, 'light'), dark: hasBishop(map.board, side, 'dark') }, knights };
}

function markLeaps(from: number, into: Uint8Array): void {
  for (let at = from * LEAP_ROW, to = KNIGHT_LEAPS[at]!; to >= 0; to = KNIGHT_LEAPS[++at]!) into[to] = 1;
}
