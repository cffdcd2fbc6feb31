/** Lasting features of a position: what a move can change for good, and what one asks for the origin of. */
import type { ReadingValues } from '../explain';
import { squareName } from '../board';
import { capital, name, possessive } from '../explain';
import { opponent, SIDES, type Side, type SquareName } from '../types';

/** Kinds of lasting features. */
export const FEATURE_KINDS = [
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
] as const;
export type FeatureKind = (typeof FEATURE_KINDS)[number];

/** One feature. Its key names it among all others. */
export interface Feature {
  readonly key: string;
  readonly kind: FeatureKind;
  /** Whose it is: who suffers from a weakness, who has the rest; null for both. */
  readonly side: Side | null;
  readonly squares: readonly SquareName[];
  /** As a claim: 'c6 is weak for Black for good'. */
  readonly claim: string;
  /** As a claim about its end: 'c6 is weak for Black no longer'. */
  readonly end: string;
}

const FILES = 'abcdefgh';

/** All features of a position, by their keys. */
export function featuresOf(values: ReadingValues): ReadonlyMap<string, Feature> {
  const found = new Map<string, Feature>();
  const add = (
    kind: FeatureKind,
    side: Side | null,
    where: string,
    squares: SquareName[],
    claim: string,
    end: string,
  ) => {
    const key = [kind, side ?? 'both', where].join(' ');
    found.set(key, { key, kind, side, squares, claim: capital(claim), end: capital(end) });
  };
  const { structure, weakSquares, outposts, files, pawns, complexes } = values;
  if (structure)
    add(
      'structure',
      structure.side,
      structure.id,
      [],
      `the structure is ${structure.name}`,
      `the structure is ${structure.name} no longer`,
    );
  for (const { square, side, hold, matters } of weakSquares) {
    if (!matters || hold !== 'permanent') continue;
    const at = squareName(square);
    add(
      'weak-square',
      side,
      at,
      [at],
      `${at} is weak for ${name(side)} for good`,
      `${at} is weak for ${name(side)} no longer`,
    );
  }
  for (const { square, side, rank, hold, support } of outposts) {
    if (rank !== 'outpost' || hold === 'open' || support?.moves !== 0) continue;
    const at = squareName(square);
    add(
      'outpost',
      side,
      at,
      [at],
      `${at} is an outpost of ${possessive(side)}`,
      `${at} is an outpost of ${possessive(side)} no longer`,
    );
  }
  for (const { file, status, halfOpenFor } of files) {
    const letter = FILES.charAt(file);
    if (status === 'open')
      add('open-file', null, letter, [], `the ${letter}-file is open`, `the ${letter}-file is open no longer`);
    if (status === 'half-open' && halfOpenFor)
      add(
        'half-open-file',
        halfOpenFor,
        letter,
        [],
        `the ${letter}-file is half-open for ${name(halfOpenFor)}`,
        `the ${letter}-file is half-open for ${name(halfOpenFor)} no longer`,
      );
  }
  for (const side of SIDES) {
    if (bishopsOf(values, side) === 2 && bishopsOf(values, opponent(side)) < 2)
      add(
        'bishop-pair',
        side,
        '',
        [],
        `${name(side)} alone has both bishops`,
        `${name(side)} alone has both bishops no longer`,
      );
    const { passed, isolated, backward, doubled } = pawns[side];
    const lists = {
      'passed-pawn': passed,
      'isolated-pawn': isolated,
      'backward-pawn': backward,
      'doubled-pawn': doubled,
    };
    for (const [kind, squares] of Object.entries(lists)) {
      const trait = kind.slice(0, -'-pawn'.length);
      for (const square of squares) {
        const at = squareName(square);
        const pawn = `the ${side} pawn on ${at} is`;
        add(kind as FeatureKind, side, at, [at], `${pawn} ${trait}`, `${pawn} ${trait} no longer`);
      }
    }
  }
  for (const { side, colour } of complexes) {
    const where = `${possessive(side)} ${colour} squares`;
    add('weak-complex', side, colour, [], `${where} are weak together`, `${where} are weak together no longer`);
  }
  for (const { white, black } of pawns.rams) {
    const pair = [squareName(white), squareName(black)];
    const says = `the pawns on ${pair[0]} and ${pair[1]} stand head to head`;
    add('ram', null, pair.join('-'), pair, says, `${says} no longer`);
  }
  return found;
}

function bishopsOf({ map }: ReadingValues, side: Side): number {
  const code = side === 'white' ? 3 : 11;
  let count = 0;
  for (let square = 0; square < 64; square++) if (map.board[square] === code) count++;
  return count;
}
