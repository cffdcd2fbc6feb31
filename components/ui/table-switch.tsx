/** The same figures as a table, behind a switch that needs no scripts. */
import type { ReactNode } from 'react';

export interface TableSwitchProps {
  /** What the table holds: its caption, for all readers. */
  readonly caption: string;
  readonly heads: readonly string[];
  /** Rows of cells; figures are set to the right. */
  readonly rows: readonly (readonly (string | number)[])[];
  /** Beside the switch: downloads. */
  readonly children?: ReactNode;
}

/** A switch, and the table that it shows; wide tables scroll within themselves. */
export function TableSwitch({ caption, heads, rows, children }: TableSwitchProps) {
  return (
    <div className="mt-3">
      <details className="group print:[&:not([open])]:hidden">
        <summary className="underlined inline-flex print:hidden min-h-11 cursor-pointer items-center text-[14px]">
          <span className="group-open:hidden">Show as a table</span>
          <span className="hidden group-open:inline">Hide the table</span>
        </summary>
        <div role="region" aria-label={caption} tabIndex={0} className="overflow-x-auto">
          <table className="w-full border-collapse text-[13px] leading-5">
            <caption className="pb-1 text-left text-soft">{caption}</caption>
            <thead>
              <tr className="border-y border-ink">
                {heads.map((head) => (
                  <th key={head} scope="col" className="px-2 py-1 text-left font-medium first:pl-0">
                    {head}
                  </th>
                ))}
              </tr>
            </thead>
            <tbody>
              {rows.map((row, index) => (
                <tr key={index} className="border-b border-rule align-top">
                  {row.map((cell, place) => (
                    <td
                      key={place}
                      className={`px-2 py-1 first:pl-0 ${typeof cell === 'number' ? 'text-right whitespace-nowrap' : ''}`}
                    >
                      {typeof cell === 'number' ? String(cell).replace('-', '−') : cell}
                    </td>
                  ))}
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      </details>
      {children}
    </div>
  );
}
