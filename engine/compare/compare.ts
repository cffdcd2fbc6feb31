/** The difference of two readings. Start here. */
import { inView } from '../explain';
import type { Reading, Statement } from '../reading/schema';
import type { Side, SquareName, Theme } from '../types';
import { balanceOf } from './counts';
import type { BoardDifference, Difference, DifferenceSentence } from './difference';
import type { DifferenceFact } from './facts';
import { differenceFacts } from './gather';
import type { Board } from './given';
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
  'target-made': { theme: 'men', weight: 71 },
  'last-guard-gone': { theme: 'squares', weight: 70 },
  'outpost-made': { theme: 'outposts', weight: 68 },
  'outpost-gone': { theme: 'outposts', weight: 66 },
  'weak-square-made': { theme: 'squares', weight: 64 },
  'weak-square-mended': { theme: 'squares', weight: 60 },
  'target-gone': { theme: 'men', weight: 63 },
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

/** Most sentences of one kind for one side: the others are in the lists of squares and men. */
const MOST_OF_A_KIND = 4;
/** Counts and room weigh a little within a kind. */
const SHARE = 0.5;

/** What differs from `a` to `b`, best said first. Two equal readings differ in nothing. */
export function compare(a: Reading, b: Reading): Difference {
  const [saidA, saidB] = [a, b].map(({ statements }) => new Set(statements.map(saidBy)));
  const gained = b.statements.filter((statement) => !saidA!.has(saidBy(statement)));
  const lost = a.statements.filter((statement) => !saidB!.has(saidBy(statement)));
  return { ...compareBoards(a, b), gained, lost, unchanged: a.statements.length - lost.length };
}

/** What a statement says: a count that changed makes another of it. */
function saidBy({ key, text }: Statement): string {
  return `${key} ${text}`;
}

/** The same without the statements of the two readings. */
export function compareBoards(a: Board, b: Board): BoardDifference {
  const squares = squaresDifference(a, b);
  const men = menDifference(a, b);
  const facts = differenceFacts({ a, b, squares, men });
  return { squares, men, balance: balanceOf(a, b), sentences: sentencesOf(facts, b.sideToMove) };
}

/** By weight; among equals the side to move first, then what is nearest to the middle files. */
function sentencesOf(facts: readonly DifferenceFact[], mover: Side): DifferenceSentence[] {
  const weighed = facts.map((fact) => ({
    fact,
    weight: RANK[fact.id].weight + extra(fact),
    order: `${fact.side === mover ? 0 : 1} ${fact.id} ${inView(fact.squares, fact.side ?? mover).map((square) => place(square, fact.side ?? mover))}`,
  }));
  weighed.sort((one, two) => two.weight - one.weight || (one.order < two.order ? -1 : 1));
  const counts = new Map<string, number>();
  const few = weighed.filter(({ fact }) => {
    const count = (counts.get(`${fact.id} ${fact.side}`) ?? 0) + 1;
    counts.set(`${fact.id} ${fact.side}`, count);
    return count <= MOST_OF_A_KIND;
  });
  return few.map(({ fact, weight }) => {
    const { id, side, good, squares, ...rest } = fact;
    const men = menOf(fact);
    return { id, theme: RANK[id].theme, side, good, weight, text: differenceText(fact), squares, men, facts: rest };
  });
}

/** A square by its distance from the middle files, its file, and its rank as the side counts it. */
function place(square: SquareName, side: Side): string {
  const file = square.charCodeAt(0) - 97;
  const rank = Number(square.charAt(1));
  return `${Math.floor(Math.abs(file - 3.5))}${file}${side === 'white' ? rank : 9 - rank}`;
}

function extra(fact: DifferenceFact): number {
  if ('safeMoves' in fact) return SHARE * Math.min(8, Math.abs(fact.safeMoves.b - fact.safeMoves.a));
  if ('loses' in fact) return SHARE * Math.min(9, fact.loses);
  if ('user' in fact) return fact.user ? 2 : 0;
  return 'hold' in fact ? (fact.matters ? 1 : 0) + (fact.hold === 'permanent' ? 1 : 0) : 0;
}

/** The men of B that a fact speaks of. */
function menOf(fact: DifferenceFact): readonly SquareName[] {
  if (fact.id === 'target-made') return [fact.man.square, ...fact.heavy.map(({ square }) => square)];
  if ('man' in fact) return [fact.man.square];
  if ('user' in fact) return fact.user ? [fact.user.from] : [];
  if ('king' in fact) return [fact.king];
  if (fact.id === 'file-taken') return fact.heavy.map(({ square }) => square);
  if (fact.id === 'problem-bishop-gone' && fact.traded) return [];
  return POINTING.has(fact.id) ? fact.squares : [];
}

/** Kinds of facts whose squares are those of men. */
const POINTING: ReadonlySet<DifferenceFact['id']> = new Set<DifferenceFact['id']>([
  'man-placed',
  'problem-bishop-made',
  'problem-bishop-gone',
  'pawn-trait-made',
  'pawn-trait-gone',
  'bishop-pair-won',
  'bishop-pair-given',
]);
