/** The plate with what lies over it, its caption and its legend. */
import type { ReactNode } from 'react';
import { PlateMarks } from '@/components/plate/draw-jsx';
import type { Plate } from '@/components/plate/types';
import { PlateCaption } from '../reading/plate-caption';

export function PlateColumn({ plate, children }: { readonly plate: Plate; readonly children: ReactNode }) {
  return (
    <>
      <div className="relative contain-layout">
        <svg
          viewBox={`0 0 ${plate.width} ${plate.height}`}
          width="100%"
          className="block"
          role="img"
          aria-label={plate.alt}
        >
          <PlateMarks plate={plate} />
        </svg>
        {children}
      </div>
      <PlateCaption plate={plate} />
    </>
  );
}
