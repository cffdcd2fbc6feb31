/** Squares on which two readings differ. */
import { bySide } from '../types';
import { lookedUp } from './counts';
import type { Change, Occupant, SquareDifference } from './difference';
import type { Board } from './given';

/** The squares that differ, a1 first. */
export function squaresDifference(a: Board, b: Board): SquareDifference[] {
  const { holds: holdsA, outposts: postsA } = lookedUp(a);
  const { holds: holdsB, outposts: postsB } = lookedUp(b);
  return a.squares.flatMap((before, place) => {
    const after = b.squares[place]!;
    const { square } = before;
    const found: SquareDifference = {
      square,
      occupant: { a: before.occupant, b: after.occupant },
      attackers: bySide((side) => ({ a: before.attackers[side].length, b: after.attackers[side].length })),
      command: { a: before.command, b: after.command },
      weakFor: bySide((side) => ({ a: holdsA[side].get(square) ?? null, b: holdsB[side].get(square) ?? null })),
      outpostFor: bySide((side) => ({ a: postsA[side].has(square), b: postsB[side].has(square) })),
    };
    return isSame(found) ? [] : [found];
  });
}

function isSame({ occupant, attackers, command, weakFor, outpostFor }: SquareDifference): boolean {
  return (
    isSameMan(occupant) &&
    same(attackers.white) &&
    same(attackers.black) &&
    same(command) &&
    same(weakFor.white) &&
    same(weakFor.black) &&
    same(outpostFor.white) &&
    same(outpostFor.black)
  );
}

function same<V>({ a, b }: Change<V>): boolean {
  return a === b;
}

function isSameMan({ a, b }: Change<Occupant>): boolean {
  return a?.side === b?.side && a?.kind === b?.kind;
}
