/** The header: name and mark, the pages, the API, the theme. */
import Link from 'next/link';
import { InteractiveSiteNav } from './interactive-site-nav';
import { InteractiveThemeSwitch } from './interactive-theme-switch';
import { Mark } from './mark';
import { SITE_PAGES } from './site-pages';

/** Closed by a double rule over the whole width. On a phone the pages stand on a line of their own under a hairline. */
export function SiteHeader({ isSignedIn }: { readonly isSignedIn: boolean }) {
  return (
    <header className="double-rule-bottom print:hidden">
      <div className="page-measure flex flex-wrap items-center gap-x-6">
        <Link href="/" className="-ml-1 flex min-h-14 items-center gap-x-2 px-1 text-[20px] font-bold">
          <Mark size={26} />
          Waypost
        </Link>
        <nav
          aria-label="Main"
          className="order-last -mx-3 w-[calc(100%+24px)] overflow-x-auto border-t border-rule md:order-none md:mx-0 md:w-auto md:border-0"
        >
          <InteractiveSiteNav pages={SITE_PAGES} />
        </nav>
        <div className="-mr-1 ml-auto flex items-center gap-x-2 sm:gap-x-5">
          <a href="/reference" className="flex min-h-11 items-center px-1 hover:underline">
            API
          </a>
          <Link
            href={isSignedIn ? '/studies' : '/sign-in'}
            prefetch={false}
            className="flex min-h-11 items-center px-1 whitespace-nowrap hover:underline"
          >
            {isSignedIn ? 'Desk' : 'Sign in'}
          </Link>
          <InteractiveThemeSwitch />
        </div>
      </div>
    </header>
  );
}
