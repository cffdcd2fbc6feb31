/** The line under a figure that says what it is of, so that a printed or cut-out figure can be told and made again. */
export function FigureLine({
  parts,
}: {
  /** What made it and of what: engine, position, side. */ readonly parts: readonly string[];
}) {
  return <p className="mt-2 text-[12px] leading-[18px] break-words text-soft">{parts.join(' · ')}</p>;
}
