/** PGN as it is found in files: odd writing forgiven, faults placed, files in pieces, writing and reading the same. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type PgnGame, type PgnMove, pgnGames, pgnStream, pgnText, replayGame, writePgn } from '@/engine/games';
import { REAL_GAMES_PGN } from '../../../support/real-games';

function one(text: string): PgnGame {
  const games = [...pgnGames(text)];
  expect(games).toHaveLength(1);
  return games[0]!;
}

/** SAN of the main line, as replayed. */
function sans(text: string): string[] {
  const replayed = replayGame(one(text));
  if (!replayed.ok) throw new Error(replayed.fault.message);
  return replayed.value.steps.map(({ san }) => san);
}

function faultOf(text: string): unknown {
  const replayed = replayGame([...pgnGames(text)][0]!);
  return replayed.ok ? null : replayed.fault;
}

describe('forgiven is', () => {
  it.each([
    ['a missing number', 'e4 e5 Nf3 *', 'e4 e5 Nf3'],
    ['a number without dot', '1 e4 e5 2 Nf3 *', 'e4 e5 Nf3'],
    ['a number that sticks to its move', '1.e4 e5 2.Nf3 2...Nc6 *', 'e4 e5 Nf3 Nc6'],
    ['a wrong number', '7. e4 e5 9... Nf3 *', 'e4 e5 Nf3'],
    ['zeros in castling', '1. Nf3 Nf6 2. g3 g6 3. Bg2 Bg7 4. 0-0 0-0 *', 'Nf3 Nf6 g3 g6 Bg2 Bg7 O-O O-O'],
    ['"e.p." as a word, stuck on and without dots', '1. e4 a6 2. e5 d5 3. exd6 e.p. *', 'e4 a6 e5 d5 exd6'],
    ['"e.p." stuck to its move', '1. e4 a6 2. e5 d5 3. exd6e.p. *', 'e4 a6 e5 d5 exd6'],
    ['a check sign too many and one too few', '1. e4+ f6 2. d4 g5 3. Qh5 *', 'e4 f6 d4 g5 Qh5#'],
    ['long moves', '1. e2-e4 e7-e5 2. Ng1-f3 Nb8xc6 *'.replace('Nb8xc6', 'Nb8-c6'), 'e4 e5 Nf3 Nc6'],
    ['squares alone', 'e2e4 e7e5 g1f3 b8c6 f1b5 g8f6 e1g1 *', 'e4 e5 Nf3 Nc6 Bb5 Nf6 O-O'],
    ['a promotion without sign', '[FEN "8/P6k/8/8/8/8/8/K7 w - - 0 1"]\n1. a8Q *', 'a8=Q'],
    ['glyphs as signs', '1. e4 ± e5 += 2. Nf3! +- Nc6?! *', 'e4 e5 Nf3 Nc6'],
    ['a draw as one half', '1. e4 1/2', 'e4'],
    ['stray bytes of old systems', '1. e\x004 e5\x1a\n*', 'e4 e5'],
    ['old line ends', '[Event "x"]\r\r1. e4\re5 *\r', 'e4 e5'],
    ['an escaped line', '1. e4\n% 1. d4 {\ne5 *', 'e4 e5'],
    ['a comment to the end of the line with braces', '1. e4 ; {not open\ne5 *', 'e4 e5'],
    ['quotes inside a tag', '[Event "The "great" open"]\n1. e4 *', 'e4'],
    ['a backslash before the last quote', '[Event "Cup \\"]\n1. e4 *', 'e4'],
    ['a passing move inside a variation', '1. e4 (1. d4 -- 2. c4) e5 *', 'e4 e5'],
  ])('%s', (_, text, expected) => {
    expect(sans(text).join(' ')).toBe(expected);
  });

  it('signs come as their glyphs', () => {
    const { moves } = one('1. e4! e5 $14 2. Nf3 ?! ± Nc6 $999 $255 *');
    expect(moves.map(({ nags }) => nags)).toEqual([[1], [14], [6, 16], [255]]);
  });
});

