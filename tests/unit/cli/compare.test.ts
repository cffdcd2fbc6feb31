/** `waypost compare`, `exchanges` and `game`: text, JSON, streams, and what is refused. */
import { describe, expect, it } from 'vitest';
import { comparisonSchema, exchangeTestSchema } from '@/engine/reading/schema/compare';
import { gamesAnswerSchema } from '@/engine/reading/schema/games';
import { EXAMPLE_FEN, EXAMPLE_PGN } from '@/openapi/schemas/examples';
import { ran } from './terminal-double';

describe('waypost compare', () => {
  it('says what a man elsewhere changes, in 80 columns', async () => {
    const { code, output } = await ran(['compare', EXAMPLE_FEN, '--place', 'f3 e5']);
    expect(code).toBe(0);
    expect(output).toContain('The white knight stands on e5 instead of f3');
    expect(output.split('\n').every((line) => line.length <= 80)).toBe(true);
  });

  it('answers JSON as the API does', async () => {
    const { output } = await ran(['compare', EXAMPLE_FEN, EXAMPLE_FEN, '--json']);
    expect(comparisonSchema.parse(JSON.parse(output)).differences[0]?.sentences).toEqual([]);
  });

  it.each([
    [[EXAMPLE_FEN], 2, 'two to 4 positions'],
    [[EXAMPLE_FEN, '--place', 'f3'], 2, 'two squares'],
    [[EXAMPLE_FEN, '--place', 'e4 e5'], 1, 'no man on e4'],
    [[EXAMPLE_FEN, '8/8'], 1, 'refused'],
  ])('refuses %j in words', async (words, code, said) => {
    const done = await ran(['compare', ...words]);
    expect(done.code).toBe(code);
    expect(done.errors).toContain(said);
  });
});

describe('waypost exchanges', () => {
  it('says each trade once', async () => {
    const { code, output } = await ran(['exchanges', EXAMPLE_FEN]);
    expect(code).toBe(0);
    expect(output).toContain('Bg5 for Be7');
    expect(output.split('\n').every((line) => line.length <= 120)).toBe(true);
  });

  it('answers a stream line for line', async () => {
    const { code, output } = await ran(['exchanges', '-'], [`${EXAMPLE_FEN}\nnothing\n`]);
    const [first, second] = output.trimEnd().split('\n');
    expect(exchangeTestSchema.safeParse(JSON.parse(first!)).success).toBe(true);
    expect(JSON.parse(second!)).toMatchObject({ line: 2 });
    expect(code).toBe(1);
  });
});

describe('waypost game', () => {
  it('reads PGN from standard input', async () => {
    const { code, output } = await ran(['game', '-'], [EXAMPLE_PGN]);
    expect(code).toBe(0);
    expect(output).toContain('The e-file is half-open for Black.');
    expect(output.split('\n').every((line) => line.length <= 80)).toBe(true);
  });

  it('answers JSON, and names the bad game on standard error', async () => {
    const done = await ran(['game', '-', '--json'], [`${EXAMPLE_PGN}\n\n[Event "x"]\n\n1. e4 e5 2. Ke3 *`]);
    const answer = gamesAnswerSchema.parse(JSON.parse(done.output));
    expect([answer.games.length, answer.faults.length, done.code]).toEqual([1, 1, 1]);
    expect(done.errors).toContain('Game 2, line');
  });

  it.each([
    [[], 2, 'Name one PGN file'],
    [['no-such-file.pgn'], 2, 'cannot be read'],
  ])('refuses %j in words', async (words, code, said) => {
    const done = await ran(['game', ...words]);
    expect(done.code).toBe(code);
    expect(done.errors).toContain(said);
  });
});
