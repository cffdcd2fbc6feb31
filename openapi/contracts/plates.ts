/** A figure of a position, as SVG or PNG, at an address that an `img` element can hold. */
import { contract } from '../contract';
import { EXAMPLE_FEN } from '../schemas/examples';
import { plateQuerySchema, plateWidthMax } from '../schemas/plates';

const description =
  'Draws the position with one layer of its reading and, if asked, the leading statements beside the board. The same marks draw the page.';

export const getPlateSvg = contract({
  id: 'getPlateSvg',
  method: 'GET',
  path: '/api/v1/plates.svg',
  tag: 'Plates',
  scope: 'compute',
  summary: 'Draw a plate as SVG',
  description,
  query: plateQuerySchema,
  reply: { form: 'text', media: 'image/svg+xml' },
  cached: true,
  errors: ['fen-refused'],
  example: { query: { fen: EXAMPLE_FEN, layer: 'command' } },
});

export const getPlatePng = contract({
  id: 'getPlatePng',
  method: 'GET',
  path: '/api/v1/plates.png',
  tag: 'Plates',
  scope: 'compute',
  summary: 'Draw a plate as PNG',
  description: `${description} The PNG is at most ${plateWidthMax} pixels wide.`,
  query: plateQuerySchema,
  reply: { form: 'bytes', media: 'image/png' },
  cached: true,
  errors: ['fen-refused'],
  example: { query: { fen: EXAMPLE_FEN, layer: 'command', width: '480' } },
});