describe('a fault has its place', () => {
  it.each([
    ['illegal', '\n\n1. e4 e5\n2. Ke3 *', { game: 1, line: 4, move: '2. Ke3', code: 'illegal-move' }],
    ['ambiguous', '1. Nf3 d5 2. d4 d4', { code: 'illegal-move', move: '2... d4' }],
    [
      'of two knights',
      '[FEN "4k3/8/8/8/8/8/8/1N2KN2 w - - 0 1"]\n1. Nd2 *',
      { code: 'ambiguous-move', line: 2, move: '1. Nd2' },
    ],
    ['no move at all', '1. e4 hello *', { code: 'unreadable-move', move: '1... hello' }],
    ['a move that passes', '1. e4 -- *', { code: 'null-move', move: '1... --' }],
    ['a comment without end', '1. e4\n\n{ never\n\nends', { code: 'unclosed-comment', line: 3 }],
    ['a variation without end', '1. e4\n(1. d4\n d5\n *', { code: 'unclosed-variation', line: 2 }],
    ['deep variations', `1. e4 ${'(1. d4 '.repeat(60)}`, { code: 'too-deep', line: 1 }],
    ['a start that is no position', '[FEN "8/8/8/8/8/8/8/8 w - - 0 1"]\n1. e4 *', { line: 1, move: null }],
  ])('%s', (_, text, expected) => {
    expect(faultOf(text)).toMatchObject(expected);
  });

  it('a comment that never ends costs one game, not those behind it', () => {
    const text = '[White "A"]\n\n1. e4 {oh\n\n[White "B"]\n[Black "C"]\n\n1. d4 {fine} d5 *\n';
    const games = [...pgnGames(text)];
    expect(games.map(({ tags }) => tags)).toEqual([{ White: 'A' }, { White: 'B', Black: 'C' }]);
    expect(games.map((game) => replayGame(game).ok)).toEqual([false, true]);
    expect(games[1]).toMatchObject({ number: 2, line: 5, moves: [{ line: 8 }, { line: 8, text: 'd5' }] });
  });

  it('results and remarks between games are no games', () => {
    expect([...pgnGames('1. e4 1-0\n\n1-0\n{ remark } *\n\n[Event "x"]\n\n*')]).toHaveLength(2);
    expect([...pgnGames(' \n\n% nothing\n')]).toHaveLength(0);
  });

  it('ten thousand brackets neither hang nor overflow', () => {
    for (const text of ['('.repeat(10_000), '{'.repeat(10_000), ')'.repeat(10_000), '['.repeat(10_000)])
      for (const game of pgnGames(`1. e4 ${text}`))
        expect(replayGame(game).ok).toBe(text[0] === '[' && game.number === 1);
  });
});

describe('files', () => {
  async function streamed(bytes: Uint8Array, size: number): Promise<PgnGame[]> {
    const pieces = Array.from({ length: Math.ceil(bytes.length / size) }, (_, at) =>
      bytes.subarray(at * size, (at + 1) * size),
    );
    const games: PgnGame[] = [];
    for await (const game of pgnStream(pieces)) games.push(game);
    return games;
  }

  it('in pieces are read as in one, wherever they are cut', async () => {
    const text = `${REAL_GAMES_PGN.slice(0, 12_000).replaceAll('\n', '\r\n')}\n[White "Łódź"]\n\n1. e4 {a\ncomment} (1. d4\nd5) e5\n\n[White "Ende"]\n\n1. c4 {open`;
    const whole = [...pgnGames(text)];
    const bytes = new TextEncoder().encode(text);
    for (const size of [17, 256, 4096, bytes.length]) expect(await streamed(bytes, size)).toEqual(whole);
    expect(whole.length).toBeGreaterThan(20);
  });

  it('of a thousand games are read in pieces of 64 kB as in one', async () => {
    expect(await streamed(new TextEncoder().encode(REAL_GAMES_PGN), 65_536)).toEqual([...pgnGames(REAL_GAMES_PGN)]);
  });

  it('are UTF-8, UTF-16 with its mark, or Latin', () => {
    expect(pgnText(Uint8Array.of(0xff, 0xfe, 0x41, 0, 0x42, 1))).toBe('Ał');
    expect(pgnText(Uint8Array.of(0xfe, 0xff, 0, 0x41))).toBe('A');
    expect(pgnText(Uint8Array.of(0xef, 0xbb, 0xbf, 0x41))).toBe('A');
    expect(pgnText(Uint8Array.of(0xe9, 0x41))).toBe('éA');
  });
});

