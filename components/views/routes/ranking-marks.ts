/** The ranking as marks: drawn on the page and into the file by the same hands as a plate. */
import { textWidth } from '@/components/plate/measure';
import { box, n } from '@/components/plate/place';
import type { Drawing, LegendItem, Look, Mark, Paint } from '@/components/plate/types';
import type { Side } from '@/engine/types';
import { FAMILIES, type Family, FAMILY_NAMES, familyPatterns } from './families';
import { AXIS_HEIGHT, type Ranking, type RankingRow, ROW_HEIGHT, type Segment } from './layout';
import { choiceName, signed, wayText } from './words';

const BAR = { top: 24, height: 17 };

export interface RankingRequest {
  readonly ranking: Ranking;
  readonly width: number;
  readonly side: Side;
  /** Names the man in every row: the ranking is that of a whole side. */
  readonly named: boolean;
  /** Place of the chosen row; -1 for none. */
  readonly chosen: number;
  /** Prefix of pattern names. */
  readonly id: string;
  readonly title: string;
}

/** The whole chart. */
export function rankingDrawing({ ranking, width, side, named, chosen, id, title }: RankingRequest): Drawing {
  const paint = side === 'white' ? 'ochre' : 'indigo';
  const { rows, ticks, zero, height } = ranking;
  const bottom = height - 4;
  const marks: Mark[] = [
    ...ticks.map(({ x, value }): Mark => {
      const d = `M${n(x)} ${AXIS_HEIGHT - 8}V${bottom}`;
      return { type: 'path', d, stroke: value === 0 ? 'ink' : 'rule', width: 1, fill: 'none' };
    }),
    ...ticks.map(
      ({ x, value }): Mark => ({
        type: 'text',
        x,
        y: 14,
        text: signed(value, Number.isInteger(value) ? 0 : 1),
        size: 12,
        weight: 400,
        fill: 'soft',
        anchor: 'middle',
      }),
    ),
    ...rows.flatMap((row, index) => rowMarks(row, index, { width, paint, named, id, zero, chosen: index === chosen })),
  ];
  return { width, height, patterns: familyPatterns(id, paint), marks, title, alt: altText(rows, named) };
}

function altText(rows: readonly RankingRow[], named: boolean): string {
  const list = rows.map(
    ({ choice }, index) => `${index + 1}: ${choiceName(choice, named)}, ${signed(choice.merit, 2)}`,
  );
  return `Posts by what helps most, the parts of each stacked. ${list.join('; ')}.`;
}

interface RowLook {
  readonly width: number;
  readonly paint: Paint;
  readonly named: boolean;
  readonly id: string;
  readonly zero: number;
  readonly chosen: boolean;
}

function rowMarks({ choice, segments, y, sum }: RankingRow, index: number, look: RowLook): Mark[] {
  const { width, paint, named, id, chosen } = look;
  const name = choiceName(choice, named);
  const start = 28;
  const line = y + 17;
  const text = { type: 'text', y: line, size: 14, weight: 400 } as const;
  const way = wayText(choice);
  const room = width - 70 - (start + textWidth(name, 14, 700) + 10);
  const marks: Mark[] = [
    { type: 'path', d: box(0, y, width, ROW_HEIGHT - 26), fill: 'paper' },
    {
      ...text,
      x: 20,
      text: String(index + 1),
      fill: chosen ? 'pick' : 'soft',
      weight: chosen ? 700 : 400,
      anchor: 'end',
    },
    { ...text, x: start, text: name, weight: 700, fill: paint },
    { ...text, x: width - 8, text: signed(choice.merit, 2), weight: 700, fill: 'ink', anchor: 'end' },
  ];
  if (textWidth(way, 13, 400) <= room)
    marks.push({ ...text, size: 13, x: start + textWidth(name, 14, 700) + 10, text: way, fill: 'soft' });
  marks.push(...segments.flatMap((segment) => segmentMarks(segment, { y: y + BAR.top, paint, id, sum })));
  const foot = y + BAR.top;
  marks.push({ type: 'path', d: `M${n(sum)} ${foot - 3}v${BAR.height + 6}`, stroke: 'ink', width: 2.4, fill: 'none' });
  if (chosen)
    marks.push({ type: 'path', d: `M1.5 ${y + 2}v${ROW_HEIGHT - 6}`, stroke: 'pick', width: 3, fill: 'none' });
  return marks;
}

/** Fill of a family in a figure whose patterns have the prefix. */
function fillOf(family: Family, paint: Paint, id: string): Pick<Look, 'fill' | 'dash'> {
  if (family === 'tactics') return { fill: paint };
  if (family === 'time') return { fill: 'paper', dash: '3 2' };
  return { fill: { pattern: `${id}${family}` } };
}

interface SegmentLook {
  readonly y: number;
  readonly paint: Paint;
  readonly id: string;
  /** Where the row's sum is marked, px: figures keep clear of it. */
  readonly sum: number;
}

function segmentMarks({ family, x0, x1, now, there }: Segment, { y, paint, id, sum }: SegmentLook): Mark[] {
  const d = box(x0, y, x1 - x0, BAR.height);
  const text = signed(there - now, 0);
  const marks: Mark[] = [
    { type: 'path', d, fill: 'paper' },
    { type: 'path', d, stroke: paint, width: 1, ...fillOf(family, paint, id) },
  ];
  const wide = textWidth(text, 11, 700) + 8;
  const [from, to] = clearOf(x0, x1, sum);
  if (to - from < wide) return marks;
  const isSolid = family === 'tactics';
  marks.push({
    type: 'text',
    x: (from + to) / 2,
    y: y + 12.6,
    text,
    size: 11,
    weight: 700,
    fill: isSolid ? 'paper' : 'ink',
    anchor: 'middle',
    ...(isSolid ? {} : { halo: 4 }),
  });
  return marks;
}

/** The wider part of a box on one side of the sum's mark; the whole box where the mark is not in it. */
function clearOf(x0: number, x1: number, sum: number): [number, number] {
  if (sum <= x0 || sum >= x1) return [x0, x1];
  return sum - x0 > x1 - sum ? [x0, sum] : [sum, x1];
}

/** A family as a figure of the legend. */
export function familyMarks(family: Family, paint: Paint, id: string): Mark[] {
  return [{ type: 'path', d: box(0.5, 1.5, 23, 13), stroke: paint, width: 1, ...fillOf(family, paint, id) }];
}

/** The families that occur, and what the line across a bar is. */
export function rankingLegend({ rows }: Ranking, side: Side, id: string): LegendItem[] {
  const paint = side === 'white' ? 'ochre' : 'indigo';
  const present = new Set(rows.flatMap(({ segments }) => segments.map(({ family }) => family)));
  const items = FAMILIES.filter((family) => present.has(family)).map((family) => ({
    label: FAMILY_NAMES[family],
    marks: familyMarks(family, paint, id),
  }));
  const sum: LegendItem = {
    label: 'sum',
    marks: [{ type: 'path', d: 'M12 0v16', stroke: 'ink', width: 2.4, fill: 'none' }],
  };
  return [...items, sum];
}
