/** Routes: where a man belongs, how it gets there, and a way of one's own checked. No sign-in. */
import type { Metadata } from 'next';
import { type Query, readRoutesAddress, routesHref } from '@/components/views/routes/address';
import { answerRoutes } from '@/components/views/routes/answer';
import { openedFirst } from '@/components/views/routes/first-position';
import { InteractiveRoutes } from '@/components/views/routes/interactive';
import { askOf, routesStateOf } from '@/components/views/routes/state';
import { FIRST_POSITION } from '@/components/views/reading/examples';

export const metadata: Metadata = {
  title: 'Routes',
  description: 'Where a man belongs, the safe ways there move by move, and what must come first, all in counts.',
};

export default async function RoutesPage({ searchParams }: { readonly searchParams: Promise<Query> }) {
  const address = readRoutesAddress(await searchParams, { fen: FIRST_POSITION });
  const first = answerRoutes(askOf(routesStateOf(address, openedFirst())));
  return (
    <div className="page-measure py-6 md:py-8">
      <div className="mb-4 lg:mb-0 lg:w-[44%]">
        <h1>Which man, which post, which way?</h1>
        <p className="mt-1 max-w-130 text-soft">
          Posts ranked by counts that are all shown, the safe ways there stop by stop, and the steps of a way of your
          own with a verdict each.
        </p>
      </div>
      <InteractiveRoutes key={routesHref(address)} address={address} first={first} />
    </div>
  );
}
