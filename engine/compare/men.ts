/** Men of two readings matched: the same man where it stood, the same man elsewhere, men gone and new. */
import type { SquareName } from '../types';
import { colourOf, lookedUp, manCounts } from './counts';
import type { Change, ManCounts, ManDifference } from './difference';
import type { Board } from './given';

type Man = Board['men'][number];

/** Men that differ, in square order of where they stand (A's square for those that are gone). */
export function menDifference(a: Board, b: Board): ManDifference[] {
  const countsIn = (reading: Board): ((man: Man) => ManCounts) => {
    const { enemyHalf } = lookedUp(reading);
    return (man) => manCounts(man, enemyHalf);
  };
  const [countsA, countsB] = [countsIn(a), countsIn(b)];
  return matched(a, b).flatMap(([before, after]): ManDifference[] => {
    const { side, kind } = (after ?? before)!;
    const counts = { a: before && countsA(before), b: after && countsB(after) };
    const squares = { a: before?.square ?? null, b: after?.square ?? null };
    const same = squares.a === squares.b && isSame(counts);
    return same ? [] : [{ side, kind, squares, counts }];
  });
}

function isSame({ a, b }: Change<ManCounts | null>): boolean {
  if (a === null || b === null) return a === b;
  return COUNTS.every((count) => a[count] === b[count]);
}

const COUNTS = ['safeMoves', 'enemyHalf', 'attackers', 'defenders', 'enPrise'] as const;

type Pair = readonly [Man | null, Man | null];

/**
 * Men that stand where they stood are the same. Of those left, men of one side and kind (bishops: of one colour of
 * squares too) are the same by nearness, the nearest two first, as many as both have; the rest is gone or new.
 */
function matched(a: Board, b: Board): readonly Pair[] {
  const name = ({ side, kind, square }: Man): string => `${side} ${kind} ${square}`;
  const inB = new Map(b.men.map((man) => [name(man), man]));
  const inA = new Set(a.men.map(name));
  const pairs: Pair[] = [];
  const left = new Map<string, { a: Man[]; b: Man[] }>();
  const rest = ({ side, kind, square }: Man): { a: Man[]; b: Man[] } => {
    const key = `${side} ${kind} ${kind === 'bishop' ? colourOf(square) : ''}`;
    const found = left.get(key) ?? { a: [], b: [] };
    left.set(key, found);
    return found;
  };
  for (const man of a.men) {
    const there = inB.get(name(man));
    if (there) pairs.push([man, there]);
    else rest(man).a.push(man);
  }
  for (const man of b.men) if (!inA.has(name(man))) rest(man).b.push(man);
  for (const { a: before, b: after } of left.values()) pairs.push(...nearest(before, after));
  return pairs.sort((one, two) => placeOf(one) - placeOf(two));
}

/** Pairs by nearness; what is left over stands alone. The same whichever of the two comes first, and for both colours. */
function nearest(before: readonly Man[], after: readonly Man[]): Pair[] {
  const ways = before.flatMap((from) =>
    after.map((to) => ({ from, to, far: distance(from, to), name: together(from, to) })),
  );
  ways.sort((one, two) => one.far - two.far || (one.name < two.name ? -1 : 1));
  const taken = new Set<Man>();
  const pairs: Pair[] = [];
  for (const { from, to } of ways) {
    if (taken.has(from) || taken.has(to)) continue;
    taken.add(from).add(to);
    pairs.push([from, to]);
  }
  for (const man of before) if (!taken.has(man)) pairs.push([man, null]);
  for (const man of after) if (!taken.has(man)) pairs.push([null, man]);
  return pairs;
}

/** King's steps between two squares; for pawns a file weighs more than the whole length of another. */
function distance({ square: from, kind }: Man, { square: to }: Man): number {
  const files = Math.abs(from.charCodeAt(0) - to.charCodeAt(0));
  const ranks = Math.abs(from.charCodeAt(1) - to.charCodeAt(1));
  return kind === 'pawn' ? files * 8 + ranks : Math.max(files, ranks);
}

/** Two squares as their side sees them, in an order that does not ask which came first. */
function together(from: Man, to: Man): string {
  const [one, two] = [seen(from), seen(to)];
  return one < two ? one + two : two + one;
}

function seen({ side, square }: Man): string {
  return side === 'white' ? square : `${square.charAt(0)}${9 - Number(square.charAt(1))}`;
}

/** Where the man of a pair stands now (or stood), a1 first. */
function placeOf([before, after]: Pair): number {
  const square: SquareName = (after ?? before)!.square;
  return square.charCodeAt(1) * 8 + square.charCodeAt(0);
}
