/** Games and SAN through the one door. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatFen } from '@/engine/board';
import { legalMoves } from '@/engine/rules';
import { fromSan, PGN_LENGTH_MAX, replayPgn, toSan } from '@/engine/rules/notation';
import { NAMED } from '../../../support/positions';
import { playedPositions, strictPositionOf } from '../../../support/random';

function replayed(text: string): { sans: string; last: string } | string {
  const game = replayPgn(text);
  if (!game.ok) return game.fault.message;
  return { sans: game.value.sans.join(' '), last: formatFen(game.value.positions.at(-1) ?? game.value.start) };
}

const OPEN_GAME = {
  sans: 'e4 e5 Nf3',
  last: 'rnbqkbnr/pppp1ppp/8/4p3/4P3/5N2/PPPP1PPP/RNBQKB1R b KQkq - 1 2',
};

describe('the main line of the first game', () => {
  it.each([
    ['1. e4 e5 2. Nf3 *', 'plain'],
    ['1.e4 e5 2.Nf3', 'no spaces, no result'],
    ['e4 e5 Nf3', 'no numbers'],
    ['1. e4 1... e5 2. Nf3', 'numbers before black moves'],
    ['1. e4! $1 e5?! 2. Nf3!!', 'glyphs'],
    ['1. e4 {a {comment} e5 (1... c5 2. Nf3 (2. c3) d6) 2. Nf3', 'comments and variations in variations'],
    ['1. e4 {with ) and 1-0 inside} e5 ; to the end of the line 1-0\n2. Nf3', 'signs within comments'],
    ['1. e4 e5\n% escaped 2. d4\n2. Nf3', 'an escaped line'],
    ['1. e2e4 e7e5 2. g1f3', 'squares alone'],
    ['\uFEFF[Event "a ] { \\" b"]\r\n\r\n1. e4\r\ne5 2. Nf3\r\n', 'byte-order mark, CRLF, signs within a tag'],
    ['[Event "a"]\n\n1. e4 e5 2. Nf3 1-0\n\n[Event "b"]\n\n1. d4 *', 'a second game after it'],
    ['[Event "a"]\n\n1. e4 e5 2. Nf3\n\n[Event "b"]\n\n1. d4 *', 'a second game, and no result'],
    ['1. e4 e5 2. Nf3 1/2-1/2 1. d4', 'a second game without tags'],
  ])('%j (%s)', (text) => {
    expect(replayed(text)).toEqual(OPEN_GAME);
  });

  it('the sample game of the standard (PGN specification of 1994, section 2.3), moves only', () => {
    const text = `1. e4 e5 2. Nf3 Nc6 3. Bb5 a6 4. Ba4 Nf6 5. O-O Be7 6. Re1 b5 7. Bb3 d6 8. c3
      O-O 9. h3 Nb8 10. d4 Nbd7 11. c4 c6 12. cxb5 axb5 13. Nc3 Bb7 14. Bg5 b4 15.
      Nb1 h6 16. Bh4 c5 17. dxe5 Nxe4 18. Bxe7 Qxe7 19. exd6 Qf6 20. Nbd2 Nxd6 21.
      Nc4 Nxc4 22. Bxc4 Nb6 23. Ne5 Rae8 24. Bxf7+ Rxf7 25. Nxf7 Rxe1+ 26. Qxe1 Kxf7
      27. Qe3 Qg5 28. Qxg5 hxg5 29. b3 Ke6 30. a3 Kd6 31. axb4 cxb4 32. Ra5 Nd5 33.
      f3 Bc8 34. Kf2 Bf5 35. Ra7 g6 36. Ra6+ Kc5 37. Ke1 Nf4 38. g3 Nxh3 39. Kd2 Kb5
      40. Rd6 Kc5 41. Ra6 Nf2 42. g4 Bd3 43. Re6 1/2-1/2`;
    const game = replayPgn(text);
    expect(game.ok && game.value.moves).toHaveLength(85);
    expect(game.ok && formatFen(game.value.positions.at(-1) ?? game.value.start)).toBe(
      '8/8/4R1p1/2k3p1/1p4P1/1P1b1P2/3K1n2/8 b - - 2 43',
    );
  });

  it('starts where its FEN tag says, and keeps the square passed over after every double step', () => {
    const game = replayPgn('[SetUp "1"]\n[FEN "4k3/8/8/8/8/8/4P3/4K3 w - - 5 39"]\n\n39. e4 *');
    expect(game.ok && formatFen(game.value.start)).toBe('4k3/8/8/8/8/8/4P3/4K3 w - - 5 39');
    expect(game.ok && game.value.positions.map(formatFen)).toEqual(['4k3/8/8/8/4P3/8/8/4K3 b - e3 0 39']);
  });

  it('may have no moves', () => {
    expect(replayed('[Event "a"]\n\n*')).toEqual({ sans: '', last: NAMED.start });
  });
});

describe('games that are refused', () => {
  it.each([
    ['', 'There is no game in an empty text.'],
    ['1. e4 e5 2. Ke3', '"Ke3" is no legal move for White at move 2.'],
    ['1. e4 Z0', '"Z0" is no legal move for Black at move 1.'],
    ['1. e4 -- 2. d4', '"--" is no legal move for Black at move 1.'],
    ['[FEN "4k3/8/8/8/8/8/8/8 w - - 0 1"]\n\n*', 'White has no king.'],
    ['hello world', '"hello" is no legal move for White at move 1.'],
    [
      'x'.repeat(PGN_LENGTH_MAX + 1),
      `The game has ${PGN_LENGTH_MAX + 1} characters; up to ${PGN_LENGTH_MAX} are read.`,
    ],
  ])('%j: %s', (text, message) => {
    expect(replayed(text)).toBe(message);
  });

  it('nothing makes it throw or hang', () => {
    const parts = fc.constantFrom(
      '1.',
      ' ',
      '\n',
      'e4',
      '{',
      '}',
      '(',
      ')',
      '[',
      ']',
      '"',
      '\\',
      ';',
      '%',
      '$',
      'Nf3',
      '*',
    );
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string(),
          fc.array(parts, { maxLength: 60 }).map((list) => list.join('')),
        ),
        (text) => {
          const game = replayPgn(text);
          if (game.ok) expect(game.value.positions).toHaveLength(game.value.moves.length);
          else expect(game.fault.message).toMatch(/\.$/);
        },
      ),
      { numRuns: 1500, seed: 9 },
    );
    for (const sign of ['[', '{', '(', '"', '1.', '$', '\\', '[a "', '%\n']) {
      const started = performance.now();
      replayPgn(sign.repeat(Math.floor(PGN_LENGTH_MAX / sign.length)));
      expect(performance.now() - started).toBeLessThan(5000);
    }
  });
});

describe('SAN', () => {
  it('names each legal move so that it is found again, in positions of random play', () => {
    fc.assert(
      fc.property(playedPositions, (position) => {
        for (const move of legalMoves(position).slice(0, 12)) {
          expect(fromSan(position, toSan(position, move))).toEqual({ ok: true, value: move });
        }
      }),
      { numRuns: 40, seed: 4 },
    );
  });

  it.each([
    ['castlingBothWays', '0-0', 'castle-king'],
    ['castlingBothWays', 'O-O-O', 'castle-queen'],
    ['start', 'e4', 'double-step'],
  ] as const)('%s: %s is %s', (name, text, special) => {
    const found = fromSan(strictPositionOf(NAMED[name]), text);
    expect(found.ok && found.value.special).toBe(special);
  });

  it('refuses what is no move', () => {
    const found = fromSan(strictPositionOf(NAMED.start), 'e5');
    expect(found).toEqual({
      ok: false,
      fault: { code: 'illegal-move', field: 'text', message: '"e5" is no legal move here.' },
    });
  });
});
