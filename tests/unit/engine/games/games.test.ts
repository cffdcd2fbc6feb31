/** Games: PGN in all its dress, faults with their place, journeys that add up, commitments and origins held by a slow scan. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readPosition } from '@/engine';
import { pgnGames, pgnText, readGame, replayGame, writePgn } from '@/engine/games';
import { gamesAnswerSchema } from '@/engine/reading/schema/games';
import { positionOf } from '../../../support/random';

/** A main line of opening theory with everything that PGN can carry. */
const DRESSED = `\uFEFF% an escaped line
[Event "A \\"quoted\\" name"]
[Site "?"]

{Before the first move} 1. d4! d5 2.c4 $14 e6 (2... c6 3. Nf3 (3. e3 Bf5) 3... Nf6 {a Slav}) 3 Nc3 Nf6
4. cxd5 ; to the end of the line
exd5 5. Bg5 Be7 6. e3 0-0 7. Bd3 Nbd7 8. Qc2 Re8 9. Nge2 c6 10. O-O Nf8+ 11. Rab1 *

[Event "Bad"]

1. e4 e5
2. Ke3 *

[Event "Short"]

1. e4 c5 1/2-1/2
`;

const games = [...pgnGames(DRESSED)];

describe('PGN', () => {
  it('is read with its comments, glyphs, variations and odd writing', () => {
    const [first] = games;
    expect(first?.tags.Event).toBe('A "quoted" name');
    expect(first?.comments).toEqual(['Before the first move']);
    expect(first?.moves).toHaveLength(21);
    expect(first?.moves[0]?.nags).toEqual([1]);
    expect(first?.moves[2]?.nags).toEqual([14]);
    const [slav] = first!.moves[3]!.variations;
    expect(slav?.map(({ text }) => text)).toEqual(['c6', 'Nf3', 'Nf6']);
    expect(slav?.[1]?.variations[0]?.map(({ text }) => text)).toEqual(['e3', 'Bf5']);
    expect(slav?.[2]?.comments).toEqual(['a Slav']);
  });

  it('names a bad game by number, line and move, and keeps the good ones', () => {
    const read = games.map(replayGame);
    expect(read.map(({ ok }) => ok)).toEqual([true, false, true]);
    expect(!read[1]!.ok && read[1]!.fault).toMatchObject({ game: 2, line: 12, move: '2. Ke3', code: 'illegal-move' });
  });

  it.each([
    ['a comment without end', '1. e4 {never', 'unclosed-comment'],
    ['a variation without end', '1. e4 (1. d4 *', 'unclosed-variation'],
    ['a bracket too many', '1. e4 ) e5 *', 'stray-bracket'],
    ['a variation of nothing', '( 1. e4 ) *', 'stray-bracket'],
    ['a bad tag', '[Event no quotes]\n1. e4 *', 'bad-tag'],
    ['an illegal move in a variation', '1. e4 (1. Ke3) e5 *', 'illegal-move'],
    ['a FEN that is none', '[FEN "8/8"]\n1. e4 *', 'field-count'],
  ])('%s is refused', (_, text, code) => {
    const [game] = [...pgnGames(text)];
    const read = replayGame(game!);
    expect(!read.ok && read.fault.code).toBe(code);
  });

  it('decodes UTF-8, and what is no UTF-8 as Latin letters', () => {
    expect(pgnText(new TextEncoder().encode('Łódź'))).toBe('Łódź');
    expect(pgnText(Uint8Array.of(0x4d, 0xfc, 0x6c))).toBe('Mül');
  });

  it('never throws, whatever it is given', () => {
    fc.assert(
      fc.property(
        fc.array(
          fc.constantFrom(
            '1.',
            'e4',
            '{',
            '}',
            '(',
            ')',
            '[',
            ']',
            '"',
            '%',
            '\n',
            ';',
            '*',
            '$3',
            'Nf3',
            ' ',
            '\0',
            'O-O',
            '…',
          ),
        ),
        (parts) => {
          for (const game of pgnGames(parts.join(''))) replayGame(game);
        },
      ),
      { numRuns: 2000 },
    );
  });

  it('written and read again is the same game', () => {
    for (const game of games) {
      const replayed = replayGame(game);
      if (!replayed.ok) continue;
      const text = writePgn({ ...game, first: { fullmove: 1, side: 'white' } });
      expect(text.split('\n').every((line) => line.length < 80)).toBe(true);
      const [again] = [...pgnGames(text)];
      const plain = (
        moves: readonly {
          text: string;
          variations: readonly unknown[];
          comments: readonly string[];
          nags: readonly number[];
        }[],
      ): unknown =>
        moves.map(({ text: move, variations, comments, nags }) => [
          move,
          comments,
          nags,
          variations.map((line) => plain(line as never)),
        ]);
      expect(plain(again!.moves)).toEqual(plain(game.moves));
      expect(again!.tags.Event).toBe(game.tags.Event);
    }
  });
});

describe('a game read', () => {
  const replayed = replayGame(games[0]!);
  if (!replayed.ok) throw new Error(replayed.fault.message);
  const reading = readGame(replayed.value);

  it('is as its schema says', () => {
    const answer = {
      engine: '1',
      games: [{ game: 1, tags: {}, result: '*', plies: 21, ...reading }],
      faults: [],
    };
    expect(gamesAnswerSchema.parse(JSON.parse(JSON.stringify(answer)))).toEqual(JSON.parse(JSON.stringify(answer)));
  });

  it('has in its timeline what whole readings count', () => {
    for (const { fen, white, black, structure } of reading.timeline) {
      const whole = readPosition(positionOf(fen));
      expect([white.safeMoves, black.safeMoves]).toEqual([whole.totals.white.safeMoves, whole.totals.black.safeMoves]);
      expect(structure?.name ?? null).toBe(whole.pawns.structure?.name ?? null);
      expect(white.files).toBe(whole.files.filter(({ control }) => control === 'white').length);
    }
  });

  it('follows every man: stays without a gap, from the beginning to its end', () => {
    expect(reading.journeys).toHaveLength(32);
    for (const { stays, takenAt } of reading.journeys) {
      expect(stays[0]?.from).toBe(0);
      for (const [place, stay] of stays.entries()) {
        const next = stays[place + 1]?.from ?? takenAt ?? 21;
        expect(stay.from + stay.plies).toBe(next);
      }
    }
    const standing = reading.journeys
      .filter(({ takenAt }) => takenAt === null)
      .map(({ stays }) => stays[stays.length - 1]!.square);
    const last = readPosition(positionOf(reading.timeline[21]!.fen));
    expect(standing.sort()).toEqual(last.men.map(({ square }) => square).sort());
  });

  it('says which move opened the e-file for Black and named the structure', () => {
    const text = reading.commitments.map((each) => each.text).join('\n');
    expect(text).toContain('4... exd5: The e-file is half-open for Black.');
    expect(text).toContain('9... c6: Pawn structure: Carlsbad structure.');
  });
});
