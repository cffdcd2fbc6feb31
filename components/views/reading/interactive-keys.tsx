'use client';

/** Keys for the frequent acts, and the sheet that lists them. */
import { useEffect, useRef } from 'react';
import { LAYERS } from '@/components/plate/types';
import { LAYER_NAMES } from '@/components/plate/words';
import type { Act } from './state';

const SHEET: readonly (readonly [string, string])[] = [
  ...LAYERS.map((layer, index) => [String(index + 1), `Layer: ${LAYER_NAMES[layer].toLowerCase()}`] as const),
  ['t', 'Turn the board'],
  ['m', 'Change the side to move'],
  ['u', 'Undo'],
  ['Arrows', 'On the board: from square to square'],
  ['Enter', 'On the board: pick up, put down'],
  ['Delete', 'On the board: take the man off'],
  ['P N B R Q K', 'On the board: put a white man; small letters a black one'],
  ['Esc', 'Let go'],
  ['?', 'This sheet'],
];

export function InteractiveKeys({ act }: { readonly act: (act: Act) => void }) {
  const sheet = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    const press = (event: KeyboardEvent) => {
      const target = event.target;
      const typing =
        target instanceof HTMLElement && (target.matches('input, textarea, select') || target.isContentEditable);
      const undoes = event.key === 'z' && (event.ctrlKey || event.metaKey);
      if (typing || ((event.ctrlKey || event.metaKey || event.altKey) && !undoes)) return;
      const layer = LAYERS[Number(event.key) - 1];
      if (layer) act({ type: 'layer', layer });
      else if (event.key === 't') act({ type: 'turn' });
      else if (event.key === 'm') act({ type: 'side' });
      else if (event.key === 'u' || undoes) act({ type: 'undo' });
      else if (event.key === 'Escape') act({ type: 'cancel' });
      else if (event.key === '?') sheet.current?.showModal();
      else return;
      event.preventDefault();
    };
    document.addEventListener('keydown', press);
    return () => document.removeEventListener('keydown', press);
  }, [act]);
  return (
    <>
      <p className="needs-scripts mt-6 text-[14px] text-soft">
        <button type="button" className="underlined min-h-11 cursor-pointer" onClick={() => sheet.current?.showModal()}>
          Keys
        </button>
      </p>
      <dialog
        ref={sheet}
        aria-labelledby="keys-title"
        className="m-auto max-w-[calc(100vw-24px)] border-2 border-ink bg-paper p-6 text-ink backdrop:bg-black/40"
      >
        <h2 id="keys-title">Keys</h2>
        <dl className="mt-3 grid grid-cols-[auto_1fr] gap-x-6 gap-y-1">
          {SHEET.map(([key, what]) => (
            <div key={key} className="contents">
              <dt className="font-bold">{key}</dt>
              <dd>{what}</dd>
            </div>
          ))}
        </dl>
        <form method="dialog" className="mt-4">
          <button type="submit" className="h-11 cursor-pointer rounded-sm bg-ink px-5 font-bold text-paper">
            Close
          </button>
        </form>
      </dialog>
    </>
  );
}
