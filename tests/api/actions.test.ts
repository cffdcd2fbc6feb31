/** Who may send which form: every role and a visitor against every server action; a new action without a rule fails here. */
import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import { type Role, ROLES } from '@/db/schema';
import { exampleWorld, type ExampleWorld, renewed } from '@/tests/support/example-world';
import type { FormState } from '@/openapi/schemas/form-state';

const sent = vi.hoisted(() => ({ headers: new Headers() }));
vi.mock('next/headers', () => ({
  headers: async () => sent.headers,
  cookies: async () => ({ set: () => undefined, delete: () => undefined }),
}));
vi.mock('next/navigation', () => ({
  redirect: (to: string) => {
    throw Object.assign(new Error('elsewhere'), { digest: `NEXT_REDIRECT;${to}` });
  },
}));

type Action = (state: FormState, form: FormData) => Promise<FormState>;
/** `all`: a visitor too. */
type Rule = 'all' | readonly Role[];

const WRITERS: Rule = ['owner', 'coach', 'writer'];
const OWNERS: Rule = ['owner'];

/** The table of the service, written out a second time, by the names of actions. */
const RULES: Readonly<Record<string, Rule>> = {
  sendLinkAction: 'all',
  signUpAction: 'all',
  signInAction: 'all',
  signInByLinkAction: 'all',
  signOutAction: 'all',
  acceptAsNewAction: 'all',
  renameAction: ROLES,
  changePasswordAction: ROLES,
  askEmailChangeAction: ROLES,
  confirmEmailAction: ROLES,
  endSessionAction: ROLES,
  endOtherSessionsAction: ROLES,
  deleteAccountAction: ROLES,
  chooseWorkspaceAction: ROLES,
  createWorkspaceAction: ROLES,
  acceptInvitationAction: ROLES,
  renameWorkspaceAction: OWNERS,
  deleteWorkspaceAction: OWNERS,
  inviteAction: OWNERS,
  revokeInvitationAction: OWNERS,
  changeRoleAction: OWNERS,
  removeMemberAction: OWNERS,
  createKeyAction: OWNERS,
  revokeKeyAction: OWNERS,
  createStudyAction: WRITERS,
  trashStudyAction: WRITERS,
  restoreStudyAction: WRITERS,
  addPositionAction: WRITERS,
  trashPositionAction: WRITERS,
};

/** Asks for what it changes before it changes it: to a student what is not shared with them is not there. */
const READS_FIRST = ['trashPositionAction'];

const NOBODY = '00000000-0000-4000-8000-000000000000';
const FIELDS: Readonly<Record<string, string>> = {
  id: NOBODY,
  member: NOBODY,
  study: NOBODY,
  position: NOBODY,
  workspace: NOBODY,
  role: 'student',
  name: 'Another',
  title: 'Another',
  summary: '',
  email: 'kit.vane@waypost.test',
  password: 'four quiet rooks',
  present: 'wrong words',
  token: 'none',
  scopes: 'compute',
  days: '30',
  version: '1',
  fen: '8/8/8/3k4/8/3K4/3P4/8 w - - 0 1',
};

/** Every action there is: what files of lib/actions that begin with 'use server' export. */
async function allActions(): Promise<readonly (readonly [string, Action])[]> {
  const folder = join(process.cwd(), 'lib/actions');
  const served = readdirSync(folder).filter((name) =>
    readFileSync(join(folder, name), 'utf8').startsWith("'use server'"),
  );
  const modules = await Promise.all(
    served.map((name) => import(`../../lib/actions/${name.replace('.ts', '')}.ts`) as Promise<Record<string, Action>>),
  );
  return modules.flatMap((module) => Object.entries(module));
}

const actions = await allActions();

/** What an action says to a form with every field there is; where it leads elsewhere, nothing was refused. */
async function answerOf(action: Action): Promise<string> {
  const form = new FormData();
  for (const [name, value] of Object.entries(FIELDS)) form.set(name, value);
  try {
    return (await action({ values: {} }, form)).fault ?? 'done';
  } catch (error) {
    if (error instanceof Error && 'digest' in error) return 'done';
    throw error;
  }
}

const REFUSED = /^(Nobody is signed in|The role of a \w+ does not allow)/;

describe('every server action', () => {
  let example: ExampleWorld;
  beforeAll(async () => {
    example = await exampleWorld();
  });
  afterAll(() => example.close());
  beforeEach(async () => {
    example = await renewed(example);
    sent.headers = new Headers();
  });

  it('has a rule', () => {
    expect(actions.map(([name]) => name).sort()).toEqual(Object.keys(RULES).sort());
  });

  it.each(actions)('%s: a visitor', async (name, action) => {
    const answer = await answerOf(action);
    if (RULES[name] === 'all') expect(answer).not.toMatch(REFUSED);
    else expect(answer).toMatch(/^Nobody is signed in/);
  });

  it.each(actions)('%s: each role as the table says', async (name, action) => {
    const rule = RULES[name] ?? [];
    for (const role of ROLES) {
      const { people, session } = await renewed(example);
      sent.headers = new Headers(await session(people[role]));
      const answer = await answerOf(action);
      if (rule === 'all' || rule.includes(role)) expect(answer, role).not.toMatch(REFUSED);
      else if (READS_FIRST.includes(name)) expect(answer, role).toBe('There is no such study.');
      else expect(answer, role).toMatch(/^The role of a \w+ does not allow/);
      expect(answer, role).not.toMatch(/our mistake/);
    }
  });
});
