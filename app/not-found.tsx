import type { Metadata } from 'next';
import Link from 'next/link';
import { SiteFrame } from '@/components/ui/site-frame';

export const metadata: Metadata = { title: 'Nothing here' };

/** What is not there, and what one may not see: the same page with status 404. */
export default function NotFound() {
  return (
    <SiteFrame>
      <div className="page-measure py-12">
        <h1>There is nothing at this address</h1>
        <p className="mt-2 max-w-130 text-soft">
          It may have been mistyped, moved or taken back. A position can always be read from the first page.
        </p>
        <p className="mt-6">
          <Link href="/" className="underlined">
            Read a position
          </Link>
        </p>
      </div>
    </SiteFrame>
  );
}
