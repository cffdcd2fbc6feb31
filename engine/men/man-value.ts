/** One man and what it can do from where it stands. */
import { type AttackMap, isPinned, kindOn, type SideIndex, sideOn } from '../attacks';
import { bitCount, fileOf, KING, PAWN, type Position } from '../board';
import { lossOn, type Safety, safeAmong, worthOf } from '../exchange';
import { type PawnMap, pawnReach } from '../pawns';
import type { Reach } from '../reach';
import type { OutpostValue, SquareTable } from '../squares';
import { type BySide, bySide, type Kind, type Side, type Square } from '../types';
import { allDuties, type Duty, isOverloaded } from './duties';
import {
  addSquare,
  countAhead,
  fillMovesOf,
  hasSquare,
  newWords,
  squaresOfWords,
  type Words,
  wordsOfMen,
} from './moves';

/** Traits with names. Each is said of a man where its definition below holds. */
export const NOTES = [
  'bad-bishop',
  'bad-but-active',
  'rim',
  'outpost',
  'overloaded',
  'trapped',
  'pinned',
  'loose',
  'en-prise',
  'out-of-play',
  'blocked-in',
] as const;
export type Note = (typeof NOTES)[number];

export interface ManValue {
  readonly square: Square;
  readonly side: Side;
  readonly kind: Kind;
  /** Pseudo-legal moves, pins kept, castling left out. */
  readonly moves: readonly Square[];
  /**
   * Moves after which the enemy gains nothing by capturing the man where it went; what it captured is not set
   * against that. For a king: squares that the enemy does not attack.
   */
  readonly safeMoves: readonly Square[];
  /** Squares that it attacks, own men's included. */
  readonly sees: number;
  /** Of these, squares on ranks ahead of it. */
  readonly seesAhead: number;
  readonly pinned: boolean;
  /** Pawns that the enemy gains by taking it now. */
  readonly enPrise: number;
  /** Masks of the enemy men that attack it and the own men that guard it. */
  readonly attackers: number;
  readonly defenders: number;
  readonly duties: readonly Duty[];
  readonly trapped: boolean;
  /** Safe moves needed to the nearest of d4, e4, d5, e5; null for kings and pawns, and where it takes more than three. */
  readonly movesToCentre: number | null;
  readonly notes: readonly Note[];
}

/** What the values of men are read from. */
export interface MenContext {
  readonly position: Position;
  readonly map: AttackMap;
  readonly safety: Safety;
  readonly table: SquareTable;
  readonly pawns: PawnMap;
  readonly reach: Reach;
  readonly outposts: readonly OutpostValue[];
}

/** All men of the position in square order; `bishops` says which bishops are bad. */
export function manValues(context: MenContext, bishops: ReadonlyMap<Square, Note>): ManValue[] {
  const { map, outposts } = context;
  const posts = newWords();
  for (const { rank, occupant } of outposts) if (rank === 'outpost' && occupant !== null) addSquare(posts, occupant);
  const own = bySide((side) => wordsOfMen(map, side));
  const duties = allDuties(map, context.table);
  const values: ManValue[] = [];
  for (let square = 0; square < 64; square++) {
    if (map.board[square] === 0) continue;
    const at = square as Square;
    values.push(manValue(context, at, bishops.get(at), hasSquare(posts, at), own, duties));
  }
  return values;
}

const words: Words = newWords();

