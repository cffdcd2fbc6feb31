'use client';

/** The board as a grid that hands, keys and taps can work: one tab stop, arrows inside, dragging with the pointer. */
import { type KeyboardEvent, type PointerEvent, useRef, useState } from 'react';
import { codeOfLetter, manOf, squareName } from '@/engine/board';
import type { Man, Square, SquareName } from '@/engine/types';
import { jsxOf, PAGE_PALETTE } from './draw-jsx';
import { elementOf } from './element';
import { manMarks } from './men';
import type { BoardPlace } from './types';

export interface BoardProps {
  readonly place: BoardPlace;
  /** Size of the whole figure, of which the board is a part. */
  readonly figure: { readonly width: number; readonly height: number };
  readonly board: Readonly<Uint8Array>;
  /** Names of squares for readers; null while a man is under way. */
  readonly labels: ReadonlyMap<SquareName, string> | null;
  readonly picked: Square | null;
  readonly onTouch: (square: Square) => void;
  readonly onDrag: (from: Square, over: Square | null) => void;
  readonly onDrop: () => void;
  readonly onCancel: () => void;
  readonly onPut: (square: Square, man: Man | null) => void;
  readonly onPoint: (square: Square | null) => void;
}

const STEPS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
};

const CELLS = [0, 1, 2, 3, 4, 5, 6, 7] as const;

/** The grid over a plate's board. */
export function InteractiveBoard(props: BoardProps) {
  const { place, figure, board, labels, picked } = props;
  const [focus, setFocus] = useState({ column: 0, row: 7 });
  const hand = useRef<{
    from: Square;
    x: number;
    y: number;
    over: Square | null;
    moving: boolean;
    box: DOMRect;
  } | null>(null);
  const ghost = useRef<HTMLDivElement>(null);
  const [held, setHeld] = useState<Man | null>(null);
  const grid = useRef<HTMLDivElement>(null);

  const squareIn = (column: number, row: number): Square =>
    (place.flipped ? row * 8 + (7 - column) : (7 - row) * 8 + column) as Square;

  const squareUnder = (event: PointerEvent): Square | null => {
    // Measured once a drag: asking again would lay the page out at every move.
    const box = hand.current?.box ?? grid.current?.getBoundingClientRect();
    if (!box) return null;
    const column = Math.floor(((event.clientX - box.left) / box.width) * 8);
    const row = Math.floor(((event.clientY - box.top) / box.height) * 8);
    return column < 0 || column > 7 || row < 0 || row > 7 ? null : squareIn(column, row);
  };

  const float = (event: PointerEvent) => {
    const box = hand.current?.box;
    if (!box || !ghost.current) return;
    ghost.current.style.transform = `translate(${event.clientX - box.left}px, ${event.clientY - box.top}px) translate(-50%, -50%)`;
  };

  const down = (event: PointerEvent) => {
    const from = squareUnder(event);
    const box = grid.current?.getBoundingClientRect();
    if (from === null || !box || event.button !== 0) return;
    hand.current = { from, x: event.clientX, y: event.clientY, over: from, moving: false, box };
    event.currentTarget.setPointerCapture(event.pointerId);
  };

  const move = (event: PointerEvent) => {
    const over = squareUnder(event);
    const grip = hand.current;
    if (!grip) {
      props.onPoint(over);
      return;
    }
    if (!grip.moving) {
      if (Math.hypot(event.clientX - grip.x, event.clientY - grip.y) < 5 || board[grip.from] === 0) return;
      grip.moving = true;
      setHeld(manOf(board[grip.from] ?? 0));
      props.onDrag(grip.from, grip.over);
    }
    float(event);
    if (over === grip.over) return;
    grip.over = over;
    props.onDrag(grip.from, over);
  };

  const up = () => {
    const grip = hand.current;
    hand.current = null;
    setHeld(null);
    if (!grip) return;
    if (grip.moving) props.onDrop();
    else props.onTouch(grip.from);
  };

  const lost = () => {
    hand.current = null;
    setHeld(null);
    props.onCancel();
  };

  const key = (event: KeyboardEvent) => {
    const step = STEPS[event.key];
    const at = squareIn(focus.column, focus.row);
    if (step) {
      event.preventDefault();
      const column = Math.min(7, Math.max(0, focus.column + step[0]));
      const row = Math.min(7, Math.max(0, focus.row + step[1]));
      setFocus({ column, row });
      props.onPoint(squareIn(column, row));
      grid.current?.querySelectorAll<HTMLElement>('[role=gridcell]')[row * 8 + column]?.focus();
      return;
    }
    const code = codeOfLetter(event.key);
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    if (event.key === 'Enter' || event.key === ' ') props.onTouch(at);
    else if (event.key === 'Delete' || event.key === 'Backspace') props.onPut(at, null);
    else if (event.key === 'Escape') props.onCancel();
    else if (code !== undefined) props.onPut(at, manOf(code));
    else return;
    event.preventDefault();
    event.stopPropagation();
  };

  const percent = (part: number, whole: number) => `${(100 * part) / whole}%`;
  const style = {
    left: percent(place.x, figure.width),
    top: percent(place.y, figure.height),
    width: percent(8 * place.size, figure.width),
    height: percent(8 * place.size, figure.height),
  };
  return (
    <div
      ref={grid}
      role="grid"
      aria-label="Board. Arrow keys move, Enter picks up and puts down, Delete takes off, letters put men."
      className="absolute grid cursor-grab touch-none grid-rows-8 select-none active:cursor-grabbing"
      style={style}
      onPointerDown={down}
      onPointerMove={move}
      onPointerUp={up}
      onPointerCancel={lost}
      onPointerLeave={() => props.onPoint(null)}
      onKeyDown={key}
    >
      {CELLS.map((row) => (
        <div key={row} role="row" className="grid grid-cols-8">
          {CELLS.map((column) => {
            const at = squareIn(column, row);
            const name = squareName(at);
            return (
              <div
                key={column}
                role="gridcell"
                tabIndex={focus.column === column && focus.row === row ? 0 : -1}
                aria-label={labels?.get(name) ?? name}
                aria-selected={picked === at}
                data-square={name}
                className={`focus-visible:outline-3 focus-visible:-outline-offset-3 ${picked === at ? 'outline-3 -outline-offset-3 outline-pick outline-dashed' : ''}`}
                onFocus={() => setFocus({ column, row })}
              />
            );
          })}
        </div>
      ))}
      <div
        ref={ghost}
        aria-hidden="true"
        className="pointer-events-none absolute top-0 left-0"
        style={{ width: '12.5%', height: '12.5%', opacity: held ? 1 : 0 }}
      >
        {held ? (
          <svg viewBox="0 0 64 64" width="100%" height="100%">
            {manMarks(held.side, held.kind, 0, 0, 64).map((mark, index) => jsxOf(elementOf(mark, PAGE_PALETTE), index))}
          </svg>
        ) : null}
      </div>
    </div>
  );
}
