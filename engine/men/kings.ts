/** A king: its shelter, the men that reach and guard its zone, its flights and its luft. */
import { type AttackMap, attackersOf, isAttacked, isPinned, menOfMask } from '../attacks';
import {
  ahead,
  fileOf,
  KING,
  KING_STEPS,
  LEAP_ROW,
  manCode,
  QUEEN,
  rankOf,
  relativeRank,
  ROOK,
  squareAt,
} from '../board';
import { isSafeMove, type Safety } from '../exchange';
import { opponent, type Side, type Square } from '../types';

export interface ShelterFile {
  /** 0 = a … 7 = h. */
  readonly file: number;
  /** The own pawn nearest ahead of the king on the file, or level with it. */
  readonly pawn: Square | null;
  /** Ranks that this pawn has left its first square behind; 0 without a pawn. */
  readonly advanced: number;
}

export interface KingValue {
  readonly square: Square;
  readonly side: Side;
  /** The king's file and its neighbours, from the a-file on. */
  readonly shelter: readonly ShelterFile[];
  /** Of these files, those without an enemy pawn: open, or half-open for the enemy. */
  readonly openBeside: readonly number[];
  /** Enemy men, the king apart, that attack its zone: its square and the squares around. */
  readonly reachedBy: readonly Square[];
  /** Own men, the king apart, that guard its zone. */
  readonly guardedBy: readonly Square[];
  /** Squares to which it can step now: free of own men and of enemy attack. */
  readonly flights: readonly Square[];
  /** Flights off its back rank; empty for a king that stands elsewhere. */
  readonly luft: readonly Square[];
  /** Pawn moves that would give a king on its back rank, not in check, its first luft: see `luftMoves`. */
  readonly luftMoves: readonly { readonly from: Square; readonly to: Square }[];
  /**
   * The back rank is weak: the king stands on it without luft, no own rook or queen does, and the enemy has a rook
   * or queen (common practice).
   */
  readonly weakBackRank: boolean;
}

/** The king of a side; null in diagrams without one. */
export function kingValue(safety: Safety, side: Side): KingValue | null {
  const { map } = safety;
  const at = map.kings[side === 'white' ? 0 : 1]!;
  if (at < 0) return null;
  const square = at as Square;
  const onBackRank = relativeRank(square, side) === 1;
  const isInCheck = isAttacked(map, opponent(side), square);
  const flights = flightsOf(safety, square, side);
  const luft = onBackRank ? flights.filter((to) => rankOf(to) !== rankOf(square)) : [];
  const shelter = shelterOf(map, side, square);
  const zone = zoneOf(square);
  return {
    square,
    side,
    shelter,
    openBeside: shelter.filter(({ file }) => !hasPawn(map, opponent(side), file)).map(({ file }) => file),
    reachedBy: bearing(map, opponent(side), zone),
    guardedBy: bearing(map, side, zone),
    flights,
    luft,
    luftMoves: onBackRank && luft.length === 0 && !isInCheck ? luftMoves(map, side, square) : [],
    weakBackRank:
      onBackRank && luft.length === 0 && !hasHeavy(map, side, rankOf(square)) && hasHeavy(map, opponent(side), null),
  };
}

function zoneOf(square: Square): Square[] {
  const zone = [square];
  for (let at = square * LEAP_ROW, to = KING_STEPS[at]!; to >= 0; to = KING_STEPS[++at]!) zone.push(to as Square);
  return zone;
}

function flightsOf(safety: Safety, square: Square, side: Side): Square[] {
  const { board } = safety.map;
  const own = side === 'white' ? 0 : 1;
  return zoneOf(square)
    .slice(1)
    .filter(
      (to) =>
        (board[to] === 0 || (board[to]! >> 3 !== own && (board[to]! & 7) !== KING)) && isSafeMove(safety, square, to),
    )
    .sort((a, b) => a - b);
}

/** Men of the side, its king apart, that attack one of the squares; cheapest first. */
function bearing(map: AttackMap, side: Side, squares: readonly Square[]): Square[] {
  const row = side === 'white' ? 0 : 64;
  let mask = 0;
  for (const square of squares) mask |= map.attackers[row | square]!;
  return menOfMask(map, side, mask).filter((from) => (map.board[from]! & 7) !== KING);
}

function shelterOf(map: AttackMap, side: Side, king: Square): ShelterFile[] {
  const files: ShelterFile[] = [];
  const pawnCode = manCode(side, 'pawn');
  for (let file = Math.max(0, fileOf(king) - 1); file <= Math.min(7, fileOf(king) + 1); file++) {
    let pawn: Square | null = null;
    const stride = side === 'white' ? 1 : -1;
    for (let rank = rankOf(king); pawn === null; rank += stride) {
      const square = squareAt(file, rank);
      if (square === undefined) break;
      if (map.board[square] === pawnCode) pawn = square;
    }
    files.push({ file, pawn, advanced: pawn === null ? 0 : Math.max(0, relativeRank(pawn, side) - 2) });
  }
  return files;
}

function hasPawn(map: AttackMap, side: Side, file: number): boolean {
  for (let square = file; square < 64; square += 8) if (map.board[square] === manCode(side, 'pawn')) return true;
  return false;
}

/** Whether the side has a rook or queen, on the rank given or anywhere. */
function hasHeavy(map: AttackMap, side: Side, rank: number | null): boolean {
  const row = side === 'white' ? 0 : 32;
  for (let number = map.counts[row >> 5]! - 1; number >= 0; number--) {
    const square = map.squares[row | number]!;
    const kind = map.board[square]! & 7;
    if ((kind === ROOK || kind === QUEEN) && (rank === null || square >> 3 === rank)) return true;
  }
  return false;
}

/**
 * Pawn moves beside a king without luft that give it some: the pawn stands next to the king on its second rank, can
 * step, and no enemy man attacks the square that it leaves. A slider that bears on that square from ahead along the
 * pawn's own file, pinning it there or not, is shut out by the pawn where it has gone. Captures, and steps that
 * shut a line elsewhere, are not looked for.
 */
function luftMoves(map: AttackMap, side: Side, king: Square): { from: Square; to: Square }[] {
  const moves: { from: Square; to: Square }[] = [];
  for (const from of zoneOf(king)) {
    if (map.board[from] !== manCode(side, 'pawn') || relativeRank(from, side) !== 2) continue;
    const to = ahead(from, side);
    if (to === undefined || map.board[to] !== 0) continue;
    if (isPinned(map, from) && fileOf(from) !== fileOf(king)) continue;
    const attackers = attackersOf(map, opponent(side), from);
    if (attackers.some((enemy) => !isShutOut(map, enemy, from, to))) continue;
    moves.push({ from, to });
    const second = ahead(from, side, 2);
    if (second !== undefined && map.board[second] === 0) moves.push({ from, to: second });
  }
  return moves.sort((a, b) => a.from - b.from || a.to - b.to);
}

/** Whether the pawn that steps from one square to the next shuts out a slider that attacks the first. */
function isShutOut({ board }: AttackMap, enemy: Square, from: Square, to: Square): boolean {
  const isSlider = (board[enemy]! & 7) === ROOK || (board[enemy]! & 7) === QUEEN;
  return isSlider && fileOf(enemy) === fileOf(from) && enemy > from === to > from;
}
