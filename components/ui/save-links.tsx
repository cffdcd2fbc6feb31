/** Downloads of a figure, made on the page: SVG of the drawing, CSV of its table. */

export interface SaveLinksProps {
  /** What is saved, in a word: 'Plate', 'Chart'. */
  readonly of: string;
  readonly saves: readonly { readonly kind: string; readonly save: () => void }[];
}

/** 'Chart: SVG CSV', as buttons that look like the links of the first page. */
export function SaveLinks({ of, saves }: SaveLinksProps) {
  return (
    <p className="needs-scripts flex items-center gap-x-3 text-[14px] print:hidden">
      <span className="text-soft">{of}:</span>
      {saves.map(({ kind, save }) => (
        <button
          key={kind}
          type="button"
          aria-label={`Save the ${of.toLowerCase()} as ${kind}`}
          className="underlined min-h-11 min-w-6 cursor-pointer"
          onClick={save}
        >
          {kind}
        </button>
      ))}
    </p>
  );
}
