/** GET /plates.svg and /plates.png: figures that can be shown anywhere and do nothing. */
import { describe, expect, it } from 'vitest';
import { LAYERS } from '@/components/plate/types';
import { THEMES } from '@/components/plate/tokens';
import { contracts } from '@/openapi/contracts';
import { EXAMPLE_FEN } from '@/openapi/schemas/examples';
import { plateLayers, plateThemes, plateWidthMax, plateWidthMin } from '@/openapi/schemas/plates';
import type { Problem } from '@/openapi/schemas/problem';
import { call, promisedJson } from './caller';

const { getPlateSvg, getPlatePng } = contracts;
const fen = EXAMPLE_FEN;

async function svgOf(query: Readonly<Record<string, string>>): Promise<string> {
  const response = await call(getPlateSvg, { query: { fen, ...query } });
  expect(response.status).toBe(200);
  return response.text();
}

/** Width and height of a PNG, from its header (PNG specification, 11.2.2). */
function pngSize(bytes: Uint8Array): { readonly width: number; readonly height: number } {
  expect([...bytes.subarray(0, 8)]).toEqual([137, 80, 78, 71, 13, 10, 26, 10]);
  const view = new DataView(bytes.buffer, bytes.byteOffset);
  return { width: view.getUint32(16), height: view.getUint32(20) };
}

/** Characters that no XML document may hold (XML 1.0, 2.2). */
function isNoXml(code: number): boolean {
  return (code < 32 && code !== 9 && code !== 10 && code !== 13) || code === 0xfffe || code === 0xffff;
}

