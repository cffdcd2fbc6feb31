/** The studies that the caller may read, last changed first. */
import { studiesPage } from '@/db/queries/study-list';
import { pageOf, readCursor } from '@/lib/api/cursor';
import type { Context } from '@/lib/context';
import { memberFor } from '@/lib/permissions';
import type { StudyAnswer } from '@/openapi/schemas/studies';
import { studyAnswer } from './answers';

interface Wanted {
  readonly limit: number;
  readonly cursor?: string | undefined;
  readonly trash: boolean;
}

/** A page of studies. The trash is shown to those who may write. */
export async function listStudies(
  ctx: Context,
  { limit, cursor, trash }: Wanted,
): Promise<{ readonly items: StudyAnswer[]; readonly next: string | null }> {
  const member = memberFor(ctx.actor, trash ? 'studies:write' : 'studies:read');
  const after = cursor === undefined ? undefined : readCursor(cursor);
  const rows = await studiesPage(ctx.db, {
    workspaceId: member.workspaceId,
    sharedWith: member.role === 'student' ? (member.userId ?? undefined) : undefined,
    trash,
    limit: limit + 1,
    after: after && { at: new Date(after.after), id: after.id },
  });
  const { items, next } = pageOf(rows, limit, (row) => ({ after: row.updatedAt.toISOString(), id: row.id }));
  return { items: items.map(studyAnswer), next };
}
