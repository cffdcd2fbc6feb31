/** The header: name and mark, where else to go, the theme. */
import Link from 'next/link';
import { Mark } from './mark';
import { InteractiveThemeSwitch } from './interactive-theme-switch';

/** Closed by a double rule over the whole width. */
export function SiteHeader() {
  return (
    <header className="double-rule-bottom print:hidden">
      <div className="page-measure flex min-h-14 items-center gap-x-6">
        <Link href="/" className="-ml-1 flex min-h-11 items-center gap-x-2 px-1 text-[20px] font-bold">
          <Mark size={26} />
          Waypost
        </Link>
        <nav aria-label="Main" className="-mr-1 ml-auto flex items-center gap-x-2 sm:gap-x-5">
          <a href="/api/v1/openapi.json" className="flex min-h-11 items-center px-1 hover:underline">
            API
          </a>
          <InteractiveThemeSwitch />
        </nav>
      </div>
    </header>
  );
}
