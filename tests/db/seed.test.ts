/** The demo workspace in the database: once, whole, and as its people may see it. */
import { verify } from '@node-rs/argon2';
import { expect, it } from 'vitest';
import { changesPage } from '@/db/queries/changes';
import { positionsOf } from '@/db/queries/studies';
import { studiesPage } from '@/db/queries/study-list';
import { userByEmailKey } from '@/db/queries/users';
import { membersOf, workspacesOfUser } from '@/db/queries/workspaces';
import { workspaces } from '@/db/schema';
import { DEMO_PEOPLE, DEMO_STUDIES } from '@/db/seed';
import { seedDemo } from '@/lib/cli/seed-demo';
import { describeOnBoth } from '@/tests/support/databases';

describeOnBoth('the seed', ({ fresh }) => {
  it('writes the demo workspace once', { timeout: 60_000 }, async () => {
    const { db } = await fresh();
    expect(await seedDemo(db, 'first')).toBe(true);
    expect(await seedDemo(db, 'second')).toBe(false);
    const [workspace, ...others] = await db.select().from(workspaces);
    expect(others).toEqual([]);
    const members = await membersOf(db, workspace?.id ?? '');
    expect(members.map(({ email, role }) => `${email} ${role}`).sort()).toEqual(
      DEMO_PEOPLE.map(({ email, role }) => `${email} ${role}`).sort(),
    );
    const owner = await userByEmailKey(db, DEMO_PEOPLE[0].email);
    expect(await verify(owner?.passwordHash ?? '', 'first')).toBe(true);
    expect(await verify(owner?.passwordHash ?? '', 'second')).toBe(false);
  });

  it('writes every study with its positions in order, their history, and what is shared', {
    timeout: 60_000,
  }, async () => {
    const { db } = await fresh();
    await seedDemo(db, 'x');
    const student = await userByEmailKey(db, DEMO_PEOPLE[3].email);
    const [place] = await workspacesOfUser(db, student?.id ?? '');
    expect(place?.role).toBe('student');
    const wanted = { workspaceId: place?.workspace.id ?? '', trash: false, limit: 50 };
    const all = await studiesPage(db, wanted);
    expect(all.map(({ title, positions }) => `${positions} ${title}`).sort()).toEqual(
      DEMO_STUDIES.map(({ title, positions }) => `${positions.length} ${title}`).sort(),
    );
    const shared = await studiesPage(db, { ...wanted, sharedWith: student?.id });
    expect(shared.map(({ title }) => title).sort()).toEqual(
      DEMO_STUDIES.filter((study) => study.shared)
        .map(({ title }) => title)
        .sort(),
    );
    for (const { id, title } of all) {
      const written = DEMO_STUDIES.find((study) => study.title === title)?.positions ?? [];
      expect((await positionsOf(db, id)).map(({ fen, note }) => ({ fen, note }))).toEqual(
        written.map(({ fen, note }) => ({ fen, note })),
      );
      const history = await changesPage(db, { studyId: id, limit: 50 });
      expect(history.map(({ change, person }) => `${person} ${change.kind}`)).toEqual(
        Array.from({ length: written.length + 1 }, () => 'Tibor Fennwick create'),
      );
    }
  });
});
