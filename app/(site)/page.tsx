/** The first page: a live plate for any position, without sign-in. */
import type { Metadata } from 'next';
import { addressHref, type Query, readAddress } from '@/components/views/reading/address';
import { FIRST_POSITION } from '@/components/views/reading/examples';
import { InteractiveReading } from '@/components/views/reading/interactive';

export const metadata: Metadata = { title: { absolute: 'Waypost: where the pieces belong' } };

export default async function HomePage({ searchParams }: { readonly searchParams: Promise<Query> }) {
  const address = readAddress(await searchParams, { fen: FIRST_POSITION });
  return (
    <div className="page-measure py-6 md:py-8">
      <div className="mb-4 lg:mb-0 lg:w-[44%]">
        <h1>Where do the pieces belong?</h1>
        <p className="mt-1 max-w-130 text-soft">
          Waypost counts a position square by square and says what follows, in sentences you can check with a finger on
          the board.
        </p>
      </div>
      <InteractiveReading key={addressHref(address)} address={address} />
    </div>
  );
}
