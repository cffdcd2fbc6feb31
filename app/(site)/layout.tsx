import type { ReactNode } from 'react';
import { SiteFrame } from '@/components/ui/site-frame';
import { openContext } from '@/lib/pages/open-context';

/** Public pages, between header and footer. */
export default async function SiteLayout({ children }: { readonly children: ReactNode }) {
  // Without a cookie of ours this asks no database.
  const { actor } = await openContext();
  return <SiteFrame isSignedIn={actor.kind === 'person'}>{children}</SiteFrame>;
}
