/** What the address holds, so that every state worth sharing has a link. */
import { squareName, squareNamed } from '@/engine/board';
import type { Square } from '@/engine/types';
import { LAYERS, type Layer } from '@/components/plate/types';

/** The part of the page's state that a link carries. */
export interface Address {
  /** The position as FEN, as it was typed. */
  readonly fen: string;
  readonly layer: Layer;
  /** The man whose mobility is asked for. */
  readonly man: Square | null;
  readonly flipped: boolean;
  /** Key of the chosen statement. */
  readonly statement: string | null;
}

/** Values of a query string as Next hands them down. */
export type Query = Readonly<Record<string, string | readonly string[] | undefined>>;

/** Reads the address; whatever is missing or wrong takes its default, the FEN is kept as it is. */
export function readAddress(query: Query, defaults: { fen: string }): Address {
  const one = (name: string): string | undefined => {
    const value = query[name];
    return typeof value === 'string' ? value : value?.[0];
  };
  const layer = one('layer');
  return {
    fen: one('fen')?.trim() || defaults.fen,
    layer: LAYERS.find((known) => known === layer) ?? 'command',
    man: squareNamed(one('man') ?? '') ?? null,
    flipped: one('side') === 'black',
    statement: one('statement') ?? null,
  };
}

/** The path and query of an address; `change` overrides parts of it. */
export function addressHref(address: Address, change: Partial<Address> = {}): string {
  const { fen, layer, man, flipped, statement } = { ...address, ...change };
  const query = new URLSearchParams({ fen, layer });
  if (man !== null) query.set('man', squareName(man));
  if (flipped) query.set('side', 'black');
  if (statement !== null) query.set('statement', statement);
  return `/?${query.toString()}`;
}
