/** Behind a link by e-mail: one button, so that a program that only looks at links uses none up. */
import type { Metadata } from 'next';
import Link from 'next/link';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { signInByLinkAction } from '@/lib/actions/accounts';
import { openContext, shownOrReason } from '@/lib/pages/open-context';
import { readLink } from '@/lib/services/accounts/read-link';
import { ownPath } from '@/lib/site-address';

export const metadata: Metadata = { title: 'Sign in', referrer: 'no-referrer', robots: 'noindex' };

interface Props {
  readonly params: Promise<{ readonly token: string }>;
  readonly searchParams: Promise<{ readonly next?: string | readonly string[] }>;
}

export default async function SignInByLinkPage({ params, searchParams }: Props) {
  const { token } = await params;
  const { next } = await searchParams;
  const ctx = await openContext();
  const link = await shownOrReason(() => readLink(ctx, { purpose: 'sign-in', token }));
  return (
    <div className="page-measure py-6 md:py-8">
      <h1>Sign in</h1>
      {'reason' in link ? (
        <p className="mt-1">
          {link.reason}{' '}
          <Link href="/sign-in" className="underlined">
            To the page of signing in
          </Link>
        </p>
      ) : (
        <>
          <p className="mt-1 mb-6">As {link.shown}.</p>
          <InteractiveForm
            action={signInByLinkAction}
            verb="Sign in"
            fields={[
              { name: 'token', label: '', type: 'hidden', value: token },
              {
                name: 'next',
                label: '',
                type: 'hidden',
                value: ownPath(typeof next === 'string' ? next : undefined, '/studies'),
              },
            ]}
          />
        </>
      )}
    </div>
  );
}
