/** Who may do what with a study: the first line of every service here. */
import { isSharedWith, countedStudy, type CountedStudy } from '@/db/queries/study-list';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { type Member, memberFor } from '@/lib/permissions';

/** Of a study that is another's, and of one that never was, the same is said. */
export function noStudy(): AppError {
  return new AppError('not-found', 'There is no such study.');
}

/** A study that the caller may read. Students read what is shared with them; the trash is seen by those who may write. */
export async function readableStudy(
  ctx: Context,
  id: string,
): Promise<{ readonly member: Member; readonly study: CountedStudy }> {
  const member = memberFor(ctx.actor, 'studies:read');
  const study = await countedStudy(ctx.db, member.workspaceId, id);
  if (!study || study.deletedAt !== null) throw noStudy();
  if (member.role === 'student' && !(await isSharedWith(ctx.db, id, member.userId ?? ''))) throw noStudy();
  return { member, study };
}

/** A study that the caller may change; `trashed` ones only where they are asked for. */
export async function writableStudy(
  ctx: Context,
  id: string,
  { trashed = false }: { readonly trashed?: boolean } = {},
): Promise<{ readonly member: Member; readonly study: CountedStudy }> {
  const member = memberFor(ctx.actor, 'studies:write');
  const study = await countedStudy(ctx.db, member.workspaceId, id);
  if (!study || (study.deletedAt !== null && !trashed)) throw noStudy();
  return { member, study };
}

/** Who makes a change, as history keeps it. */
export function authorOf(member: Member): { readonly userId: string | null; readonly keyId: string | null } {
  return { userId: member.userId, keyId: member.keyId };
}

/** Somebody else changed it first; nothing of this change is kept. */
export function versionLost(current: number): AppError {
  return new AppError('version-lost', `Somebody else has changed this first; it is at version ${current} now.`);
}
