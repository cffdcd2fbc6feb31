/** Trade English once more, for sentences that are written from the board and compared with what the reading says. */
import { type Kind, nameOf, other, rankFor, type Scene, type Side } from './scene';

const WORDS = 'no one two three four five six seven eight nine ten eleven twelve'.split(' ');

export const num = (count: number): string => WORDS[count] ?? String(count);
export const many = (count: number, noun: string): string => `${num(count)} ${noun}${count === 1 ? '' : 's'}`;
export const list = (items: readonly string[], word = 'and'): string =>
  items.length < 2 ? items.join('') : `${items.slice(0, -1).join(', ')} ${word} ${items.at(-1) ?? ''}`;
export const named = (side: Side): string => (side === 'white' ? 'White' : 'Black');
export const enemyNamed = (side: Side): string => named(other(side));
/** Upper case for a word, never for a square's name. */
export const start = (text: string): string =>
  /^[a-h][1-8]/.test(text) ? text : text.charAt(0).toUpperCase() + text.slice(1);
/** 's' after one: 'stands', 'stand'. */
export const verb = (count: number, plural: string): string => (count === 1 ? `${plural}s` : plural);
export const files = (letters: readonly string[]): string =>
  letters.length === 1
    ? `${letters[0]}-file`
    : letters.length === 2
      ? `${letters[0]}- and ${letters[1]}-files`
      : `files ${list(letters)}`;
export const sentences = (...parts: readonly (string | null)[]): string =>
  parts
    .filter((part) => part !== null && part !== '')
    .map((part) => `${part}.`)
    .join(' ');

/** A man as facts name it. */
export interface ManAt {
  readonly kind: Kind;
  readonly square: string;
}

export function man(scene: Scene, square: number): ManAt {
  return { kind: scene.kindOn(square) ?? 'pawn', square: nameOf(square) };
}

export const manOrNull = (scene: Scene, square: number): ManAt | null =>
  square < 0 || scene.letter(square) === '' ? null : man(scene, square);

export const the = ({ kind, square }: ManAt): string => `the ${kind} on ${square}`;

/** 'the queen on d1 and the rooks on a1 and f1': in the order given, like kinds together. */
export function theAll(men: readonly ManAt[]): string {
  const kinds = men.map(({ kind }) => kind).filter((kind, index, all) => all.indexOf(kind) === index);
  return list(
    kinds.map((kind) => {
      const on = men.filter((one) => one.kind === kind).map(({ square }) => square);
      return on.length === 1 ? `the ${kind} on ${on[0]}` : `the ${kind}s on ${list(on)}`;
    }),
  );
}

/** Squares by file, then by rank as the side counts it. */
export function inOrder(squares: readonly number[], side: Side): number[] {
  return [...squares].sort((a, b) => (a % 8) - (b % 8) || rankFor(side, a) - rankFor(side, b));
}

export const names = (squares: readonly number[], side: Side): string[] => inOrder(squares, side).map(nameOf);

/** 'five of eight pawns stand', 'all seven pawns stand'. */
export const share = (count: number, total: number): string =>
  count === total && count > 1
    ? `all ${num(total)} pawns stand`
    : `${num(count)} of ${many(total, 'pawn')} ${verb(count, 'stand')}`;
