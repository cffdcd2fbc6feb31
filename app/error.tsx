'use client';

import { SiteFrame } from '@/components/ui/site-frame';

/** Our own mistake: answered blankly, with a number by which the log can be searched. */
export default function ErrorPage({
  error,
  reset,
}: {
  readonly error: Error & { readonly digest?: string };
  readonly reset: () => void;
}) {
  return (
    <SiteFrame>
      <div role="alert" className="page-measure py-12">
        <h1>This page could not be drawn</h1>
        <p className="mt-2 max-w-130 text-soft">
          The mistake is ours and has been logged{error.digest ? ` as number ${error.digest}` : ''}. Nothing that was
          stored is lost.
        </p>
        <p className="mt-6">
          <button type="button" onClick={reset} className="min-h-11 cursor-pointer rounded-sm bg-ink px-4 text-paper">
            Try again
          </button>
        </p>
      </div>
    </SiteFrame>
  );
}
