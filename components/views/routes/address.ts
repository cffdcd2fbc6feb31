/** What the address of the routes page holds, so that every state worth sharing has a link. */
import { squareNamed } from '@/engine/board';
import type { Side, SquareName } from '@/engine/types';

/** Values of a query string as Next hands them down. */
export type Query = Readonly<Record<string, string | readonly string[] | undefined>>;

/** The part of the page's state that a link carries. */
export interface RoutesAddress {
  /** The position as FEN, as it was typed. */
  readonly fen: string;
  /** Whose men; the side to move where null. */
  readonly of: Side | null;
  /** The man whose posts are asked; the whole side where null. */
  readonly man: SquareName | null;
  /** The chosen row of the ranking, as man and post; the first where null. */
  readonly post: string | null;
  /** A route of one's own, as it was typed: squares or moves in SAN. */
  readonly route: string;
  /** Black at the foot of the board. */
  readonly flipped: boolean;
}

/** Longest route text that is kept: twelve moves with room to spare. */
const ROUTE_TEXT_MAX = 200;

/** Reads the address; whatever is missing or wrong takes its default, what was typed is kept as it is. */
export function readRoutesAddress(query: Query, defaults: { readonly fen: string }): RoutesAddress {
  const one = (name: string): string | undefined => {
    const value = query[name];
    return typeof value === 'string' ? value : value?.[0];
  };
  const of = one('of');
  const post = one('post') ?? '';
  const man = one('man') ?? '';
  return {
    fen: one('fen')?.trim() || defaults.fen,
    of: of === 'white' || of === 'black' ? of : null,
    man: squareNamed(man) === undefined ? null : (man as SquareName),
    post: /^[a-h][1-8]-[a-h][1-8]$/.test(post) ? post : null,
    route: (one('route') ?? '').slice(0, ROUTE_TEXT_MAX),
    flipped: one('side') === 'black',
  };
}

/** The path and query of an address; `change` overrides parts of it. */
export function routesHref(address: RoutesAddress, change: Partial<RoutesAddress> = {}): string {
  const { fen, of, man, post, route, flipped } = { ...address, ...change };
  const query = new URLSearchParams({ fen });
  if (of !== null) query.set('of', of);
  if (man !== null) query.set('man', man);
  if (post !== null) query.set('post', post);
  if (route !== '') query.set('route', route);
  if (flipped) query.set('side', 'black');
  return `/routes?${query.toString()}`;
}
