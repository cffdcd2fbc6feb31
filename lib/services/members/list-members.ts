/** Who belongs to the workspace and who is invited. */
import { openInvitationsOf } from '@/db/queries/invitations';
import { membersOf } from '@/db/queries/workspaces';
import type { Role } from '@/db/schema';
import type { Context } from '@/lib/context';
import { personFor } from '@/lib/permissions';

export interface Members {
  readonly members: readonly {
    readonly userId: string;
    readonly name: string;
    readonly email: string;
    readonly role: Role;
    readonly since: Date;
    /** Whether it is the one who asks. */
    readonly isSelf: boolean;
  }[];
  readonly invitations: readonly {
    readonly id: string;
    readonly email: string;
    readonly role: Role;
    readonly expiresAt: Date;
  }[];
}

/** Members by name, open invitations the newest first. For owners. */
export async function listMembers(ctx: Context): Promise<Members> {
  const { workspaceId, userId } = personFor(ctx.actor, 'workspace');
  const rows = await membersOf(ctx.db, workspaceId);
  const open = await openInvitationsOf(ctx.db, workspaceId, ctx.now());
  return {
    members: rows.map((row) => ({
      ...row,
      name: row.name ?? '',
      email: row.email ?? '',
      isSelf: row.userId === userId,
    })),
    invitations: open.map(({ id, email, role, expiresAt }) => ({ id, email, role, expiresAt })),
  };
}
