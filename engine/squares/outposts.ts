/**
 * Outposts and advanced posts: squares of a side's ranks 4 to 6 which no enemy pawn attacks.
 *
 * An outpost is safe from pawns for good (`permanent`, or `fixed` while the pawns that could come are
 * stopped) and has a pawn's support now or in one move; so Nimzowitsch, My System (from memory), who asks for
 * pawn support, but not his open file. All else is an advanced post. Squares on which a pawn stands are no
 * homes and are left out. On the 7th rank no pawn can ever challenge: a square there is listed, as `deep`,
 * where a pawn supports it now or in one move; the others are entry squares and belong to the files.
 */
import { type AttackMap, KNIGHT } from '../attacks';
import { colourOf, KNIGHT_LEAPS, LEAP_ROW, relativeRank } from '../board';
import { type PawnMap, pawnHold, pawnReach } from '../pawns';
import { type Reach, type User, usersOf } from '../reach';
import { opponent, type Side, type Square } from '../types';
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
  /** The enemy has a minor piece that can trade itself for the occupant: see `isTradable`. */
  readonly tradable: boolean;
}

/** Outposts and advanced posts of both sides, in square order, White's before Black's on one square. */
export function outposts(pawns: PawnMap, reach: Reach): OutpostValue[] {
  const found: OutpostValue[] = [];
  for (let square = 8; square < 56; square++) {
    for (const side of ['white', 'black'] as const) {
      const post = outpost(pawns, reach, side, square as Square);
      if (post) found.push(post);
    }
  }
  return found;
}

function outpost(pawns: PawnMap, reach: Reach, side: Side, square: Square): OutpostValue | null {
  const rank = relativeRank(square, side);
  if (rank < 4 || rank > 7) return null;
  const { map } = reach.safety;
  const code = map.board[square]!;
  if ((code & 7) === 1) return null;
  const enemy = opponent(side);
  const hold = pawnHold(pawns, enemy, square);
  if (hold === 'attacked') return null;
  const { soonest } = pawnReach(pawns, side, square);
  const supported = soonest !== null && soonest.moves <= 1;
  if (rank === 7 && !supported) return null;
  const own = code !== 0 && code >> 3 === (side === 'white' ? 0 : 1);
  return {
    square,
    side,
    rank: hold !== 'open' && supported ? 'outpost' : 'advanced',
    deep: rank === 7,
    hold,
    challenge: hold === 'open' ? pawnReach(pawns, enemy, square).soonest : null,
    support: soonest && { pawn: soonest.from, moves: soonest.moves },
    occupant: own ? square : null,
    users: usersOf(reach, side, square),
    tradable: isTradable(map, reach, enemy, square),
  };
}

/**
 * Whether the enemy has a minor piece that can challenge a man on the square: a bishop of its colour, or a
 * knight that attacks it now or after one safe move.
 */
export function isTradable(map: AttackMap, reach: Reach, enemy: Side, square: Square): boolean {
  if (hasBishop(map.board, enemy, colourOf(square))) return true;
  const row = enemy === 'white' ? 0 : 32;
  for (let at = square * LEAP_ROW, from = KNIGHT_LEAPS[at]!; from >= 0; from = KNIGHT_LEAPS[++at]!) {
    for (let number = 0; number < map.counts[row >> 5]!; number++) {
      const man = row | number;
      const kind = map.board[map.squares[man]!]! & 7;
      if (kind < KNIGHT) continue;
      if (kind > KNIGHT) break;
      if (map.squares[man] === from) return true;
      const moves = reach.moves[(man << 6) | from]!;
      if (moves >= 0 && moves <= 1) return true;
    }
  }
  return false;
}
