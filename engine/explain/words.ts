/** Plain trade English from facts: numbers, lists, sides, men and squares. */
import type { Kind, Side, SquareName } from '../types';

const NUMBERS = [
  'no',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
];

/** A count in words up to twelve, in figures beyond. */
export function inWords(count: number): string {
  return NUMBERS[count] ?? String(count);
}

/** A count with its noun: 'one move', 'two moves'. */
export function counted(count: number, noun: string, plural = `${noun}s`): string {
  return `${inWords(count)} ${count === 1 ? noun : plural}`;
}

/** A share of the pawns with its verb: 'five of eight pawns stand', 'one of three pawns stands', 'all seven pawns stand'. */
export function pawnsStand(count: number, total: number): string {
  if (count === total && count > 1) return `all ${inWords(total)} pawns stand`;
  return `${inWords(count)} of ${counted(total, 'pawn')} ${count === 1 ? 'stands' : 'stand'}`;
}

/** A text at the beginning of a sentence; a square's name stays as it is. */
export function capital(text: string): string {
  const second = text.charCodeAt(1);
  const isSquare = second >= 49 && second <= 56;
  return isSquare ? text : text.charAt(0).toUpperCase() + text.slice(1);
}

/** 'a', 'a and b', 'a, b and c'. */
export function listed(items: readonly string[], word = 'and'): string {
  const last = items.length - 1;
  if (last < 1) return items[0] ?? '';
  let text = items[0] as string;
  for (let index = 1; index < last; index++) text += `, ${items[index]}`;
  return `${text} ${word} ${items[last]}`;
}

/** 'White' or 'Black'. */
export function name(side: Side): string {
  return side === 'white' ? 'White' : 'Black';
}

/** 'White’s' or 'Black’s'. */
export function possessive(side: Side): string {
  return `${name(side)}’s`;
}

/** The other side's name. */
export function enemyName(side: Side): string {
  return side === 'white' ? 'Black' : 'White';
}

/** The other side as an adjective: 'black' for White. */
export function enemyOf(side: Side): Side {
  return side === 'white' ? 'black' : 'white';
}

/** A man where it stands, as a fact holds it. */
export interface ManAt {
  readonly kind: Kind;
  readonly square: SquareName;
}

/** 'the knight on d6'. */
export function theMan({ kind, square }: ManAt): string {
  return `the ${kind} on ${square}`;
}

/** 'the knight on d6 and the pawns on e5 and f4': men of a list, like kinds together, in the order given. */
export function theMen(men: readonly ManAt[]): string {
  const [first] = men;
  if (men.length === 1 && first) return theMan(first);
  const kinds: Kind[] = [];
  for (const { kind } of men) if (!kinds.includes(kind)) kinds.push(kind);
  return listed(kinds.map((kind) => kindOnSquares(kind, men)));
}

/** 'the pawns on e5 and f4': the men of one kind. */
function kindOnSquares(kind: Kind, men: readonly ManAt[]): string {
  const squares: SquareName[] = [];
  for (const man of men) if (man.kind === kind) squares.push(man.square);
  return squares.length === 1 ? `the ${kind} on ${squares[0]}` : `the ${kind}s on ${listed(squares)}`;
}

/** A square as its side sees it, for orders that hold when the board is turned: file first, then relative rank. */
function viewOrder(square: SquareName, side: Side): number {
  const rank = square.charCodeAt(1) - 48;
  return square.charCodeAt(0) * 10 + (side === 'white' ? rank : 9 - rank);
}

/** Which of two squares comes first in a side's view: see `viewOrder`. */
export function compareInView(a: SquareName, b: SquareName, side: Side): number {
  return viewOrder(a, side) - viewOrder(b, side);
}

/** Squares by file, then by rank as the side counts it: the same list when colours and board are turned. */
export function inView(squares: readonly SquareName[], side: Side): SquareName[] {
  const sorted = squares.slice();
  if (sorted.length > 1) sorted.sort((a, b) => viewOrder(a, side) - viewOrder(b, side));
  return sorted;
}

/** 'c-file', 'c- and e-file', 'files c, e and g'. */
export function filesNamed(files: readonly string[]): string {
  if (files.length === 1) return `${files[0]}-file`;
  if (files.length === 2) return `${files[0]}- and ${files[1]}-files`;
  return `files ${listed(files)}`;
}

/** Files at the beginning of a sentence: 'The c-file', 'The c- and e-files', 'Files c, e and g'. */
export function theFiles(files: readonly string[]): string {
  return files.length > 2 ? capital(filesNamed(files)) : `The ${filesNamed(files)}`;
}

/** A man that can come, as a fact holds it. */
export interface Comer extends ManAt {
  readonly moves: number;
}

/** Of so many men of several kinds each is named; more are counted. */
const NAMED_MOST = 3;

/**
 * Who gets there, in a sentence of its own without full stop: 'The white knight on c4 gets there in one move', 'Both
 * black knights get there in two moves'. Only the soonest are named, where they are few; men that stand there already
 * are left out.
 */
export function comersSentence(comers: readonly Comer[], side: Side, knights: number): string | null {
  const coming = comers.filter(({ moves }) => moves > 0);
  const [first] = coming;
  if (!first) return null;
  const soonest = coming.filter(({ moves }) => moves === first.moves);
  const within = `in ${counted(first.moves, 'move')}`;
  if (soonest.length === 1) return `The ${side} ${first.kind} on ${first.square} gets there ${within}`;
  const squares = soonest.map(({ square }) => square);
  if (soonest.length === 2 && soonest.every(({ kind }) => kind === 'knight') && knights === 2) {
    return `Both ${side} knights get there ${within}`;
  }
  const kinds = new Set(soonest.map(({ kind }) => kind));
  if (kinds.size === 1) return `The ${side} ${first.kind}s on ${listed(squares)} get there ${within}`;
  const men = `${capital(inWords(soonest.length))} ${side} men get there ${within}`;
  return soonest.length > NAMED_MOST ? men : `${men}: ${theMen(soonest)}`;
}
