/** Finding a Chromium for the browser tests, or getting one from the system's packages. */
import { delimiter, join } from 'node:path';
import { installPackage, isProgram } from './system.mjs';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable'];

const MISSING = `No Chromium was found, and none could be installed from the system's packages.
Install one (on Debian: apt-get install chromium), or say where one is:
  CHROMIUM=/path/to/chromium npm run check`;

/**
 * The path of a Chromium: what the variable CHROMIUM says, else the first on the path.
 *
 * @param {Record<string, string | undefined>} environment
 * @returns {string | undefined}
 */
export function findChromium({ CHROMIUM, PATH = '' }) {
  if (CHROMIUM) return CHROMIUM;
  const folders = [...PATH.split(delimiter), '/usr/bin'];
  return NAMES.flatMap((name) => folders.map((folder) => join(folder, name))).find(isProgram);
}

/** The path of a Chromium, installed if need be; undefined, and said why, when there is no way. */
export async function ensureChromium() {
  const found =
    findChromium(process.env) ?? ((await installPackage('chromium')) ? findChromium(process.env) : undefined);
  if (found === undefined) console.error(MISSING);
  return found;
}
