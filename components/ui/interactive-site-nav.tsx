'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';

interface Props {
  readonly pages: readonly { readonly name: string; readonly href: string }[];
}

/** Pages as words on a hairline, the present one under a thicker rule. Runs off to the side on a phone. */
export function InteractiveSiteNav({ pages }: Props) {
  const here = usePathname();
  // What stands below a page belongs to it; everything stands below the first.
  const isHere = (href: string): boolean => here === href || (href !== '/' && here.startsWith(`${href}/`));
  return (
    <ul className="flex">
      {pages.map(({ name, href }) => (
        <li key={href}>
          <Link
            href={href}
            prefetch={false}
            aria-current={isHere(href) ? 'page' : undefined}
            className="flex min-h-11 items-center border-b-3 border-transparent px-3 pt-[3px] hover:underline aria-[current]:border-ink aria-[current]:font-bold md:min-h-14"
          >
            {name}
          </Link>
        </li>
      ))}
    </ul>
  );
}
