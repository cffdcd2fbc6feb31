/** Who belongs to the workspace, who is invited, and the workspace itself. For owners. */
import type { Metadata } from 'next';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { MemberList } from '@/components/views/people/member-list';
import {
  changeRoleAction,
  deleteWorkspaceAction,
  inviteAction,
  removeMemberAction,
  renameWorkspaceAction,
  revokeInvitationAction,
} from '@/lib/actions/workspace';
import { deskContext, shownOrNothing } from '@/lib/pages/desk-context';
import { listMembers } from '@/lib/services/members/list-members';
import { readWorkspace } from '@/lib/services/workspaces/read-workspace';

export const metadata: Metadata = { title: 'Members' };

const ROLES = [
  { value: 'student', label: 'Student: reads what is shared with them' },
  { value: 'writer', label: 'Writer: makes, changes and publishes studies' },
  { value: 'coach', label: 'Coach: also exercises and attempts' },
  { value: 'owner', label: 'Owner: also members, keys and the log' },
] as const;

interface Props {
  readonly searchParams: Promise<{ readonly done?: string | readonly string[] }>;
}

export default async function MembersPage({ searchParams }: Props) {
  const { done } = await searchParams;
  const { ctx } = await deskContext('/members');
  const { members, invitations } = await shownOrNothing(() => listMembers(ctx));
  const { name } = await readWorkspace(ctx);
  return (
    <div className="page-measure grid gap-y-10 py-6 md:py-8">
      <h1>Members of {name}</h1>
      <MemberList
        members={members}
        invitations={invitations}
        roles={ROLES}
        changeRole={changeRoleAction}
        remove={removeMemberAction}
        revoke={revokeInvitationAction}
      />
      <section aria-labelledby="invite">
        <h2 id="invite" className="mb-4 border-b border-rule pb-2">
          Invite somebody
        </h2>
        {done === 'invited' && (
          <p role="status" className="mb-4">
            The invitation is on its way. It is good once, for seven days.
          </p>
        )}
        <InteractiveForm
          action={inviteAction}
          verb="Send the invitation"
          fields={[
            { name: 'email', label: 'E-mail address', type: 'email', autoComplete: 'off', maxLength: 254 },
            { name: 'role', label: 'Role', type: 'choice', choices: ROLES, value: 'student' },
          ]}
        />
      </section>
      <section aria-labelledby="workspace">
        <h2 id="workspace" className="mb-4 border-b border-rule pb-2">
          The workspace
        </h2>
        <div className="grid gap-x-16 gap-y-10 lg:grid-cols-[420px_420px]">
          <InteractiveForm
            action={renameWorkspaceAction}
            verb="Rename it"
            fields={[{ name: 'name', label: 'Name', value: name, maxLength: 80 }]}
          />
          <details>
            <summary className="flex min-h-11 cursor-pointer items-center underlined">
              Delete it, with all that is in it
            </summary>
            <InteractiveForm
              action={deleteWorkspaceAction}
              verb="Delete it for good"
              grave
              fields={[{ name: 'name', label: 'Its name, to be sure', maxLength: 80, autoComplete: 'off' }]}
            />
          </details>
        </div>
      </section>
    </div>
  );
}
