import { describe, expect, it } from 'vitest';
import { type Trail, trailLegend, trailMarks } from '@/components/plate/layers/routes';
import type { Mark } from '@/components/plate/types';

const board = { x: 0, y: 0, size: 60, flipped: false };
const shown: Trail = {
  side: 'white',
  from: 'f3',
  stops: [
    { square: 'd2', fine: true },
    { square: 'b3', fine: true },
  ],
  rank: 'shown',
};

/** Numbers that stand on stops, in order of drawing. */
function numbers(marks: readonly Mark[]): string[] {
  return marks.flatMap((mark) => (mark.type === 'text' ? [mark.text] : []));
}

describe('trails', () => {
  it('number their stops where they stand', () => {
    const marks = trailMarks([shown], board);
    expect(numbers(marks)).toEqual(['1', '2']);
    const circles = marks.filter((mark) => mark.type === 'circle');
    // d2 is the fourth file and the seventh row from above; b3 the second and the sixth.
    expect(circles.map(({ x, y }) => [x, y])).toEqual([
      [210, 390],
      [210, 390],
      [90, 330],
      [90, 330],
    ]);
  });

  it('are dotted where safe and broken, with the stop crossed, where a step fails', () => {
    const dashes = (trail: Trail) =>
      trailMarks([trail], board).flatMap((mark) => (mark.type === 'path' && mark.dash ? [mark] : []));
    expect(dashes(shown).map(({ cap, stroke }) => [cap, stroke])).toEqual([
      ['round', 'ochre'],
      ['round', 'ochre'],
    ]);
    const failing = {
      ...shown,
      stops: [
        { square: 'd2', fine: true },
        { square: 'c5', fine: false },
      ],
    } as const;
    expect(dashes(failing).map(({ cap, stroke }) => [cap, stroke])).toEqual([
      ['round', 'ochre'],
      ['butt', 'pick'],
    ]);
    expect(trailMarks([failing], board)).toHaveLength(trailMarks([shown], board).length + 1);
  });

  it('in lighter ink do not number again a stop that they share', () => {
    const other: Trail = {
      ...shown,
      stops: [
        { square: 'd2', fine: true },
        { square: 'f1', fine: true },
      ],
      rank: 'other',
    };
    expect(numbers(trailMarks([shown, other], board))).toEqual(['2', '1', '2']);
  });

  it('turn with the board', () => {
    const turned = trailMarks([shown], { ...board, flipped: true }).find((mark) => mark.type === 'circle');
    expect(turned).toMatchObject({ x: 270, y: 90 });
  });

  it('explain in the legend what occurs and nothing else', () => {
    expect(trailLegend([]).map(({ label }) => label)).toEqual([]);
    expect(trailLegend([shown]).map(({ label }) => label)).toEqual(['way, each stop safe by exchange', 'post']);
  });
});
