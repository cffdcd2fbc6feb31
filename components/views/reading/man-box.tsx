/** The box of men: choose one, then tap the squares where it goes. Also the eraser, the empty board and the first one. */
import { jsxOf, PAGE_PALETTE } from '@/components/plate/draw-jsx';
import { elementOf } from '@/components/plate/element';
import { manMarks } from '@/components/plate/men';
import { KINDS, SIDES } from '@/engine/types';
import type { Act, PageState } from './state';

const EMPTY = '8/8/8/8/8/8/8/8 w - - 0 1';
const INITIAL = 'rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1';

export function ManBox({ picked, act }: { readonly picked: PageState['picked']; readonly act: (act: Act) => void }) {
  const held = picked !== null && typeof picked === 'object' ? picked : null;
  return (
    <details className="needs-scripts mx-auto mt-4 max-w-[760px]">
      <summary className="min-h-11 cursor-pointer py-2.5 lg:text-center">Edit the position</summary>
      <p className="pb-2 text-[13px] leading-5 text-soft lg:text-center">
        Drag men on the board, off it to take them away. Or choose a man here and tap squares; tap the man again to
        stop.
      </p>
      <div className="flex flex-wrap gap-1 lg:justify-center">
        {SIDES.flatMap((side) =>
          KINDS.map((kind) => {
            const isHeld = held?.side === side && held.kind === kind;
            return (
              <button
                key={`${side}${kind}`}
                type="button"
                aria-pressed={isHeld}
                aria-label={`Put a ${side} ${kind}`}
                className={`size-11 cursor-pointer rounded-sm border bg-raise ${isHeld ? 'border-2 border-pick' : 'border-hair'}`}
                onClick={() => act({ type: 'pick', man: isHeld ? null : { side, kind } })}
              >
                <svg viewBox="0 0 44 44" width="100%" height="100%" aria-hidden="true">
                  {manMarks(side, kind, 0, 0, 44).map((mark, index) => jsxOf(elementOf(mark, PAGE_PALETTE), index))}
                </svg>
              </button>
            );
          }),
        )}
      </div>
      <p className="mt-1 flex gap-x-5 text-[14px] lg:justify-center">
        <button
          type="button"
          className="underlined min-h-11 cursor-pointer"
          onClick={() => act({ type: 'read', text: EMPTY })}
        >
          Empty board
        </button>
        <button
          type="button"
          className="underlined min-h-11 cursor-pointer"
          onClick={() => act({ type: 'read', text: INITIAL })}
        >
          First position of the game
        </button>
      </p>
    </details>
  );
}
