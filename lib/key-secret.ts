/** The secret of a key: how it is made, recognised and found again without being stored. */
import { createHash, randomBytes } from 'node:crypto';

/** Every key begins so: a secret that leaks is recognised. */
const MARK = 'wpk_';
const SECRET_BYTES = 32;
/** Letters by which an owner recognises a key. */
const PREFIX_LENGTH = MARK.length + 6;

/** A new secret with 256 bits of chance, and what is stored of it. */
export function newKeySecret(): { readonly secret: string; readonly prefix: string; readonly hash: string } {
  const secret = MARK + randomBytes(SECRET_BYTES).toString('base64url');
  return { secret, prefix: secret.slice(0, PREFIX_LENGTH), hash: keyHash(secret) };
}

/** SHA-256 in hex. A secret of 256 random bits needs no slow hash. */
export function keyHash(secret: string): string {
  return createHash('sha256').update(secret).digest('hex');
}

/** The secret in an Authorization header; undefined where there is none of ours. */
export function secretIn(authorization: string | null): string | undefined {
  return /^Bearer\s+(wpk_[\w-]{20,100})\s*$/i.exec(authorization ?? '')?.[1];
}
