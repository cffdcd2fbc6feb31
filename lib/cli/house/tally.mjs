/** Counting tests from the reports that the two test programs write. */
import { readFileSync } from 'node:fs';

/** @typedef {{ readonly passed: number, readonly failed: number }} Count */

/** @type {Count} */
export const NOTHING = { passed: 0, failed: 0 };

/**
 * @param {Count} a
 * @param {Count} b
 * @returns {Count}
 */
export function add(a, b) {
  return { passed: a.passed + b.passed, failed: a.failed + b.failed };
}

/**
 * A report as a program wrote it; undefined when it wrote none, as after a crash.
 *
 * @param {string} path
 * @returns {unknown}
 */
export function readReport(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch {
    return undefined;
  }
}

/**
 * Vitest's report. A file that could not even be loaded has no tests in it, and counts as one failure.
 *
 * @param {unknown} report
 * @returns {Count}
 */
export function vitestCount(report) {
  const { numPassedTests, numFailedTests, testResults } =
    /** @type {{ numPassedTests?: number, numFailedTests?: number, testResults?: { status: string, assertionResults: unknown[] }[] }} */ (
      report ?? {}
    );
  const unloaded = (testResults ?? []).filter((file) => file.status === 'failed' && file.assertionResults.length === 0);
  return { passed: numPassedTests ?? 0, failed: (numFailedTests ?? 0) + unloaded.length };
}

/**
 * Playwright's report. A test that passes only at a second try has not passed; errors outside tests count each.
 *
 * @param {unknown} report
 * @returns {Count}
 */
export function playwrightCount(report) {
  const { stats, errors } =
    /** @type {{ stats?: { expected: number, unexpected: number, flaky: number }, errors?: unknown[] }} */ (
      report ?? {}
    );
  if (stats === undefined) return NOTHING;
  return { passed: stats.expected, failed: stats.unexpected + stats.flaky + (errors?.length ?? 0) };
}
