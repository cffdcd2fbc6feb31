/** Addresses of a kept position: its figure, and its reading on the first page. */
import type { PositionAnswer } from '@/openapi/schemas/studies';

type Shown = Pick<PositionAnswer, 'fen' | 'layer' | 'man'>;

/** The figure, with the layer that was chosen for it. */
export function plateHref({ fen, layer, man }: Shown): string {
  const query = new URLSearchParams({ fen, mode: 'diagram', layer: layer ?? 'position' });
  if (man !== null && (layer === 'mobility' || layer === 'routes')) query.set('man', man);
  return `/api/v1/plates.svg?${query}`;
}

/** The first page with this position. */
export function readingHref({ fen, layer }: Shown): string {
  const query = new URLSearchParams({ fen });
  if (layer !== null && layer !== 'position' && layer !== 'routes') query.set('layer', layer);
  return `/?${query}`;
}
