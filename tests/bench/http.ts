/**
 * Figures over HTTP: POST /readings beside a trivial route of the same server, and the batch.
 *
 * The server is the built application (`next start`); autocannon asks it. Rounds alternate, so that whatever else the machine
 * does falls on both alike, and medians are given. The positions are all different and more than the service keeps,
 * so that every reading is computed.
 */
import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import autocannon from 'autocannon';
import type { Figure } from './figure';

/** A built server that answers at `url` until it is stopped. */
export interface BuiltServer {
  readonly url: string;
  readonly stop: () => Promise<void>;
}

export interface HttpBenchOptions {
  /** Distinct FENs, at least 1,000. */
  readonly fens: readonly string[];
  readonly rounds: number;
  readonly roundSeconds: number;
  readonly connections: number;
}

const START_TIMEOUT_MS = 30_000;

/** Starts `next start` on a free port; the application has to be built before. */
export async function startBuiltServer(): Promise<BuiltServer> {
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const data = mkdtempSync(join(tmpdir(), 'waypost-bench-'));
  const child = spawn(
    process.execPath,
    ['node_modules/next/dist/bin/next', 'start', '-H', '127.0.0.1', '-p', String(port)],
    {
      stdio: ['ignore', 'ignore', 'inherit'],
      env: {
        ...process.env,
        NODE_ENV: 'production',
        NEXT_TELEMETRY_DISABLED: '1',
        WAYPOST_DATA: data,
        DATABASE_URL: '',
      },
    },
  );
  const deadline = Date.now() + START_TIMEOUT_MS;
  while (!(await isLive(url))) {
    if (child.exitCode !== null || Date.now() > deadline)
      throw new Error('The built server does not start; run `npm run build` first.');
    await new Promise((resolve) => setTimeout(resolve, 100));
  }
  const stop = async () => {
    await stopped(child);
    rmSync(data, { recursive: true, force: true });
  };
  return { url, stop };
}

/** All figures of this file. Throws when any request is refused: a wrong answer has no speed. */
export async function httpFigures(url: string, options: HttpBenchOptions): Promise<Figure[]> {
  return [...(await readingsBesideTrivial(url, options)), ...(await batchFigures(url, options.fens.slice(0, 1000)))];
}

/** POST /readings beside GET /api/health, requests a second. */
export async function readingsBesideTrivial(
  url: string,
  { fens, rounds, roundSeconds, connections }: HttpBenchOptions,
): Promise<Figure[]> {
  let asked = 0;
  const nextBody = (): string => JSON.stringify({ fen: fens[asked++ % fens.length] });
  const trivial = { url: `${url}/api/health`, connections, duration: roundSeconds };
  const readings = {
    url: `${url}/api/v1/readings`,
    connections,
    duration: roundSeconds,
    requests: [
      {
        method: 'POST' as const,
        headers: { 'content-type': 'application/json' },
        setupRequest: (request: autocannon.Request) => ({ ...request, body: nextBody() }),
      },
    ],
  };
  await perSecond({ ...trivial, duration: 1 });
  await perSecond({ ...readings, duration: 2 });
  const pairs: { readonly trivial: number; readonly readings: number }[] = [];
  for (let round = 0; round < rounds; round += 1) {
    pairs.push({ trivial: await perSecond(trivial), readings: await perSecond(readings) });
  }
  const beside = `GET /api/health of the same server, ${round(median(pairs.map((pair) => pair.trivial)))} requests a second`;
  return [
    {
      name: 'http-readings-per-second',
      value: round(median(pairs.map((pair) => pair.readings))),
      unit: 'requests/s',
      beside,
    },
    {
      name: 'http-readings-vs-trivial',
      value: round(median(pairs.map((pair) => pair.readings / pair.trivial)), 3),
      unit: 'ratio',
      beside,
    },
  ];
}

/** One batch: positions a second, the first line, and how the server answers others meanwhile. */
export async function batchFigures(url: string, fens: readonly string[]): Promise<Figure[]> {
  const begun = performance.now();
  const response = await fetch(`${url}/api/v1/readings/batch`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ fens }),
  });
  const others = healthTimes(url);
  let lines = 0;
  let firstLineMs = 0;
  for await (const chunk of response.body as unknown as AsyncIterable<Uint8Array>) {
    for (const byte of chunk) if (byte === 10) lines += 1;
    if (firstLineMs === 0 && lines > 0) firstLineMs = performance.now() - begun;
  }
  const seconds = (performance.now() - begun) / 1000;
  if (lines !== fens.length) throw new Error(`${fens.length} FENs were answered by ${lines} lines.`);
  const times = await others.stop();
  return [
    {
      name: 'http-batch-positions-per-second',
      value: round(fens.length / seconds),
      unit: 'positions/s',
      beside: `one batch of ${fens.length}`,
    },
    {
      name: 'http-batch-first-line-ms',
      value: round(firstLineMs, 1),
      unit: 'ms',
      beside: `whole batch ${round(seconds * 1000)} ms`,
    },
    {
      name: 'http-health-during-batch-ms-p50',
      value: round(median(times), 1),
      unit: 'ms',
      beside: `${times.length} requests during the batch`,
    },
  ];
}

/** Asks for the health one request after the other until stopped; the times in milliseconds. */
function healthTimes(url: string): { readonly stop: () => Promise<number[]> } {
  let wanted = true;
  const times: number[] = [];
  const asking = (async () => {
    while (wanted) {
      const begun = performance.now();
      await (await fetch(`${url}/api/health`)).arrayBuffer();
      times.push(performance.now() - begun);
    }
  })();
  return {
    stop: async () => {
      wanted = false;
      await asking;
      return times;
    },
  };
}

async function perSecond(options: autocannon.Options): Promise<number> {
  const result = await autocannon(options);
  if (result.non2xx > 0 || result.errors > 0)
    throw new Error(`${options.url}: ${result.non2xx} refusals, ${result.errors} errors.`);
  return result.requests.total / result.duration;
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? Number.NaN;
}

function round(value: number, digits = 0): number {
  return Number(value.toFixed(digits));
}

async function isLive(url: string): Promise<boolean> {
  try {
    return (await fetch(`${url}/api/health`)).ok;
  } catch {
    return false;
  }
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen(0, '127.0.0.1', () => {
      const address = server.address();
      server.close(() =>
        address !== null && typeof address === 'object' ? resolve(address.port) : reject(new Error('No port.')),
      );
    });
  });
}

function stopped(child: ChildProcess): Promise<void> {
  return new Promise((resolve) => {
    if (child.exitCode !== null) return resolve();
    child.once('exit', () => resolve());
    child.kill('SIGTERM');
  });
}
