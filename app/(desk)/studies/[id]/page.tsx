/** A study: its positions as plates beside what is written of them. */
import type { Metadata } from 'next';
import Image from 'next/image';
import Link from 'next/link';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { InteractivePosition } from '@/components/views/study/interactive-position';
import { plateHref, readingHref } from '@/components/views/study/plate-href';
import { addPositionAction, trashPositionAction } from '@/lib/actions/studies';
import { trashStudyAction } from '@/lib/actions/workspace';
import { deskContext, shownOrNothing } from '@/lib/pages/desk-context';
import { may } from '@/lib/permissions';
import { listPositions, readStudy } from '@/lib/services/studies/read-study';

interface Props {
  readonly params: Promise<{ readonly id: string }>;
}

export const metadata: Metadata = { title: 'Study' };

export default async function StudyPage({ params }: Props) {
  const { id } = await params;
  const { ctx, person } = await deskContext(`/studies/${id}`);
  const study = await shownOrNothing(() => readStudy(ctx, { id }));
  const { items } = await listPositions(ctx, { id });
  const mayWrite = may(person, 'studies:write');
  return (
    <div className="page-measure py-6 md:py-8">
      <p className="text-[14px]">
        <Link className="underlined" href="/studies">
          Studies
        </Link>
      </p>
      <h1 className="mt-2">{study.title}</h1>
      {study.summary !== '' && <p className="mt-1 max-w-160 text-soft">{study.summary}</p>}
      <p className="mt-2 flex flex-wrap gap-x-5 text-[14px]">
        Take along:
        {['pgn', 'csv', 'json'].map((kind) => (
          <a key={kind} className="underlined" href={`/api/v1/studies/${id}/export.${kind}`} download>
            {kind.toUpperCase()}
          </a>
        ))}
      </p>
      {items.length === 0 && (
        <p className="mt-8">
          No position is kept here yet.{' '}
          {mayWrite ? 'Add one below, or choose “Keep in a study” on the first page.' : ''}
        </p>
      )}
      <ol className="mt-6">
        {items.map((position, place) => (
          <li
            key={position.id}
            className="grid grid-cols-[minmax(0,1fr)] gap-x-10 gap-y-4 border-t border-rule py-6 md:grid-cols-[minmax(0,420px)_minmax(0,1fr)]"
          >
            <a href={readingHref(position)} aria-label={`Position ${place + 1}, read it on the first page`}>
              {/* The very figure that the API gives: what stands here is what is embedded and printed. */}
              <Image
                src={plateHref(position)}
                alt={`Plate of position ${place + 1}`}
                width={420}
                height={450}
                unoptimized
                className="h-auto w-full"
              />
            </a>
            <div className="grid content-start gap-y-3">
              {mayWrite ? (
                <InteractivePosition study={id} position={position} />
              ) : (
                <>
                  <h2 className="text-[18px]">{position.title}</h2>
                  <p className="max-w-160 whitespace-pre-line">{position.note}</p>
                </>
              )}
              <p className="text-[13px] break-all text-soft">{position.fen}</p>
              {mayWrite && (
                <InteractiveForm
                  action={trashPositionAction}
                  verb="Put into the trash"
                  plain
                  fields={[
                    { name: 'study', label: '', type: 'hidden', value: id },
                    { name: 'position', label: '', type: 'hidden', value: position.id },
                  ]}
                />
              )}
            </div>
          </li>
        ))}
      </ol>
      {mayWrite && (
        <section aria-labelledby="add" className="mt-6 border-t border-ink pt-6">
          <h2 id="add" className="mb-3">
            Add a position
          </h2>
          <InteractiveForm
            action={addPositionAction}
            verb="Keep it"
            fields={[
              { name: 'study', label: '', type: 'hidden', value: id },
              { name: 'fen', label: 'FEN', maxLength: 200 },
              { name: 'title', label: 'Title', maxLength: 200, optional: true },
            ]}
          />
          <div className="mt-10">
            <InteractiveForm
              action={trashStudyAction}
              verb="Put the whole study into the trash"
              grave
              fields={[
                { name: 'id', label: '', type: 'hidden', value: id },
                { name: 'version', label: '', type: 'hidden', value: String(study.version) },
              ]}
            />
          </div>
        </section>
      )}
    </div>
  );
}
