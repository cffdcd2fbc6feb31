/** The counts of one post that change, each with its family's hatching, what it is now, there, and what that adds. */
import { PlateMarks, LegendFigure } from '@/components/plate/draw-jsx';
import type { Side } from '@/engine/types';
import type { RankedChoice } from './ask';
import { familyPatterns } from './families';
import { weighedParts } from './layout';
import { familyMarks } from './ranking-marks';
import { signed } from './words';

const ID = 'parts';
const HEADS = ['Count', 'Now', 'There', 'Weight', 'Adds'] as const;

export function PartsList({ choice, side }: { readonly choice: RankedChoice; readonly side: Side }) {
  const paint = side === 'white' ? 'ochre' : 'indigo';
  const parts = weighedParts(choice).sort((a, b) => Math.abs(b.value) - Math.abs(a.value));
  if (parts.length === 0) return null;
  return (
    <div className="mt-6 overflow-x-auto" role="region" aria-label="Counts that change" tabIndex={0}>
      <svg width={0} height={0} aria-hidden="true" className="absolute">
        <PlateMarks plate={{ patterns: familyPatterns(ID, paint), marks: [] }} />
      </svg>
      <table className="w-full border-collapse text-[14px] leading-5">
        <caption className="pb-1 text-left text-[13px] text-soft">
          The counts that change, with the man where it stands and on {choice.post}; weight by the documented table
        </caption>
        <thead>
          <tr className="border-y border-ink">
            {HEADS.map((head, index) => (
              <th
                key={head}
                scope="col"
                className={`px-2 py-1 font-medium first:pl-0 ${index === 0 ? 'text-left' : 'text-right'}`}
              >
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {parts.map(({ part, family, label, reason, now, there, weight, value }) => (
            <tr key={part} className="border-b border-rule align-top">
              <th scope="row" className="flex gap-x-2 px-2 py-1.5 pl-0 text-left font-normal">
                <span className="pt-0.5">
                  <LegendFigure item={{ label, marks: familyMarks(family, paint, ID) }} />
                </span>
                <span>
                  {label}
                  <span className="block text-[12px] leading-4 text-soft">{reason}</span>
                </span>
              </th>
              <td className="px-2 py-1.5 text-right">{now}</td>
              <td className="px-2 py-1.5 text-right font-bold">{there}</td>
              <td className="px-2 py-1.5 text-right text-soft">{signed(weight, 2)}</td>
              <td className="px-2 py-1.5 text-right">{signed(value, 2)}</td>
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr className="border-b border-ink">
            <th scope="row" colSpan={4} className="py-1.5 text-left font-bold">
              Sum
            </th>
            <td className="px-2 py-1.5 text-right font-bold">{signed(choice.merit, 2)}</td>
          </tr>
        </tfoot>
      </table>
    </div>
  );
}
