/** Men of two readings matched: the same man where it stood, the same man elsewhere, men gone and new. */
import type { Reading } from '../reading/schema';
import type { SquareName } from '../types';
import { lookedUp, manCounts } from './counts';
import type { Change, ManCounts, ManDifference } from './difference';

type Man = Reading['men'][number];

/** Men that differ, in square order of where they stand (A's square for those that are gone). */
export function menDifference(a: Reading, b: Reading): ManDifference[] {
  const countsIn = (reading: Reading): ((man: Man) => ManCounts) => {
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
 * Men that stand where they stood are the same. Of those left, men of one side and kind are the same in order of their
 * squares, as many as both have; the rest is gone or new.
 */
function matched(a: Reading, b: Reading): readonly Pair[] {
  const name = ({ side, kind, square }: Man): string => `${side} ${kind} ${square}`;
  const inB = new Map(b.men.map((man) => [name(man), man]));
  const inA = new Set(a.men.map(name));
  const pairs: Pair[] = [];
  const left = new Map<string, { a: Man[]; b: Man[] }>();
  const rest = ({ side, kind }: Man): { a: Man[]; b: Man[] } => {
    const key = `${side} ${kind}`;
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
  for (const { a: before, b: after } of left.values()) {
    for (let place = 0; place < Math.max(before.length, after.length); place++)
      pairs.push([before[place] ?? null, after[place] ?? null]);
  }
  return pairs.sort((one, two) => placeOf(one) - placeOf(two));
}

/** Where the man of a pair stands now (or stood), a1 first. */
function placeOf([before, after]: Pair): number {
  const square: SquareName = (after ?? before)!.square;
  return square.charCodeAt(1) * 8 + square.charCodeAt(0);
}
