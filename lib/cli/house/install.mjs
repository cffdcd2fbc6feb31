/** Installing the packages, only when what is there is not what package-lock.json asks for. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { ROOT, run } from './run.mjs';

/**
 * What we read of a lock file: a package's folder to what stands there.
 *
 * @typedef {Record<string, { readonly version?: string, readonly optional?: boolean, readonly devOptional?: boolean }>} Packages
 */

/**
 * Whether all that is asked for is there in the same version. Optional packages (those for other machines) may be absent.
 *
 * @param {Packages} asked
 * @param {Packages} there
 */
export function isInstalled(asked, there) {
  return Object.entries(asked).every(([folder, { version, optional, devOptional }]) => {
    if (folder === '') return true;
    const found = there[folder];
    return found === undefined ? optional === true || devOptional === true : found.version === version;
  });
}

/**
 * The packages of a lock file; none when it is missing or cannot be read.
 *
 * @param {string} path from the project's folder
 * @returns {Packages}
 */
function packagesOf(path) {
  try {
    return JSON.parse(readFileSync(join(ROOT, path), 'utf8')).packages ?? {};
  } catch {
    return {};
  }
}

/** Installs with `npm ci` when packages are missing or others. @returns {Promise<boolean>} whether they are there now */
export async function install() {
  // npm leaves in node_modules a lock of what it put there.
  if (isInstalled(packagesOf('package-lock.json'), packagesOf('node_modules/.package-lock.json'))) return true;
  return run(process.platform === 'win32' ? 'npm.cmd' : 'npm', ['ci', '--include=dev', '--no-audit', '--no-fund']);
}

/** Ends the process in words when Node is older than package.json asks for. */
export function requireNode() {
  const { engines } = JSON.parse(readFileSync(join(ROOT, 'package.json'), 'utf8'));
  const [major = 0, minor = 0] = String(engines.node).replace('>=', '').split('.').map(Number);
  const [ownMajor = 0, ownMinor = 0] = process.versions.node.split('.').map(Number);
  if (ownMajor > major || (ownMajor === major && ownMinor >= minor)) return;
  console.error(`Waypost needs Node.js ${engines.node}; this is ${process.versions.node}.`);
  process.exit(1);
}
