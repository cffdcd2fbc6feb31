/** POST /readings/batch: a line a FEN, in order, sent as computed. */
import { beforeEach, describe, expect, it, vi } from 'vitest';
import type { BatchLine } from '@/openapi/schemas/readings';
import type * as EngineDoor from '@/lib/services/readings/engine';
import { contracts } from '@/openapi/contracts';
import { EXAMPLE_ENDING, EXAMPLE_FEN } from '@/openapi/schemas/examples';
import type { Problem } from '@/openapi/schemas/problem';
import { call, promisedJson, promisedLines } from './caller';

const { createReadings } = contracts;

/** Counts what the engine is asked for; the engine itself is the real one. */
const asked = vi.hoisted(() => ({ count: 0, throwAt: 0 }));
vi.mock('@/lib/services/readings/engine', async (original) => {
  const real = await original<typeof EngineDoor>();
  return {
    ...real,
    writeReading: (...args: Parameters<typeof real.writeReading>) => {
      asked.count += 1;
      if (asked.count === asked.throwAt) throw new Error('secret of the house');
      return real.writeReading(...args);
    },
  };
});

beforeEach(() => {
  asked.count = 0;
  asked.throwAt = 0;
});

function thousand(): string[] {
  return Array.from({ length: 1000 }, (_, index) =>
    index % 2 === 0 ? EXAMPLE_FEN.replace(/\d+$/, String(index + 1)) : `bad ${index}`,
  );
}

describe('POST /readings/batch', () => {
  it('answers 1,000 lines for 1,000 FENs of which 500 are bad, each in its place', async () => {
    const response = await call(createReadings, { body: { fens: thousand(), include: ['lead'] } });
    expect(response.headers.get('content-type')).toBe('application/x-ndjson');
    const lines = await promisedLines<BatchLine>(createReadings, response);
    expect(lines).toHaveLength(1000);
    for (const [index, line] of lines.entries()) {
      if (index % 2 === 0) expect(line).toMatchObject({ fen: expect.stringMatching(new RegExp(` ${index + 1}$`)) });
      else
        expect(line).toMatchObject({
          line: index + 1,
          error: { code: expect.any(String), message: expect.any(String) },
        });
    }
  });

  it('answers whole readings when no parts are picked', async () => {
    const [line] = await promisedLines<BatchLine>(
      createReadings,
      await call(createReadings, { body: { fens: [EXAMPLE_ENDING] } }),
    );
    expect(line).toHaveProperty('squares.63');
  });

  it('sends the first line before the second is computed, and computes only as fast as lines are taken', async () => {
    const response = await call(createReadings, { body: { fens: thousand(), include: ['lead'] } });
    const reader = response.body?.getReader();
    expect(asked.count).toBe(0);
    const first = await reader?.read();
    expect(new TextDecoder().decode(first?.value).trimEnd().split('\n')).toHaveLength(1);
    expect(asked.count).toBe(1);
    await new Promise((resolve) => setTimeout(resolve, 20));
    expect(asked.count).toBe(1);
    await reader?.read();
    expect(asked.count).toBeLessThan(20);
    await reader?.cancel();
  });

  it('gives others their turn between chunks', async () => {
    const response = await call(createReadings, { body: { fens: thousand(), include: ['lead'] } });
    let turns = 0;
    const timer = setInterval(() => {
      turns += 1;
    }, 0);
    await response.text();
    clearInterval(timer);
    expect(turns).toBeGreaterThan(10);
  });

  it('stops computing when the reader goes away', async () => {
    const response = await call(createReadings, { body: { fens: thousand(), include: ['lead'] } });
    const reader = response.body?.getReader();
    await reader?.read();
    await reader?.cancel();
    const count = asked.count;
    await new Promise((resolve) => setTimeout(resolve, 20));
    expect(asked.count).toBe(count);
    expect(count).toBeLessThan(20);
  });

  it('stops computing when the request is aborted', async () => {
    const gone = new AbortController();
    const response = await call(createReadings, { body: { fens: thousand(), include: ['lead'] }, signal: gone.signal });
    const reader = response.body?.getReader();
    await reader?.read();
    gone.abort();
    const rest = await reader?.read();
    expect(rest?.done).toBe(true);
    expect(asked.count).toBe(1);
  });

  it('goes on after a mistake of our own in one line', async () => {
    asked.throwAt = 2;
    const fens = [EXAMPLE_FEN, EXAMPLE_ENDING, EXAMPLE_FEN];
    const response = await call(createReadings, { body: { fens, include: ['lead'] } });
    const lines = await promisedLines<BatchLine>(createReadings, response);
    expect(lines[1]).toMatchObject({ line: 2, error: { code: 'internal' } });
    expect(JSON.stringify(lines)).not.toContain('secret');
    expect(lines[2]).toMatchObject({ fen: EXAMPLE_FEN });
  });

  it.each([
    ['1,001 FENs', { fens: Array.from({ length: 1001 }, () => '8/8') }, '/fens', 'too-large'],
    ['no FEN', { fens: [] }, '/fens', 'too-small'],
    ['a number among the FENs', { fens: ['8/8', 3] }, '/fens/1', 'wrong-type'],
    ['no list', { fens: '8/8' }, '/fens', 'wrong-type'],
  ])('refuses %s', async (_, body, path, code) => {
    const problem = await promisedJson<Problem>(createReadings, await call(createReadings, { body }));
    expect(problem).toMatchObject({ status: 422, path });
    expect(problem.faults).toContainEqual(expect.objectContaining({ path, code }));
  });
});
