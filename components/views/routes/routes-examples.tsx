/** Links to positions to start from. */
import { EXAMPLES } from '../reading/examples';

export function RoutesExamples({ onRead }: { readonly onRead: (fen: string) => void }) {
  return (
    <p className="mt-1 flex flex-wrap items-center gap-x-4 text-[14px] text-soft print:hidden">
      <span>Examples:</span>
      {EXAMPLES.map(({ name, fen }) => (
        <a
          key={name}
          href={`/routes?${new URLSearchParams({ fen }).toString()}`}
          className="underlined flex min-h-9 items-center text-ink"
          onClick={(event) => {
            if (event.metaKey || event.ctrlKey || event.shiftKey) return;
            event.preventDefault();
            onRead(fen);
          }}
        >
          {name}
        </a>
      ))}
    </p>
  );
}
