/** Where one is signed in; each session ends at once. */
import type { Metadata } from 'next';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { MomentText } from '@/components/ui/moment-text';
import { agentWords } from '@/components/views/people/agent-words';
import { endOtherSessionsAction, endSessionAction } from '@/lib/actions/accounts';
import { deskContext } from '@/lib/pages/desk-context';
import { listSignIns } from '@/lib/services/sign-ins/list-sign-ins';

export const metadata: Metadata = { title: 'Sessions' };

interface Props {
  readonly searchParams: Promise<{ readonly ended?: string | readonly string[] }>;
}

export default async function SessionsPage({ searchParams }: Props) {
  const { ended } = await searchParams;
  const { ctx } = await deskContext('/sessions');
  const sessions = await listSignIns(ctx);
  return (
    <div className="page-measure py-6 md:py-8">
      <h1>Sessions</h1>
      <p className="mt-1 max-w-130 text-soft">
        Every browser in which you are signed in. A session that you end is asked to sign in again at its next step.
      </p>
      {typeof ended === 'string' && /^\d+$/.test(ended) && (
        <p role="status" className="mt-4">
          Other sessions ended: {ended}.
        </p>
      )}
      <ul className="mt-8 mb-8">
        {sessions.map(({ id, agent, createdAt, seenAt, isThis }) => (
          <li
            key={id}
            className="grid gap-x-6 gap-y-2 border-t border-rule py-3 md:grid-cols-[1fr_260px_260px_120px] md:items-center"
          >
            <span>
              {agentWords(agent)}
              {isThis && <span className="text-soft"> (this one)</span>}
            </span>
            <span className="text-[13px] text-soft">
              begun <MomentText at={createdAt} />
            </span>
            <span className="text-[13px] text-soft">
              last used <MomentText at={seenAt} />
            </span>
            {!isThis && (
              <InteractiveForm
                action={endSessionAction}
                verb="End it"
                plain
                fields={[{ name: 'id', label: '', type: 'hidden', value: id }]}
              />
            )}
          </li>
        ))}
      </ul>
      {sessions.length > 1 && (
        <InteractiveForm action={endOtherSessionsAction} verb="End all others" fields={[]} plain grave />
      )}
    </div>
  );
}
