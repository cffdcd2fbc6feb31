/** What is counted of a reading for a comparison. */
import {
  type BySide,
  bySide,
  type Colour,
  opponent,
  SIDES,
  type Side,
  type SquareName,
  THEMES,
  type Theme,
} from '../types';
import type { BalanceLine, Hold, ManCounts } from './difference';
import type { Board } from './given';

type Man = Board['men'][number];

/** Squares that each man attacks in the other side's half, by the man's square. */
function enemyHalfOf({ squares }: Board): ReadonlyMap<SquareName, number> {
  const counts = new Map<SquareName, number>();
  for (const { square, attackers } of squares) {
    const attackersThere = Number(square.charAt(1)) > 4 ? attackers.white : attackers.black;
    for (const man of attackersThere) counts.set(man, (counts.get(man) ?? 0) + 1);
  }
  return counts;
}

/** The counts of a man. */
export function manCounts(man: Man, enemyHalf: ReadonlyMap<SquareName, number>): ManCounts {
  return {
    safeMoves: man.safeMoves.length,
    enemyHalf: enemyHalf.get(man.square) ?? 0,
    attackers: man.attackers.length,
    defenders: man.defenders.length,
    enPrise: man.enPrise,
  };
}

/** What is looked up of a reading again and again while it is compared with many others. */
export interface Looked {
  readonly enemyHalf: ReadonlyMap<SquareName, number>;
  readonly holds: BySide<ReadonlyMap<SquareName, Hold>>;
  readonly outposts: BySide<ReadonlySet<SquareName>>;
}

const looked = new WeakMap<Board, Looked>();

/** What is looked up of a reading; made once for each. */
export function lookedUp(reading: Board): Looked {
  const known = looked.get(reading);
  if (known) return known;
  const made = {
    enemyHalf: enemyHalfOf(reading),
    holds: holdsOf(reading),
    outposts: outpostsOf(reading),
  };
  looked.set(reading, made);
  return made;
}

/** The colour of a square: a1 is dark. */
export function colourOf(square: SquareName): Colour {
  return (square.charCodeAt(0) + square.charCodeAt(1)) % 2 === 0 ? 'dark' : 'light';
}

/** Each weak square with its hold, of the side that suffers. */
function holdsOf({ weakSquares }: Board): BySide<ReadonlyMap<SquareName, Hold>> {
  return bySide(
    (side) => new Map(weakSquares.filter((weak) => weak.side === side).map((weak) => [weak.square, weak.hold])),
  );
}

/** Outposts of each side, advanced posts left out. */
function outpostsOf({ outposts }: Board): BySide<ReadonlySet<SquareName>> {
  return bySide(
    (side) =>
      new Set(outposts.filter((post) => post.side === side && post.rank === 'outpost').map((post) => post.square)),
  );
}

interface Count {
  /** What is counted, in words. */
  readonly counts: string;
  readonly of: (reading: Board, side: Side) => number;
}

/** One count a theme: what a balance line shows. */
const COUNTS: Readonly<Record<Theme, Count>> = {
  structure: {
    counts: 'isolated, doubled and backward pawns',
    of: ({ pawns }, side) => {
      const { isolated, doubled, backward } = pawns[side];
      return new Set([...isolated, ...doubled, ...backward]).size;
    },
  },
  squares: {
    counts: 'weak squares of the enemy',
    of: ({ weakSquares }, side) => weakSquares.filter((weak) => weak.side !== side).length,
  },
  outposts: {
    counts: 'outposts taken or free to be taken',
    of: (reading, side) => lookedUp(reading).outposts[side].size,
  },
  files: {
    counts: 'files controlled',
    of: ({ files }, side) => files.filter(({ control }) => control === side).length,
  },
  men: {
    counts: 'safe moves',
    of: ({ totals }, side) => totals[side].safeMoves,
  },
  king: {
    counts: 'enemy men that attack its king’s zone',
    of: ({ kings }, side) => kings[side]?.reachedBy.length ?? 0,
  },
  control: {
    counts: 'squares commanded',
    of: ({ totals }, side) => totals[side].commanded,
  },
};

/** The balance of each theme, A beside B. */
export function balanceOf(a: Board, b: Board): BalanceLine[] {
  return THEMES.map((theme) => {
    const { counts, of } = COUNTS[theme];
    const [white, black] = SIDES.map((side) => ({ a: of(a, side), b: of(b, side) }));
    return { theme, counts, white: white!, black: black! };
  });
}

/** For which themes a smaller count is the better one. */
export const FEWER_IS_BETTER: ReadonlySet<Theme> = new Set<Theme>(['structure', 'king']);

/** What a side gains from A to B: what it gets itself and what the enemy loses, theme by theme; positive is good for it. */
export function gainOf({ theme, ...line }: BalanceLine, side: Side): number {
  const own = line[side].b - line[side].a;
  const enemy = line[opponent(side)].b - line[opponent(side)].a;
  return FEWER_IS_BETTER.has(theme) ? enemy - own : own - enemy;
}
