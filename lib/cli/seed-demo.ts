/** Writing the demo workspace, through the same services that people use. */
import { randomUUID } from 'node:crypto';
import { hash } from '@node-rs/argon2';
import type { Db } from '@/db/client';
import { putShares } from '@/db/queries/study-list';
import { insertUser, isPeopled } from '@/db/queries/users';
import { insertWorkspace, putMembership } from '@/db/queries/workspaces';
import { DEMO_PEOPLE, DEMO_STUDIES, DEMO_WORKSPACE } from '@/db/seed';
import { computing } from '@/lib/compute/computing';
import type { Context } from '@/lib/context';
import { createPosition } from '@/lib/services/studies/create-position';
import { createStudy } from '@/lib/services/studies/create-study';
import { positionRequestSchema } from '@/openapi/schemas/studies';

/** Writes the demo workspace, all of it or nothing. False, and nothing written, where somebody has an account already. */
export async function seedDemo(db: Db, password: string): Promise<boolean> {
  if (await isPeopled(db)) return false;
  // Outside the transaction: it takes a while, and transactions queue.
  const passwordHash = await hash(password, { memoryCost: 19_456, timeCost: 2, parallelism: 1 });
  return db.transaction(async (tx) => {
    const workspace = await insertWorkspace(tx, DEMO_WORKSPACE);
    if (!workspace) return false;
    const ids = new Map<string, string>();
    for (const { name, email, role } of DEMO_PEOPLE) {
      const user = await insertUser(tx, { name, email, emailKey: email, emailVerified: new Date(), passwordHash });
      if (!user) throw new Error(`two people of the demo have the address ${email}`);
      await putMembership(tx, workspace.id, user.id, role);
      ids.set(role, user.id);
    }
    await writeStudies(tx, workspace.id, ids);
    return true;
  });
}

async function writeStudies(tx: Db, workspaceId: string, ids: ReadonlyMap<string, string>): Promise<void> {
  const coach = { kind: 'person', userId: ids.get('coach') ?? '', name: null, workspaceId, role: 'coach' } as const;
  const ctx: Context = {
    actor: { ...coach, signInId: randomUUID() },
    requestId: randomUUID(),
    now: () => new Date(),
    db: tx,
    compute: computing,
    signal: new AbortController().signal,
  };
  for (const { title, summary, shared, positions } of DEMO_STUDIES) {
    const { id } = await createStudy(ctx, { title, summary });
    for (const { line: _, ...position } of positions) {
      await createPosition(ctx, { id, ...positionRequestSchema.parse(position) });
    }
    if (shared) await putShares(tx, id, [ids.get('student') ?? '']);
  }
}
