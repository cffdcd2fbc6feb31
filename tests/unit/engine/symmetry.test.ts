/** Turning colours and board turns the reading, and nothing else. */
import { describe, expect, it } from 'vitest';
import { type Reading, readPosition } from '@/engine';
import { mirrored, squareName, squareNamed } from '@/engine/board';
import { filesMirrored, flipped, positionOf } from '../../support/random';
import { realPositions } from '../../support/real-positions';

/** Each value with squares turned, sides swapped, and lists of squares in a fixed order, so that order does not count. */
function turned(value: unknown, square: (name: string) => string, swaps: boolean): unknown {
  if (typeof value === 'string') {
    if (squareNamed(value) !== undefined) return square(value);
    if (swaps && value === 'white') return 'black';
    if (swaps && value === 'black') return 'white';
    // The board turned over its middle changes the colour of every square.
    if (swaps && value === 'light') return 'dark';
    if (swaps && value === 'dark') return 'light';
    return value;
  }
  if (Array.isArray(value)) {
    return value
      .map((each) => turned(each, square, swaps))
      .sort((a, b) => (JSON.stringify(a) < JSON.stringify(b) ? -1 : 1));
  }
  if (value === null || typeof value !== 'object') return value;
  return Object.fromEntries(
    Object.entries(value)
      .map(([key, each]): [string, unknown] => {
        const name = swaps ? (SWAPPED[key] ?? key) : key;
        return [name, turned(each, square, swaps)];
      })
      .sort(([a], [b]) => (a < b ? -1 : 1)),
  );
}

const SWAPPED: Readonly<Record<string, string>> = {
  white: 'black',
  black: 'white',
  onLight: 'onDark',
  onDark: 'onLight',
};

function sorted(value: unknown): unknown {
  return turned(value, (name) => name, false);
}

const upsideDown = (name: string): string => {
  const square = squareNamed(name);
  return square === undefined ? name : squareName(mirrored(square));
};

/** What must turn with the colours: everything but the names of the position itself. */
function core({
  fen: _fen,
  engine: _engine,
  warnings: _warnings,
  mode: _mode,
  lead: _lead,
  statements,
  diagonals,
  ...rest
}: Reading) {
  return {
    ...rest,
    diagonals: diagonals.map(({ direction: _direction, ...diagonal }) => diagonal),
    statements: statements.map(({ id, side, weight }) => ({ id, side, weight })),
  };
}

const TURNED_WORDS: Readonly<Record<string, string>> = {
  White: 'Black',
  Black: 'White',
  white: 'black',
  black: 'white',
  light: 'dark',
  dark: 'light',
};

/** A text with sides and squares turned. */
function turnedText(text: string): string {
  return text
    .replace(/[a-h][1-8]/g, upsideDown)
    .replace(/\b(White|Black|white|black|light|dark)\b/g, (word) => TURNED_WORDS[word] ?? word);
}

describe('colours turned', () => {
  it('every part of the reading turns, on 400 positions of real games', () => {
    for (const fen of realPositions(400)) {
      const position = positionOf(fen);
      const straight = core(readPosition(position));
      const other = core(readPosition(flipped(position)));
      expect(sorted(other), fen).toEqual(turned(straight, upsideDown, true));
    }
  });

  it('every sentence turns and is otherwise the same, on 1,500 positions of real games', () => {
    for (const fen of realPositions(1500)) {
      const position = positionOf(fen);
      const straight = readPosition(position);
      const other = readPosition(flipped(position));
      expect(
        other.statements.map(({ text }) => text),
        fen,
      ).toEqual(straight.statements.map(({ text }) => turnedText(text)));
    }
  });
});

describe('files mirrored', () => {
  const mirror = (name: string): string => {
    const square = squareNamed(name);
    return square === undefined ? name : squareName((square ^ 7) as typeof square);
  };

  it('squares, men, weak squares and outposts mirror where castling plays no part', () => {
    for (const fen of realPositions(400)) {
      const position = {
        ...positionOf(fen),
        castling: { whiteKing: false, whiteQueen: false, blackKing: false, blackQueen: false },
      };
      const pick = ({ squares, men, weakSquares, outposts, kings, totals }: Reading) => ({
        // A square's colour changes with the file; the soonest of two equal pawns is named by its place.
        squares,
        men,
        weakSquares: weakSquares.map(({ complex: _complex, ...weak }) => weak),
        outposts: outposts.map(({ challenge, support, ...post }) => ({
          ...post,
          challenge: challenge?.moves ?? null,
          support: support?.moves ?? null,
        })),
        kings: {
          white: kings.white && {
            ...kings.white,
            shelter: kings.white.shelter.length,
            openBeside: kings.white.openBeside.length,
          },
          black: kings.black && {
            ...kings.black,
            shelter: kings.black.shelter.length,
            openBeside: kings.black.openBeside.length,
          },
        },
        totals,
      });
      const straight = pick(readPosition(position));
      const other = pick(readPosition(filesMirrored(position)));
      expect(sorted(other), fen).toEqual(turned(straight, mirror, false));
    }
  });
});
