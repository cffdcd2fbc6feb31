/** A position of the first page is kept in a study: which one, under which title. */
import type { Metadata } from 'next';
import Image from 'next/image';
import Link from 'next/link';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { plateHref } from '@/components/views/study/plate-href';
import { addPositionAction } from '@/lib/actions/studies';
import { deskContext } from '@/lib/pages/desk-context';
import { may } from '@/lib/permissions';
import { listStudies } from '@/lib/services/studies/list-studies';

export const metadata: Metadata = { title: 'Keep in a study' };

/** As many as are offered; the last changed come first. */
const STUDIES_MAX = 50;

export default async function KeepPage({
  searchParams,
}: {
  readonly searchParams: Promise<{ readonly fen?: string | string[] }>;
}) {
  const given = (await searchParams).fen;
  const fen = typeof given === 'string' ? given.slice(0, 200) : '';
  const { ctx, person } = await deskContext(`/keep?${new URLSearchParams({ fen })}`);
  const { items } = await listStudies(ctx, { limit: STUDIES_MAX, trash: false });
  const isReady = may(person, 'studies:write') && items.length > 0;
  return (
    <div className="page-measure grid gap-x-10 gap-y-6 py-6 md:grid-cols-[minmax(0,420px)_minmax(0,1fr)] md:py-8">
      <div>
        <h1 className="mb-4">Keep in a study</h1>
        <Image
          src={plateHref({ fen, layer: null, man: null })}
          alt="Plate of the position to be kept"
          width={420}
          height={450}
          unoptimized
          className="h-auto w-full"
        />
      </div>
      <div className="content-start md:pt-14">
        {isReady ? (
          <InteractiveForm
            action={addPositionAction}
            verb="Keep it"
            fields={[
              {
                name: 'study',
                label: 'Study',
                type: 'choice',
                choices: items.map(({ id, title }) => ({ value: id, label: title })),
              },
              { name: 'title', label: 'Title', maxLength: 200, optional: true },
              { name: 'fen', label: 'FEN', value: fen, maxLength: 200 },
            ]}
          />
        ) : (
          <p>
            {may(person, 'studies:write')
              ? 'There is no study yet. '
              : 'Your role reads studies and does not write them. '}
            <Link className="underlined" href="/studies">
              To the studies
            </Link>
          </p>
        )}
      </div>
    </div>
  );
}
