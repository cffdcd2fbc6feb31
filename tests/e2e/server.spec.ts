/** The built server as a process: alone on its folder, and graceful when asked to end. */
import { type ChildProcess, spawn } from 'node:child_process';
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { expect, test } from '@playwright/test';

interface Copy {
  readonly url: string;
  readonly pid: number;
  readonly said: () => string;
  readonly ended: Promise<number | null>;
  readonly end: (signal: NodeJS.Signals) => void;
}

/** Starts another copy of the built application on a data folder. */
async function startCopy(data: string): Promise<Copy> {
  const port = await freePort();
  const child: ChildProcess = spawn(
    process.execPath,
    ['node_modules/next/dist/bin/next', 'start', '-p', String(port)],
    {
      env: {
        ...process.env,
        NODE_ENV: 'production',
        NEXT_MANUAL_SIG_HANDLE: 'true',
        WAYPOST_DATA: data,
        DATABASE_URL: '',
      },
      stdio: ['ignore', 'pipe', 'pipe'],
    },
  );
  let said = '';
  for (const stream of [child.stdout, child.stderr]) stream?.on('data', (part) => (said += String(part)));
  const ended = new Promise<number | null>((resolve) => child.once('exit', resolve));
  return {
    url: `http://127.0.0.1:${port}`,
    pid: child.pid ?? 0,
    said: () => said,
    ended,
    end: (signal) => child.kill(signal),
  };
}

async function untilReady({ url, said }: Copy): Promise<void> {
  await expect
    .poll(
      () =>
        fetch(`${url}/api/health`).then(
          (answer) => answer.ok,
          () => false,
        ),
      { timeout: 25_000, message: said() },
    )
    .toBe(true);
}

function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1');
  return new Promise((resolve) =>
    server.once('listening', () => {
      const address = server.address();
      server.close(() => resolve(typeof address === 'object' ? (address?.port ?? 0) : 0));
    }),
  );
}

test.describe('the server', () => {
  const data = mkdtempSync(join(tmpdir(), 'waypost-server-'));
  test.afterAll(() => rmSync(data, { recursive: true, force: true }));

  test('refuses a folder that another copy has, names that copy, and leaves it at work', async () => {
    const first = await startCopy(data);
    await untilReady(first);
    const second = await startCopy(data);
    expect(await second.ended).toBe(1);
    expect(second.said()).toContain(`is in use by process ${first.pid}`);
    console.log(`two copies on one folder: the second ends with 1 and names process ${first.pid}`);
    expect((await fetch(`${first.url}/api/health`)).status).toBe(200);
    first.end('SIGTERM');
    expect(await first.ended).toBe(0);
  });

  test('finishes the answer that it is giving when it is asked to end', async () => {
    const copy = await startCopy(data);
    await untilReady(copy);
    const fens = Array.from({ length: 1000 }, (_, index) => `8/8/8/3k4/8/3K4/3P4/8 w - - 0 ${index + 1}`);
    const answer = await fetch(`${copy.url}/api/v1/readings/batch`, {
      method: 'POST',
      headers: { 'content-type': 'application/json' },
      body: JSON.stringify({ fens }),
    });
    copy.end('SIGTERM');
    expect((await answer.text()).trimEnd().split('\n')).toHaveLength(1000);
    expect(await copy.ended).toBe(0);
    await expect(fetch(`${copy.url}/api/health`)).rejects.toThrow();
  });
});
