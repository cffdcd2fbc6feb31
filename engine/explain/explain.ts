/** From engine values to ranked statements, and the few that lead. */
import { bySide, THEMES, type Side, type SquareName, type Theme } from '../types';
import type { Fact, FactId } from './fact';
import { controlFacts } from './gather/control';
import { filesFacts } from './gather/files';
import { kingFacts } from './gather/king';
import { menFacts } from './gather/men';
import { outpostsFacts } from './gather/outposts';
import { squaresFacts } from './gather/squares';
import { structureFacts } from './gather/structure';
import { phraseText } from './phrase';
import { phraseOf } from './phrases';
import { weightOf } from './rank';
import type { ReadingValues } from './values';

/** One statement of a reading. */
export interface StatementValue {
  /** Unique in the reading. */
  readonly key: string;
  readonly id: FactId;
  readonly theme: Theme;
  readonly side: Side | null;
  readonly weight: number;
  readonly head: string;
  readonly text: string;
  readonly squares: readonly SquareName[];
  readonly men: readonly SquareName[];
  /** What it says; id, side, squares and men stand in the fields above too. */
  readonly fact: Fact;
}

export interface Explanation {
  /** Heaviest first. */
  readonly statements: readonly StatementValue[];
  /** Keys of the few that matter most: at most one a theme and one a man. */
  readonly lead: readonly string[];
}

const GATHER: Readonly<Record<Theme, (values: ReadingValues) => readonly Fact[]>> = {
  structure: structureFacts,
  squares: squaresFacts,
  outposts: outpostsFacts,
  files: filesFacts,
  men: menFacts,
  king: kingFacts,
  control: controlFacts,
};

/** Most statements of one kind that a side gets; the heaviest stay. */
const MOST_OF_A_KIND = 4;
/** Most statements of a theme; the heaviest stay. Together as many as a person reads of one position. */
const MOST_OF_A_THEME: Readonly<Record<Theme, number>> = {
  structure: 10,
  squares: 8,
  outposts: 6,
  files: 7,
  men: 9,
  king: 5,
  control: 3,
};
/** Most leading statements: as many as stand beside a plate. */
const LEAD_MAX = 5;
/** The lead never falls short of so many for want of weight; further ones must weigh LEAD_WEIGHT. */
const LEAD_LEAST = 3;
const LEAD_WEIGHT = 40;

interface Weighed {
  readonly theme: Theme;
  readonly fact: Fact;
  readonly weight: number;
  /** Breaks ties: see `tieOrder`. */
  readonly order: number;
}

/** Everything that is said of a position. */
export function explain(values: ReadingValues): Explanation {
  const mover = values.position.sideToMove;
  const weighed: Weighed[] = [];
  for (const theme of THEMES) {
    for (const fact of GATHER[theme](values)) {
      weighed.push({ theme, fact, weight: weightOf(fact), order: tieOrder(fact, mover) });
    }
  }
  weighed.sort((a, b) => b.weight - a.weight || a.order - b.order);
  const statements = withoutRepeats(weighed).map(statement);
  return { statements, lead: leading(statements) };
}

/**
 * Among equals the side to move comes first, then by the first square as the fact's side sees it, so that turning
 * colours and board turns nothing else.
 */
function tieOrder({ squares, men, side }: Fact, mover: Side): number {
  const sideOrder = side === mover ? 0 : side === null ? 1 : 2;
  return (
    sideOrder * 1_000_000 + placeInView(squares[0] ?? men[0], side ?? mover) * 1000 + placeInView(men[0], side ?? mover)
  );
}

function placeInView(square: SquareName | undefined, side: Side): number {
  if (!square) return 0;
  const rank = square.charCodeAt(1) - 48;
  return (square.charCodeAt(0) - 96) * 10 + (side === 'black' ? 9 - rank : rank);
}

/** Names the statement among the others: what it says, of whom, about which men and squares. */
function keyOf({ id, side, men, squares }: Fact): string {
  let key: string = side === null ? id : `${id}.${side}`;
  for (const man of men) key += `.${man}`;
  for (let index = 0; index < squares.length; index++) key += (index === 0 ? '-' : '.') + squares[index]!;
  return key;
}

/** Drops what an outpost's sentence says better, and all but the heaviest of a kind and of a theme. */
function withoutRepeats(weighed: readonly Weighed[]): Weighed[] {
  const posts: SquareName[] = [];
  for (const { fact } of weighed) {
    if (fact.id === 'outpost-free') posts.push(fact.square);
    else if (fact.id === 'outpost-taken') posts.push(fact.man.square);
  }
  const counts = bySide(() => new Map<FactId, number>());
  const themes = new Map<Theme, number>();
  return weighed.filter(({ theme, fact }) => {
    if ((fact.id === 'weak-for-good' || fact.id === 'weak-while-fixed') && posts.includes(fact.square)) return false;
    const kinds = counts[fact.side ?? 'white'];
    const count = (kinds.get(fact.id) ?? 0) + 1;
    kinds.set(fact.id, count);
    if (count > MOST_OF_A_KIND) return false;
    const ofTheme = (themes.get(theme) ?? 0) + 1;
    themes.set(theme, ofTheme);
    return ofTheme <= MOST_OF_A_THEME[theme];
  });
}

function statement({ theme, fact, weight }: Weighed): StatementValue {
  const { id, side, squares, men } = fact;
  const phrase = phraseOf(fact);
  return {
    key: keyOf(fact),
    id,
    theme,
    side,
    weight,
    head: phrase.head,
    text: phraseText(phrase),
    squares,
    men,
    fact,
  };
}

function leading(statements: readonly StatementValue[]): string[] {
  const themes = new Set<Theme>();
  const taken = new Set<SquareName>();
  const lead: string[] = [];
  for (const { key, theme, men, squares, weight } of statements) {
    if (lead.length === LEAD_MAX || (lead.length >= LEAD_LEAST && weight < LEAD_WEIGHT)) break;
    if (themes.has(theme) || squares.length + men.length === 0 || men.some((man) => taken.has(man))) continue;
    themes.add(theme);
    for (const man of men) taken.add(man);
    lead.push(key);
  }
  return lead;
}
