/** Widths of text in Roboto Slab and lines broken to a width, from the font's own metrics. */
import { CHARACTERS, WIDTHS } from './metrics.gen';

export type Weight = keyof typeof WIDTHS;

const PLACE = new Map([...CHARACTERS].map((character, index) => [character, index]));
/** Width taken for a character that is not in the table, thousandths of the size: that of a wide letter. */
const UNKNOWN = 700;

/** Width of a text in px. */
export function textWidth(text: string, size: number, weight: Weight): number {
  const widths: readonly number[] = WIDTHS[weight];
  let sum = 0;
  for (const character of text) sum += widths[PLACE.get(character) ?? -1] ?? UNKNOWN;
  return (sum * size) / 1000;
}

/** Text broken into lines no wider than given; a word that is wider stands alone on its line. */
export function brokenLines(text: string, width: number, size: number, weight: Weight): string[] {
  const lines: string[] = [];
  const space = textWidth(' ', size, weight);
  let line = '';
  let used = 0;
  for (const word of text.split(' ')) {
    const wide = textWidth(word, size, weight);
    if (line !== '' && used + space + wide > width) {
      lines.push(line);
      line = '';
      used = 0;
    }
    used += line === '' ? wide : space + wide;
    line = line === '' ? word : `${line} ${word}`;
  }
  if (line !== '') lines.push(line);
  return lines;
}
