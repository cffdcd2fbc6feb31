/** A reading's plate as a file: the same marks as on the page. */
import { drawSvg } from '@/components/plate/draw-svg';
import { plateOf } from '@/components/plate/layout';
import type { ThemeName } from '@/components/plate/tokens';
import type { PlateRequest } from '@/components/plate/types';
import { heatMapOf } from '@/engine';
import type { Reading } from '@/engine/reading/schema';

/** What a figure is asked for. `width` in px; `man` for the layer of mobility. */
export type PlateOptions = Pick<
  PlateRequest,
  'layer' | 'width' | 'flipped' | 'man' | 'notes' | 'caption' | 'chosen'
> & {
  readonly theme: ThemeName;
};

/** The figure as the text of an SVG file. */
export function plateSvg(reading: Reading, options: PlateOptions): string {
  const { theme, ...request } = options;
  const heat = options.layer === 'mobility' && options.man ? (heatMapOf(reading.fen, options.man) ?? null) : null;
  return drawSvg(plateOf({ ...request, reading, heat, print: theme === 'print' }), theme);
}
