/** Pages of the desk: the site's header, and under it where one works and what there is. Each page checks its person itself. */
import Link from 'next/link';
import type { ReactNode } from 'react';
import { InteractiveForm } from '@/components/forms/interactive-form';
import { DESK_PAGES } from '@/components/ui/desk-pages';
import { InteractiveSiteNav } from '@/components/ui/interactive-site-nav';
import { SiteFrame } from '@/components/ui/site-frame';
import { signOutAction } from '@/lib/actions/accounts';
import { openContext } from '@/lib/pages/open-context';
import { may } from '@/lib/permissions';
import { readWorkspace } from '@/lib/services/workspaces/read-workspace';

export default async function DeskLayout({ children }: { readonly children: ReactNode }) {
  const ctx = await openContext();
  if (ctx.actor.kind !== 'person') return <SiteFrame>{children}</SiteFrame>;
  const { name, role } = await readWorkspace(ctx);
  const pages = DESK_PAGES.filter(({ isForOwners }) => !isForOwners || may(ctx.actor, 'workspace'));
  return (
    <SiteFrame isSignedIn>
      <div className="border-b border-rule print:hidden">
        <div className="page-measure flex flex-wrap items-center gap-x-6">
          <p className="min-w-0 flex-1 py-2">
            <Link href="/workspaces" className="font-bold hover:underline">
              {name}
            </Link>{' '}
            <span className="text-[13px] text-soft">
              as {role}, {ctx.actor.name}
            </span>
          </p>
          <div className="order-last -mx-3 w-[calc(100%+24px)] overflow-x-auto border-t border-rule lg:order-none lg:w-auto lg:border-0">
            <nav aria-label="Desk">
              <InteractiveSiteNav pages={pages} />
            </nav>
          </div>
          <InteractiveForm action={signOutAction} fields={[]} verb="Sign out" plain />
        </div>
      </div>
      {children}
    </SiteFrame>
  );
}
