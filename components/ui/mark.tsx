/** Our mark: a post on a slab foot with a small flag. Beside the name it says nothing more, so it is hidden from readers. */
export function Mark({ size }: { /** Height and width in px. */ readonly size: number }) {
  return (
    <svg width={size} height={size} viewBox="0 0 24 24" aria-hidden="true" focusable="false">
      <path d="M7.5 2h2.4v17h4.6v3H3v-3h4.5z" fill="var(--ink)" />
      <path d="M11.4 2.8 20 7l-8.6 4.2z" fill="var(--ochre)" />
    </svg>
  );
}
