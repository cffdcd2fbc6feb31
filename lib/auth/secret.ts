/** The secret that sessions are sealed with: from the settings, or made once and kept in the data folder. */
import { randomBytes } from 'node:crypto';
import { chmodSync, existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { env } from '@/lib/env';

/** Shorter secrets of the settings are refused. */
const SECRET_LENGTH_MIN = 32;
const SECRET_BYTES = 48;

let kept: string | undefined;

/** The secret of this installation. Throws on one of the settings that is too short to be safe. */
export function sessionSecret(): string {
  kept ??= env.secret === undefined ? keptSecret(join(env.dataFolder, 'secret')) : checked(env.secret);
  return kept;
}

function checked(secret: string): string {
  if (secret.length < SECRET_LENGTH_MIN || new Set(secret).size < 10)
    throw new Error(`WAYPOST_SECRET is too weak: it needs ${SECRET_LENGTH_MIN} characters of chance or more.`);
  return secret;
}

/** Two processes that begin at once end with the same secret: the file is made by one of them only. */
function keptSecret(path: string): string {
  if (!existsSync(path)) {
    mkdirSync(env.dataFolder, { recursive: true, mode: 0o700 });
    try {
      writeFileSync(path, randomBytes(SECRET_BYTES).toString('base64url'), { flag: 'wx', mode: 0o600 });
    } catch (error) {
      if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error;
    }
  }
  chmodSync(path, 0o600);
  return checked(readFileSync(path, 'utf8').trim());
}
