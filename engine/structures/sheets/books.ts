/** The handbooks behind the sheets. Authors, titles and years are from memory; no page was looked up. */

/** A book: year of its first edition, or of the first in English where that is the one meant. */
export interface Book {
  readonly author: string;
  readonly title: string;
  readonly year: number;
}

export const BOOKS = {
  lasker: { author: 'Edward Lasker', title: 'Chess Strategy', year: 1915 },
  nimzowitsch: { author: 'Aron Nimzowitsch', title: 'My System', year: 1925 },
  kmoch: { author: 'Hans Kmoch', title: 'Pawn Power in Chess', year: 1959 },
  pachman: { author: 'Luděk Pachman', title: 'Modern Chess Strategy', year: 1963 },
  euwe: { author: 'Max Euwe and Hans Kramer', title: 'The Middle Game', year: 1964 },
  soltis: { author: 'Andrew Soltis', title: 'Pawn Structure Chess', year: 1976 },
  suba: { author: 'Mihai Suba', title: 'Dynamic Chess Strategy', year: 1991 },
  watson: { author: 'John Watson', title: 'Secrets of Modern Chess Strategy', year: 1998 },
  baburin: { author: 'Alexander Baburin', title: 'Winning Pawn Structures', year: 1998 },
  openings: { author: 'John Watson', title: 'Mastering the Chess Openings', year: 2006 },
  flores: { author: 'Mauricio Flores Rios', title: 'Chess Structures', year: 2015 },
} as const satisfies Readonly<Record<string, Book>>;

export type BookName = keyof typeof BOOKS;
