/** A FEN and a few choices to a figure. */
import type { Reading } from '@/engine/reading/schema';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { type PlateOptions, plateSvg } from '@/lib/figures/plate';
import { pngOf } from '@/lib/figures/png';
import type { PlateQuery } from '@/openapi/schemas/plates';
import { fullReading } from '../readings/full-reading';

/** The figure as SVG text. Throws `fen-refused`, or `invalid-request` for a man that is not there. */
export async function drawPlateSvg(_ctx: Context, query: PlateQuery): Promise<string> {
  const reading = fullReading(query);
  return plateSvg(reading, optionsOf(reading, query));
}

/** The same figure as the bytes of a PNG, exactly `width` pixels wide. */
export function plateAsPng(svg: string, { width }: PlateQuery): Uint8Array {
  return pngOf(svg, width);
}

function optionsOf(reading: Reading, query: PlateQuery): PlateOptions {
  const { layer, width, theme, side, man, caption, notes } = query;
  if (layer === 'mobility' && man === undefined)
    throw manRefused('required', 'The layer "mobility" needs the square of a man.');
  if (man !== undefined && !reading.men.some(({ square }) => square === man))
    throw manRefused('no-man', `There is no man on ${man}.`);
  return {
    layer,
    width,
    theme,
    notes,
    flipped: side === 'black',
    man: man ?? null,
    caption: caption === undefined ? null : { title: caption },
  };
}

function manRefused(code: string, message: string): AppError {
  return new AppError('invalid-request', message, { faults: [{ path: '/man', code, message }] });
}
