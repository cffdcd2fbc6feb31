/** Many editors of one study at once: whoever comes second is told so, and nothing is overwritten unseen. */
import { expect, it } from 'vitest';
import { changesPage } from '@/db/queries/changes';
import { insertStudy } from '@/db/queries/studies';
import { countedStudy } from '@/db/queries/study-list';
import { insertWorkspace } from '@/db/queries/workspaces';
import { inPlace } from '@/lib/compute/computing';
import type { Context } from '@/lib/context';
import { AppError } from '@/lib/errors';
import { changeStudy } from '@/lib/services/studies/change-study';
import { describeOnBoth } from '@/tests/support/databases';

/** As many as the figure asks for when it is asked for: EDITORS=200. */
const EDITORS = Number(process.env.EDITORS ?? 40);

describeOnBoth(`${EDITORS} editors of one study at once`, ({ fresh }) => {
  it('change it one after the other, and every other one is told 412', async () => {
    const { db } = await fresh();
    const workspace = await insertWorkspace(db, { name: 'Editors', slug: 'editors' });
    const study = await insertStudy(db, { workspaceId: workspace!.id, title: '0' });
    const ctx: Context = {
      actor: {
        kind: 'key',
        keyId: '00000000-0000-4000-8000-000000000001',
        workspaceId: workspace!.id,
        scopes: ['studies:write'],
      },
      requestId: 'test',
      now: () => new Date(),
      db,
      compute: inPlace,
      signal: new AbortController().signal,
    };
    let lost = 0;
    /** Reads the version, changes what it read, and tries again when it was not first. */
    const edit = async (): Promise<void> => {
      for (;;) {
        const seen = await countedStudy(db, workspace!.id, study.id);
        try {
          await changeStudy(ctx, { id: study.id, version: seen!.version, title: String(Number(seen!.title) + 1) });
          return;
        } catch (error) {
          if (!(error instanceof AppError) || error.code !== 'version-lost') throw error;
          expect(error.status).toBe(412);
          lost++;
        }
      }
    };
    await Promise.all(Array.from({ length: EDITORS }, edit));
    const last = await countedStudy(db, workspace!.id, study.id);
    expect([last?.title, last?.version]).toEqual([String(EDITORS), EDITORS + 1]);
    expect(lost).toBeGreaterThan(0);
    const history = await changesPage(db, { studyId: study.id, limit: EDITORS + 1 });
    expect(new Set(history.map(({ change }) => change.version)).size).toBe(EDITORS);
  }, 120_000);
});
