/** Signing in: with a password, or with a link by e-mail. */
import type { Metadata } from 'next';
import Link from 'next/link';
import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { sendLinkAction, signInAction } from '@/lib/actions/accounts';
import { openContext } from '@/lib/pages/open-context';
import { hasMailbox, ownPath } from '@/lib/site-address';

export const metadata: Metadata = { title: 'Sign in' };

interface Props {
  readonly searchParams: Promise<{ readonly next?: string | readonly string[] }>;
}

export default async function SignInPage({ searchParams }: Props) {
  const asked = (await searchParams).next;
  const next = ownPath(typeof asked === 'string' ? asked : undefined, '/studies');
  const { actor } = await openContext();
  if (actor.kind === 'person') redirect(next);
  const email = {
    name: 'email',
    label: 'E-mail address',
    type: 'email',
    autoComplete: 'username',
    maxLength: 254,
  } as const;
  const to = { name: 'next', label: '', type: 'hidden', value: next } as const;
  return (
    <div className="page-measure py-6 md:py-8">
      <h1>Sign in</h1>
      <p className="mt-1 max-w-130 text-soft">
        Readings and routes need no account. An account keeps studies, and lets others into them.
      </p>
      <div className="mt-8 grid gap-x-16 gap-y-10 lg:grid-cols-[420px_420px]">
        <section aria-labelledby="with-password">
          <h2 id="with-password" className="mb-4 border-b border-rule pb-2">
            With your password
          </h2>
          <InteractiveForm
            action={signInAction}
            verb="Sign in"
            fields={[
              email,
              {
                name: 'password',
                label: 'Password',
                type: 'password',
                autoComplete: 'current-password',
                maxLength: 200,
              },
              to,
            ]}
          />
        </section>
        <section aria-labelledby="with-link">
          <h2 id="with-link" className="mb-4 border-b border-rule pb-2">
            With a link by e-mail
          </h2>
          <InteractiveForm action={sendLinkAction} verb="Send the link" fields={[email, to]} />
          {hasMailbox(await headers()) && <MailboxLine />}
        </section>
      </div>
      <p className="mt-10">
        No account yet?{' '}
        <Link href={`/sign-up?next=${encodeURIComponent(next)}`} className="underlined">
          Sign up
        </Link>
      </p>
    </div>
  );
}

function MailboxLine() {
  return (
    <p className="mt-4 max-w-105 text-[13px] leading-5 text-soft">
      No mail server is set, so messages stay on this machine, in{' '}
      <Link href="/mailbox" className="underlined">
        the mailbox
      </Link>
      .
    </p>
  );
}
