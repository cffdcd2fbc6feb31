/** Finding a PostgreSQL server for the database tests, or getting one from the system's packages. */
import { readdirSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { installPackage, isProgram } from './system.mjs';

/** Where Debian keeps the server's programs: a folder a version, none of them on the path. */
const DEBIAN = '/usr/lib/postgresql';

/** What a person reads who has no PostgreSQL. */
export const POSTGRES_MISSING = `No PostgreSQL server was found, and none could be installed from the system's packages.
Install one (on Debian: apt-get install postgresql), or say where initdb and postgres are:
  POSTGRES_BIN=/path/to/bin npm run check`;

/**
 * The folder of `initdb` and `postgres`: what the variable POSTGRES_BIN says, else Debian's newest, else one on the path.
 *
 * @param {Record<string, string | undefined>} environment
 * @returns {string | undefined}
 */
export function findPostgres({ POSTGRES_BIN, PATH = '' }) {
  const folders = POSTGRES_BIN ? [POSTGRES_BIN] : [...debianFolders(), ...PATH.split(delimiter)];
  return folders.find((folder) => ['initdb', 'postgres'].every((name) => isProgram(join(folder, name))));
}

/** The folder of the server's programs, installed if need be; undefined, and said why, when there is no way. */
export async function ensurePostgres() {
  const found =
    findPostgres(process.env) ?? ((await installPackage('postgresql')) ? findPostgres(process.env) : undefined);
  if (found === undefined) console.error(POSTGRES_MISSING);
  return found;
}

function debianFolders() {
  try {
    return readdirSync(DEBIAN)
      .sort((a, b) => Number(b) - Number(a))
      .map((version) => join(DEBIAN, version, 'bin'));
  } catch {
    return [];
  }
}
