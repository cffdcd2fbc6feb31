/** `waypost read`: what a person sees, what a program gets, and what the exit code says. */
import { describe, expect, it } from 'vitest';
import { readingSchema } from '@/engine/reading/schema';
import { EXAMPLE_FEN } from '@/openapi/schemas/examples';
import { ran } from './terminal-double';

const PAWNS_ONLY = '8/8/8/3p4/3P4/8/8/8 w - - 0 1';

describe('waypost read "<FEN>"', () => {
  it('prints a page of at most 80 columns that holds the board and every statement', async () => {
    const [page, data] = [await ran(['read', EXAMPLE_FEN]), await ran(['read', EXAMPLE_FEN, '--json'])];
    expect(page.code).toBe(0);
    expect(page.errors).toBe('');
    for (const line of page.output.split('\n')) {
      expect(line.length).toBeLessThanOrEqual(80);
      expect(line).toBe(line.trimEnd());
    }
    expect(page.output).toContain('8 | r : b q r : k : |');
    expect(page.output).toContain('1 | R   :   : R K   |');
    const flowing = page.output.replace(/\s+/g, ' ');
    for (const { text } of readingSchema.parse(JSON.parse(data.output)).statements)
      expect(flowing).toContain(text.replace(/\s+/g, ' '));
  });

  it('prints the leading statements first', async () => {
    const [page, data] = [await ran(['read', EXAMPLE_FEN]), await ran(['read', EXAMPLE_FEN, '--json'])];
    const { lead, statements } = readingSchema.parse(JSON.parse(data.output));
    const first = statements.find(({ key }) => key === lead[0]);
    const afterHeading = page.output.slice(page.output.indexOf('What matters most')).replace(/\s+/g, ' ');
    expect(afterHeading.startsWith(`What matters most - ${first?.text}`)).toBe(true);
  });

  it('prints one line of JSON that is the promised reading', async () => {
    const { code, output } = await ran(['read', '--json', EXAMPLE_FEN]);
    expect(code).toBe(0);
    expect(output.indexOf('\n')).toBe(output.length - 1);
    const reading: unknown = JSON.parse(output);
    expect(readingSchema.parse(reading)).toEqual(reading);
  });

  it('takes a FEN whose quotes were forgotten', async () => {
    expect((await ran(['read', ...EXAMPLE_FEN.split(' ')])).output).toBe((await ran(['read', EXAMPLE_FEN])).output);
  });

  it('says every fault in words on standard error, and nothing on standard output', async () => {
    const { code, output, errors } = await ran(['read', 'rnbqkbnr/ppppxppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1']);
    expect(code).toBe(1);
    expect(output).toBe('');
    expect(errors).toMatch(/^This FEN cannot be read\.\n {2}board: /);
    expect(errors).not.toMatch(/\bat .*:\d+:\d+/);
  });

  it('reads diagrams when asked, and says of a refused FEN that it could', async () => {
    expect((await ran(['read', PAWNS_ONLY])).errors).toContain('--mode diagram');
    const { code, output } = await ran(['read', PAWNS_ONLY, '--mode', 'diagram']);
    expect(code).toBe(0);
    expect(output).toContain('Read as a diagram');
  });

  it('colours the page only when told that the terminal wants it', async () => {
    const [plain, inked] = [await ran(['read', EXAMPLE_FEN]), await ran(['read', EXAMPLE_FEN], [], true)];
    expect(plain.output).not.toContain('\u001b');
    expect(inked.output).toContain('\u001b[');
    const colours = new RegExp(`${String.fromCharCode(27)}\\[\\d+m`, 'g');
    expect(inked.output.replace(colours, '')).toBe(plain.output);
  });
});

describe('waypost on commands that it does not understand', () => {
  it.each([
    [[], 'A command is missing.'],
    [['write'], 'There is no command "write".'],
    [['read'], 'A FEN is missing.'],
    [['read', ''], 'A FEN is missing.'],
    [['read', EXAMPLE_FEN, '--jsno'], 'There is no option "--jsno".'],
    [['read', EXAMPLE_FEN, '--mode'], 'The option "--mode" needs a value.'],
    [['read', EXAMPLE_FEN, '--mode', 'loose'], 'There is no mode "loose"; the modes are strict and diagram.'],
    [['read', EXAMPLE_FEN, '--json=yes'], 'The option "--json" takes no value.'],
  ])('%j', async (args, sentence) => {
    const { code, output, errors } = await ran(args);
    expect(code).toBe(2);
    expect(output).toBe('');
    expect(errors).toContain(sentence);
    expect(errors).toContain('--help');
  });

  it.each([[['--help']], [['help']], [['read', '--help']], [['read', '-h']]])(
    '%j explains the command within 80 columns',
    async (args) => {
      const { code, output } = await ran(args);
      expect(code).toBe(0);
      expect(output).toContain('--mode diagram');
      for (const line of output.split('\n')) expect(line.length).toBeLessThanOrEqual(80);
    },
  );
});
