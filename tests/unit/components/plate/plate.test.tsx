/** The plate: geometry that holds for any position, two drawers that draw the same, and nothing that gets markup in. */
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { PlateMarks } from '@/components/plate/draw-jsx';
import { drawSvg } from '@/components/plate/draw-svg';
import { plateOf } from '@/components/plate/layout';
import { textWidth } from '@/components/plate/measure';
import { cornerOf, frameInset } from '@/components/plate/place';
import { THEME } from '@/components/plate/tokens';
import { LAYERS, type Mark, type Plate, type PlateRequest } from '@/components/plate/types';
import { heatMapOf, type Reading, readFen } from '@/engine';
import { realPositions } from '../../../support/real-positions';

function readingOf(fen: string): Reading {
  const reading = readFen(fen, 'diagram');
  if (!reading.ok) throw new Error(reading.fault[0].message);
  return reading.value;
}

/** All marks of a plate, groups opened. */
function flat(marks: readonly Mark[]): Mark[] {
  return marks.flatMap((mark) => (mark.type === 'group' ? flat(mark.marks) : [mark]));
}

/** The notes of a margin plate, each as its group of marks. */
function noteGroups(plate: Plate): (readonly Mark[])[] {
  const notes = plate.marks.find((mark) => mark.type === 'group' && mark.key === 'notes');
  return notes?.type === 'group' ? notes.marks.flatMap((mark) => (mark.type === 'group' ? [mark.marks] : [])) : [];
}

