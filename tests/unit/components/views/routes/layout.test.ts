import { describe, expect, it } from 'vitest';
import { answerRoutes } from '@/components/views/routes/answer';
import { STACKED } from '@/components/views/routes/families';
import { rankingOf, weighedParts } from '@/components/views/routes/layout';
import { rankingDrawing } from '@/components/views/routes/ranking-marks';
import { RANKING_HEADS, rankingRows } from '@/components/views/routes/table';
import { MOVE_COST, PARTS } from '@/engine/posts';

const CARLSBAD = 'r3r1k1/pp1nqpp1/2p2n1p/3p4/3P2b1/2NBPN2/PPQ2PPP/1R2R1K1 w - - 0 15';
const { choices } = answerRoutes({ fen: CARLSBAD, of: null, man: 'f3', route: [] });
const WIDTH = 640;
const ranking = rankingOf(choices, WIDTH);

describe('the families of parts', () => {
  it('name every part of the table of weights once', () => {
    expect(STACKED.map(({ name }) => name).sort()).toEqual(PARTS.map(({ name }) => name).sort());
  });
});

describe('the bars of the ranking', () => {
  /** Units of weight to a pixel, from two figures of the axis. */
  const [first, second] = ranking.ticks;
  const unit = first && second ? (second.x - first.x) / (second.value - first.value) : Number.NaN;

  it('are as wide as weight times difference of count', () => {
    expect(ranking.rows).toHaveLength(choices.length);
    for (const { segments } of ranking.rows) {
      for (const { x0, x1, weight, now, there } of segments) {
        expect(x1 - x0).toBeCloseTo(Math.abs(weight * (there - now)) * unit, 6);
      }
    }
  });

  it('stack what helps right of zero, what harms left of it, without gap or overlap', () => {
    for (const { segments } of ranking.rows) {
      const right = segments.filter(({ value }) => value > 0);
      const left = segments.filter(({ value }) => value < 0);
      const ends = (list: typeof segments) => list.reduce((sum, { x0, x1 }) => sum + x1 - x0, 0);
      expect(Math.max(ranking.zero, ...right.map(({ x1 }) => x1)) - ranking.zero).toBeCloseTo(ends(right), 0);
      expect(ranking.zero - Math.min(ranking.zero, ...left.map(({ x0 }) => x0))).toBeCloseTo(ends(left), 0);
    }
  });

  it('add up to what the list is ordered by', () => {
    for (const choice of choices) {
      const sum = weighedParts(choice).reduce((total, { value }) => total + value, 0);
      // The gain comes rounded to hundredths.
      expect(Math.abs(sum - choice.merit)).toBeLessThan(0.006);
    }
    expect(choices.map(({ merit }) => merit)).toEqual(choices.map(({ merit }) => merit).toSorted((a, b) => b - a));
  });

  it('charge each further move, and a preparation as two', () => {
    const far = choices.find(({ moves, needs }) => moves === 3 && needs === null);
    const prepared = choices.find(({ moves, needs }) => moves === 1 && needs !== null);
    const time = (choice: typeof far) => choice && weighedParts(choice).find(({ part }) => part === 'moves')?.value;
    expect(time(far)).toBe(-2 * MOVE_COST);
    expect(time(prepared)).toBe(-2 * MOVE_COST);
  });

  it('stay inside the figure at every width', () => {
    for (const width of [320, 640, 1200]) {
      const { rows } = rankingOf(choices, width);
      const edges = rows.flatMap(({ segments, sum }) => [sum, ...segments.flatMap(({ x0, x1 }) => [x0, x1])]);
      expect(Math.min(...edges)).toBeGreaterThanOrEqual(0);
      expect(Math.max(...edges)).toBeLessThanOrEqual(width);
    }
  });

  it('are drawn in hatchings, one ink a side, never by hue alone', () => {
    const request = { ranking, width: WIDTH, side: 'white', named: false, chosen: 0, id: 't', title: 'Posts' } as const;
    const { patterns, marks, alt } = rankingDrawing(request);
    const paints = new Set(
      marks.flatMap((mark) => ('fill' in mark && typeof mark.fill === 'string' ? [mark.fill] : [])),
    );
    expect([...paints].filter((paint) => !['ochre', 'ink', 'soft', 'paper', 'pick', 'none'].includes(paint))).toEqual(
      [],
    );
    expect(new Set(patterns.map(({ id }) => id)).size).toBe(5);
    expect(alt).toContain(choices[0]?.post ?? '-');
  });
});

describe('the table of the ranking', () => {
  it('has the same figures as the bars: one row a count that differs', () => {
    const rows = rankingRows(choices);
    expect(rows).toHaveLength(choices.reduce((sum, choice) => sum + weighedParts(choice).length, 0));
    for (const row of rows) expect(row).toHaveLength(RANKING_HEADS.length);
  });
});
