/** Caption and legend under the plate. */
import { LegendFigure } from '@/components/plate/draw-jsx';
import type { Plate } from '@/components/plate/types';

export function PlateCaption({ plate }: { readonly plate: Plate }) {
  return (
    <div className="mx-auto mt-3 max-w-[760px] lg:text-center">
      <p className="text-[16px] leading-6 font-bold">{plate.title}</p>
      <p className="text-[13px] leading-5 text-soft">{plate.text}</p>
      {plate.legend.length > 0 ? (
        <ul className="mt-3 flex flex-wrap gap-x-5 gap-y-1.5 text-[12px] leading-[18px] text-soft lg:justify-center">
          {plate.legend.map((item) => (
            <li key={item.label} className="flex items-center gap-x-2">
              <LegendFigure item={item} />
              {item.label}
            </li>
          ))}
        </ul>
      ) : null}
    </div>
  );
}
