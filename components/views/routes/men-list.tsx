/** The men of a side in the order of what helps most, on a rule, the chosen one under our small pennant. */
import type { RefObject } from 'react';
import { jsxOf, PAGE_PALETTE } from '@/components/plate/draw-jsx';
import { elementOf } from '@/components/plate/element';
import { manMarks } from '@/components/plate/men';
import type { Side, SquareName } from '@/engine/types';
import type { ManRow } from './ask';
import { manText, SIDE_NAMES } from './words';

export interface MenListProps {
  /** The list itself, which scrolls sideways where it is too long. */
  readonly frame: RefObject<HTMLElement | null>;
  readonly side: Side;
  readonly men: readonly ManRow[];
  readonly chosen: SquareName | null;
  readonly hrefOf: (man: SquareName | null) => string;
  readonly onChoose: (man: SquareName | null) => void;
}

/** Links, so that it works without scripts; the first one asks the whole side. */
export function MenList({ frame, side, men, chosen, hrefOf, onChoose }: MenListProps) {
  const items = [
    { square: null, name: 'All men', text: `${SIDE_NAMES[side]}’s best posts`, kind: null },
    ...men.map((row) => ({
      square: row.square,
      name: `${row.kind} ${row.square}`,
      text: manText(row),
      kind: row.kind,
    })),
  ];
  return (
    <nav ref={frame} aria-label="Man" className="-mx-3 mt-6 overflow-x-auto px-3 print:hidden">
      <ul className="flex w-max min-w-full border-b border-ink">
        {items.map(({ square, name, text, kind }, index) => {
          const isChosen = square === chosen;
          return (
            <li key={name} className={index > 0 ? 'border-l border-rule' : ''}>
              <a
                href={hrefOf(square)}
                aria-current={isChosen ? 'true' : undefined}
                className={`relative flex min-h-14 items-center gap-x-2 px-3 py-1.5 whitespace-nowrap ${isChosen ? 'border-b-3 border-ink pb-[3px]' : 'hover:bg-raise'}`}
                onClick={(event) => {
                  if (event.metaKey || event.ctrlKey || event.shiftKey) return;
                  event.preventDefault();
                  onChoose(square);
                }}
              >
                {kind ? (
                  <svg viewBox="4 4 36 36" width={30} height={30} aria-hidden="true">
                    {manMarks(side, kind, 0, 0, 44).map((mark, place) => jsxOf(elementOf(mark, PAGE_PALETTE), place))}
                  </svg>
                ) : null}
                <span>
                  <span className={`block leading-5 ${isChosen ? 'font-bold' : 'font-medium'}`}>
                    {name.charAt(0).toUpperCase() + name.slice(1)}
                  </span>
                  <span className="block text-[12px] leading-4 text-soft">{text}</span>
                </span>
              </a>
            </li>
          );
        })}
      </ul>
    </nav>
  );
}
