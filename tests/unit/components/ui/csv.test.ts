import { describe, expect, it } from 'vitest';
import { csvOf } from '@/components/ui/csv';

describe('csvOf', () => {
  it.each([
    ['plain', 'plain'],
    ['a, b', '"a, b"'],
    ['say "so"', '"say ""so"""'],
    ['two\nlines', '"two\nlines"'],
    ['=1+1', "'=1+1"],
    ['@name', "'@name"],
    [-2.5, '-2.5'],
  ] as const)('writes %j as %s', (value, text) => {
    expect(csvOf(['head'], [[value]])).toBe(`head\r\n${text}\r\n`);
  });
});
