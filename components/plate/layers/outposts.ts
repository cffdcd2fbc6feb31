/** Outposts as pennants in the upper right corner: solid for good, outlined while fixed, a swallow-tail for advanced posts. */
import type { Reading } from '@/engine/reading/schema';
import type { Side, SquareName } from '@/engine/types';
import { cornerOf, n } from '../place';
import type { BoardPlace, Mark } from '../types';

type Outpost = Reading['outposts'][number];

/** Which posts are worth a pennant: outposts that someone holds or can reach, and held or supported advanced posts. */
export function shownPosts(posts: readonly Outpost[]): Outpost[] {
  return posts.filter((post) => {
    const used = post.occupant !== null || post.users.length > 0;
    if (post.rank === 'outpost') return used;
    const rank = Number(post.square.charAt(1));
    const inEnemyHalf = post.side === 'white' ? rank >= 5 : rank <= 4;
    return used && inEnemyHalf && post.support?.moves === 0;
  });
}

/** Pennants of the posts shown; where both sides have one on a square the second stands further in. */
export function outpostMarks(posts: readonly Outpost[], board: BoardPlace, print: boolean): Mark[] {
  const taken = new Set<SquareName>();
  return shownPosts(posts).flatMap((post) => {
    const { x, y } = cornerOf(board, post.square);
    const staff = taken.has(post.square) ? 0.68 : 0.9;
    taken.add(post.square);
    return pennant(post, x + staff * board.size, y + 0.07 * board.size, board.size, print);
  });
}

/** A pennant whose staff's head is at x, y; the flag flies to the left. */
export function pennant(
  { side, rank, hold }: { readonly side: Side; readonly rank: Outpost['rank']; readonly hold: Outpost['hold'] },
  x: number,
  y: number,
  size: number,
  print: boolean,
): Mark[] {
  const paint = side === 'white' ? 'ochre' : 'indigo';
  const width = Math.max(9, 0.2 * size);
  const height = Math.max(5.5, 0.13 * size);
  const stroke = Math.max(1, Math.min(1.5, size * 0.022));
  const advanced = rank === 'advanced';
  const flag = advanced
    ? `M${n(x)} ${n(y)}h${n(-width)}l${n(width * 0.36)} ${n(height / 2)}l${n(-width * 0.36)} ${n(height / 2)}h${n(width)}z`
    : `M${n(x)} ${n(y)}L${n(x - width)} ${n(y + height / 2)}L${n(x)} ${n(y + height)}z`;
  const solid = !advanced && hold === 'permanent';
  const marks: Mark[] = [
    { type: 'path', d: `M${n(x)} ${n(y - 0.5)}v${n(height * 2.05)}`, stroke: paint, width: stroke, fill: 'none' },
    { type: 'path', d: flag, stroke: paint, width: stroke * 0.9, join: 'miter', fill: solid ? paint : 'paper' },
  ];
  if (print && side === 'white') {
    marks.push({
      type: 'path',
      d: `M${n(x + 2.4)} ${n(y - 0.5)}v${n(height * 2.05)}`,
      stroke: paint,
      width: 0.8,
      fill: 'none',
    });
  }
  return marks;
}
