/** The ranking of posts as a figure: sums only. D3 stacks the parts of each post and scales them to the width. */
import { scaleLinear, stack, stackOffsetDiverging } from 'd3';
import { MOVE_COST, PREPARATION_MOVES, type PartName } from '@/engine/posts/weights';
import type { RankedChoice } from './ask';
import { type Family, STACKED } from './families';

/** One part of a post in its bar: the count's difference, and what it adds by its weight. */
export interface Segment {
  readonly part: PartName | 'moves';
  readonly family: Family;
  readonly label: string;
  readonly now: number;
  readonly there: number;
  readonly weight: number;
  /** Why it counts so, in a coach's words. */
  readonly reason: string;
  /** Weight times difference. */
  readonly value: number;
  /** Left and right edge, px. */
  readonly x0: number;
  readonly x1: number;
}

export interface RankingRow {
  readonly choice: RankedChoice;
  readonly segments: readonly Segment[];
  /** Top of the row, px. */
  readonly y: number;
  /** Where the sum of the bar stands, px. */
  readonly sum: number;
}

export interface Ranking {
  readonly rows: readonly RankingRow[];
  readonly ticks: readonly { readonly value: number; readonly x: number }[];
  /** Where nothing is gained nor lost, px. */
  readonly zero: number;
  readonly height: number;
}

/** Heights of the axis above the rows and of one row, px. */
export const AXIS_HEIGHT = 30;
export const ROW_HEIGHT = 48;
/** Room at both ends of the scale for half a figure of the axis, px. */
const EDGE = 16;
/** What adds less than this is no piece of the bar; the table has it. */
const VALUE_MIN = 0.005;
/** Least share of the width on each side of zero, so that the axis can be read. */
const SIDE_MIN = 0.5;

type Weighed = Omit<Segment, 'x0' | 'x1'>;

/** The parts of a choice that differ, family by family, the time last. */
export function weighedParts({ parts, moves, needs }: RankedChoice): Weighed[] {
  const counted = STACKED.map(({ name, family, ...said }): Weighed => {
    const { now, there } = parts[name] ?? { now: 0, there: 0 };
    return { part: name, family, now, there, ...said, value: said.weight * (there - now) };
  });
  const further = moves - 1 + (needs === null ? 0 : PREPARATION_MOVES);
  const label = needs === null ? 'further moves' : 'further moves, a preparation counted as two';
  const time: Weighed = {
    part: 'moves',
    family: 'time',
    label,
    now: 0,
    there: further,
    weight: -MOVE_COST,
    reason: 'Each further move lets the enemy have one.',
    value: -MOVE_COST * further,
  };
  return [...counted, time].filter(({ now, there }) => now !== there);
}

/** Bars of all choices on one scale; what helps stacks to the right of zero, what harms to the left. */
export function rankingOf(choices: readonly RankedChoice[], width: number): Ranking {
  const weighed = choices.map(
    (choice) => new Map<string, Weighed>(weighedParts(choice).map((each) => [each.part, each])),
  );
  const keys: string[] = [...STACKED.map(({ name }) => name), 'moves'];
  const series = stack<Map<string, Weighed>>()
    .keys(keys)
    .value((row, key) => row.get(key)?.value ?? 0)
    .offset(stackOffsetDiverging)(weighed);
  const edges = series.flatMap((layer) => layer.flatMap(([low, high]) => [low, high]));
  const x = scaleLinear()
    .domain([Math.min(-SIDE_MIN, ...edges), Math.max(SIDE_MIN, ...edges)])
    .nice(6)
    .range([EDGE, width - EDGE]);
  const rows = choices.map((choice, index): RankingRow => {
    const segments = series.flatMap((layer): Segment[] => {
      const part = weighed[index]?.get(layer.key);
      const [low, high] = layer[index] ?? [0, 0];
      if (!part || Math.abs(high - low) < VALUE_MIN) return [];
      return [{ ...part, x0: x(low), x1: x(high) }];
    });
    return { choice, segments, y: AXIS_HEIGHT + index * ROW_HEIGHT, sum: x(choice.merit) };
  });
  return {
    rows,
    ticks: x.ticks(Math.max(3, Math.floor(width / 90))).map((value) => ({ value, x: x(value) })),
    zero: x(0),
    height: AXIS_HEIGHT + rows.length * ROW_HEIGHT + 4,
  };
}
