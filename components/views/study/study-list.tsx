/** A list of studies, with what is in each and when it last changed. */
import Link from 'next/link';
import { InteractiveForm } from '@/components/forms/interactive-form';
import type { FormState } from '@/openapi/schemas/form-state';
import type { StudyAnswer } from '@/openapi/schemas/studies';

interface Props {
  readonly studies: readonly StudyAnswer[];
  /** Given in the trash: takes a study out of it. */
  readonly restore: ((state: FormState, form: FormData) => Promise<FormState>) | undefined;
  readonly mayWrite: boolean;
}

const DAY = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' });

/** The list, or what to do where it is empty. */
export function StudyList({ studies, restore, mayWrite }: Props) {
  if (studies.length === 0) {
    const next = mayWrite
      ? 'Make one below, then keep positions in it: here, or from the first page.'
      : 'Your coach has shared none with you yet.';
    return <p>{restore ? 'The trash is empty.' : `There is no study yet. ${next}`}</p>;
  }
  return (
    <ul className="border-t border-ink">
      {studies.map(({ id, title, summary, positions, updatedAt }) => (
        <li key={id} className="grid gap-x-8 border-b border-rule py-3 md:grid-cols-[minmax(0,1fr)_auto]">
          <div className="min-w-0">
            {restore ? (
              <p className="font-bold">{title}</p>
            ) : (
              <Link href={`/studies/${id}`} className="font-bold hover:underline">
                {title}
              </Link>
            )}
            {summary !== '' && <p className="max-w-160 text-soft">{summary}</p>}
          </div>
          <p className="text-soft tabular-nums">
            {positions === 1 ? '1 position' : `${positions} positions`}, changed {DAY.format(new Date(updatedAt))}
          </p>
          {restore && (
            <InteractiveForm
              action={restore}
              verb="Take out"
              plain
              fields={[{ name: 'id', label: '', type: 'hidden', value: id }]}
            />
          )}
        </li>
      ))}
    </ul>
  );
}
