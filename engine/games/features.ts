/**
 * Lasting features of a position: what a move can change for good. All hang on pawns, on bishops that are there or gone,
 * and on castling rights; so only pawn moves, captures and moves that cost these rights make or end one.
 */
import { BISHOP, colourOf, fileName, PAWN, type Position, squareName, squareNamed, viewOrder } from '../board';
import type { ReadingValues } from '../explain';
import { nameStructure } from '../structures';
import { opponent, type Side, SIDES, type Square, type SquareName } from '../types';
import type { Lineage } from './lineage';

/** Kinds of lasting features, in the order in which they are told. */
const FEATURE_KINDS = [
  'structure',
  'weak-square',
  'outpost',
  'open-file',
  'half-open-file',
  'bishop-pair',
  'passed-pawn',
  'isolated-pawn',
  'backward-pawn',
  'doubled-pawn',
  'weak-complex',
  'ram',
  'castling-lost',
] as const;
export type FeatureKind = (typeof FEATURE_KINDS)[number];

/** One feature. Its key names it among all others, a pawn by where it began, so that its advance makes nothing new. */
export interface Feature {
  readonly key: string;
  readonly kind: FeatureKind;
  /** Whose it is: who suffers from a weakness, who has the rest; null for both. */
  readonly side: Side | null;
  readonly squares: readonly SquareName[];
  /** For weak squares and outposts: for good, or while the pawns that could come are stopped. */
  readonly hold: 'permanent' | 'fixed' | null;
  /** The structure's name, the file's letter, the complex's colour; empty for others. */
  readonly label: string;
  /** Whether it is worth a word now: a weak square that matters, an outpost that a man can use; all others are. */
  readonly isShown: boolean;
}

export type Features = ReadonlyMap<string, Feature>;

interface Details {
  readonly squares?: readonly Square[];
  readonly hold?: 'permanent' | 'fixed';
  readonly label?: string;
  readonly isShown?: boolean;
}

class Collected extends Map<string, Feature> {
  add(kind: FeatureKind, side: Side | null, where: string | number, details: Details): void {
    const { squares = [], hold = null, label = '', isShown = true } = details;
    const key = `${kind} ${side ?? 'both'} ${where}${hold === null ? '' : ` ${hold}`}`;
    this.set(key, { key, kind, side, squares: squares.map(squareName), hold, label, isShown });
  }
}

/** All features of a position, by their keys. */
export function featuresOf(values: ReadingValues, lineage: Lineage): Features {
  const found = new Collected();
  addStructure(found, values.position);
  addSquares(found, values);
  addFiles(found, values);
  addPawns(found, values, lineage);
  for (const side of SIDES) {
    if (hasBishopPair(values.position, side) && !hasBishopPair(values.position, opponent(side)))
      found.add('bishop-pair', side, '', {});
  }
  addCastling(found, values.position, lineage);
  return found;
}

/** A structure that is alike for both sides is named after the side to move; here it is nobody's. */
function addStructure(found: Collected, position: Position): void {
  const structure = nameStructure(position);
  if (!structure) return;
  const seenByOther = nameStructure({ ...position, sideToMove: opponent(position.sideToMove) });
  const side = seenByOther?.side === structure.side ? structure.side : null;
  found.add('structure', side, structure.id, { label: structure.name });
}

function addSquares(found: Collected, { weakSquares, outposts, complexes }: ReadingValues): void {
  for (const { square, side, hold, matters } of weakSquares)
    found.add('weak-square', side, square, { squares: [square], hold, isShown: matters });
  for (const { square, side, rank, hold, deep, support, occupant, users } of outposts) {
    if (rank !== 'outpost' || hold === 'open' || deep || support?.moves !== 0) continue;
    found.add('outpost', side, square, { squares: [square], hold, isShown: occupant !== null || users.length > 0 });
  }
  for (const { side, colour, squares } of complexes)
    found.add('weak-complex', side, colour, { squares, label: colour });
}

function addFiles(found: Collected, { files }: ReadingValues): void {
  for (const { file, status, halfOpenFor } of files) {
    const label = fileName(file);
    if (status === 'open') found.add('open-file', null, label, { label });
    if (status === 'half-open') found.add('half-open-file', halfOpenFor, label, { label });
  }
}

function addPawns(found: Collected, { pawns }: ReadingValues, { origins }: Lineage): void {
  for (const side of SIDES) {
    const { passed, isolated, backward, doubled } = pawns[side];
    for (const square of passed) found.add('passed-pawn', side, origins[square]!, { squares: [square] });
    for (const square of isolated) found.add('isolated-pawn', side, origins[square]!, { squares: [square] });
    for (const square of backward) found.add('backward-pawn', side, origins[square]!, { squares: [square] });
    for (const square of doubled) found.add('doubled-pawn', side, origins[square]!, { squares: [square] });
  }
  for (const { white, black } of pawns.rams)
    found.add('ram', null, `${origins[white]} ${origins[black]} ${white}`, { squares: [white, black] });
}

/** Two bishops, one on each colour. */
function hasBishopPair({ board }: Position, side: Side): boolean {
  const bishop = side === 'white' ? BISHOP : BISHOP | 8;
  let colours = 0;
  for (let square = 0; square < 64; square++)
    if (board[square] === bishop) colours |= colourOf(square as Square) === 'light' ? 1 : 2;
  return colours === 3;
}

/** Rights lost without castling; shown while the enemy has a queen, since then it matters where a king stands. */
function addCastling(found: Collected, position: Position, { couldCastle, hasCastled }: Lineage): void {
  for (const side of SIDES) {
    if (!couldCastle[side] || hasCastled[side] || canCastle(position, side)) continue;
    const queen = side === 'white' ? 13 : 5;
    found.add('castling-lost', side, '', { isShown: position.board.includes(queen) });
  }
}

/**
 * The order of telling, for `sort`: by kind, the mover's before the other's, then as the side sees its squares; so that
 * turning colours and board changes no word but the sides.
 */
export function inTellingOrder(mover: Side): (a: Feature, b: Feature) => number {
  const rank = ({ kind, side, squares, label }: Feature): number => {
    const places = squares.map((square) => viewOrder(squareNamed(square)!, side ?? mover));
    const place = places.length > 0 ? Math.min(...places) : label.charCodeAt(0) || 0;
    return (FEATURE_KINDS.indexOf(kind) * 2 + (side === opponent(mover) ? 1 : 0)) * 256 + place;
  };
  return (a, b) => rank(a) - rank(b);
}

/** Whether the side still has a right to castle. */
export function canCastle({ castling }: Position, side: Side): boolean {
  return side === 'white' ? castling.whiteKing || castling.whiteQueen : castling.blackKing || castling.blackQueen;
}

/** Whether a pawn stands on a square. */
export function isPawnOn({ board }: Position, square: Square): boolean {
  return (board[square]! & 7) === PAWN;
}