interface Box {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

function textBoxes(marks: readonly Mark[]): Box[] {
  return marks.flatMap((mark) =>
    mark.type === 'text'
      ? [
          {
            left: mark.x,
            right: mark.x + textWidth(mark.text, mark.size, mark.weight),
            top: mark.y - mark.size * 0.8,
            bottom: mark.y + mark.size * 0.2,
          },
        ]
      : [],
  );
}

const overlaps = (a: Box, b: Box) => a.left < b.right && b.left < a.right && a.top < b.bottom && b.top < a.bottom;

/** The corners of a hairline: its path is made of M, H, L. */
function corners(mark: Mark): { x: number; y: number }[] {
  if (mark.type !== 'path') return [];
  const points: { x: number; y: number }[] = [];
  for (const [, command = '', numbers = ''] of mark.d.matchAll(/([MHL])([-\d. ]+)/g)) {
    const [x = 0, y = 0] = numbers.trim().split(/ /).map(Number);
    points.push(command === 'H' ? { x, y: points[points.length - 1]?.y ?? 0 } : { x, y });
  }
  return points;
}

const cross = (a: { x: number; y: number }, b: { x: number; y: number }, c: { x: number; y: number }) =>
  Math.sign((b.x - a.x) * (c.y - a.y) - (b.y - a.y) * (c.x - a.x));

function linesCross(a: { x: number; y: number }[], b: { x: number; y: number }[]): boolean {
  return a.slice(1).some((end, i) =>
    b.slice(1).some((otherEnd, j) => {
      const [start, otherStart] = [a[i], b[j]];
      if (!start || !otherStart) return false;
      return (
        cross(start, end, otherStart) * cross(start, end, otherEnd) < 0 &&
        cross(otherStart, otherEnd, start) * cross(otherStart, otherEnd, end) < 0
      );
    }),
  );
}

describe('margin notes, on 400 positions of real games', () => {
  const plates = realPositions(400).map((fen) => plateOf({ reading: readingOf(fen), layer: 'command', width: 1312 }));

  it('are there, five at most, numbered from one', () => {
    expect(plates.filter(({ notes }) => notes.length >= 3).length).toBeGreaterThan(390);
    for (const { notes } of plates)
      expect(notes.map(({ number }) => number)).toEqual(notes.map((_, index) => index + 1));
    expect(Math.max(...plates.map(({ notes }) => notes.length))).toBeLessThanOrEqual(5);
  });

  it('stand inside the figure, beside the board, and do not overlap', () => {
    for (const plate of plates) {
      const groups = noteGroups(plate).map(textBoxes);
      const edge = frameInset(plate.board.size);
      for (const [index, boxes] of groups.entries()) {
        for (const box of boxes) {
          expect(box.left).toBeGreaterThanOrEqual(0);
          expect(box.right).toBeLessThanOrEqual(plate.width);
          expect(box.top).toBeGreaterThanOrEqual(0);
          expect(box.bottom).toBeLessThanOrEqual(plate.height);
          const besideBoard =
            box.right < plate.board.x - edge || box.left > plate.board.x + 8 * plate.board.size + edge;
          expect(besideBoard).toBe(true);
          for (const other of groups.slice(index + 1).flat()) expect(overlaps(box, other)).toBe(false);
        }
      }
    }
  });

  it('have hairlines that cross neither each other nor a man', () => {
    for (const plate of plates) {
      const lines = noteGroups(plate).map((marks) =>
        corners(marks.find((mark) => mark.type === 'path' && mark.d.includes('L')) ?? marks[0]!),
      );
      for (const [index, line] of lines.entries()) {
        for (const other of lines.slice(index + 1)) expect(linesCross(line, other)).toBe(false);
        // On the board the line runs on a grid line, so it passes between squares and never over a man.
        const last = line[line.length - 1];
        const steps = ((last?.y ?? 0) - plate.board.y) / plate.board.size;
        expect(Math.abs(steps - Math.round(steps))).toBeLessThan(0.01);
      }
    }
  });
});

describe('every layer, width and turn', () => {
  const [fen = ''] = realPositions(1);
  const reading = readingOf(fen);
  const man = reading.men.find(({ kind }) => kind === 'knight')?.square ?? null;
  const heat = man ? (heatMapOf(fen, man) ?? null) : null;
  const requests = LAYERS.flatMap((layer) =>
    [1440, 820, 390, 180].flatMap((width) =>
      [false, true].map((flipped): PlateRequest => ({ reading, layer, width, flipped, man, heat })),
    ),
  );

  it('gives finite marks inside the figure', () => {
    for (const request of requests) {
      const plate = plateOf(request);
      expect(drawSvg(plate, 'light')).not.toMatch(/NaN|undefined|Infinity/);
      for (const mark of flat(plate.marks)) {
        if (mark.type === 'path' || mark.type === 'group') continue;
        expect(mark.x).toBeGreaterThanOrEqual(0);
        expect(mark.x).toBeLessThanOrEqual(plate.width);
        expect(mark.y).toBeLessThanOrEqual(plate.height);
      }
    }
  });

  it('is drawn alike by the page and by the file', () => {
    const strengths = THEME.light.strengths as Readonly<Record<string, number>>;
    const paints = THEME.light.paints as Readonly<Record<string, string>>;
    for (const request of requests.filter(({ width }) => width === 820)) {
      const plate = plateOf({ ...request, below: 'none' });
      const onPage = renderToStaticMarkup(<PlateMarks plate={plate} />)
        .replace(/calc\(0\.05 \+ var\(--heat-k\) \* (\d+)\)/g, (_, moves: string) =>
          String(Math.round((0.05 + 0.072 * Number(moves)) * 1000) / 1000),
        )
        .replace(/var\(--([\w-]+)\)/g, (_, name: string) => paints[name] ?? String(strengths[name]))
        .replace(/><\/(path|circle)>/g, '/>')
        .replaceAll('&#x27;', '&#39;');
      const file = drawSvg(plate, 'light');
      const inFile = file
        .slice(file.indexOf('<defs>'))
        .replace(/<rect[^>]*\/>/, '')
        .replace('</svg>', '');
      expect(onPage).toBe(inFile);
    }
  });

  it('has pips that can be counted against the reading', () => {
    const plate = plateOf({ reading, layer: 'control', width: 820, notes: 'none', below: 'none' });
    const over = plate.marks.find((mark) => mark.type === 'group' && mark.key === 'over');
    const groups = over?.type === 'group' ? over.marks : [];
    for (const { square, attackers, behind } of reading.squares) {
      const group = groups.find((mark) => mark.type === 'group' && mark.key === square);
      const marks = group?.type === 'group' ? group.marks : [];
      for (const [side, fill] of [
        ['white', 'paper'],
        ['black', 'indigo'],
      ] as const) {
        const count = attackers[side].length + behind[side].length;
        if (count > 5) continue;
        expect(
          marks.filter((mark) => mark.type === 'circle' && mark.fill === fill),
          `${square} ${side}`,
        ).toHaveLength(count);
      }
      const corner = cornerOf(plate.board, square);
      for (const mark of marks) if (mark.type === 'circle') expect(mark.x).toBeGreaterThan(corner.x);
    }
  });

  it('lets no markup in by caption or title', () => {
    const evil = '"><script>alert(1)</script><text onload="x" & \u0000';
    const svg = drawSvg(
      plateOf({ reading, layer: 'command', width: 700, caption: { title: evil, text: evil } }),
      'light',
    );
    expect(svg).not.toContain('<script');
    expect(svg).not.toContain('onload="x"');
    expect(svg).not.toContain('\u0000');
  });
});
