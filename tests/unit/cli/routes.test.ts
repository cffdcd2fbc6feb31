/** `waypost routes`: text, JSON, streams, checks, and what is refused. */
import { describe, expect, it } from 'vitest';
import { routesAnswerSchema } from '@/engine/reading/schema/routes';
import { EXAMPLE_FEN } from '@/openapi/schemas/examples';
import { ran } from './terminal-double';

describe('waypost routes', () => {
  it('answers a page that fits 80 columns', async () => {
    const { code, output } = await ran(['routes', EXAMPLE_FEN, '--man', 'a1']);
    expect(code).toBe(0);
    expect(output).toContain(' 1. rook a1 - c1');
    expect(output.split('\n').every((line) => line.length <= 80)).toBe(true);
  });

  it('answers JSON as the API does', async () => {
    const { output } = await ran(['routes', EXAMPLE_FEN, '--json', '--most', '2']);
    expect(routesAnswerSchema.parse(JSON.parse(output)).choices).toHaveLength(2);
  });

  it('answers a stream line for line', async () => {
    const { code, output } = await ran(['routes', '-', '--most', '1'], [`${EXAMPLE_FEN}\nnothing\n`]);
    const [first, second] = output
      .trimEnd()
      .split('\n')
      .map((line) => JSON.parse(line) as { line?: number; fen?: string });
    expect([first?.fen, second?.line, code]).toEqual([EXAMPLE_FEN, 2, 1]);
  });

  it.each([
    ['f3 d2 b3', 0, 'The route holds.'],
    ['f3,d2,f1', 1, 'fails at step 2'],
  ])('checks %s', async (route, code, said) => {
    const done = await ran(['routes', EXAMPLE_FEN, '--check', route]);
    expect(done.code).toBe(code);
    expect(done.output).toContain(said);
  });

  it.each([
    [['--man', 'e4'], 1, 'on e4 stands no man'],
    [['--man', 'e9'], 2, '--man'],
    [['--moves', '7'], 2, 'whole number from 1 to 6'],
    [['--side', 'green'], 2, 'no side "green"'],
    [['--check', 'f3 x9'], 1, '"x9" is no square'],
  ])('refuses %j in words', async (words, code, said) => {
    const done = await ran(['routes', EXAMPLE_FEN, ...words]);
    expect(done.code).toBe(code);
    expect(done.errors).toContain(said);
    expect(done.output).toBe('');
  });
});
