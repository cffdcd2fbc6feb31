/** A key as the API answers it: never its hash. */
import type { KeyRow } from '@/db/queries/keys';
import type { KeyAnswer } from '@/openapi/schemas/keys';

/** A key as promised. */
export function keyAnswer({ id, name, prefix, scopes, createdAt, expiresAt, revokedAt, usedAt }: KeyRow): KeyAnswer {
  return {
    id,
    name,
    prefix,
    scopes: scopes as KeyAnswer['scopes'],
    createdAt: createdAt.toISOString(),
    expiresAt: expiresAt?.toISOString() ?? null,
    revokedAt: revokedAt?.toISOString() ?? null,
    usedAt: usedAt?.toISOString() ?? null,
  };
}
