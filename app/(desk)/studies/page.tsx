/** The studies of the workspace, last changed first; a new one; the trash. */
import type { Metadata } from 'next';
import Link from 'next/link';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { StudyList } from '@/components/views/study/study-list';
import { createStudyAction, restoreStudyAction } from '@/lib/actions/workspace';
import { deskContext } from '@/lib/pages/desk-context';
import { may } from '@/lib/permissions';
import { listStudies } from '@/lib/services/studies/list-studies';

export const metadata: Metadata = { title: 'Studies' };

const PAGE = 50;

export default async function StudiesPage({
  searchParams,
}: {
  readonly searchParams: Promise<{ readonly cursor?: string; readonly trash?: string }>;
}) {
  const { cursor, trash } = await searchParams;
  const { ctx, person } = await deskContext('/studies');
  const isTrash = trash !== undefined && may(person, 'studies:write');
  const { items, next } = await listStudies(ctx, { limit: PAGE, cursor, trash: isTrash });
  const mayWrite = may(person, 'studies:write');
  return (
    <div className="page-measure grid gap-y-8 py-6 md:py-8">
      <div>
        <h1>{isTrash ? 'The trash' : 'Studies'}</h1>
        <p className="mt-1 text-soft">
          {isTrash
            ? 'What is here can be taken out again for thirty days.'
            : 'A study holds positions, routes, comparisons and games on one subject.'}
        </p>
      </div>
      <StudyList studies={items} restore={isTrash ? restoreStudyAction : undefined} mayWrite={mayWrite} />
      {next !== null && (
        <Link className="underlined" href={`/studies?cursor=${next}${isTrash ? '&trash' : ''}`}>
          Older ones
        </Link>
      )}
      {mayWrite && !isTrash && (
        <section aria-labelledby="new-study">
          <h2 id="new-study" className="mb-3 border-b border-rule pb-1">
            A new study
          </h2>
          <InteractiveForm
            action={createStudyAction}
            verb="Make the study"
            fields={[
              { name: 'title', label: 'Title', maxLength: 200 },
              { name: 'summary', label: 'What it is about', type: 'area', maxLength: 2000, optional: true },
            ]}
          />
        </section>
      )}
      {mayWrite && (
        <p>
          <Link className="underlined" href={isTrash ? '/studies' : '/studies?trash=1'}>
            {isTrash ? 'Back to the studies' : 'The trash'}
          </Link>
        </p>
      )}
    </div>
  );
}
