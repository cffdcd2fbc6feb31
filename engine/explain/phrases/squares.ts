/** Sentences about squares. */
import type { Side } from '../../types';
import type { SquaresFact, StoppedPawn, WeakSquareFact } from '../facts/squares';
import type { Phrase, Phrases } from '../phrase';
import { capital, comersSentence, counted, enemyName, enemyOf, inWords, listed, name } from '../words';

/** Who uses a weak square, in a sentence. */
function usage({ side, occupant, comers, commandedByEnemy, enemyKnights }: WeakSquareFact): string | null {
  if (occupant) return `A ${enemyOf(side)} ${occupant.kind} stands there`;
  return (
    comersSentence(comers, enemyOf(side), enemyKnights) ?? (commandedByEnemy ? `${enemyName(side)} commands it` : null)
  );
}

/** What stops a pawn: the pawn before it, or one that holds the next square. */
function stop({ on, by }: StoppedPawn, side: Side): string {
  return by === 'ram' ? `by the pawn on ${on}` : `before ${on}, which a ${enemyOf(side)} pawn holds`;
}

function weak(fact: WeakSquareFact): Phrase {
  const { square, side, stopped } = fact;
  const [first, second] = stopped;
  if (!first) {
    return { head: `${square} is weak for good`, body: `no ${side} pawn can guard it any more`, more: [usage(fact)] };
  }
  return {
    head: `${square} is weak as the pawns stand`,
    body: second
      ? `of the pawns that could guard it, the one on ${first.pawn} is stopped ${stop(first, side)}, and the one on ${second.pawn} ${stop(second, side)}`
      : `the pawn on ${first.pawn} that could guard it is stopped ${stop(first, side)}`,
    more: [usage(fact)],
  };
}

export const SQUARES_PHRASES: Phrases<SquaresFact> = {
  'weak-for-good': weak,
  'weak-while-fixed': weak,
  'weak-complex': ({ side, colour, weak: squares, enemyBishop }) => ({
    head: `${name(side)} is weak on the ${colour} squares`,
    body: `no pawn can guard ${listed(squares)}, and ${name(side)} has no ${colour}-squared bishop`,
    more: [enemyBishop ? `${enemyName(side)} has one` : null],
  }),
  'centre-command': ({ side, commanded }) => ({
    head: `${name(side)} commands the centre`,
    body: `a ${enemyOf(side)} minor piece would be lost on ${listed(commanded, 'or')}, a ${side} one would not`,
  }),
  'disputed-square': ({ square, first, firstCount, secondCount }) => ({
    head: `${square} is disputed`,
    body: `a minor piece of either side would be lost there, with ${inWords(firstCount)} ${first} ${firstCount === 1 ? 'attacker' : 'attackers'} against ${inWords(secondCount)}`,
  }),
  'square-closed': ({ side, square, own, enemy }) => ({
    head: `${name(side)} commands ${square}`,
    body: `a ${enemyOf(side)} minor piece there would be lost, a ${side} one would not`,
    more: [
      `${capital(counted(own, `${side} man`, `${side} men`))} ${own === 1 ? 'bears' : 'bear'} on it, ${enemy === 0 ? `no ${enemyOf(side)} one` : `${inWords(enemy)} of ${enemyName(side)}’s`}`,
    ],
  }),
};
