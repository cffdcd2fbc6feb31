/** The plate in the README: a file that people look at. UPDATE=1 writes it anew. */
import { readFileSync, writeFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { FIRST_POSITION } from '@/components/views/reading/examples';
import { readFen } from '@/engine';
import { plateSvg } from '@/lib/figures/plate';

const PLATES = [
  { file: 'tests/golden/plate.svg', layer: 'command', width: 1312, theme: 'light', notes: 'margin' },
  { file: 'tests/golden/plate-weak-print.svg', layer: 'weak', width: 480, theme: 'print', notes: 'numbers' },
] as const;

describe('golden plates', () => {
  it.each(PLATES)('$file is drawn as it was', ({ file, ...options }) => {
    const reading = readFen(FIRST_POSITION);
    if (!reading.ok) throw new Error(reading.fault[0].message);
    const svg = `${plateSvg(reading.value, options).replaceAll('><', '>\n<')}\n`;
    if (process.env.UPDATE === '1') writeFileSync(file, svg);
    expect(svg).toBe(readFileSync(file, 'utf8'));
  });
});
