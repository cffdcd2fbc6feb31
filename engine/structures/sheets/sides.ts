/** A sheet's lines as squares and men, for the colours as written or exchanged. */
import { mirrored, squareName, squareNamed } from '../../board';
import { type BySide, type Colour, type Kind, KINDS, type Square } from '../../types';
import type { SheetLines, StructureSheet } from './sheet';

/** A man's usual place. */
export interface SheetPost {
  readonly kind: Kind;
  readonly square: Square;
}

/** A pawn on `on` attacks the enemy pawn on `against`. */
export interface SheetLever {
  readonly on: Square;
  readonly against: Square;
}

/** A kind of man; a bishop of one colour of squares where `colour` is given. */
export interface TradeMan {
  readonly kind: Kind;
  readonly colour: Colour | null;
}

export interface SheetTrade {
  readonly own: TradeMan;
  readonly enemy: TradeMan;
}

/** What the sheet says of one side. */
export interface SheetSide {
  readonly keys: readonly Square[];
  readonly posts: readonly SheetPost[];
  readonly levers: readonly SheetLever[];
  readonly wanted: readonly SheetTrade[];
  readonly unwanted: readonly SheetTrade[];
  readonly plan: string;
}

/** Both sides of a sheet; `reversed`: with colours exchanged. Throws on a misspelt line. */
export function sheetSides({ white, black }: StructureSheet, reversed: boolean): BySide<SheetSide> {
  return reversed
    ? { white: sideOf(black, true), black: sideOf(white, true) }
    : { white: sideOf(white, false), black: sideOf(black, false) };
}

function sideOf(lines: SheetLines, reversed: boolean): SheetSide {
  const place = (name: string): Square => {
    const square = squareNamed(name);
    if (square === undefined) throw new Error(`not a square on a structure sheet: ${name}`);
    return reversed ? mirrored(square) : square;
  };
  const trade = (text: string): SheetTrade => {
    const [own = '', enemy = ''] = text.split('-');
    return { own: tradeMan(own, reversed), enemy: tradeMan(enemy, reversed) };
  };
  return {
    keys: wordsOf(lines.keys).map(place),
    posts: lines.posts.split('; ').flatMap((group) => {
      const [letter = '', ...squares] = wordsOf(group);
      return squares.map((name) => ({ kind: kindOf(letter), square: place(name) }));
    }),
    levers: wordsOf(lines.levers).map((text) => ({ on: place(text.slice(0, 2)), against: place(text.slice(3)) })),
    wanted: wordsOf(lines.wanted).map(trade),
    unwanted: wordsOf(lines.unwanted).map(trade),
    plan: lines.plan.replace(/\{(\w+)\}/g, (_, name: string) => squareName(place(name))),
  };
}

function wordsOf(text: string): string[] {
  return text.split(' ').filter((word) => word !== '');
}

const LETTERS = ['P', 'N', 'B', 'R', 'Q', 'K'];

function kindOf(letter: string): Kind {
  const kind = KINDS[LETTERS.indexOf(letter)];
  if (kind === undefined) throw new Error(`not a man on a structure sheet: ${letter}`);
  return kind;
}

/** Turning the board over changes the colour of every square. */
function tradeMan(text: string, reversed: boolean): TradeMan {
  const shade = text.charAt(1);
  const colour = shade === '' ? null : (shade === 'l') !== reversed ? 'light' : 'dark';
  return { kind: kindOf(text.charAt(0)), colour };
}
