/** A new study. */
import { insertChange } from '@/db/queries/changes';
import { insertStudy } from '@/db/queries/studies';
import type { Context } from '@/lib/context';
import { memberFor } from '@/lib/permissions';
import type { StudyAnswer, StudyRequest } from '@/openapi/schemas/studies';
import { authorOf } from './access';
import { studyAnswer, studyKept } from './answers';

/** Makes a study in the caller's workspace. */
export async function createStudy(ctx: Context, { title, summary }: StudyRequest): Promise<StudyAnswer> {
  const member = memberFor(ctx.actor, 'studies:write');
  const at = ctx.now();
  const author = authorOf(member);
  return ctx.db.transaction(async (tx) => {
    const study = await insertStudy(tx, {
      workspaceId: member.workspaceId,
      title,
      summary,
      createdBy: author.userId,
      createdAt: at,
      updatedAt: at,
    });
    await insertChange(tx, {
      ...author,
      workspaceId: member.workspaceId,
      studyId: study.id,
      entity: 'study',
      entityId: study.id,
      version: study.version,
      kind: 'create',
      at,
      before: null,
      after: studyKept(study),
    });
    return studyAnswer({ ...study, positions: 0 });
  });
}
