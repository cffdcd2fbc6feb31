/** What `up` and `check` decide before they do anything: what is installed, what is built, how many tests passed. */
import { mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { needsBuild } from '@/lib/cli/house/build-age.mjs';
import { findChromium } from '@/lib/cli/house/chromium.mjs';
import { isInstalled } from '@/lib/cli/house/install.mjs';
import { playwrightCount, vitestCount } from '@/lib/cli/house/tally.mjs';

describe('isInstalled', () => {
  const asked = {
    '': { version: '0.1.0' },
    'node_modules/zod': { version: '4.6.7' },
    'node_modules/for-other-machines': { version: '1.0.0', optional: true },
  };

  it.each([
    ['all in the asked version', { 'node_modules/zod': { version: '4.6.7' } }, true],
    ['nothing there', {}, false],
    ['another version', { 'node_modules/zod': { version: '4.6.6' } }, false],
    [
      'an optional package in another version',
      { 'node_modules/zod': { version: '4.6.7' }, 'node_modules/for-other-machines': { version: '0.9.0' } },
      false,
    ],
  ])('%s: %o is %s', (_, there, expected) => {
    expect(isInstalled(asked, there)).toBe(expected);
  });
});

describe('needsBuild', () => {
  let root = '';
  const at = (path: string, minute: number): void => utimesSync(join(root, path), minute * 60, minute * 60);

  beforeEach(() => {
    root = mkdtempSync(join(tmpdir(), 'waypost-age-'));
    for (const folder of ['app/deep', '.next']) mkdirSync(join(root, folder), { recursive: true });
    for (const file of ['app/deep/page.tsx', 'proxy.ts', '.next/BUILD_ID']) writeFileSync(join(root, file), 'x');
    for (const path of ['app/deep/page.tsx', 'proxy.ts', 'app/deep', 'app']) at(path, 1);
    at('.next/BUILD_ID', 2);
  });
  afterEach(() => rmSync(root, { recursive: true }));

  it('is false when all is older than the build', () => expect(needsBuild(root)).toBe(false));

  it.each(['app/deep/page.tsx', 'proxy.ts'])('is true when %s is newer', (path) => {
    at(path, 3);
    expect(needsBuild(root)).toBe(true);
  });

  it('is true when a file went away', () => {
    rmSync(join(root, 'app/deep/page.tsx'));
    expect(needsBuild(root)).toBe(true);
  });

  it('is true when there is no build', () => {
    rmSync(join(root, '.next/BUILD_ID'));
    expect(needsBuild(root)).toBe(true);
  });
});

describe('counts of tests', () => {
  it('count a file that could not be loaded as one failure', () => {
    const report = {
      numPassedTests: 5,
      numFailedTests: 1,
      testResults: [
        { status: 'failed', assertionResults: [{}] },
        { status: 'failed', assertionResults: [] },
        { status: 'passed', assertionResults: [{}] },
      ],
    };
    expect(vitestCount(report)).toEqual({ passed: 5, failed: 2 });
  });

  it('count a second try and an error outside tests as failures', () => {
    const report = { stats: { expected: 3, unexpected: 1, flaky: 1, skipped: 0 }, errors: [{}] };
    expect(playwrightCount(report)).toEqual({ passed: 3, failed: 3 });
  });

  it.each([vitestCount, playwrightCount])('are nothing where there is no report', (count) => {
    expect(count(undefined)).toEqual({ passed: 0, failed: 0 });
  });
});

describe('findChromium', () => {
  it('takes what CHROMIUM says before the path', () => {
    expect(findChromium({ CHROMIUM: '/opt/browser', PATH: '/usr/bin' })).toBe('/opt/browser');
  });
});
