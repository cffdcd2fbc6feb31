/** POST and GET /readings: what goes in, what comes out, caching, bounds. */
import { describe, expect, it } from 'vitest';
import type { Reading } from '@/engine/reading/schema';
import { readingSchema } from '@/engine/reading/schema';
import { contracts } from '@/openapi/contracts';
import { EXAMPLE_ENDING, EXAMPLE_FEN } from '@/openapi/schemas/examples';
import { READING_PARTS } from '@/openapi/schemas/ids';
import type { Problem } from '@/openapi/schemas/problem';
import { call, promisedJson } from './caller';

const { createReading, getReading } = contracts;
const ALWAYS = ['engine', 'fen', 'mode', 'sideToMove', 'warnings'];

describe('POST /readings', () => {
  it('answers the whole reading, and nothing that the schema does not name', async () => {
    const response = await call(createReading, { body: { fen: EXAMPLE_FEN } });
    const reading = await promisedJson<Reading>(createReading, response);
    expect(reading).toEqual(readingSchema.parse(reading));
    expect(reading.squares).toHaveLength(64);
    expect(reading.fen).toBe(EXAMPLE_FEN);
    expect(Object.keys(reading).sort()).toEqual([...ALWAYS, ...READING_PARTS].sort());
  });

  it.each(READING_PARTS)('include picks %s and leaves the rest out', async (part) => {
    const response = await call(createReading, { body: { fen: EXAMPLE_FEN, include: [part] } });
    expect(Object.keys(await promisedJson(createReading, response)).sort()).toEqual([...ALWAYS, part].sort());
  });

  it('completes a FEN of four fields, as in EPD', async () => {
    const response = await call(createReading, {
      body: { fen: EXAMPLE_ENDING.split(' ').slice(0, 4).join(' '), include: ['lead'] },
    });
    expect(await promisedJson(createReading, response)).toMatchObject({ fen: EXAMPLE_ENDING });
  });

  it('reads boards without kings as diagrams only', async () => {
    const fen = '8/8/8/3p4/3P4/8/8/8 w - - 0 1';
    const strict = await promisedJson<Problem>(createReading, await call(createReading, { body: { fen } }));
    expect(strict).toMatchObject({
      code: 'fen-refused',
      path: '/fen',
      faults: [{ code: 'no-king' }, { code: 'no-king' }],
    });
    const diagram = await promisedJson<Reading>(
      createReading,
      await call(createReading, { body: { fen, mode: 'diagram' } }),
    );
    expect(diagram.kings).toEqual({ white: null, black: null });
    expect(diagram.warnings.length).toBeGreaterThan(0);
  });

  const badBodies = [
    ['no fen', {}, '/fen', 'required'],
    ['a number for a FEN', { fen: 7 }, '/fen', 'wrong-type'],
    ['null for a FEN', { fen: null }, '/fen', 'wrong-type'],
    ['a FEN too long', { fen: 'p'.repeat(257) }, '/fen', 'too-large'],
    ['an unknown mode', { fen: EXAMPLE_FEN, mode: 'loose' }, '/mode', 'not-a-choice'],
    ['an unknown part', { fen: EXAMPLE_FEN, include: ['men', 'soul'] }, '/include/1', 'not-a-choice'],
    ['an empty list of parts', { fen: EXAMPLE_FEN, include: [] }, '/include', 'too-small'],
    ['an unknown field', { fen: EXAMPLE_FEN, colour: 1 }, '/colour', 'unknown-field'],
    ['an unknown field with a slash', { fen: EXAMPLE_FEN, 'a/b~c': 1 }, '/a~1b~0c', 'unknown-field'],
    ['a list', [EXAMPLE_FEN], '', 'wrong-type'],
    ['a bare string', '"8/8"', '', 'wrong-type'],
    ['a prototype', '{"fen":"8/8","__proto__":{"mode":"diagram"}}', '/__proto__', 'unknown-field'],
  ] as const;
  it.each(badBodies)('refuses %s with the place at fault', async (_, body, path, code) => {
    const response = await call(createReading, { body });
    expect(response.status).toBe(422);
    const problem = await promisedJson<Problem>(createReading, response);
    expect(problem.path).toBe(path);
    expect(problem.faults).toContainEqual(expect.objectContaining({ in: 'body', path, code }));
  });

  it('counts the bytes of a body that does not say its length', async () => {
    const { POST } = await import('@/app/api/v1/readings/route');
    let sent = 0;
    const endless = new ReadableStream<Uint8Array>({
      pull(controller) {
        sent += 1024;
        controller.enqueue(new Uint8Array(1024).fill(32));
      },
    });
    const init = { method: 'POST', headers: { 'content-type': 'application/json' }, body: endless, duplex: 'half' };
    const response = await POST(new Request('http://waypost.test/api/v1/readings', init as RequestInit));
    expect(response.status).toBe(413);
    expect(await promisedJson<Problem>(createReading, response)).toMatchObject({
      bound: { name: 'bodyBytes', max: 4096 },
    });
    expect(sent).toBeLessThanOrEqual(4096 + 3 * 1024);
  });

  it.each([
    ['nothing', ''],
    ['broken UTF-8', new Uint8Array([0x22, 0xff, 0x22])],
    ['ten thousand brackets', '['.repeat(4000)],
  ] as const)('refuses %s as not JSON', async (_, body) => {
    const { POST } = await import('@/app/api/v1/readings/route');
    const response = await POST(
      new Request('http://waypost.test/api/v1/readings', {
        method: 'POST',
        headers: { 'content-type': 'application/json' },
        body,
      }),
    );
    expect(response.status).toBe(400);
  });

  it.each(['application/json; charset=utf-8', 'Application/JSON', 'application/vnd.chess+json'])(
    'takes the content type %s',
    async (type) => {
      const response = await call(createReading, {
        body: { fen: EXAMPLE_FEN, include: ['lead'] },
        headers: { 'content-type': type },
      });
      expect(response.status).toBe(200);
    },
  );

  it.each(['text/json-ish', 'application/jsonp', 'multipart/form-data', 'text/plain; application/json'])(
    'refuses the content type %s',
    async (type) => {
      expect(
        (await call(createReading, { body: { fen: EXAMPLE_FEN }, headers: { 'content-type': type } })).status,
      ).toBe(415);
    },
  );
});

