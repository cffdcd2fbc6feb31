/** The ranking as rows of a table: what the bars show, count by count. */
import type { RankedChoice } from './ask';
import { weighedParts } from './layout';
import { wayText } from './words';

export const RANKING_HEADS = [
  'Rank',
  'Man',
  'Post',
  'Way',
  'Count',
  'Now',
  'There',
  'Difference',
  'Weight',
  'Adds',
  'Sum',
] as const;

/** One row for each count that differs, and one with zeros left out for a post where none does. */
export function rankingRows(choices: readonly RankedChoice[]): (string | number)[][] {
  return choices.flatMap((choice, index) => {
    const start = [index + 1, `${choice.kind} ${choice.man}`, choice.post, wayText(choice)];
    const parts = weighedParts(choice);
    if (parts.length === 0) return [[...start, 'nothing changes', '', '', '', '', '', round(choice.merit)]];
    return parts.map(({ label, now, there, weight, value }) => [
      ...start,
      label,
      now,
      there,
      there - now,
      weight,
      round(value),
      round(choice.merit),
    ]);
  });
}

function round(value: number): number {
  return Math.round(value * 100) / 100 + 0;
}