function manValue(
  context: MenContext,
  square: Square,
  bishop: Note | undefined,
  onOutpost: boolean,
  own: BySide<Words>,
  dutiesByMan: readonly (readonly Duty[])[],
): ManValue {
  const { map, position, safety, table } = context;
  const code = map.board[square]!;
  const index = (code >> 3) as SideIndex;
  const side = sideOn(map, square) ?? 'white';
  const kind = kindOn(map, square);
  const man = (index << 5) | map.numbers[square]!;
  words[0] = map.sights[man << 1]!;
  words[1] = map.sights[(man << 1) | 1]!;
  const sees = bitCount(words[0]!) + bitCount(words[1]!);
  const seesAhead = countAhead(words, side, square);
  const seesOnlyOwn = ((words[0]! & ~own[side][0]!) | (words[1]! & ~own[side][1]!)) === 0;
  fillMovesOf(map, position, square, words);
  const moves = squaresOfWords(words);
  for (let half = 0; half < 2; half++) words[half] = safeAmong(safety, man, half, words[half]!);
  const safeMoves = squaresOfWords(words);
  const pinned = isPinned(map, square);
  const enPrise = Math.max(0, table.exchanges[((index ^ 1) << 6) | square]!);
  const attackers = map.attackers[((index ^ 1) << 6) | square]!;
  const defenders = map.attackers[(index << 6) | square]!;
  const duties = dutiesByMan[square]!;
  const movesToCentre = kind === 'king' || kind === 'pawn' ? null : centreDistance(context.reach, index, square);
  const trapped = isTrapped(context, square, moves, safeMoves, attackers !== 0, pinned);
  const isPiece = kind !== 'king' && kind !== 'pawn';
  const notes: Note[] = [];
  if (bishop) notes.push(bishop);
  if (kind === 'knight' && (fileOf(square) === 0 || fileOf(square) === 7)) notes.push('rim');
  if (onOutpost) notes.push('outpost');
  if (duties.length > 1 && isOverloaded(map, index, duties)) notes.push('overloaded');
  if (trapped) notes.push('trapped');
  if (pinned) notes.push('pinned');
  if (kind !== 'king' && defenders === 0) notes.push('loose');
  if (enPrise > 0) notes.push('en-prise');
  if (isPiece && isOutOfPlay(side, square, safeMoves.length, movesToCentre)) notes.push('out-of-play');
  if (isPiece && !pinned && seesOnlyOwn) notes.push('blocked-in');
  return {
    square,
    side,
    kind,
    moves,
    safeMoves,
    sees,
    seesAhead,
    pinned,
    enPrise,
    attackers,
    defenders,
    duties,
    trapped,
    movesToCentre,
    notes,
  };
}

const CENTRE = [27, 28, 35, 36] as const;

function centreDistance({ safety: { map }, moves }: Reach, side: SideIndex, square: Square): number | null {
  const row = ((side << 5) | map.numbers[square]!) << 6;
  let nearest = Number.POSITIVE_INFINITY;
  for (const centre of CENTRE) {
    const needed = moves[row | centre]!;
    if (needed >= 0 && needed < nearest) nearest = needed;
  }
  return Number.isFinite(nearest) ? nearest : null;
}

/**
 * Out of play: a developed piece (off its side's first rank) on the a- or h-file with at most two safe moves, or on the
 * b- or g-file with at most one, that is three or more safe moves from every centre square. The bounds are ours; after Edward Lasker, Chess Strategy (1915), who
 * counts the moves that bring a man back into the game.
 */
function isOutOfPlay(side: Side, square: Square, safeMoves: number, movesToCentre: number | null): boolean {
  const developed = side === 'white' ? square >= 8 : square < 56;
  const file = fileOf(square);
  const bound = file === 0 || file === 7 ? 2 : file === 1 || file === 6 ? 1 : -1;
  return developed && safeMoves <= bound && (movesToCentre === null || movesToCentre >= 3);
}

/** Whether the enemy pawn, not pinned, has a free road to the rank from which it attacks the square. */
function canStepUp(map: AttackMap, pawn: Square, square: Square): boolean {
  const stride = map.board[pawn]! >> 3 ? -8 : 8;
  for (let at = pawn + stride; at >> 3 !== square >> 3; at += stride) if (map.board[at] !== 0) return false;
  return !isPinned(map, pawn);
}

/**
 * Trapped: a knight, bishop, rook or queen, not pinned, that is attacked now or can be attacked by an enemy pawn in
 * one move, has no safe move, and no capture that gives back what it costs.
 */
function isTrapped(
  { map, pawns, safety }: MenContext,
  square: Square,
  moves: readonly Square[],
  safeMoves: readonly Square[],
  attacked: boolean,
  pinned: boolean,
): boolean {
  const code = map.board[square]!;
  const place = code & 7;
  if (place === PAWN || place === KING || pinned || safeMoves.length > 0) return false;
  const side = (code >> 3) as SideIndex;
  if (!attacked) {
    const { soonest } = pawnReach(pawns, side === 0 ? 'black' : 'white', square);
    if (soonest === null || soonest.moves > 1 || !canStepUp(map, soonest.from, square)) return false;
  }
  return !moves.some((to) => {
    const prize = safety.map.board[to]!;
    return prize !== 0 && worthOf(prize) >= lossOn(map, side, place, to, square);
  });
}
