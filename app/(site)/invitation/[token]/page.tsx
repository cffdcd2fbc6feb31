/** An invitation: what it offers, and the way in for somebody with an account and for somebody new. */
import type { Metadata } from 'next';
import Link from 'next/link';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { newAccountFields } from '@/components/forms/new-account-fields';
import { acceptAsNewAction, acceptInvitationAction } from '@/lib/actions/workspace';
import { openContext, shownOrReason } from '@/lib/pages/open-context';
import { type Invitation, readInvitation } from '@/lib/services/invitations/read-invitation';

export const metadata: Metadata = { title: 'Invitation', referrer: 'no-referrer', robots: 'noindex' };

export default async function InvitationPage({ params }: { readonly params: Promise<{ readonly token: string }> }) {
  const { token } = await params;
  const ctx = await openContext();
  const read = await shownOrReason(() => readInvitation(ctx, { token }));
  return (
    <div className="page-measure py-6 md:py-8">
      {'reason' in read ? (
        <>
          <h1>An invitation</h1>
          <p className="mt-1">{read.reason}</p>
        </>
      ) : (
        <>
          <h1>An invitation to {read.shown.workspace}</h1>
          <p className="mt-1 mb-6 text-soft">
            As {read.shown.role}, for {read.shown.email}.
          </p>
          <WayIn invitation={read.shown} token={token} isSignedIn={ctx.actor.kind === 'person'} />
        </>
      )}
    </div>
  );
}

interface WayInProps {
  readonly invitation: Invitation;
  readonly token: string;
  readonly isSignedIn: boolean;
}

function WayIn({ invitation: { hasAccount, workspace }, token, isSignedIn }: WayInProps) {
  if (isSignedIn) {
    const fields = [{ name: 'token', label: '', type: 'hidden', value: token }] as const;
    return <InteractiveForm action={acceptInvitationAction} verb={`Join ${workspace}`} fields={fields} />;
  }
  if (hasAccount) {
    return (
      <p>
        This address has an account.{' '}
        <Link href={`/sign-in?next=/invitation/${token}`} className="underlined">
          Sign in and come back here
        </Link>
      </p>
    );
  }
  return (
    <InteractiveForm action={acceptAsNewAction} verb="Make the account and join" fields={newAccountFields({ token })} />
  );
}
