/** One phrase a fact of a difference: a fact without one does not compile. Everything is said of B, with A behind it. */
import {
  capital,
  counted,
  inWords,
  listed,
  name,
  phraseText,
  type Phrase,
  type Phrases,
  possessive,
  theMan,
  theMen,
} from '../explain';
import { opponent, type Side } from '../types';
import type { DifferenceFact, FileStatus, LastGuard } from './facts';

const COMMAND = { white: 'White’s', black: 'Black’s', open: 'open to both', disputed: 'disputed' } as const;

const PHRASES: Phrases<DifferenceFact> = {
  'man-placed': ({ kind, side, at, safeMoves, enemyHalf }) => ({
    head: `The ${side} ${kind} stands on ${at.b} instead of ${at.a}`,
    body: `${counted(safeMoves.b, 'safe move')} against ${few(safeMoves.a)}, and ${counted(enemyHalf.b, 'square')} of ${possessive(opponent(side))} half attacked against ${few(enemyHalf.a)}`,
  }),
  'man-freed': ({ man, safeMoves }) => ({
    head: `${capital(theMan(man))} is freer`,
    body: `${counted(safeMoves.b, 'safe move')} instead of ${few(safeMoves.a)}`,
  }),
  'man-shut-in': ({ man, safeMoves }) => ({
    head: `${capital(theMan(man))} has less room`,
    body: `${counted(safeMoves.b, 'safe move')} instead of ${few(safeMoves.a)}`,
  }),
  'last-guard-gone': lastGuard,
  'command-taken': ({ side, square, command, attackers }) => ({
    head: `${name(side)} commands ${square}`,
    body: `${counted(attackers[side], `${side} man attacks`, `${side} men attack`)} it against ${few(attackers[opponent(side)])}; before it was ${COMMAND[command.a]}`,
  }),
  'weak-square-made': ({ side, square, hold }) => ({
    head: `${capital(square)} is weak for ${name(side)} now`,
    body:
      hold === 'permanent'
        ? `no ${side} pawn can guard it any more`
        : `no ${side} pawn can guard it while the pawns stay fixed`,
  }),
  'weak-square-mended': ({ side, square }) => ({ head: `${capital(square)} is weak for ${name(side)} no longer` }),
  'outpost-made': ({ side, square }) => ({ head: `${capital(square)} is an outpost of ${possessive(side)} now` }),
  'outpost-gone': ({ side, square }) => ({ head: `${capital(square)} is an outpost of ${possessive(side)} no longer` }),
  'file-opened': ({ file, status, halfOpenFor }) => ({
    head: `The ${file}-file is ${opened(status.b, halfOpenFor.b)}`,
    body: `it was ${opened(status.a, halfOpenFor.a)}`,
  }),
  'file-taken': ({ file, side, good, heavy }) => ({
    head: `${name(side)} controls the ${file}-file ${good ? 'now' : 'no longer'}`,
    body: good && heavy.length > 0 ? `${theMen(heavy)} ${heavy.length === 1 ? 'stands' : 'stand'} on it` : undefined,
  }),
  'target-made': ({ man, side, file, heavy }) => ({
    head: `${capital(theMan(man))} is a target`,
    body: `no ${side} pawn guards it, and ${inWords(heavy.length)} heavy men, ${theMen(heavy)}, stand against it on the ${file}-file`,
  }),
  'target-gone': ({ man, file, heavy }) => ({
    head: `${capital(theMan(man))} is a target no longer`,
    body: `before, no pawn guarded it against ${theMen(heavy)} on the ${file}-file`,
  }),
  'now-en-prise': ({ man, side, loses }) => ({
    head: `${capital(theMan(man))} can be taken now`,
    body: `${name(opponent(side))} gains ${worth(loses)} there`,
  }),
  'en-prise-no-more': ({ man, side, loses }) => ({
    head: `${capital(theMan(man))} can be taken no longer`,
    body: `before, ${name(opponent(side))} gained ${worth(loses)} there`,
  }),
  'flight-gained': ({ side, flights }) => ({
    head: `${possessive(side)} king has ${flights.length === 1 ? 'a flight square' : 'flight squares'} now`,
    body: `${listed(flights)}; it had none`,
  }),
  'flight-lost': ({ side, flights }) => ({
    head: `${possessive(side)} king has no flight square any more`,
    body: `it had ${listed(flights)}`,
  }),
  'problem-bishop-made': ({ side, square }) => ({
    head: `The bishop on ${square} is ${possessive(side)} problem piece now`,
  }),
  'problem-bishop-gone': ({ side, square, traded }) => ({
    head: traded
      ? `${possessive(side)} problem piece, the bishop on ${square}, is off the board`
      : `The bishop on ${square} is ${possessive(side)} problem piece no longer`,
  }),
  'pawn-trait-made': ({ trait, squares }) => ({ head: `${pawns(squares)} ${trait} now` }),
  'pawn-trait-gone': ({ trait, squares }) => ({ head: `${pawns(squares)} ${trait} no longer` }),
  'bishop-pair-won': ({ side }) => ({ head: `${name(side)} alone has both bishops now` }),
  'bishop-pair-given': ({ side }) => ({ head: `${name(side)} alone has both bishops no longer` }),
  'structure-changed': ({ name: { a, b } }) => ({
    head: b === null ? `The structure has no name of its own now` : `The structure is ${b} now`,
    body: a === null ? undefined : `it was ${a}`,
  }),
};

function lastGuard({ side, square, before, on, user, gone, pair }: LastGuard): Phrase {
  const off =
    gone.length === 0
      ? ''
      : pair
        ? `With the ${pair.colour ? `${pair.colour}-squared ` : ''}${pair.kind}s gone, `
        : `With ${theMen(gone)} gone, `;
  const what = on ? `the ${on.side} ${on.kind} on ${square}` : square;
  // An enemy man is attacked, all else is guarded.
  const noun = on ? (on.side === side ? 'guard' : 'attacker') : `${side} guard`;
  const guards = before === 1 ? `its last ${noun}` : `its ${inWords(before)} ${noun}s`;
  const comes =
    user === null || user.moves === 0
      ? ''
      : `, and ${theMan({ kind: user.kind, square: user.from })} gets there in ${counted(user.moves, 'move')}`;
  return { head: capital(`${off}${what} loses ${guards}${comes}`) };
}

function opened(status: FileStatus, side: Side | null): string {
  return side ? `half-open for ${name(side)}` : status;
}

/** A count that stands alone. */
function few(count: number): string {
  return count === 0 ? 'none' : inWords(count);
}

function pawns(squares: LastGuard['squares']): string {
  return squares.length === 1 ? `The pawn on ${squares[0]} is` : `The pawns on ${listed(squares)} are`;
}

function worth(count: number): string {
  return `${counted(count, 'pawn')}’${count === 1 ? 's' : ''} worth`;
}

/** The fact in words. */
export function differenceText(fact: DifferenceFact): string {
  const phrase = PHRASES[fact.id] as (fact: DifferenceFact) => Phrase;
  return phraseText(phrase(fact));
}
