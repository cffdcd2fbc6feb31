/** Keys of the workspace with what they have used, for its owners. */
import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { KeyTable } from '@/components/views/keys/key-table';
import { createKeyAction, revokeKeyAction } from '@/lib/actions/workspace';
import { deskContext } from '@/lib/pages/desk-context';
import { may } from '@/lib/permissions';
import { listKeys } from '@/lib/services/keys/list-keys';
import { readUsage } from '@/lib/services/keys/read-usage';
import { KEY_SCOPES } from '@/openapi/contract';

export const metadata: Metadata = { title: 'Keys' };

const USAGE_DAYS = 30;

const SCOPE_WORDS: Readonly<Record<(typeof KEY_SCOPES)[number], string>> = {
  compute: 'compute: readings, routes, comparisons, games',
  'studies:read': 'studies:read: read studies',
  'studies:write': 'studies:write: make and change studies, import, jobs',
  publish: 'publish: publish and export',
};

export default async function KeysPage() {
  const { ctx, person } = await deskContext('/keys');
  if (!may(person, 'workspace')) notFound();
  const [{ items }, usage] = await Promise.all([listKeys(ctx), readUsage(ctx, { days: USAGE_DAYS })]);
  return (
    <div className="page-measure grid gap-y-10 py-6 md:py-8">
      <div>
        <h1>Keys</h1>
        <p className="mt-1 max-w-160 text-soft">
          A key lets a program act for this workspace, within its scopes and until its end. It is shown once, when it is
          made.
        </p>
      </div>
      <KeyTable
        keys={items}
        usage={usage.items}
        days={USAGE_DAYS}
        now={new Date().toISOString()}
        revoke={revokeKeyAction}
      />
      <section aria-labelledby="new-key">
        <h2 id="new-key" className="mb-3 border-b border-rule pb-1">
          A new key
        </h2>
        <InteractiveForm
          action={createKeyAction}
          verb="Make the key"
          fields={[
            { name: 'name', label: 'What it is for', maxLength: 80 },
            {
              name: 'scopes',
              label: 'What it may do',
              type: 'checks',
              value: 'compute',
              choices: KEY_SCOPES.map((scope) => ({ value: scope, label: SCOPE_WORDS[scope] })),
            },
            { name: 'days', label: 'Good for how many days', value: '90', hint: '1 to 366.' },
          ]}
        />
      </section>
    </div>
  );
}
