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
import { opponent } from '../types';
import type { DifferenceFact, LastGuard } from './facts';

const COMMAND = { white: 'White’s', black: 'Black’s', open: 'open to both', disputed: 'disputed' } as const;
const STATUS = { open: 'open', 'half-open': 'half-open', closed: 'closed' } as const;

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
  'file-opened': ({ file, status }) => ({
    head: `The ${file}-file is ${STATUS[status.b]}; it was ${STATUS[status.a]}`,
  }),
  'file-taken': ({ file, side, good }) => ({
    head: good ? `${name(side)} controls the ${file}-file now` : `${name(side)} controls the ${file}-file no longer`,
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

function lastGuard({ side, square, before, user, gone }: LastGuard): Phrase {
  const first = gone[0];
  const twins = gone.length === 2 && first !== undefined && gone.every(({ kind }) => kind === first.kind);
  const off = twins
    ? `With the ${first.kind}s gone, `
    : gone.length > 0 && gone.length <= 2
      ? `With ${theMen(gone)} gone, `
      : '';
  const guards = before === 1 ? `its last ${side} guard` : `its ${inWords(before)} ${side} guards`;
  const comes = user
    ? user.moves === 0
      ? `, and ${theMan({ kind: user.kind, square: user.from })} stands there`
      : `, and ${theMan({ kind: user.kind, square: user.from })} gets there in ${counted(user.moves, 'move')}`
    : '';
  const text = `${off}${square} loses ${guards}${comes}`;
  return { head: capital(text) };
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
