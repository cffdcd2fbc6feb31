/** A FEN and a few choices to a figure. */
import type { Reading } from '@/engine/reading/schema';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { type PlateOptions, plateSvg } from '@/lib/figures/plate';
import { pngOf } from '@/lib/figures/png';
import type { PlateQuery } from '@/openapi/schemas/plates';
import type { RouteChoice } from '@/engine/reading/schema/routes';
import { fullReading } from '../readings/full-reading';
import { findRoutes } from '../routes/find-routes';

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
    ...(layer === 'routes' && { way: wayOf(reading, query) }),
  };
}

/** How far and how widely ways are looked for: every post within four moves. */
const WAY_BOUNDS = { movesMax: 4, choicesMax: 96 };

/** The way asked for, or the one that helps most. Throws `invalid-request` for a post that the man does not reach. */
function wayOf({ fen }: Reading, { man, post, mode }: PlateQuery): RouteChoice | null {
  const { choices } = findRoutes({ fen, man, ...WAY_BOUNDS }, mode);
  if (post === undefined) return choices[0] ?? null;
  const way = choices.find((choice) => choice.post === post);
  if (way) return way;
  const message = `There is no safe way to ${post} within four moves${man === undefined ? '' : ` from ${man}`}.`;
  throw new AppError('invalid-request', message, { faults: [{ path: '/post', code: 'no-way', message }] });
}

function manRefused(code: string, message: string): AppError {
  return new AppError('invalid-request', message, { faults: [{ path: '/man', code, message }] });
}
