/** The computing thread: the same answers as in place, and what becomes of jobs when it dies. */
import { Worker } from 'node:worker_threads';
import { afterAll, describe, expect, it } from 'vitest';
import { ComputingThread, inPlace } from '@/lib/compute/computing';
import type { Job } from '@/lib/compute/jobs';
import { EXAMPLE_ENDING, EXAMPLE_FEN } from '@/openapi/schemas/examples';

const thread = new ComputingThread(() => new Worker(new URL('./loaded-thread.mjs', import.meta.url)));
afterAll(() => thread.stop());

const jobs: readonly Job[] = [
  { kind: 'reading', fen: EXAMPLE_FEN, mode: 'strict' },
  { kind: 'reading', fen: EXAMPLE_FEN, mode: 'diagram', include: ['men', 'lead'] },
  { kind: 'reading', fen: 'not a position', mode: 'strict' },
  {
    kind: 'lines',
    fens: [EXAMPLE_FEN, 'not a position', EXAMPLE_ENDING],
    firstLine: 5,
    mode: 'strict',
    include: ['lead'],
  },
];

describe('a computing thread', () => {
  it('answers every job as it is answered in place, each its own', async () => {
    const answers = await Promise.all([...jobs, ...jobs].map((job) => thread.run(job)));
    const expected = await Promise.all([...jobs, ...jobs].map((job) => inPlace.run(job)));
    expect(answers).toEqual(expected);
    expect(thread.pending).toBe(0);
  });

  it('leaves the turn to others while it computes', async () => {
    let turns = 0;
    const timer = setInterval(() => {
      turns += 1;
    }, 1);
    const fens = Array.from({ length: 200 }, () => EXAMPLE_FEN);
    await thread.run({ kind: 'lines', fens, firstLine: 1, mode: 'strict' });
    clearInterval(timer);
    expect(turns).toBeGreaterThan(5);
  });

  it('fails a job that fails by our own mistake, and goes on', async () => {
    const broken = { kind: 'lines', fens: null, firstLine: 1, mode: 'strict' } as unknown as Job;
    await expect(thread.run(broken)).rejects.toThrow();
    await expect(thread.run({ kind: 'reading', fen: EXAMPLE_FEN, mode: 'strict' })).resolves.toMatchObject({
      ok: true,
    });
  });

  it('fails its jobs when it dies, and another takes its place', async () => {
    // Long enough that it cannot be answered before the thread is ended.
    const fens = Array.from({ length: 1000 }, () => EXAMPLE_FEN);
    const lost = thread.run({ kind: 'lines', fens, firstLine: 1, mode: 'strict' });
    const outcome = expect(lost).rejects.toThrow('ended');
    await thread.stop();
    await outcome;
    await expect(thread.run({ kind: 'reading', fen: EXAMPLE_FEN, mode: 'strict' })).resolves.toMatchObject({
      ok: true,
    });
  });
});
