/** The system's programs and packages: finding the one, installing the other. */
import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { run } from './run.mjs';

/**
 * Installs one of Debian's packages, as root or by a sudo that asks nothing.
 *
 * @param {string} name
 * @returns {Promise<boolean>} whether it went well; false also where there is no apt-get
 */
export async function installPackage(name) {
  const [command, ...first] = process.getuid?.() === 0 ? ['apt-get'] : ['sudo', '-n', 'apt-get'];
  if (command === undefined || !['apt-get', command].every(isOnPath)) return false;
  const environment = { DEBIAN_FRONTEND: 'noninteractive' };
  return (
    (await run(command, [...first, 'update'], environment)) &&
    (await run(command, [...first, 'install', '-y', '--no-install-recommends', name], environment))
  );
}

/** @param {string} name */
function isOnPath(name) {
  return (process.env.PATH ?? '').split(delimiter).some((folder) => isProgram(join(folder, name)));
}

/** @param {string} path */
export function isProgram(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}
