/** What was done to members, keys, publishing and deletion. */
import { auditPage } from '@/db/queries/audit';
import type { Context } from '@/lib/context';
import { personFor } from '@/lib/permissions';

const AUDIT_PAGE = 50;

export interface AuditEntry {
  readonly id: string;
  readonly at: Date;
  /** A person's name, a key's name, or neither where both are gone. */
  readonly who: string;
  /** A noun and a verb: `member.invite`. */
  readonly action: string;
  readonly detail: Readonly<Record<string, unknown>>;
}

/** A page of the workspace's log, the newest first, and where the next one goes on. For owners. */
export async function listAudit(
  ctx: Context,
  after?: { readonly at: Date; readonly id: string },
): Promise<{
  readonly entries: readonly AuditEntry[];
  readonly next: { readonly at: Date; readonly id: string } | undefined;
}> {
  const { workspaceId } = personFor(ctx.actor, 'workspace');
  const rows = await auditPage(ctx.db, { workspaceId, limit: AUDIT_PAGE + 1, after });
  const entries = rows.slice(0, AUDIT_PAGE).map(({ entry: { id, at, action, detail }, person, key }) => {
    return { id, at, action, detail, who: person ?? (key === null ? 'Somebody who left' : `Key ${key}`) };
  });
  return { entries, next: rows.length > AUDIT_PAGE ? entries.at(-1) : undefined };
}
