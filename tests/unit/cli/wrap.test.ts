/** Words to lines: nothing lost, nothing too long. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { item, wrap } from '@/lib/cli/wrap';

const prose = fc.array(fc.stringMatching(/^[a-zé]{1,12}$/), { maxLength: 60 }).map((words) => words.join(' '));

describe('wrap', () => {
  it('keeps every word in order, on lines that are as full as they can be', () => {
    fc.assert(
      fc.property(prose, fc.integer({ min: 12, max: 80 }), (text, width) => {
        const lines = wrap(text, width);
        expect(lines.join(' ')).toBe(text);
        for (const [index, line] of lines.entries()) {
          expect(line.length).toBeLessThanOrEqual(width);
          const next = lines[index + 1]?.split(' ')[0];
          if (next !== undefined) expect(line.length + 1 + next.length).toBeGreaterThan(width);
        }
      }),
    );
  });

  it('lets a word that is too long stand alone', () => {
    expect(wrap('a incomprehensible b', 5)).toEqual(['a', 'incomprehensible', 'b']);
  });
});

describe('item', () => {
  it('sets the lines after the first under its text', () => {
    expect(item('  - ', 'one two three', 11)).toEqual(['  - one two', '    three']);
  });
});
