import type { ReactNode } from 'react';
import { SiteFrame } from '@/components/ui/site-frame';

/** Public pages, between header and footer. */
export default function SiteLayout({ children }: { readonly children: ReactNode }) {
  return <SiteFrame>{children}</SiteFrame>;
}
