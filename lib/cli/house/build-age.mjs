/** Whether the build is as new as what it was made from. */
import { readdirSync, statSync } from 'node:fs';
import { join } from 'node:path';

/** What a build is made from; folders count with all that is in them. */
export const SOURCES = [
  'app',
  'components',
  'db',
  'engine',
  'lib',
  'openapi',
  'instrumentation.ts',
  'proxy.ts',
  'next.config.mjs',
  'postcss.config.mjs',
  'package-lock.json',
];

/** Written last by a build. */
const BUILD_MARK = '.next/BUILD_ID';

/**
 * Whether something changed after the build, or there is no build. A folder's own time tells of files that went away.
 *
 * @param {string} root the project's folder
 */
export function needsBuild(root) {
  const built = timeOf(join(root, BUILD_MARK));
  return built === undefined || SOURCES.some((source) => newestIn(join(root, source)) > built);
}

/**
 * The newest time in a file or folder, in ms; 0 when there is none.
 *
 * @param {string} path
 * @returns {number}
 */
function newestIn(path) {
  const own = timeOf(path);
  if (own === undefined) return 0;
  if (!statSync(path).isDirectory()) return own;
  return Math.max(own, ...readdirSync(path).map((name) => newestIn(join(path, name))));
}

/** @param {string} path */
function timeOf(path) {
  return statSync(path, { throwIfNoEntry: false })?.mtimeMs;
}
