/** Signing up: an address first; name and password come behind the link that proves it. */
import type { Metadata } from 'next';
import Link from 'next/link';
import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { sendLinkAction } from '@/lib/actions/accounts';
import { openContext } from '@/lib/pages/open-context';
import { hasMailbox, ownPath } from '@/lib/site-address';

export const metadata: Metadata = { title: 'Sign up' };

interface Props {
  readonly searchParams: Promise<{ readonly next?: string | readonly string[] }>;
}

export default async function SignUpPage({ searchParams }: Props) {
  const asked = (await searchParams).next;
  const next = ownPath(typeof asked === 'string' ? asked : undefined, '/studies');
  const { actor } = await openContext();
  if (actor.kind === 'person') redirect(next);
  return (
    <div className="page-measure py-6 md:py-8">
      <h1>Sign up</h1>
      <p className="mt-1 max-w-130 text-soft">
        You get a workspace of your own, and can invite others into it. First the address: a message with a link goes
        there, and behind the link you choose a name and a password.
      </p>
      <div className="mt-8">
        <InteractiveForm
          action={sendLinkAction}
          verb="Send the link"
          fields={[
            { name: 'email', label: 'E-mail address', type: 'email', autoComplete: 'email', maxLength: 254 },
            { name: 'next', label: '', type: 'hidden', value: next },
          ]}
        />
      </div>
      {hasMailbox(await headers()) && (
        <p className="mt-4 max-w-105 text-[13px] leading-5 text-soft">
          No mail server is set, so messages stay on this machine, in{' '}
          <Link href="/mailbox" className="underlined">
            the mailbox
          </Link>
          .
        </p>
      )}
      <p className="mt-10">
        An account already?{' '}
        <Link href={`/sign-in?next=${encodeURIComponent(next)}`} className="underlined">
          Sign in
        </Link>
      </p>
    </div>
  );
}