describe('plates', () => {
  it('are offered with every layer and theme that can be drawn', () => {
    expect(plateLayers).toEqual([...LAYERS, 'routes']);
    expect(plateThemes).toEqual(THEMES);
  });

  it.each(plateLayers)('draw the layer %s', async (layer) => {
    const svg = await svgOf({ layer, ...(layer === 'mobility' && { man: 'd3' }) });
    expect(svg).toMatch(/^<svg [^>]*xmlns="http:\/\/www\.w3\.org\/2000\/svg"/);
    expect(svg.trimEnd()).toMatch(/<\/svg>$/);
    expect(svg).not.toMatch(/NaN|undefined|\[object/);
  });

  it('draw the way of a man to a post, and say so; refuse a post that it does not reach', async () => {
    const svg = await svgOf({ layer: 'routes', man: 'f3', post: 'b3' });
    expect(svg).toContain('The knight from f3 to b3 in 2 moves by d2');
    expect(svg).not.toBe(await svgOf({ layer: 'routes', man: 'f3' }));
    const refused = await call(getPlateSvg, { query: { fen, layer: 'routes', man: 'f3', post: 'a8' } });
    expect(refused.status).toBe(422);
    expect(await refused.json()).toMatchObject({ faults: [{ path: '/post', code: 'no-way' }] });
  });

  it('differ by layer, theme, side, caption and notes', async () => {
    const choices = [
      {},
      { layer: 'weak' },
      { theme: 'dark' },
      { side: 'black' },
      { caption: 'Own words' },
      { width: '1200', notes: 'margin' },
      { width: '1200', notes: 'numbers' },
    ];
    const drawn = await Promise.all(choices.map((query) => svgOf(query as Record<string, string>)));
    expect(new Set(drawn).size).toBe(choices.length);
  });

  it('carry a title and a description for those who do not see them', async () => {
    const svg = await svgOf({});
    expect(svg).toContain('role="img"');
    expect(svg).toMatch(/<title[ >]/);
  });

  it.each(plateThemes)('are PNGs of the asked width, theme %s', async (theme) => {
    for (const width of [plateWidthMin, 333, 720]) {
      const response = await call(getPlatePng, { query: { fen, theme, width: String(width) } });
      expect(response.headers.get('content-type')).toBe('image/png');
      expect(pngSize(new Uint8Array(await response.arrayBuffer())).width).toBe(width);
    }
  });

  it.each([
    ['getPlateSvg', 'image/svg+xml; charset=utf-8', 'waypost-command.svg'],
    ['getPlatePng', 'image/png', 'waypost-command.png'],
  ] as const)('%s may be shown anywhere, kept, and do nothing', async (id, media, name) => {
    const contract = contracts[id];
    const response = await call(contract, { query: { fen } });
    expect(response.headers.get('content-type')).toBe(media);
    expect(response.headers.get('content-disposition')).toBe(`inline; filename="${name}"`);
    expect(response.headers.get('content-security-policy')).toContain("default-src 'none'");
    expect(response.headers.get('content-security-policy')).toContain('sandbox');
    expect(response.headers.get('cross-origin-resource-policy')).toBe('cross-origin');
    expect(response.headers.get('cache-control')).toContain('public');
    const etag = response.headers.get('etag') ?? '';
    expect((await call(contract, { query: { fen }, headers: { 'if-none-match': etag } })).status).toBe(304);
  });

  const attempts = [
    '</text></svg><script>alert(1)</script>',
    '"/><image href="http://example.org/x" onload="alert(1)"/>',
    "' onmouseover='alert(1)",
    '<![CDATA[<script>]]>',
    '&lt;script&gt;&#60;script&#62;',
    ']]><!ENTITY x SYSTEM "file:///etc/passwd">&x;',
    '\u0000\u0008\uFFFE\uD800 broken',
    'javascript:alert(1)',
    '{{7*7}}${7*7}',
  ];
  it.each(attempts)('keep a caption what it is: text, %j', async (caption) => {
    const svg = await svgOf({ caption });
    const outsideTags = svg.replace(/<[^<>]*>/g, '');
    expect(outsideTags).not.toMatch(/[<>]/);
    expect(svg).not.toMatch(/<(script|image|foreignObject|!ENTITY|!\[CDATA)/i);
    for (const tag of svg.match(/<[^>]*>/g) ?? []) expect(tag).not.toMatch(/\son\w+\s*=/i);
    expect([...svg].filter((letter) => isNoXml(letter.codePointAt(0) ?? 0))).toEqual([]);
    expect(svg.isWellFormed()).toBe(true);
  });

  it.each([
    ['an unknown layer', { layer: '"><script>' }, '/layer', 'not-a-choice'],
    ['an unknown theme', { theme: 'url(#x)' }, '/theme', 'not-a-choice'],
    ['an unknown side', { side: 'red' }, '/side', 'not-a-choice'],
    ['a square that is none', { layer: 'mobility', man: 'z9' }, '/man', 'not-a-choice'],
    ['a square without a man', { layer: 'mobility', man: 'e5' }, '/man', 'no-man'],
    ['mobility without a man', { layer: 'mobility' }, '/man', 'required'],
    ['a width too small', { width: String(plateWidthMin - 1) }, '/width', 'too-small'],
    ['a width too large', { width: String(plateWidthMax + 1) }, '/width', 'too-large'],
    ['a width that is no number', { width: '10px' }, '/width', 'wrong-type'],
    ['a width in pieces', { width: '500.5' }, '/width', 'wrong-type'],
    ['a width without end', { width: 'Infinity' }, '/width', 'wrong-type'],
    ['a caption too long', { caption: 'x'.repeat(241) }, '/caption', 'too-large'],
    ['notes in no known way', { notes: '1' }, '/notes', 'not-a-choice'],
    ['an unknown parameter', { onload: 'alert(1)' }, '/onload', 'unknown-field'],
  ] as const)('refuse %s with the place at fault', async (_, query, path, code) => {
    for (const contract of [getPlateSvg, getPlatePng]) {
      const problem = await promisedJson<Problem>(
        contract,
        await call(contract, { query: { fen, ...query } as Record<string, string> }),
      );
      expect(problem).toMatchObject({ status: 422, path });
      expect(problem.faults).toContainEqual(expect.objectContaining({ in: 'query', path, code }));
    }
  });
});
