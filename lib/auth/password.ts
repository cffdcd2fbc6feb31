/** Passwords: argon2id, off the main thread (OWASP Password Storage Cheat Sheet: 19 MiB, two passes, one lane). */
import { hash, verify } from '@node-rs/argon2';
import { AppError } from '@/lib/errors';

const OPTIONS = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;
export const PASSWORD_LENGTH_MIN = 10;
const PASSWORD_LENGTH_MAX = 200;

/** What is stored of a password. Throws `invalid-request` on one that is too short or too long. */
export function passwordHash(password: string): Promise<string> {
  if (password.length < PASSWORD_LENGTH_MIN || password.length > PASSWORD_LENGTH_MAX) {
    const message = `A password has ${PASSWORD_LENGTH_MIN} to ${PASSWORD_LENGTH_MAX} characters.`;
    throw new AppError('invalid-request', message, {
      faults: [{ path: '/password', code: 'password-length', message }],
    });
  }
  return hash(password, OPTIONS);
}

let dummy: Promise<string> | undefined;

/** Whether the password is the stored one's. Without a stored one the same time passes, so that nobody learns who has an account. */
export async function isPassword(stored: string | null | undefined, password: string): Promise<boolean> {
  dummy ??= hash('a password that nobody has', OPTIONS);
  const given = password.slice(0, PASSWORD_LENGTH_MAX);
  if (stored) return verify(stored, given);
  await verify(await dummy, given);
  return false;
}
