/** Rules of the trade about posts, routes and preparations (common practice). Positions of our own. */
import { describe, expect, it } from 'vitest';
import { type Position, sq, squareName } from '@/engine/board';
import { mirrored } from '@/engine/board';
import { encodeRoutes } from '@/engine/reading/encode-routes';
import { type RouteValue, routes, type RoutesOptions } from '@/engine/routes';
import { flipped, positionOf } from '../../../support/random';
import { realPositions } from '../../../support/real-positions';

const postsOf = (fen: string, options: RoutesOptions) =>
  routes(positionOf(fen), options).choices.map(({ post }) => squareName(post));

describe('rules of the trade', () => {
  it('a rook belongs on the half-open file opposite a backward pawn', () => {
    // Carlsbad after the minority attack: c6 backward on the half-open c-file.
    const [best] = postsOf('r4rk1/1p3ppp/2p2n2/3p4/3P4/4PN2/5PPP/R4RK1 w - - 0 1', { from: sq('f1'), movesMax: 2 });
    expect(best).toMatch(/^[bc]/);
    const posts = postsOf('r4rk1/5ppp/2p2n2/3p4/3P4/4PN2/5PPP/3R2K1 w - - 0 1', { from: sq('d1'), movesMax: 2 });
    expect(posts[0]).toMatch(/^c/);
  });

  it('a knight on a supported post in the enemy half ranks above the same knight at home', () => {
    const { choices } = routes(positionOf('r4rk1/1p3ppp/p2p4/2p1p3/2P1P3/2N5/PP3PPP/R4RK1 w - - 0 1'), {
      from: sq('c3'),
    });
    const post = choices.find((choice) => choice.post === sq('d5'));
    const home = choices.find((choice) => choice.post === sq('b1'));
    expect(post?.gain).toBeGreaterThan(0);
    expect(post?.gain).toBeGreaterThan(home?.gain ?? 0);
    expect(choices[0]?.post).toBe(sq('d5'));
    expect(post?.parts.outpost).toEqual({ now: 0, there: 1 });
  });

  it('a pawn move beside the castled king that opens a square for the knight is a preparation of its route', () => {
    // Every way out of f3 but h2 is hit by a pawn or taken; from h2 the knight gets to g4.
    const fen = '6k1/5pp1/1p1p4/2p1p2p/2PpP3/1P1P1N1P/5PP1/6K1 w - - 0 1';
    const plain = routes(positionOf(fen), { from: sq('f3'), choicesMax: 60 });
    const answer = encodeRoutes(positionOf(fen), plain);
    const prepared = answer.choices.flatMap(({ preparations }) => preparations.map(({ move }) => move));
    expect(prepared.some((move) => /^[fgh][34]$/.test(move))).toBe(true);
    for (const { needs, preparations, moves } of answer.choices) {
      for (const each of preparations) expect(each.moves).toBeGreaterThan(1);
      if (needs !== null) expect(preparations).toEqual([{ move: needs, moves: moves + 1 }]);
    }
  });

  it('a man that guards another leaves a drop behind', () => {
    const { choices } = routes(positionOf('4k3/8/8/3r4/8/3N4/5B2/4K3 w - - 0 1'), { from: sq('f2'), choicesMax: 40 });
    expect(choices.every(({ drops }) => drops.every(({ loses }) => loses > 0))).toBe(true);
    const guarding = routes(positionOf('4k3/8/8/8/3r4/3N4/8/3RK3 w - - 0 1'), { from: sq('d1'), choicesMax: 40 });
    const off = guarding.choices.find(({ post }) => post === sq('a1'));
    expect(off?.drops).toEqual([{ square: sq('d3'), loses: 3 }]);
    expect(off?.guard).toMatchObject({ verdict: 'loses', loses: 3 });
    const stays = guarding.choices.find(({ post }) => post === sq('d2'));
    expect(stays?.drops).toEqual([]);
  });

  it('the enemy’s soonest challenge is named', () => {
    const { choices } = routes(positionOf('4k3/2p5/8/8/8/2N5/8/4K3 w - - 0 1'), { from: sq('c3') });
    expect(choices.find(({ post }) => post === sq('d5'))?.challenge).toEqual({ by: sq('c7'), kind: 'pawn', moves: 1 });
    expect(choices.find(({ post }) => post === sq('e4'))?.challenge).toBeNull();
  });

  it('a side in check has only answers to it', () => {
    const { choices } = routes(positionOf('4k3/4r3/8/8/8/2N5/8/4K2R w - - 0 1'), { choicesMax: 60 });
    expect(choices.length).toBeGreaterThan(0);
    expect(new Set(choices.map(({ post }) => squareName(post)))).toEqual(new Set(['e2']));
  });
});

describe('mirrors', () => {
  it('turning colours and board turns the routes and nothing else, on 10 positions of real games', () => {
    for (const fen of realPositions(10)) {
      const position = positionOf(fen);
      expect(turned(routes(flipped(position)).choices)).toEqual(plain(routes(position).choices));
    }
  }, 60_000);
});

const rounded = (gain: number) => Math.round(gain * 1e6) / 1e6 + 0;

function plain(choices: readonly RouteValue[]) {
  return choices.map(({ man, stops, gain, shortest, parts, needs }) => ({
    man,
    stops,
    gain: rounded(gain),
    shortest,
    parts,
    needs: needs && [needs.from, needs.to],
  }));
}

function turned(choices: readonly RouteValue[]) {
  return plain(choices).map(({ man, stops, needs, ...rest }) => ({
    man: mirrored(man),
    stops: stops.map(mirrored),
    ...rest,
    needs: needs?.map(mirrored) ?? null,
  }));
}

describe('answers', () => {
  it('are empty for a square without a piece, and keep to their bounds', () => {
    const start: Position = positionOf('rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1');
    expect(routes(start, { from: sq('e2') }).choices).toEqual([]);
    expect(routes(start, { from: sq('e4') }).choices).toEqual([]);
    expect(routes(start, { choicesMax: 5 }).choices).toHaveLength(5);
    expect(
      routes(start, { side: 'black', movesMax: 1 }).choices.every(({ moves, needs }) => moves === 1 || needs),
    ).toBe(true);
    expect(routes(start, { from: sq('g8') }).side).toBe('black');
  });
});
