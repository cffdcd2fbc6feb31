/** Invitations, roles and workspaces, and what of them nobody from elsewhere can see or change. */
import { sql } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { insertSignIn } from '@/db/queries/sessions';
import type { UserRow } from '@/db/queries/users';
import { type Role, ROLES } from '@/db/schema';
import { VISITOR } from '@/lib/actor';
import type { Context } from '@/lib/context';
import { acceptAsNew, acceptInvitation } from '@/lib/services/invitations/accept-invitation';
import { invite } from '@/lib/services/invitations/invite';
import { readInvitation } from '@/lib/services/invitations/read-invitation';
import { revokeInvitation } from '@/lib/services/invitations/revoke-invitation';
import { listAudit } from '@/lib/services/audit/list-audit';
import { deleteAccount } from '@/lib/services/accounts/delete-account';
import { changeRole } from '@/lib/services/members/change-role';
import { listMembers } from '@/lib/services/members/list-members';
import { removeMember } from '@/lib/services/members/remove-member';
import { chooseWorkspace } from '@/lib/services/workspaces/choose-workspace';
import { createWorkspace } from '@/lib/services/workspaces/create-workspace';
import { deleteWorkspace } from '@/lib/services/workspaces/delete-workspace';
import { listWorkspaces } from '@/lib/services/workspaces/list-workspaces';
import { renameWorkspace } from '@/lib/services/workspaces/rename-workspace';
import { actorOf, contextFor, linkTo } from '@/tests/support/acting';
import { freshWorld, type World } from '@/tests/support/world';

const NEW = 'uma.brook@waypost.test';
const DAY_MS = 86_400_000;
const NOBODY = '00000000-0000-4000-8000-000000000000';

let world: World;
let people: Record<Role, UserRow>;
let workspaceId: string;

beforeAll(async () => {
  world = await freshWorld();
});
afterAll(() => world.close());
beforeEach(async () => {
  await world.db.execute(sql`truncate users, workspaces, rate_limits, mail cascade`);
  people = {
    owner: await world.person('Ines Ward'),
    coach: await world.person('Tom Fell'),
    writer: await world.person('Rosa Lind'),
    student: await world.person('Jo Marsh'),
  };
  ({ id: workspaceId } = await world.workspace('Evening group', people));
});

/** A context of a person in a workspace with a role, as a session gives it. */
async function as(role: Role, user = people[role], place = workspaceId, now?: () => Date): Promise<Context> {
  const signInId = await insertSignIn(world.db, { userId: user.id, agent: null, at: new Date() });
  const actor = { kind: 'person', userId: user.id, name: user.name, workspaceId: place, role, signInId } as const;
  return contextFor(world.db, actor, now);
}

async function invited(email = NEW, role: Role = 'writer'): Promise<string> {
  await invite(await as('owner'), { email, role });
  return linkTo(world.db, email, 'invitation');
}

const newcomer = (token: string) =>
  acceptAsNew(contextFor(world.db), { token, name: 'Uma Brook', password: 'four quiet rooks', agent: null });

/** Code and sentence of a refusal. */
function refusal(promise: Promise<unknown>): Promise<unknown> {
  return promise.then(
    () => 'not refused',
    (error: Error & { code?: string }) => [error.code, error.message],
  );
}

