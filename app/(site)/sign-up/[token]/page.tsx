/** Behind the link of signing up: a name and a password, and the account is made. */
import type { Metadata } from 'next';
import Link from 'next/link';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { newAccountFields } from '@/components/forms/new-account-fields';
import { signUpAction } from '@/lib/actions/accounts';
import { openContext, shownOrReason } from '@/lib/pages/open-context';
import { readLink } from '@/lib/services/accounts/read-link';
import { ownPath } from '@/lib/site-address';

export const metadata: Metadata = { title: 'Your account', referrer: 'no-referrer', robots: 'noindex' };

interface Props {
  readonly params: Promise<{ readonly token: string }>;
  readonly searchParams: Promise<{ readonly next?: string | readonly string[] }>;
}

export default async function NewAccountPage({ params, searchParams }: Props) {
  const { token } = await params;
  const { next } = await searchParams;
  const ctx = await openContext();
  const link = await shownOrReason(() => readLink(ctx, { purpose: 'sign-up', token }));
  return (
    <div className="page-measure py-6 md:py-8">
      <h1>Your account</h1>
      {'reason' in link ? (
        <p className="mt-1">
          {link.reason}{' '}
          <Link href="/sign-up" className="underlined">
            To the page of signing up
          </Link>
        </p>
      ) : (
        <>
          <p className="mt-1 mb-6 text-soft">For {link.shown}.</p>
          <InteractiveForm
            action={signUpAction}
            verb="Make the account"
            fields={newAccountFields({ token, next: ownPath(typeof next === 'string' ? next : undefined, '/studies') })}
          />
        </>
      )}
    </div>
  );
}
