/** Routes as dotted trails with numbered stops: dots where safe, broken where not, other ways in lighter ink. */
import type { Kind, Side, SquareName } from '@/engine/types';
import { cornerOf, n } from '../place';
import type { BoardPlace, LegendItem, Mark, Paint, PlateExtra } from '../types';

/** One way over the board. */
export interface Trail {
  readonly side: Side;
  readonly from: SquareName;
  readonly stops: readonly TrailStop[];
  /** The way that is shown, one's own, or another of the same length. */
  readonly rank: 'shown' | 'own' | 'other';
}

export interface TrailStop {
  readonly square: SquareName;
  /** The step is safe and possible. */
  readonly fine: boolean;
}

/** A way of one man as the engine's answer has it. */
export interface WayOfMan {
  readonly man: SquareName;
  readonly kind: Kind;
  readonly post: SquareName;
  readonly stops: readonly SquareName[];
}

/** The trail of a way all of whose stops are safe, and those of other ways to the same post. */
export function wayTrails(
  side: Side,
  { man, stops }: Pick<WayOfMan, 'man' | 'stops'>,
  others: readonly (readonly SquareName[])[],
): Trail[] {
  const trail = (way: readonly SquareName[], rank: Trail['rank']): Trail => ({
    side,
    from: man,
    stops: way.map((square) => ({ square, fine: true })),
    rank,
  });
  return [trail(stops, 'shown'), ...others.map((way) => trail(way, 'other'))];
}

/** A way in a line: 'The knight from f3 to g3 in 3 moves by d2, f1'. */
export function wayTitle({ man, kind, post, stops }: WayOfMan): string {
  const via = stops.slice(0, -1).join(', ');
  const moves = stops.length === 1 ? '1 move' : `${stops.length} moves`;
  return `The ${kind} from ${man} to ${post} in ${moves}${via ? ` by ${via}` : ''}`;
}

/** Radius of a stop in sides of a square. */
const STOP = 0.2;
/** How far a step bows out to the side, in its own lengths: two steps on one line do not hide each other. */
const BOW = 0.09;

/** The trails, the least important first. Stops of the shown way are not drawn again by the others. */
export function trailMarks(trails: readonly Trail[], board: BoardPlace): Mark[] {
  const order = { other: 0, shown: 1, own: 2 } as const;
  const sorted = [...trails].sort((a, b) => order[a.rank] - order[b.rank]);
  return sorted.flatMap((trail, index) => {
    const taken = new Set(sorted.slice(index + 1).flatMap(({ stops }) => stops.map(({ square }) => square)));
    return [...stepMarks(trail, board), ...stopMarks(trail, board, taken)];
  });
}

function paintOf({ side, rank }: Trail, fine: boolean): Paint {
  if (!fine) return 'pick';
  if (rank === 'other') return 'hair';
  return side === 'white' ? 'ochre' : 'indigo';
}

function stepMarks(trail: Trail, board: BoardPlace): Mark[] {
  let before = trail.from;
  return trail.stops.flatMap(({ square, fine }, index) => {
    const d = stepPath(board, before, square, index === 0 ? 0.3 : STOP + 0.05);
    before = square;
    const width = Math.max(1.6, board.size * (trail.rank === 'other' ? 0.032 : 0.052));
    const marks: Mark[] = [];
    if (trail.rank !== 'other') marks.push({ type: 'path', d, stroke: 'paper', width: width * 2.1, fill: 'none' });
    marks.push({ type: 'path', d, stroke: paintOf(trail, fine), width, fill: 'none', ...dashOf(board, width, fine) });
    return marks;
  });
}

function dashOf({ size }: BoardPlace, width: number, fine: boolean): { dash: string; cap: 'round' | 'butt' } {
  return fine
    ? { dash: `0.01 ${n(width * 2.1)}`, cap: 'round' }
    : { dash: `${n(size * 0.16)} ${n(size * 0.1)}`, cap: 'butt' };
}

