/** The mailbox of this machine, where no mail server is set and nobody from outside can look. */
import type { Metadata } from 'next';
import { headers } from 'next/headers';
import { MomentText } from '@/components/ui/moment-text';
import { readMailbox } from '@/lib/mail/read-mailbox';
import { shownOrNothing } from '@/lib/pages/desk-context';
import { openContext } from '@/lib/pages/open-context';

export const metadata: Metadata = { title: 'Mailbox' };

export default async function MailboxPage() {
  const [ctx, sent] = [await openContext(), await headers()];
  const messages = await shownOrNothing(async () => readMailbox(ctx, sent));
  return (
    <div className="page-measure py-6 md:py-8">
      <h1>Mailbox</h1>
      <p className="mt-1 max-w-130 text-soft">
        No mail server is set, so messages to people stay here, the newest first. This page answers on this machine
        only.
      </p>
      {messages.length === 0 && <p className="mt-8">There is no message yet. Sign up, or ask for a link.</p>}
      <ol className="mt-8">
        {messages.map(({ id, to, subject, text, at }) => (
          <li key={id} className="grid gap-x-8 gap-y-2 border-t border-rule py-5 md:grid-cols-[280px_1fr]">
            <div className="text-[13px] leading-5 text-soft">
              <p className="break-all">{to}</p>
              <MomentText at={at} />
            </div>
            <div className="max-w-160 min-w-0">
              <h2>{subject}</h2>
              {text.split('\n\n').map((paragraph, place) => (
                <Paragraph key={place} text={paragraph.trim()} />
              ))}
            </div>
          </li>
        ))}
      </ol>
    </div>
  );
}

function Paragraph({ text }: { readonly text: string }) {
  if (!/^https?:\/\/\S+$/.test(text)) return <p className="mt-2">{text}</p>;
  const { pathname, search } = new URL(text);
  return (
    <p className="mt-2 break-all">
      <a href={pathname + search} className="underlined">
        {text}
      </a>
    </p>
  );
}
