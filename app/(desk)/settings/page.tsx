/** One's own account: name, address, password, one's data, and leaving. */
import type { Metadata } from 'next';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { Section } from '@/components/ui/section';
import { askEmailChangeAction, changePasswordAction, deleteAccountAction, renameAction } from '@/lib/actions/accounts';
import { deskContext } from '@/lib/pages/desk-context';
import { readAccount } from '@/lib/services/accounts/read-account';
import type { FormField } from '@/openapi/schemas/form-state';

export const metadata: Metadata = { title: 'Settings' };

const DONE: Readonly<Record<string, string>> = { name: 'Your name is changed.', email: 'Your address is changed.' };

const PRESENT: FormField = {
  name: 'present',
  label: 'Present password',
  type: 'password',
  autoComplete: 'current-password',
  maxLength: 200,
};

interface Props {
  readonly searchParams: Promise<{ readonly done?: string | readonly string[] }>;
}

export default async function SettingsPage({ searchParams }: Props) {
  const { done } = await searchParams;
  const { ctx } = await deskContext('/settings');
  const { name, email, hasPassword } = await readAccount(ctx);
  const present = hasPassword ? [PRESENT] : [];
  const said = typeof done === 'string' ? DONE[done] : undefined;
  return (
    <div className="page-measure grid gap-y-10 py-6 md:py-8">
      <div>
        <h1>Settings</h1>
        {said !== undefined && (
          <p role="status" className="mt-1">
            {said}
          </p>
        )}
      </div>
      <Section id="name" title="Name">
        <InteractiveForm
          action={renameAction}
          verb="Save the name"
          fields={[
            { name: 'name', label: 'Your name, as others see it', value: name, autoComplete: 'name', maxLength: 80 },
          ]}
        />
      </Section>
      <Section id="address" title="E-mail address">
        <p className="mb-4">It is {email}.</p>
        <InteractiveForm
          action={askEmailChangeAction}
          verb="Send a link to the new address"
          fields={[
            { name: 'email', label: 'New address', type: 'email', autoComplete: 'email', maxLength: 254 },
            ...present,
          ]}
        />
      </Section>
      <Section id="password" title="Password">
        <InteractiveForm
          action={changePasswordAction}
          verb={hasPassword ? 'Change the password' : 'Set a password'}
          fields={[
            ...present,
            {
              name: 'password',
              label: 'New password',
              type: 'password',
              autoComplete: 'new-password',
              maxLength: 200,
              hint: 'Ten characters or more.',
            },
          ]}
        />
      </Section>
      <Section id="data" title="Your data">
        <p className="max-w-130">
          <a href="/settings/export" className="underlined">
            All that is kept of you, as JSON
          </a>
          : account, workspaces, sessions, what you made and when.
        </p>
        <details className="mt-4">
          <summary className="flex min-h-11 cursor-pointer items-center underlined">Delete the account</summary>
          <p className="mb-4 max-w-130">
            Name, address and password are erased, and every session ends. Workspaces with nobody else in them go with
            the account. What you wrote in the workspaces of others stays there, without your name.
          </p>
          <InteractiveForm
            action={deleteAccountAction}
            verb="Delete the account for good"
            grave
            fields={[
              { name: 'email', label: 'Your address, to be sure', type: 'email', autoComplete: 'off', maxLength: 254 },
              ...present,
            ]}
          />
        </details>
      </Section>
    </div>
  );
}
