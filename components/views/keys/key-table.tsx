/** The keys of a workspace: what each may do, until when, and how often it was used. */
import { InteractiveForm } from '@/components/forms/interactive-form';
import type { FormState } from '@/openapi/schemas/form-state';
import type { KeyAnswer, Usage } from '@/openapi/schemas/keys';

interface Props {
  readonly keys: readonly KeyAnswer[];
  readonly usage: Usage['items'];
  readonly days: number;
  /** The present moment, as the server has it. */
  readonly now: string;
  readonly revoke: (state: FormState, form: FormData) => Promise<FormState>;
}

const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric', timeZone: 'UTC' });
const HEADS = ['Key', 'Begins with', 'May', 'State', 'Calls', ''] as const;

/** One row a key; calls are those of the last days. */
export function KeyTable({ keys, usage, days, now, revoke }: Props) {
  if (keys.length === 0) return <p>There is no key yet. Make one below.</p>;
  const isGood = (key: KeyAnswer): boolean => key.revokedAt === null && (key.expiresAt === null || key.expiresAt > now);
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label="Keys">
      <table className="w-full border-collapse">
        <caption className="mb-2 text-left text-soft">Calls are those of the last {days} days (UTC).</caption>
        <thead>
          <tr>
            {HEADS.map((head) => (
              <th key={head} scope="col" className="border-b border-ink py-2 pr-6 text-left font-normal">
                {head || <span className="sr-only">End it</span>}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {keys.map((key) => (
            <tr key={key.id} className="align-top">
              <th scope="row" className="border-b border-rule py-2 pr-6 text-left">
                {key.name}
              </th>
              <td className="border-b border-rule py-2 pr-6">
                <code>{key.prefix}…</code>
              </td>
              <td className="border-b border-rule py-2 pr-6">{key.scopes.join(', ')}</td>
              <td className="border-b border-rule py-2 pr-6">{stateOf(key, isGood(key))}</td>
              <td className="border-b border-rule py-2 pr-6 tabular-nums">{callsOf(usage, key.id)}</td>
              <td className="border-b border-rule py-2">
                {isGood(key) && (
                  <InteractiveForm
                    action={revoke}
                    verb="End it"
                    plain
                    fields={[{ name: 'id', label: '', type: 'hidden', value: key.id }]}
                  />
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function stateOf({ revokedAt, expiresAt }: KeyAnswer, good: boolean): string {
  if (revokedAt !== null) return `ended ${DAY.format(new Date(revokedAt))}`;
  if (expiresAt === null) return 'good';
  return `${good ? 'good until' : 'expired'} ${DAY.format(new Date(expiresAt))}`;
}

/** The count of all calls, and the call made most. */
function callsOf(usage: Usage['items'], id: string): string {
  const own = usage.filter(({ key }) => key === id);
  const byCall = new Map<string, number>();
  for (const { call, count } of own) byCall.set(call, (byCall.get(call) ?? 0) + count);
  const [most] = [...byCall].sort((a, b) => b[1] - a[1]);
  const all = own.reduce((sum, { count }) => sum + count, 0);
  return most === undefined ? 'none' : `${all}, most ${most[0]} (${most[1]})`;
}
