/** A reading's plate as a file: the same marks as on the page. */
import { drawSvg } from '@/components/plate/draw-svg';
import { plateOf } from '@/components/plate/layout';
import type { ThemeName } from '@/components/plate/tokens';
import type { Layer, PlateRequest } from '@/components/plate/types';
import { trailExtra, type WayOfMan, wayTitle, wayTrails } from '@/components/plate/layers/routes';
import { heatMapOf } from '@/engine';
import type { Reading } from '@/engine/reading/schema';

/** What a figure is asked for. `width` in px; `man` for the layer of mobility. */
export type PlateOptions = Pick<PlateRequest, 'width' | 'flipped' | 'man' | 'notes' | 'caption' | 'chosen'> & {
  readonly theme: ThemeName;
  readonly layer: Layer | 'routes';
  /** For the layer of routes: the way to draw; null where there is none. */
  readonly way?: WayOfMan | null;
};

/** The figure as the text of an SVG file. */
export function plateSvg(reading: Reading, options: PlateOptions): string {
  const { theme, layer, way = null, ...request } = options;
  const print = theme === 'print';
  if (layer === 'routes') return drawSvg(plateOf({ ...request, ...routesOf(reading, way, request), print }), theme);
  const heat = layer === 'mobility' && options.man ? (heatMapOf(reading.fen, options.man) ?? null) : null;
  return drawSvg(plateOf({ ...request, layer, reading, heat, print }), theme);
}

/** The bare position with the trail of a way, and the way as caption unless the caller has words of his own. */
function routesOf(
  reading: Reading,
  way: WayOfMan | null,
  { caption }: Pick<PlateOptions, 'caption'>,
): Pick<PlateRequest, 'reading' | 'layer' | 'caption' | 'extra' | 'lit'> {
  const side = reading.men.find(({ square }) => square === way?.man)?.side ?? reading.sideToMove;
  const title = way ? wayTitle(way) : 'No safe way to a better post';
  const mover = `${reading.sideToMove === 'white' ? 'White' : 'Black'} to move.`;
  return {
    reading,
    layer: 'position',
    caption: caption ?? { title, text: `${mover} Every stop is safe by exchange, the enemy standing still.` },
    extra: trailExtra(way ? wayTrails(side, way, []) : [], title),
    lit: way ? [way.man] : [],
  };
}
