/** Changes of a study as a whole: its words, its way into the trash and out of it. */
import { insertChange } from '@/db/queries/changes';
import { changeStudy as changeRow, type CountedStudy } from '@/db/queries/study-list';
import type { Context } from '@/lib/context';
import type { Member } from '@/lib/permissions';
import type { StudyAnswer, StudyChange } from '@/openapi/schemas/studies';
import { authorOf, versionLost, writableStudy } from './access';
import { studyAnswer, studyKept } from './answers';

interface Versioned {
  readonly id: string;
  /** The version that the caller has seen. */
  readonly version: number;
}

/** Changes title or summary. Throws `version-lost` where another change was first. */
export async function changeStudy(
  ctx: Context,
  { id, version, ...change }: Versioned & StudyChange,
): Promise<StudyAnswer> {
  const { member, study } = await writableStudy(ctx, id);
  const { title = study.title, summary = study.summary } = change;
  return changed(ctx, member, study, { version, kind: 'update', set: { title, summary } });
}

/** Puts a study into the trash, with all that is in it. */
export async function trashStudy(ctx: Context, { id, version }: Versioned): Promise<undefined> {
  const { member, study } = await writableStudy(ctx, id);
  await changed(ctx, member, study, { version, kind: 'delete', set: { deletedAt: ctx.now() } });
}

/** Takes a study out of the trash, as it was. One that is not there stays as it is. */
export async function restoreStudy(ctx: Context, { id }: { readonly id: string }): Promise<StudyAnswer> {
  const { member, study } = await writableStudy(ctx, id, { trashed: true });
  if (study.deletedAt === null) return studyAnswer(study);
  return changed(ctx, member, study, { version: study.version, kind: 'restore', set: { deletedAt: null } });
}

interface Changed {
  readonly version: number;
  readonly kind: 'update' | 'delete' | 'restore';
  readonly set: Partial<Pick<CountedStudy, 'title' | 'summary' | 'deletedAt'>>;
}

async function changed(ctx: Context, member: Member, study: CountedStudy, { version, kind, set }: Changed) {
  const at = ctx.now();
  return ctx.db.transaction(async (tx) => {
    const row = await changeRow(tx, { id: study.id, version }, { ...set, updatedAt: at });
    if (!row) throw versionLost(study.version);
    await insertChange(tx, {
      ...authorOf(member),
      workspaceId: study.workspaceId,
      studyId: study.id,
      entity: 'study',
      entityId: study.id,
      version: row.version,
      kind,
      at,
      before: studyKept(study),
      after: kind === 'delete' ? null : studyKept(row),
    });
    return studyAnswer({ ...row, positions: study.positions });
  });
}
