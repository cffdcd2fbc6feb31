/** Behind the link that goes to a new address. */
import type { Metadata } from 'next';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { confirmEmailAction } from '@/lib/actions/accounts';
import { deskContext } from '@/lib/pages/desk-context';

export const metadata: Metadata = { title: 'Your new address', referrer: 'no-referrer', robots: 'noindex' };

export default async function NewAddressPage({ params }: { readonly params: Promise<{ readonly token: string }> }) {
  const { token } = await params;
  await deskContext(`/settings/email/${token}`);
  return (
    <div className="page-measure py-6 md:py-8">
      <h1>Your new address</h1>
      <p className="mt-1 mb-6 text-soft">From now on you sign in with it, and messages go there.</p>
      <InteractiveForm
        action={confirmEmailAction}
        verb="Make it my address"
        fields={[{ name: 'token', label: '', type: 'hidden', value: token }]}
      />
    </div>
  );
}
