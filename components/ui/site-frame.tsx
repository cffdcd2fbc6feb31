/** What stands around every public page: a way past the header, the header, the page, the footer. */
import type { ReactNode } from 'react';
import { SiteFooter } from './site-footer';
import { SiteHeader } from './site-header';

const MAIN_ID = 'main';

interface Props {
  readonly children: ReactNode;
  /** Whether the header leads to the desk, or else to signing in. */
  readonly isSignedIn?: boolean;
}

/** A page between header and footer. The page brings its own measure (`page-measure`) and one h1. */
export function SiteFrame({ children, isSignedIn = false }: Props) {
  return (
    <>
      <a
        href={`#${MAIN_ID}`}
        className="sr-only rounded-sm bg-ink px-4 py-2 text-paper focus:not-sr-only focus:fixed focus:top-2 focus:left-3 focus:z-10 focus:px-4 focus:py-2"
      >
        Skip to the page
      </a>
      <SiteHeader isSignedIn={isSignedIn} />
      <main id={MAIN_ID} tabIndex={-1} className="grow outline-none">
        {children}
      </main>
      <SiteFooter />
    </>
  );
}
