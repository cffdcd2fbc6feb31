/** Weak squares as depression contours: a ring with hachures turned inwards, broken where the weakness is only fixed. */
import type { Reading } from '@/engine/reading/schema';
import type { Side } from '@/engine/types';
import { cornerOf, n } from '../place';
import type { BoardPlace, Mark } from '../types';

type WeakSquare = Reading['weakSquares'][number];

/** Rings of weak squares; those that do not matter are drawn in hairline. `all` takes them in too. */
export function weakMarks(
  weak: readonly WeakSquare[],
  board: BoardPlace,
  options: { all: boolean; print: boolean },
): Mark[] {
  return weak
    .filter(({ matters }) => options.all || matters)
    .flatMap((one) => {
      const both = weak.some((other) => other.square === one.square && other.side !== one.side);
      const { x, y } = cornerOf(board, one.square);
      const radius = board.size * (both && one.side === 'white' ? 0.37 : 0.28);
      return ring(
        one.side,
        one.hold === 'fixed',
        x + board.size / 2,
        y + board.size / 2,
        radius,
        one.matters,
        options.print,
      );
    });
}

/** One ring. In print White's is a double line, since hue cannot tell the sides apart there. */
export function ring(
  side: Side,
  broken: boolean,
  x: number,
  y: number,
  r: number,
  strong: boolean,
  print: boolean,
): Mark[] {
  const paint = strong ? (side === 'white' ? 'ochre' : 'indigo') : 'hair';
  const width = strong ? Math.max(1.1, Math.min(1.7, r * 0.09)) : 0.9;
  const teeth = strong ? (r < 14 ? 10 : 18) : 0;
  const parts = broken ? 9 : 1;
  const gap = broken ? 0.24 : 0;
  let d = '';
  for (let part = 0; part < parts; part++) {
    const from = (2 * Math.PI * part) / parts;
    const to = (2 * Math.PI * (part + 1 - gap)) / parts;
    d += broken ? arc(x, y, r, from, to) : arc(x, y, r, 0, Math.PI) + arc(x, y, r, Math.PI, 2 * Math.PI);
  }
  let wedges = '';
  for (let tooth = 0; tooth < teeth; tooth++) {
    const angle = (2 * Math.PI * (tooth + (broken ? 0.4 : 0))) / teeth;
    if (broken && teeth === 18 && ((tooth + 0.4) / 2) % 1 > 0.74) continue;
    wedges += wedge(x, y, r, angle, r * 0.26, r * 0.07);
  }
  const marks: Mark[] = [{ type: 'path', d, stroke: paint, width, fill: 'none' }];
  if (wedges) marks.push({ type: 'path', d: wedges, fill: paint });
  if (print && side === 'white' && strong) {
    marks.push({
      type: 'path',
      d: arc(x, y, r + 2.6, 0, Math.PI) + arc(x, y, r + 2.6, Math.PI, 2 * Math.PI),
      stroke: paint,
      width: 0.7,
      fill: 'none',
      ...(broken ? { dash: '4 3' } : {}),
    });
  }
  return marks;
}

function point(x: number, y: number, r: number, angle: number): string {
  return `${n(x + r * Math.cos(angle))} ${n(y + r * Math.sin(angle))}`;
}

function arc(x: number, y: number, r: number, from: number, to: number): string {
  return `M${point(x, y, r, from)}A${n(r)} ${n(r)} 0 0 1 ${point(x, y, r, to)}`;
}

function wedge(x: number, y: number, r: number, angle: number, depth: number, half: number): string {
  const spread = half / r;
  return `M${point(x, y, r, angle - spread)}L${point(x, y, r - depth, angle)}L${point(x, y, r, angle + spread)}z`;
}
