/** The footer: how far a reading can be trusted, and where the same is to be had without the page. */

/** Small type, in the soft ink. */
export function SiteFooter() {
  return (
    <footer className="mt-16 border-t border-rule print:hidden">
      <div className="page-measure flex flex-col gap-x-12 gap-y-3 py-6 text-[13px] leading-5 text-soft md:flex-row md:justify-between">
        <p className="max-w-150">
          Every figure is a count that can be checked on the board. Counts are an aid to judgement, not a verdict: no
          score, no best move.
        </p>
        <ul className="flex shrink-0 flex-wrap gap-x-5">
          <li>
            <a href="/api/v1/openapi.json" className="underlined">
              API document
            </a>
          </li>
          <li>Free under the MIT licence</li>
        </ul>
      </div>
    </footer>
  );
}
