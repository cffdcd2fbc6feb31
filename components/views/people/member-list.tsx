/** Members and open invitations, one a line, with what an owner may do to each. */
import { InteractiveForm } from '@/components/forms/interactive-form';
import { MomentText } from '@/components/ui/moment-text';
import type { FormField, FormState } from '@/openapi/schemas/form-state';

type Action = (state: FormState, form: FormData) => Promise<FormState>;

interface Props {
  readonly members: readonly {
    readonly userId: string;
    readonly name: string;
    readonly email: string;
    readonly role: string;
    readonly since: Date;
    readonly isSelf: boolean;
  }[];
  readonly invitations: readonly {
    readonly id: string;
    readonly email: string;
    readonly role: string;
    readonly expiresAt: Date;
  }[];
  readonly roles: NonNullable<FormField['choices']>;
  readonly changeRole: Action;
  readonly remove: Action;
  readonly revoke: Action;
}

const LINE = 'grid gap-x-6 gap-y-1 border-t border-rule py-3 md:grid-cols-[1fr_1fr_100px_220px] md:items-start';

/** The list; what changes somebody's place is folded away under their line. */
export function MemberList({ members, invitations, roles, changeRole, remove, revoke }: Props) {
  return (
    <ul>
      {members.map(({ userId, name, email, role, since, isSelf }) => (
        <li key={userId} className={LINE}>
          <span className="font-bold">
            {name}
            {isSelf && <span className="font-normal text-soft"> (you)</span>}
          </span>
          <span className="break-all">{email}</span>
          <span>{role}</span>
          <span className="text-[13px] text-soft">
            since <MomentText at={since} />
          </span>
          <details className="md:col-span-4">
            <summary className="flex min-h-11 cursor-pointer items-center text-[13px] text-soft underlined">
              {isSelf ? 'Change your role, or leave' : `Change ${name}’s role, or take them out`}
            </summary>
            <div className="flex flex-wrap items-end gap-x-6 gap-y-3 pb-3">
              <InteractiveForm
                action={changeRole}
                verb="Change the role"
                plain
                fields={[
                  { name: 'member', label: '', type: 'hidden', value: userId },
                  { name: 'role', label: 'Role', type: 'choice', choices: roles, value: role },
                ]}
              />
              <InteractiveForm
                action={remove}
                verb={isSelf ? 'Leave the workspace' : 'Take out'}
                plain
                grave
                fields={[{ name: 'member', label: '', type: 'hidden', value: userId }]}
              />
            </div>
          </details>
        </li>
      ))}
      {invitations.map(({ id, email, role, expiresAt }) => (
        <li key={id} className={LINE}>
          <span className="text-soft">invited</span>
          <span className="break-all">{email}</span>
          <span>{role}</span>
          <span className="text-[13px] text-soft">
            until <MomentText at={expiresAt} />
          </span>
          <div className="md:col-span-4">
            <InteractiveForm
              action={revoke}
              verb="Take it back"
              plain
              fields={[{ name: 'id', label: '', type: 'hidden', value: id }]}
            />
          </div>
        </li>
      ))}
    </ul>
  );
}