/** A step as a slightly bowed line from the edge of one stop to the edge of the next. */
function stepPath(board: BoardPlace, from: SquareName, to: SquareName, startGap: number): string {
  const a = centreOf(board, from);
  const b = centreOf(board, to);
  const length = Math.hypot(b.x - a.x, b.y - a.y);
  if (length === 0) return `M${n(a.x)} ${n(a.y)}`;
  const along = { x: (b.x - a.x) / length, y: (b.y - a.y) / length };
  const start = { x: a.x + along.x * startGap * board.size, y: a.y + along.y * startGap * board.size };
  const endGap = (STOP + 0.05) * board.size;
  const end = { x: b.x - along.x * endGap, y: b.y - along.y * endGap };
  const bend = { x: (a.x + b.x) / 2 - along.y * length * BOW, y: (a.y + b.y) / 2 + along.x * length * BOW };
  return `M${n(start.x)} ${n(start.y)}Q${n(bend.x)} ${n(bend.y)} ${n(end.x)} ${n(end.y)}`;
}

function centreOf(board: BoardPlace, square: SquareName): { x: number; y: number } {
  const { x, y } = cornerOf(board, square);
  return { x: x + board.size / 2, y: y + board.size / 2 };
}

function stopMarks(trail: Trail, board: BoardPlace, taken: ReadonlySet<SquareName>): Mark[] {
  return trail.stops.flatMap(({ square, fine }, index): Mark[] => {
    if (taken.has(square)) return [];
    const { x, y } = centreOf(board, square);
    return stop(x, y, STOP * board.size, index + 1, {
      paint: paintOf(trail, fine),
      last: index === trail.stops.length - 1 && trail.rank !== 'other',
      thin: trail.rank === 'other',
      fine,
    });
  });
}

/** A numbered stop: the last one solid, a faulty one crossed. */
function stop(
  x: number,
  y: number,
  r: number,
  number: number,
  { paint, last, thin, fine }: { paint: Paint; last: boolean; thin: boolean; fine: boolean },
): Mark[] {
  const size = r * 1.16;
  const marks: Mark[] = [
    { type: 'circle', x, y, r: r + 2, fill: 'paper' },
    { type: 'circle', x, y, r, fill: last ? paint : 'paper', stroke: paint, width: thin ? 1 : Math.max(1.2, r * 0.15) },
    {
      type: 'text',
      x,
      y: y + size * 0.36,
      text: String(number),
      size,
      weight: thin ? 500 : 700,
      fill: last ? 'paper' : thin ? 'soft' : paint,
      anchor: 'middle',
    },
  ];
  if (fine) return marks;
  const reach = r * 1.25;
  const cross = `M${n(x - reach)} ${n(y + reach)}L${n(x - r * 0.8)} ${n(y + r * 0.8)}M${n(x + r * 0.8)} ${n(y - r * 0.8)}L${n(x + reach)} ${n(y - reach)}`;
  return [...marks, { type: 'path', d: cross, stroke: paint, width: Math.max(1.6, r * 0.2), fill: 'none' }];
}

/** The legend of the trails that occur. */
export function trailLegend(trails: readonly Trail[]): LegendItem[] {
  const main = trails.find(({ rank }) => rank !== 'other');
  const items: LegendItem[] = [];
  const line = (paint: Paint, width: number, fine: boolean): Mark => ({
    type: 'path',
    d: 'M1 8H23',
    stroke: paint,
    width,
    fill: 'none',
    ...(fine ? { dash: `0.01 ${n(width * 2.1)}`, cap: 'round' } : { dash: '7 4' }),
  });
  if (main) {
    items.push({ label: 'way, each stop safe by exchange', marks: [line(paintOf(main, true), 2.6, true)] });
    if (main.stops[main.stops.length - 1]?.fine)
      items.push({ label: 'post', marks: stop(12, 8, 7, main.stops.length, stopLook(main)) });
  }
  if (trails.some(({ stops }) => stops.some(({ fine }) => !fine)))
    items.push({ label: 'step that fails', marks: [line('pick', 2.6, false)] });
  if (trails.some(({ rank }) => rank === 'other'))
    items.push({ label: 'another way', marks: [line('hair', 1.8, true)] });
  return items;
}

/** The trails as what a plate shows besides its layer; `words` say them for the alt text. */
export function trailExtra(trails: readonly Trail[], words: string): PlateExtra {
  return { over: (board) => trailMarks(trails, board), legend: trailLegend(trails), alt: `${words}.` };
}

function stopLook(trail: Trail): { paint: Paint; last: boolean; thin: boolean; fine: boolean } {
  return { paint: paintOf(trail, true), last: true, thin: false, fine: true };
}
