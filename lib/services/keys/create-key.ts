/** A new key: its secret is shown once. */
import { insertKey } from '@/db/queries/keys';
import { insertAudit } from '@/db/queries/audit';
import type { Context } from '@/lib/context';
import { newKeySecret } from '@/lib/key-secret';
import { personFor } from '@/lib/permissions';
import type { KeyAnswer, KeyRequest } from '@/openapi/schemas/keys';
import { keyAnswer } from './answers';

const DAY_MS = 86_400_000;

/** Makes a key of the workspace. */
export async function createKey(
  ctx: Context,
  { name, scopes, days }: KeyRequest,
): Promise<{ readonly key: KeyAnswer; readonly secret: string }> {
  const { workspaceId, userId } = personFor(ctx.actor, 'workspace');
  const { secret, prefix, hash } = newKeySecret();
  const at = ctx.now();
  return ctx.db.transaction(async (tx) => {
    const row = await insertKey(tx, {
      workspaceId,
      name,
      prefix,
      hash,
      scopes: [...new Set(scopes)],
      createdBy: userId,
      createdAt: at,
      expiresAt: new Date(at.getTime() + days * DAY_MS),
    });
    await insertAudit(tx, { workspaceId, userId, at, action: 'key.create', subject: row.id, detail: { name, scopes } });
    return { key: keyAnswer(row), secret };
  });
}
