/** A plate on the page: the drawing, and what lies over it. */
import type { ReactNode } from 'react';
import { PlateMarks } from '@/components/plate/draw-jsx';
import type { Plate } from '@/components/plate/types';

const SHOWN = { any: '', wide: 'hidden xl:block', narrow: 'xl:hidden' } as const;

/** `only` says on which screens it is shown, while the page does not know its width yet. */
export function PlateFigure({
  plate,
  only,
  onChoose,
  children,
}: {
  readonly plate: Plate;
  readonly only: keyof typeof SHOWN;
  readonly onChoose: (key: string) => void;
  readonly children: ReactNode;
}) {
  const choose = (target: EventTarget) => {
    const key =
      target instanceof Element ? target.closest<SVGElement>('[data-statement]')?.dataset.statement : undefined;
    if (key) onChoose(key);
  };
  return (
    <div className={`relative mx-auto max-w-[760px] contain-layout xl:max-w-none ${SHOWN[only]}`}>
      <svg
        viewBox={`0 0 ${plate.width} ${plate.height}`}
        width="100%"
        className="block"
        role="img"
        aria-label={plate.alt}
        onClick={(event) => choose(event.target)}
      >
        <PlateMarks plate={plate} />
      </svg>
      {children}
    </div>
  );
}
