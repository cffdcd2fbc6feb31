/** Rules of the trade about posts, routes and sentences (common practice). Positions of our own, from opening theory; each is asked for both colours. */
import { describe, expect, it } from 'vitest';
import { readPosition } from '@/engine';
import { mirrored, sq, squareName } from '@/engine/board';
import { encodeRoutes } from '@/engine/reading/encode-routes';
import { routes, type RoutesOptions } from '@/engine/routes';
import type { SquareName } from '@/engine/types';
import { flipped, positionOf } from '../support/random';

/** The posts of one man, best first, and the same for the position with colours exchanged, turned back. */
function postsOf(fen: string, from: SquareName, options: RoutesOptions = {}): string[] {
  const position = positionOf(fen);
  const posts = routes(position, { ...options, from: sq(from), choicesMax: 60 }).choices.map(({ post }) => post);
  const over = routes(flipped(position), { ...options, from: mirrored(sq(from)), choicesMax: 60 }).choices;
  expect(over.map(({ post }) => mirrored(post))).toEqual(posts);
  return posts.map(squareName);
}

const said = (fen: string, id: string) => readPosition(positionOf(fen)).statements.filter((each) => each.id === id);

describe('a half-open file opposite a target has the rook’s best post', () => {
  it.each([
    [
      'the backward d6 of the Boleslavsky hole',
      'r4rk1/1p3ppp/p1np1n2/4p3/4P3/1NN2P2/PPP3PP/R4RK1 w - - 0 14',
      'a1',
      'd',
    ],
    ['the isolated queen’s pawn on d4', '2r2rk1/pp2bppp/2n1pn2/8/3P4/P1N2N2/1P2BPPP/R4RK1 b - - 0 15', 'f8', 'd'],
    ['the isolated queen’s pawn on d5', '2r1r1k1/pp3ppp/2n2n2/3p4/8/2N1PN2/PP3PPP/R4RK1 w - - 0 15', 'a1', 'd'],
  ] as const)('%s', (_, fen, from, file) => {
    expect(postsOf(fen, from, { movesMax: 2 })[0]).toMatch(new RegExp(`^${file}`));
  });
});

describe('a knight on a supported post that no pawn can challenge', () => {
  it('e5 against a stonewall ranks above every square at home', () => {
    const posts = postsOf('r4rk1/pp4pp/2n1p3/3p1p2/3P4/2P1PN2/PP4PP/R4RK1 w - - 0 15', 'f3');
    expect(posts[0]).toBe('e5');
    for (const home of ['e1', 'd2', 'h4']) expect(posts.indexOf(home)).toBeGreaterThan(0);
  });

  it('d5 behind c4 and e4 is worth more than the same knight on the first two ranks', () => {
    const position = positionOf('r4rk1/1p3ppp/p2p4/2p1p3/2P1P3/2N5/PP3PPP/R4RK1 w - - 0 1');
    const { choices } = routes(position, { from: sq('c3'), choicesMax: 60 });
    const gain = (post: SquareName) => choices.find((choice) => choice.post === sq(post))?.gain ?? -Infinity;
    const home = choices.filter(({ post }) => post < 16);
    expect(home.length).toBeGreaterThan(0);
    for (const { post } of home) expect(gain('d5')).toBeGreaterThan(gain(squareName(post)));
  });
});

describe('a pawn move beside the castled king', () => {
  /** The knight needs four moves to g4, by d2, f1 and e3; after h2-h3 it goes by h2. */
  const FEN = '6k1/1p3pp1/p2p3p/2p1p3/2P1P3/PP3N2/5PPP/6K1 w - - 0 25';

  it('that opens a square for the knight’s route is a preparation of it', () => {
    const position = positionOf(FEN);
    const { choices } = encodeRoutes(position, routes(position, { from: sq('f3'), choicesMax: 60 }));
    const g4 = choices.find(({ post }) => post === 'g4');
    expect(g4).toMatchObject({ moves: 4, needs: null });
    // One pawn move and two of the knight: three in all.
    expect(g4?.preparations).toContainEqual({ move: 'h3', moves: 3 });
    expect(choices.find(({ post }) => post === 'h2')?.preparations).toContainEqual({ move: 'h4', moves: 2 });
  });
});

describe('a king without a flight square', () => {
  /** Own men stand on all squares beside the king but h1. */
  const SHUT = '3r2k1/5pp1/7p/8/8/8/5PPP/5RK1 w - - 0 30';

  it('is named, and the side pawn’s move that gives it one', () => {
    const [statement] = said(SHUT, 'no-luft').filter(({ side }) => side === 'white');
    expect(statement?.facts).toMatchObject({ king: 'g1', noFlight: false });
    expect(statement?.text).toContain('h2-h3');
  });

  it('without any step at all it has no flight square', () => {
    const [shut] = said('3r2k1/5pp1/7p/8/8/8/5PPP/5RKR w - - 0 30', 'no-luft').filter(({ side }) => side === 'white');
    expect(shut?.facts).toMatchObject({ king: 'g1', noFlight: true });
    expect(shut?.text).toMatch(/^The king on g1 has no flight square: .*h2-h3.* gives it the first\.$/);
  });

  it('is not named once the side pawn has moved', () => {
    expect(said('3r2k1/5pp1/7p/8/8/7P/5PP1/5RK1 w - - 0 30', 'no-luft')).toEqual([]);
  });
});

describe('a knight without pawn support on a half-open file', () => {
  const row = (d3: string, seventh = 'pp1p1p1p') => `r2q2k1/${seventh}/5np1/3n4/8/${d3}/PP3PPP/3R2K1 w - - 0 20`;

  it('against doubled rooks is a target, for either colour', () => {
    const [statement] = said(row('3R4'), 'file-man-target');
    expect(statement?.text).toBe(
      'The knight on d5 is a target on the d-file: no pawn guards it, and the rooks on d1 and d3 stand against it.',
    );
    expect(statement).toMatchObject({ side: 'white', theme: 'files', squares: ['d5', 'd1', 'd3'] });
    const over = readPosition(flipped(positionOf(row('3R4')))).statements.find(({ id }) => id === 'file-man-target');
    expect(over).toMatchObject({ side: 'black', squares: ['d4', 'd8', 'd6'] });
  });

  it.each([
    ['a single rook', row('8')],
    ['a pawn that guards it', row('3R4').replace('5np1', '4pnp1')],
    ['an own pawn before the rooks', row('3R4').replace('/8/3R4', '/3P4/3R4')],
  ])('not with %s', (_, fen) => {
    expect(said(fen, 'file-man-target')).toEqual([]);
  });
});
