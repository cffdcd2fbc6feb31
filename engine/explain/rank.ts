/**
 * Which statements come first. Weights only order, and only within one reading. They are the team's judgement of
 * what a coach would say first: what is lost now, then what lasts, then what is merely so.
 */
import type { Fact, FactId } from './fact';

/** Where each statement starts, 0 to 100. */
const BASE: Readonly<Record<FactId, number>> = {
  // What is lost now.
  'en-prise': 84,
  trapped: 86,
  'in-check': 82,
  // What lasts.
  'named-structure': 78,
  'outpost-taken': 76,
  'protected-passed-pawn': 72,
  'bad-bishop': 70,
  'weak-complex': 68,
  'on-seventh': 68,
  'file-owned': 66,
  'outpost-free': 66,
  'bishop-against-knight': 64,
  'hanging-pawns': 64,
  'passed-pawn': 60,
  'backward-pawn': 58,
  'weak-for-good': 58,
  'half-open-target': 56,
  'centre-fixed': 56,
  'centre-open': 54,
  'centre-tension': 54,
  'bishop-pair': 54,
  'isolated-pawn': 52,
  'minority-attack': 60,
  'weak-while-fixed': 46,
  // What holds for some moves.
  'out-of-play': 62,
  overloaded: 62,
  'weak-back-rank': 60,
  pinned: 56,
  'worst-placed': 50,
  'advanced-post': 50,
  'lever-ready': 50,
  'no-flight': 50,
  'centre-command': 50,
  'open-line-beside-king': 48,
  'heavy-doubled': 48,
  'file-man-target': 54,
  'shelter-broken': 46,
  'bad-but-active': 46,
  'best-placed': 46,
  'no-luft': 44,
  'half-open-nothing': 44,
  'rook-to-file': 46,
  'long-diagonal-open': 44,
  'diagonal-shut': 42,
  'file-contested': 42,
  'file-open-no-entry': 42,
  'to-seventh': 42,
  'king-zone': 42,
  'blocked-in': 40,
  'crippled-majority': 42,
  'doubled-pawns': 42,
  'knight-on-rim': 40,
  loose: 38,
  majority: 38,
  'lever-coming': 38,
  'candidate-pawn': 36,
  'pawn-chain': 34,
  tied: 32,
  'disputed-square': 32,
  'square-closed': 30,
  'pawns-on-colour': 30,
  rams: 28,
  islands: 24,
  'shelter-whole': 22,
  // Counts over the board.
  reach: 26,
  'safe-moves': 24,
  space: 24,
  command: 20,
};

/** What a square on the edge files or next to them matters less. */
function edgeCost(square: string): number {
  const file = square.charAt(0);
  return file === 'a' || file === 'h' ? 12 : file === 'b' || file === 'g' ? 5 : 0;
}

function isInOwnHalf(square: string, side: 'white' | 'black'): boolean {
  return side === 'white' ? square.charAt(1) <= '4' : square.charAt(1) >= '5';
}

/** A square of the fifth rank, as the side sees it, lies outside its camp. */
function isOutsideCamp(square: string, side: 'white' | 'black'): boolean {
  return square.charAt(1) === (side === 'white' ? '5' : '4');
}

/** What raises or lowers a statement within its kind. */
function adjustment(fact: Fact): number {
  switch (fact.id) {
    case 'en-prise':
      return fact.gain;
    case 'named-structure':
      return -6 * fact.differs;
    case 'outpost-taken':
      return (
        (fact.tradable ? 0 : 4) -
        (fact.man.kind === 'rook' ? 8 : 0) -
        (isInOwnHalf(fact.man.square, fact.side) ? 14 : 0) -
        edgeCost(fact.man.square)
      );
    case 'outpost-free':
      return (
        -4 * ((fact.comers[0]?.moves ?? 3) - 1) +
        (fact.hold === 'permanent' ? 2 : 0) -
        (fact.comers[0]?.kind === 'knight' ? 0 : 6) -
        (isInOwnHalf(fact.square, fact.side) ? 14 : 0) -
        edgeCost(fact.square)
      );
    case 'weak-for-good':
    case 'weak-while-fixed':
      return (
        (fact.occupant ? 14 : 8 - 3 * ((fact.comers[0]?.moves ?? 4) - 1)) +
        (fact.commandedByEnemy ? 3 : 0) -
        (isOutsideCamp(fact.square, fact.side) ? 8 : 0) -
        edgeCost(fact.square)
      );
    case 'weak-complex':
      return fact.enemyBishop ? 4 : -10;
    case 'bad-bishop':
      // One move mends it.
      return fact.outside?.moves === 1 ? -16 : 0;
    case 'backward-pawn':
      return (fact.halfOpen ? 6 : 0) + (fact.stopHeldBy ? 3 : 0);
    case 'isolated-pawn':
      return fact.halfOpen ? 6 : 0;
    case 'doubled-pawns':
      return fact.isolated ? 6 : 0;
    case 'passed-pawn':
    case 'protected-passed-pawn':
      return 6 - 2 * fact.moves + (fact.blocker ? -2 : 0);
    case 'lever-ready':
    case 'lever-coming':
      return (fact.supported ? 6 : -8) - (fact.blocker ? 10 : 0) - fact.moves;
    case 'file-owned':
      return fact.entries.length > 0 ? 6 : 0;
    case 'half-open-target':
      return 4 * fact.heavy.length - (fact.heavy.length === 0 ? 6 : 0) - (fact.why === 'unguarded' ? 4 : 0);
    case 'rook-to-file':
      return (fact.status === 'open' ? 8 : 0) - 4 * (fact.moves - 1);
    case 'on-seventh':
      return 2 * fact.pawns.length;
    case 'tied':
      return 2 * fact.loses;
    case 'no-luft':
      return fact.noFlight ? 14 : 0;
    case 'open-line-beside-king':
      return (fact.status === 'open' ? 4 : -4) + 6 * fact.heavy.length;
    case 'king-zone':
      return 4 * (fact.attackers.length - fact.guards);
    case 'reach':
    case 'safe-moves':
    case 'space':
    case 'command':
      return Math.min(12, fact.more - fact.fewer);
    default:
      return 0;
  }
}

/** Weight of a fact, 0 to 100 or a little beyond. */
export function weightOf(fact: Fact): number {
  return BASE[fact.id] + adjustment(fact);
}
