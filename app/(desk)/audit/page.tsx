/** What was done to members, keys, publishing and deletion, by whom and when. For owners. */
import type { Metadata } from 'next';
import Link from 'next/link';
import { MomentText } from '@/components/ui/moment-text';
import { deskContext, shownOrNothing } from '@/lib/pages/desk-context';
import { listAudit } from '@/lib/services/audit/list-audit';

export const metadata: Metadata = { title: 'Log' };

interface Props {
  readonly searchParams: Promise<{
    readonly at?: string | readonly string[];
    readonly id?: string | readonly string[];
  }>;
}

export default async function AuditPage({ searchParams }: Props) {
  const { at, id } = await searchParams;
  const { ctx } = await deskContext('/audit');
  const { entries, next } = await shownOrNothing(() => listAudit(ctx, afterOf(at, id)));
  return (
    <div className="page-measure py-6 md:py-8">
      <h1>Log</h1>
      <p className="mt-1 max-w-130 text-soft">
        What was done to members, keys, publishing and deletion, the newest first.
      </p>
      {entries.length === 0 && <p className="mt-8">Nothing was done yet that belongs here.</p>}
      <ul className="mt-8 mb-8">
        {entries.map((entry) => (
          <li
            key={entry.id}
            className="grid gap-x-6 gap-y-1 border-t border-rule py-3 md:grid-cols-[220px_1fr_180px_1fr]"
          >
            <span className="text-[13px] text-soft">
              <MomentText at={entry.at} />
            </span>
            <span className="font-bold">{entry.who}</span>
            <span>{entry.action.replace('.', ': ')}</span>
            <span className="min-w-0 text-[13px] break-words text-soft">{detailWords(entry.detail)}</span>
          </li>
        ))}
      </ul>
      {next !== undefined && (
        <Link className="underlined" href={`/audit?at=${encodeURIComponent(next.at.toISOString())}&id=${next.id}`}>
          Older ones
        </Link>
      )}
    </div>
  );
}

/** `role coach, name Evening group`. */
function detailWords(detail: Readonly<Record<string, unknown>>): string {
  return Object.entries(detail)
    .map(([name, value]) => `${name} ${Array.isArray(value) ? value.join(', ') : String(value)}`)
    .join(', ');
}

/** Where the page goes on; an address that somebody wrote wrong begins at the newest. */
function afterOf(at: unknown, id: unknown): { readonly at: Date; readonly id: string } | undefined {
  if (typeof at !== 'string' || typeof id !== 'string') return undefined;
  const moment = new Date(at);
  return Number.isNaN(moment.getTime()) || !/^[0-9a-f-]{36}$/.test(id) ? undefined : { at: moment, id };
}
