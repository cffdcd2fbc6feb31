/** The vocabulary of the engine: sides, kinds of men, squares, and records over them. */

/** The two sides, White first wherever an order is needed. */
export const SIDES = ['white', 'black'] as const;
export type Side = (typeof SIDES)[number];

/** The kinds of men, cheapest first. */
export const KINDS = ['pawn', 'knight', 'bishop', 'rook', 'queen', 'king'] as const;
export type Kind = (typeof KINDS)[number];

export const FILES = ['a', 'b', 'c', 'd', 'e', 'f', 'g', 'h'] as const;
export type FileName = (typeof FILES)[number];
export const RANKS = ['1', '2', '3', '4', '5', '6', '7', '8'] as const;
export type RankName = (typeof RANKS)[number];
export type SquareName = `${FileName}${RankName}`;

export type Colour = 'light' | 'dark';

declare const squareBrand: unique symbol;
/**
 * A square as a number: a1 = 0, b1 = 1 … h8 = 63. Branded, so that arithmetic gives a plain
 * number and a step off the board has to be asked for.
 */
export type Square = number & { readonly [squareBrand]: true };

export type BySide<T> = Readonly<Record<Side, T>>;
export type ByKind<T> = Readonly<Record<Kind, T>>;

/** A man: whose it is and what it is. */
export interface Man {
  readonly side: Side;
  readonly kind: Kind;
}

/**
 * Worth of the men in pawns: the trade's common table (common practice; so in Edward Lasker,
 * Chess Strategy, 1915, up to halves). The king is never given up, so it has no price: 0 here.
 */
export const WORTH: ByKind<number> = { pawn: 1, knight: 3, bishop: 3, rook: 5, queen: 9, king: 0 };

/** The other side. */
export function opponent(side: Side): Side {
  return side === 'white' ? 'black' : 'white';
}

/** One value for each side, made by a function of the side. */
export function bySide<T>(make: (side: Side) => T): BySide<T> {
  return { white: make('white'), black: make('black') };
}

/** The themes that statements speak of. */
export const THEMES = ['structure', 'squares', 'outposts', 'files', 'men', 'king', 'control'] as const;
export type Theme = (typeof THEMES)[number];
