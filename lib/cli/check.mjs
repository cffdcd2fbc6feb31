/** `npm run check`: everything the project holds itself to, in one go. Needs Node and npm only. */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { ensureChromium } from './house/chromium.mjs';
import { install, requireNode } from './house/install.mjs';
import { ensurePostgres } from './house/postgres.mjs';
import { runProgram } from './house/run.mjs';
import { add, NOTHING, playwrightCount, readReport, vitestCount } from './house/tally.mjs';

/** @typedef {import('./house/tally.mjs').Count} Count */

const reports = mkdtempSync(join(tmpdir(), 'waypost-check-'));
const UNIT_REPORT = join(reports, 'vitest.json');
const BROWSER_REPORT = join(reports, 'playwright.json');

let total = NOTHING;
/** @type {string[]} */
const times = [];

/**
 * Runs a step and notes its time. A step that is no test and fails counts as one failure; one that passes counts nothing.
 *
 * @param {string} name
 * @param {() => Promise<boolean>} work whether it went well
 * @param {() => Count} [count] what a step of tests reports, after it has run
 */
async function step(name, work, count) {
  console.log(`\n== ${name}`);
  const start = performance.now();
  const good = await work();
  const counted = count?.() ?? NOTHING;
  const failed = good ? counted.failed : Math.max(counted.failed, 1);
  total = add(total, { passed: counted.passed, failed });
  const line = `${good ? 'ok    ' : 'FAILED'}  ${name}, ${((performance.now() - start) / 1000).toFixed(1)} s`;
  times.push(line);
  console.log(`-- ${line}`);
  return good;
}

/** All steps; those that need an earlier one are left out when it failed. */
async function check() {
  if (!(await step('packages', install))) return;
  /** @type {string | undefined} */
  let chromium;
  await step('chromium', async () => {
    chromium = await ensureChromium();
    if (chromium !== undefined) console.log(chromium);
    return chromium !== undefined;
  });
  await step('postgresql', async () => {
    const programs = await ensurePostgres();
    if (programs !== undefined) console.log(programs);
    return programs !== undefined;
  });
  await step('format', () => runProgram('biome', ['format', '--max-diagnostics=8']));
  await step('lint', () => runProgram('eslint', ['--max-warnings', '0']));
  await step(
    'types',
    async () => (await runProgram('next', ['typegen'])) && (await runProgram('tsc', ['--noEmit', '-p', '.'])),
  );
  await step('dead code', () => runProgram('knip', ['--no-progress', '--no-config-hints']));
  await step('dead code, as shipped', () =>
    runProgram('knip', ['--no-progress', '--no-config-hints', '--production', '--exclude', 'types']),
  );
  await step(
    'tests',
    () => runProgram('vitest', ['run', '--reporter=default', '--reporter=json', `--outputFile.json=${UNIT_REPORT}`]),
    () => vitestCount(readReport(UNIT_REPORT)),
  );
  const built = await step('build', () => runProgram('next', ['build'], { NODE_ENV: 'production' }));
  if (!built || chromium === undefined) return;
  await step(
    'browser',
    () =>
      runProgram('playwright', ['test', '--reporter=list,json'], {
        CHROMIUM: chromium,
        PLAYWRIGHT_JSON_OUTPUT_NAME: BROWSER_REPORT,
      }),
    () => playwrightCount(readReport(BROWSER_REPORT)),
  );
}

requireNode();
await check();
rmSync(reports, { recursive: true, force: true });
console.log(`\n${times.join('\n')}\n\n${total.passed} passed, ${total.failed} failed`);
process.exitCode = total.failed === 0 ? 0 : 1;
