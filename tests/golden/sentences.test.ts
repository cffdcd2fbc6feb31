/** The sentences of five positions, to be read by people. UPDATE=1 writes the file anew. */
import { readFileSync, writeFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import { EXAMPLES } from '@/components/views/reading/examples';
import { readFen } from '@/engine';

const FILE = 'tests/golden/sentences.txt';

it('the examples of the first page read as they did', () => {
  const text = EXAMPLES.map(({ name, fen }) => {
    const reading = readFen(fen);
    if (!reading.ok) throw new Error(`${name}: ${reading.fault[0].message}`);
    const { statements, lead } = reading.value;
    const lines = statements.map(
      ({ key, theme, text: sentence }) => `${lead.includes(key) ? '*' : ' '} ${theme.padEnd(9)} ${sentence}`,
    );
    return `${name}\n${fen}\n${lines.join('\n')}\n`;
  }).join('\n');
  if (process.env.UPDATE === '1') writeFileSync(FILE, text);
  expect(text).toBe(readFileSync(FILE, 'utf8'));
});
