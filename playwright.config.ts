/** The real browser: the built application on a free port, in the Chromium that the system has. */
import { mkdtempSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { defineConfig } from '@playwright/test';

/** A port that nobody listens on. */
async function freePort(): Promise<number> {
  const server = createServer().listen(0, '127.0.0.1');
  await new Promise((resolve) => server.once('listening', resolve));
  const address = server.address();
  await new Promise((resolve) => server.close(resolve));
  if (address === null || typeof address === 'string') throw new Error('No free port.');
  return address.port;
}

// Workers read this file again: they find the port that the first reading chose.
process.env.E2E_PORT ??= String(await freePort());
// A database of their own, with the demo workspace; how to sign in to it stands in the folder's demo-sign-in.txt.
if (process.env.E2E_DATA === undefined) {
  const data = mkdtempSync(join(tmpdir(), 'waypost-e2e-'));
  process.env.E2E_DATA = data;
  process.once('exit', () => rmSync(data, { recursive: true, force: true }));
}
const baseURL = `http://127.0.0.1:${process.env.E2E_PORT}`;

export default defineConfig({
  testDir: 'tests/e2e',
  testMatch: '**/*.spec.ts',
  forbidOnly: true,
  fullyParallel: true,
  workers: 2,
  timeout: 30_000,
  outputDir: 'test-results',
  use: {
    baseURL,
    locale: 'en-GB',
    trace: 'retain-on-failure',
    launchOptions: {
      executablePath: process.env.CHROMIUM || '/usr/bin/chromium',
      args: [
        '--no-sandbox',
        '--disable-gpu',
        '--disable-quic',
        '--no-first-run',
        '--disable-background-networking',
        '--disable-component-update',
        '--disable-sync',
      ],
    },
  },
  projects: [{ name: 'chromium', use: { viewport: { width: 1440, height: 900 } } }],
  webServer: {
    command: `node --import tsx lib/cli/waypost.ts seed && exec node node_modules/next/dist/bin/next start -H 127.0.0.1 -p ${process.env.E2E_PORT}`,
    url: `${baseURL}/api/health`,
    env: {
      NEXT_TELEMETRY_DISABLED: '1',
      NEXT_MANUAL_SIG_HANDLE: 'true',
      LOG_LEVEL: 'warn',
      WAYPOST_DATA: process.env.E2E_DATA,
      DATABASE_URL: '',
    },
    timeout: 60_000,
  },
});
