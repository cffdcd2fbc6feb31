'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { SITE_PAGES } from './site-pages';

/** The public pages as words on a hairline, the present one under a thicker rule. Runs off to the side on a phone. */
export function InteractiveSiteNav() {
  const here = usePathname();
  return (
    <ul className="flex">
      {SITE_PAGES.map(({ name, href }) => (
        <li key={href}>
          <Link
            href={href}
            prefetch={false}
            aria-current={here === href ? 'page' : undefined}
            className="flex min-h-11 items-center border-b-3 border-transparent px-3 pt-[3px] hover:underline aria-[current]:border-ink aria-[current]:font-bold md:min-h-14"
          >
            {name}
          </Link>
        </li>
      ))}
    </ul>
  );
}