describe('writing', () => {
  const said = fc.string({ unit: 'grapheme' }).map((text) =>
    text
      .replace(/[}\0\x1a]/g, '')
      .replace(/\s+/g, ' ')
      .trim(),
  );
  /** A move with variations so deep. */
  const moveOf = (depth: number): fc.Arbitrary<PgnMove> =>
    fc.record({
      text: fc.constantFrom('e4', 'Nf3', 'O-O', 'exd6', 'a8=Q+', 'Qh5#'),
      line: fc.constant(0),
      nags: fc.array(fc.integer({ min: 0, max: 255 }), { maxLength: 2 }),
      comments: fc.array(said, { maxLength: 2 }),
      variations:
        depth === 0
          ? fc.constant([])
          : fc.array(fc.array(moveOf(depth - 1), { minLength: 1, maxLength: 3 }), { maxLength: 2 }),
    });
  const plain = (moves: readonly PgnMove[]): unknown[] =>
    moves.map(({ text, nags, comments, variations }) => [text, nags, comments, variations.map(plain)]);

  it('and reading again gives the same tags, comments, glyphs and variations, whatever they say', () => {
    fc.assert(
      fc.property(fc.array(moveOf(3), { minLength: 1, maxLength: 6 }), said, said, (moves, value, intro) => {
        const game = { tags: { White: value }, comments: [intro], moves, result: '*' };
        const text = writePgn({ ...game, first: { fullmove: 3, side: 'black' } });
        const again = one(text);
        expect(again.fault).toBeNull();
        expect(again.tags.White).toBe(value);
        expect(again.comments).toEqual([intro]);
        expect(plain(again.moves)).toEqual(plain(moves));
      }),
      { numRuns: 500 },
    );
  });

  it('keeps lines below 80 letters, numbers moves after every break, and puts no escape at the start of a line', () => {
    const move = (text: string, comments: string[] = []): PgnMove => ({
      text,
      line: 0,
      nags: [],
      comments,
      variations: [],
    });
    const moves = [move('e4', [`${'word '.repeat(14)}100 % of it ${'[x] '.repeat(40)}`]), move('e5'), move('Nf3')];
    const first = { fullmove: 1, side: 'white' } as const;
    const text = writePgn({ tags: {}, comments: [], moves, result: '1-0', first });
    expect(text).toContain('1... e5 2. Nf3 1-0');
    for (const line of text.split('\n').slice(8)) expect(line).toMatch(/^(?![%[]).{0,79}$/);
    expect(text.split('\n').slice(0, 7).join('')).toBe(
      '[Event "?"][Site "?"][Date "????.??.??"][Round "?"][White "?"][Black "?"][Result "1-0"]',
    );
  });

  it('nothing that is read throws, and each fault is a sentence with a line of the text', () => {
    const word = fc.constantFrom(
      ...'1. e4 e5 { } ( ) [ ] " % ; * $3 Nf3 O-O -- 0-0 \n \n\n [White 1-0 é … \0 <x> exd6'.split(' '),
      '\n',
      '[A "b"]\n',
    );
    fc.assert(
      fc.property(fc.array(word, { maxLength: 60 }), fc.constantFrom('', ' '), (words, between) => {
        const text = words.join(between);
        for (const game of pgnGames(text)) {
          const replayed = replayGame(game);
          if (replayed.ok) continue;
          expect(replayed.fault.message).toMatch(/\.$/);
          expect(replayed.fault.line).toBeGreaterThan(0);
          expect(replayed.fault.line).toBeLessThanOrEqual(text.split('\n').length);
        }
      }),
      { numRuns: 3000 },
    );
  });
});
