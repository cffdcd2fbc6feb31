/** The man in the hand: it follows the pointer over the board while it is dragged. */
import type { RefObject } from 'react';
import type { Man } from '@/engine/types';
import { jsxOf, PAGE_PALETTE } from './draw-jsx';
import { elementOf } from './element';
import { manMarks } from './men';

/** `place` is moved by the hand itself, without drawing anew. */
export function BoardGhost({
  place,
  man,
}: {
  readonly place: RefObject<HTMLDivElement | null>;
  readonly man: Man | null;
}) {
  return (
    <div
      ref={place}
      aria-hidden="true"
      className="pointer-events-none absolute top-0 left-0"
      style={{ width: '12.5%', height: '12.5%', opacity: man ? 1 : 0 }}
    >
      {man ? (
        <svg viewBox="0 0 64 64" width="100%" height="100%">
          {manMarks(man.side, man.kind, 0, 0, 64).map((mark, index) => jsxOf(elementOf(mark, PAGE_PALETTE), index))}
        </svg>
      ) : null}
    </div>
  );
}
