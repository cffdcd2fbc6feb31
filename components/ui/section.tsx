/** A part of a page under a heading on a hairline. */
import type { ReactNode } from 'react';

interface Props {
  readonly id: string;
  readonly title: string;
  readonly children: ReactNode;
}

/** The part, named by its heading for whoever listens. */
export function Section({ id, title, children }: Props) {
  return (
    <section aria-labelledby={id}>
      <h2 id={id} className="mb-4 border-b border-rule pb-2">
        {title}
      </h2>
      {children}
    </section>
  );
}
