/** The workspaces that one belongs to: which to work in, and one more. */
import type { Metadata } from 'next';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { Section } from '@/components/ui/section';
import { chooseWorkspaceAction, createWorkspaceAction } from '@/lib/actions/workspace';
import { deskContext } from '@/lib/pages/desk-context';
import { listWorkspaces } from '@/lib/services/workspaces/list-workspaces';

export const metadata: Metadata = { title: 'Workspaces' };

export default async function WorkspacesPage() {
  const { ctx, person } = await deskContext('/workspaces');
  const workspaces = await listWorkspaces(ctx);
  return (
    <div className="page-measure grid gap-y-10 py-6 md:py-8">
      <div>
        <h1>Workspaces</h1>
        <p className="mt-1 max-w-130 text-soft">
          Each has its own studies, members and keys. You work in one at a time.
        </p>
      </div>
      <ul>
        {workspaces.map(({ id, name, role }) => (
          <li key={id} className="flex flex-wrap items-center gap-x-6 gap-y-2 border-t border-rule py-3">
            <span className="min-w-0 grow">
              <span className="font-bold">{name}</span> <span className="text-soft">as {role}</span>
            </span>
            {id === person.workspaceId ? (
              <span className="flex min-h-11 items-center text-soft">You work here</span>
            ) : (
              <InteractiveForm
                action={chooseWorkspaceAction}
                verb="Work here"
                plain
                fields={[{ name: 'workspace', label: '', type: 'hidden', value: id }]}
              />
            )}
          </li>
        ))}
      </ul>
      <Section id="another" title="One more">
        <InteractiveForm
          action={createWorkspaceAction}
          verb="Make the workspace"
          fields={[{ name: 'name', label: 'Name', maxLength: 80 }]}
        />
      </Section>
    </div>
  );
}