describe('GET /readings', () => {
  const get = (query: string | Readonly<Record<string, string>>, headers: Readonly<Record<string, string>> = {}) =>
    call(getReading, { query, headers });

  it('answers the same reading as POST', async () => {
    const got = await promisedJson(getReading, await get({ fen: EXAMPLE_FEN }));
    expect(got).toEqual(await promisedJson(createReading, await call(createReading, { body: { fen: EXAMPLE_FEN } })));
  });

  it('carries a strong ETag and may be kept; a good copy is answered 304 without a body', async () => {
    const first = await get({ fen: EXAMPLE_FEN, include: 'lead' });
    const etag = first.headers.get('etag') ?? '';
    expect(etag).toMatch(/^"[\w-]{22}"$/);
    expect(first.headers.get('cache-control')).toMatch(/public, max-age=\d+/);
    for (const named of [etag, `W/${etag}`, `"x", ${etag}`, '*']) {
      const again = await get({ fen: EXAMPLE_FEN, include: 'lead' }, { 'if-none-match': named });
      expect(again.status).toBe(304);
      expect(await again.text()).toBe('');
      expect(again.headers.get('etag')).toBe(etag);
    }
    expect((await get({ fen: EXAMPLE_FEN, include: 'lead' }, { 'if-none-match': '"other"' })).status).toBe(200);
  });

  it('has one ETag for all spellings of a position, and others for other answers', async () => {
    const etag = async (query: Readonly<Record<string, string>>) => (await get(query)).headers.get('etag');
    const own = await etag({ fen: EXAMPLE_FEN });
    expect(await etag({ fen: `  ${EXAMPLE_FEN.replaceAll(' ', '  ')} ` })).toBe(own);
    const different = [
      own,
      await etag({ fen: EXAMPLE_ENDING }),
      await etag({ fen: EXAMPLE_FEN, mode: 'diagram' }),
      await etag({ fen: EXAMPLE_FEN, include: 'men' }),
    ];
    expect(new Set(different).size).toBe(4);
  });

  it.each([
    ['nothing at all', '', '/fen', 'required'],
    ['a parameter given twice', 'fen=8/8&fen=8/8', '/fen', 'repeated'],
    ['an unknown parameter', `fen=${EXAMPLE_FEN}&color=1`, '/color', 'unknown-field'],
    ['an unknown part', `fen=${EXAMPLE_FEN}&include=men,soul`, '/include/1', 'not-a-choice'],
    ['an unknown mode', `fen=${EXAMPLE_FEN}&mode=x`, '/mode', 'not-a-choice'],
  ])('refuses %s with the place at fault', async (_, query, path, code) => {
    const problem = await promisedJson<Problem>(getReading, await get(query));
    expect(problem).toMatchObject({ status: 422, path });
    expect(problem.faults).toContainEqual(expect.objectContaining({ in: 'query', path, code }));
  });

  it('takes parts with commas or one by one', async () => {
    const query = `fen=${encodeURIComponent(EXAMPLE_FEN)}`;
    const commas = await promisedJson(getReading, await get(`${query}&include=men,lead`));
    expect(await promisedJson(getReading, await get(`${query}&include=men&include=lead`))).toEqual(commas);
  });

  it('answers HEAD like GET, without the body', async () => {
    const query = { fen: EXAMPLE_FEN };
    const [got, head] = [await get(query), await call(getReading, { query, method: 'HEAD' })];
    expect(head.status).toBe(200);
    expect(await head.text()).toBe('');
    expect(head.headers.get('etag')).toBe(got.headers.get('etag'));
  });
});
