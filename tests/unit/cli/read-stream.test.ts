/** `waypost read -`: a line for a line, in order, as fast as they are taken. */
import { spawn } from 'node:child_process';
import { Readable, Writable } from 'node:stream';
import { describe, expect, it } from 'vitest';
import { runWaypost } from '@/lib/cli/waypost';
import { EXAMPLE_ENDING, EXAMPLE_FEN } from '@/openapi/schemas/examples';
import { ran } from './terminal-double';

type Line = { readonly fen?: string; readonly line?: number; readonly error?: { readonly code: string } };

function parsed(output: string): Line[] {
  expect(output.endsWith('\n')).toBe(true);
  return output
    .slice(0, -1)
    .split('\n')
    .map((line) => JSON.parse(line) as Line);
}

describe('waypost read -', () => {
  it('answers each line in its place, a bad one by its fault', async () => {
    const { code, output, errors } = await ran(['read', '-'], [`${EXAMPLE_FEN}\nnot a position\n${EXAMPLE_ENDING}\n`]);
    const lines = parsed(output);
    expect(lines.map(({ fen }) => fen)).toEqual([EXAMPLE_FEN, undefined, EXAMPLE_ENDING]);
    expect(lines[1]).toMatchObject({ line: 2, error: { code: expect.any(String) } });
    expect(code).toBe(1);
    expect(errors).toBe('1 of 3 lines could not be read; each is answered in its place.\n');
  });

  it.each([
    ['lines broken anywhere', [EXAMPLE_FEN.slice(0, 11), EXAMPLE_FEN.slice(11), '\n', EXAMPLE_ENDING]],
    ['ends of lines as on other systems', [`${EXAMPLE_FEN}\r\n${EXAMPLE_ENDING}\r\n`]],
    ['no end of the last line', [`${EXAMPLE_FEN}\n${EXAMPLE_ENDING}`]],
  ])('takes %s', async (_, input) => {
    const { code, output } = await ran(['read', '-'], input);
    expect(parsed(output).map(({ fen }) => fen)).toEqual([EXAMPLE_FEN, EXAMPLE_ENDING]);
    expect(code).toBe(0);
  });

  it('answers an empty line, so that lines can be matched by their number', async () => {
    const { output } = await ran(['read', '-'], [`\n${EXAMPLE_FEN}\n`]);
    expect(parsed(output)).toMatchObject([{ line: 1, error: {} }, { fen: EXAMPLE_FEN }]);
  });

  it('answers nothing for nothing', async () => {
    expect(await ran(['read', '-'])).toEqual({ code: 0, output: '', errors: '' });
  });

  it('refuses a line without end without keeping it', async () => {
    const { output } = await ran(
      ['read', '-'],
      [...Array.from({ length: 1000 }, () => 'p'.repeat(10_000)), `\n${EXAMPLE_FEN}\n`],
    );
    expect(parsed(output)).toMatchObject([{ line: 1, error: { code: 'too-long' } }, { fen: EXAMPLE_FEN }]);
  });

  it('waits for whoever reads: it takes no more lines in than can be written out', async () => {
    let taken = 0;
    const input = Readable.from(
      (function* () {
        for (; taken < 200; taken += 1) yield `${EXAMPLE_FEN}\n`;
      })(),
      { highWaterMark: 1 },
    );
    const waiting: (() => void)[] = [];
    const output = new Writable({ highWaterMark: 1, write: (_chunk, _encoding, done) => void waiting.push(done) });
    const done = runWaypost(['read', '-'], { input, output, errors: output, colour: false });
    await new Promise((resolve) => setTimeout(resolve, 50));
    expect(taken).toBeLessThan(10);
    const drain = setInterval(() => waiting.shift()?.(), 0);
    expect(await done).toBe(0);
    clearInterval(drain);
    expect(taken).toBe(200);
  });
});

describe('the command as a process', () => {
  it('ends quietly when its reader stops early', async () => {
    const child = spawn(process.execPath, ['--import', 'tsx', 'lib/cli/waypost.ts', 'read', '-'], {
      stdio: ['pipe', 'pipe', 'pipe'],
    });
    let errors = '';
    child.stderr.on('data', (chunk) => {
      errors += String(chunk);
    });
    child.stdin.on('error', () => {});
    child.stdin.write(`${EXAMPLE_FEN}\n`.repeat(2000));
    child.stdout.once('data', () => child.stdout.destroy());
    const code = await new Promise<number | null>((resolve) => child.on('close', resolve));
    expect(errors).toBe('');
    expect(code).toBe(0);
  }, 20_000);
});