describe('an invitation', () => {
  it('brings somebody new in with its role, and with a workspace of their own', async () => {
    const { session, workspaceId: joined } = await newcomer(await invited());
    expect(joined).toBe(workspaceId);
    const actor = await actorOf(session);
    expect(actor).toMatchObject({ kind: 'person', name: 'Uma Brook' });
    const places = await listWorkspaces(contextFor(world.db, actor));
    expect(places.map(({ name, role }) => [name, role])).toEqual([
      ['Evening group', 'writer'],
      ['Workspace of Uma Brook', 'owner'],
    ]);
  });

  it('used twice says so, to the reader and to whoever accepts', async () => {
    const token = await invited();
    await newcomer(token);
    const used = ['conflict', 'This invitation has been accepted already. Each is good once.'];
    expect(await refusal(newcomer(token))).toEqual(used);
    expect(await refusal(readInvitation(contextFor(world.db), { token }))).toEqual(used);
  });

  it('accepted twice at once is accepted once', async () => {
    const token = await invited();
    const both = await Promise.allSettled([newcomer(token), newcomer(token)]);
    expect(both.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
    expect((await listMembers(await as('owner'))).members).toHaveLength(5);
  });

  it('that is too old, taken back or followed by another says so', async () => {
    const token = await invited();
    const later = contextFor(world.db, VISITOR, () => new Date(Date.now() + 8 * DAY_MS));
    expect(await refusal(readInvitation(later, { token }))).toEqual(['conflict', expect.stringContaining('too old')]);
    await invited(NEW, 'student');
    expect(await refusal(readInvitation(contextFor(world.db), { token }))).toEqual([
      'conflict',
      expect.stringContaining('another one'),
    ]);
    const owner = await as('owner');
    const [open] = (await listMembers(owner)).invitations;
    await revokeInvitation(owner, { id: open?.id ?? '' });
    expect((await listMembers(owner)).invitations).toEqual([]);
  });

  it('that never was is not found', async () => {
    expect(await refusal(readInvitation(contextFor(world.db), { token: 'nothing' }))).toEqual([
      'not-found',
      'There is no such invitation.',
    ]);
  });

  it('is for its address only', async () => {
    const token = await invited();
    const stranger = await world.person('Kit Vane');
    const { id } = await world.workspace('Elsewhere', { owner: stranger });
    const refused = await refusal(acceptInvitation(await as('owner', stranger, id), { token }));
    expect(refused).toEqual(['not-allowed', expect.stringContaining('another address')]);
    expect(await newcomer(token)).toMatchObject({ workspaceId });
  });

  it('brings in somebody who has an account, and gives nobody two roles', async () => {
    const guest = await world.person('Kit Vane');
    const { id } = await world.workspace('Elsewhere', { owner: guest });
    const token = await invited(guest.email ?? '');
    const ctx = await as('owner', guest, id);
    expect(await acceptInvitation(ctx, { token })).toBe(workspaceId);
    const again = await invited(guest.email ?? '', 'owner');
    expect(await refusal(acceptInvitation(ctx, { token: again }))).toEqual([
      'conflict',
      expect.stringContaining('already'),
    ]);
    const { members } = await listMembers(await as('owner'));
    expect(members.find(({ userId }) => userId === guest.id)?.role).toBe('writer');
  });

  it('is not kept as it came', async () => {
    const token = await invited();
    expect(JSON.stringify(await world.db.query.invitations.findMany())).not.toContain(token);
  });
});

describe('members', () => {
  it('change and go at once, and the log says who did it', async () => {
    const owner = await as('owner');
    await changeRole(owner, { userId: people.student.id, role: 'coach' });
    await removeMember(owner, { userId: people.writer.id });
    const { members } = await listMembers(owner);
    expect(members.map(({ name, role }) => [name, role])).toEqual([
      ['Ines Ward', 'owner'],
      ['Jo Marsh', 'coach'],
      ['Tom Fell', 'coach'],
    ]);
    const { entries } = await listAudit(owner);
    expect(entries.map(({ action, who }) => [action, who]).sort()).toEqual([
      ['member.remove', 'Ines Ward'],
      ['member.role', 'Ines Ward'],
    ]);
  });

  it('leave by themselves, but nobody else takes them out', async () => {
    await removeMember(await as('student'), { userId: people.student.id });
    expect(await refusal(removeMember(await as('coach'), { userId: people.writer.id }))).toMatchObject({
      0: 'not-allowed',
    });
  });

  it('always have an owner: the last neither goes nor steps back nor deletes the account', async () => {
    const owner = await as('owner');
    const last = { userId: people.owner.id };
    expect(await refusal(removeMember(owner, last))).toMatchObject({ 0: 'conflict' });
    expect(await refusal(changeRole(owner, { ...last, role: 'coach' }))).toMatchObject({ 0: 'conflict' });
    const leaving = { present: '', email: people.owner.email ?? '' };
    expect(await refusal(deleteAccount(owner, leaving))).toMatchObject({ 0: 'conflict' });
  });

  it('of two owners who step back at once one stays', async () => {
    await changeRole(await as('owner'), { userId: people.coach.id, role: 'owner' });
    const [one, two] = [await as('owner'), await as('owner', people.coach)];
    await Promise.allSettled([
      changeRole(one, { userId: people.coach.id, role: 'student' }),
      changeRole(two, { userId: people.owner.id, role: 'student' }),
    ]);
    const rows = await world.db.query.memberships.findMany();
    expect(rows.filter(({ role }) => role === 'owner').length).toBeGreaterThanOrEqual(1);
  });
});

describe('workspaces', () => {
  it('of others are told apart from none by nothing', async () => {
    const stranger = await world.person('Kit Vane');
    const { id } = await world.workspace('Elsewhere', { owner: stranger });
    const owner = await as('owner');
    const foreign = await refusal(chooseWorkspace(owner, { id }));
    expect(foreign).toEqual(await refusal(chooseWorkspace(owner, { id: NOBODY })));
    const elsewhere = await as('owner', stranger, id);
    for (const userId of [people.coach.id, NOBODY]) {
      const gone = ['not-found', 'There is no such member.'];
      expect(await refusal(changeRole(elsewhere, { userId, role: 'student' }))).toEqual(gone);
      expect(await refusal(removeMember(elsewhere, { userId }))).toEqual(gone);
    }
    await invited();
    const [open] = (await listMembers(owner)).invitations;
    const refused = await refusal(revokeInvitation(elsewhere, { id: open?.id ?? '' }));
    expect(refused).toEqual(await refusal(revokeInvitation(elsewhere, { id: NOBODY })));
    expect((await listAudit(elsewhere)).entries).toEqual([]);
  });

  it('go with all that is in them once their name is typed, and leave their owner a place', async () => {
    const owner = await as('owner');
    expect(await refusal(deleteWorkspace(owner, { name: 'evening' }))).toMatchObject({ 0: 'invalid-request' });
    await deleteWorkspace(owner, { name: 'Evening group' });
    expect(await listWorkspaces(owner)).toMatchObject([{ name: 'Workspace of Ines Ward', role: 'owner' }]);
  });

  it('are made and chosen', async () => {
    const student = await as('student');
    const id = await createWorkspace(student, { name: 'Morning group' });
    expect(await chooseWorkspace(student, { id })).toBe(id);
  });
});

describe('each role', () => {
  const OWNERS: Readonly<Record<string, (ctx: Context) => Promise<unknown>>> = {
    listMembers,
    listAudit: (ctx) => listAudit(ctx),
    invite: (ctx) => invite(ctx, { email: NEW, role: 'student' }),
    revokeInvitation: (ctx) => revokeInvitation(ctx, { id: NOBODY }),
    changeRole: (ctx) => changeRole(ctx, { userId: NOBODY, role: 'student' }),
    removeMember: (ctx) => removeMember(ctx, { userId: NOBODY }),
    renameWorkspace: (ctx) => renameWorkspace(ctx, { name: 'Another' }),
    deleteWorkspace: (ctx) => deleteWorkspace(ctx, { name: 'Evening group' }),
  };

  it.each(Object.entries(OWNERS))('%s: owners only, no key, no visitor', async (_, act) => {
    for (const role of ROLES.filter((each) => each !== 'owner')) {
      expect(await refusal(act(await as(role))), role).toMatchObject({ 0: 'not-allowed' });
    }
    const scopes = ['compute', 'studies:read', 'studies:write', 'publish'] as const;
    const key = contextFor(world.db, { kind: 'key', keyId: NOBODY, workspaceId, scopes });
    expect(await refusal(act(key))).toMatchObject({ 0: 'not-allowed' });
    expect(await refusal(act(contextFor(world.db)))).toMatchObject({ 0: 'not-signed-in' });
    expect(await refusal(act(await as('owner')))).not.toMatchObject({ 0: 'not-allowed' });
  });
});
