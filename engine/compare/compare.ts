/** The difference of two readings. Start here. */
import type { Reading } from '../reading/schema';
import type { Theme } from '../types';
import { balanceOf, lookedUp, saidBy } from './counts';
import type { Difference, DifferenceSentence } from './difference';
import type { DifferenceFact } from './facts';
import { differenceFacts } from './gather';
import { menDifference } from './men';
import { differenceText } from './phrases';
import { squaresDifference } from './squares';

/** Theme and weight of each sentence: what is lost now first, then what lasts, then what is merely so. */
const RANK: Readonly<Record<DifferenceFact['id'], { readonly theme: Theme; readonly weight: number }>> = {
  'now-en-prise': { theme: 'men', weight: 90 },
  'en-prise-no-more': { theme: 'men', weight: 80 },
  'flight-lost': { theme: 'king', weight: 78 },
  'flight-gained': { theme: 'king', weight: 76 },
  'problem-bishop-gone': { theme: 'men', weight: 74 },
  'problem-bishop-made': { theme: 'men', weight: 74 },
  'man-placed': { theme: 'men', weight: 72 },
  'last-guard-gone': { theme: 'squares', weight: 70 },
  'outpost-made': { theme: 'outposts', weight: 68 },
  'outpost-gone': { theme: 'outposts', weight: 66 },
  'weak-square-made': { theme: 'squares', weight: 64 },
  'weak-square-mended': { theme: 'squares', weight: 60 },
  'man-shut-in': { theme: 'men', weight: 62 },
  'man-freed': { theme: 'men', weight: 58 },
  'pawn-trait-made': { theme: 'structure', weight: 56 },
  'pawn-trait-gone': { theme: 'structure', weight: 54 },
  'file-taken': { theme: 'files', weight: 52 },
  'file-opened': { theme: 'files', weight: 50 },
  'command-taken': { theme: 'control', weight: 48 },
  'bishop-pair-won': { theme: 'men', weight: 46 },
  'bishop-pair-given': { theme: 'men', weight: 46 },
  'structure-changed': { theme: 'structure', weight: 44 },
};

/** Most sentences of one kind: the others are in the lists of squares and men. */
const MOST_OF_A_KIND = 4;
/** Counts and room weigh a little within a kind. */
const SHARE = 0.5;

/** What differs from `a` to `b`, best said first. Two equal readings differ in nothing. */
export function compare(a: Reading, b: Reading): Difference {
  const squares = squaresDifference(a, b);
  const men = menDifference(a, b);
  const [saidA, saidB] = [lookedUp(a).said, lookedUp(b).said];
  const gained = b.statements.filter((statement) => !saidA.has(saidBy(statement)));
  const lost = a.statements.filter((statement) => !saidB.has(saidBy(statement)));
  return {
    squares,
    men,
    balance: balanceOf(a, b),
    gained,
    lost,
    unchanged: a.statements.length - lost.length,
    sentences: sentencesOf(differenceFacts({ a, b, squares, men })),
  };
}

function sentencesOf(facts: readonly DifferenceFact[]): DifferenceSentence[] {
  const weighed = facts.map((fact) => ({ fact, weight: RANK[fact.id].weight + extra(fact) }));
  weighed.sort((one, two) => two.weight - one.weight);
  const counts = new Map<string, number>();
  const few = weighed.filter(({ fact }) => {
    const count = (counts.get(`${fact.id} ${fact.side}`) ?? 0) + 1;
    counts.set(`${fact.id} ${fact.side}`, count);
    return count <= MOST_OF_A_KIND;
  });
  return few.map(({ fact, weight }) => {
    const { id, side, good, squares, ...facts_ } = fact;
    return { id, theme: RANK[id].theme, side, good, weight, text: differenceText(fact), squares, facts: facts_ };
  });
}

function extra(fact: DifferenceFact): number {
  if ('safeMoves' in fact) return SHARE * Math.min(8, Math.abs(fact.safeMoves.b - fact.safeMoves.a));
  if ('loses' in fact) return SHARE * Math.min(9, fact.loses);
  if ('user' in fact) return fact.user ? 2 : 0;
  return 'hold' in fact && fact.hold === 'permanent' ? 1 : 0;
}
