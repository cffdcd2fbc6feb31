'use client';

/** The board as a grid that hands, keys and taps can work: one tab stop, arrows inside, dragging with the pointer. */
import { type KeyboardEvent, useState } from 'react';
import { codeOfLetter, manOf, squareName } from '@/engine/board';
import type { Man, Square, SquareName } from '@/engine/types';
import { BoardGhost } from './board-ghost';
import type { BoardPlace } from './types';
import { type HandActs, useHand } from './use-hand';

export interface BoardProps extends HandActs {
  readonly place: BoardPlace;
  /** Size of the whole figure, of which the board is a part. */
  readonly figure: { readonly width: number; readonly height: number };
  /** Names of squares for readers; null while a man is under way. */
  readonly labels: ReadonlyMap<SquareName, string> | null;
  readonly picked: Square | null;
  /** What the keys do, for readers; those of editing unless said. */
  readonly label?: string;
  readonly onPut: (square: Square, man: Man | null) => void;
}

const STEPS: Readonly<Record<string, readonly [number, number]>> = {
  ArrowUp: [0, -1],
  ArrowDown: [0, 1],
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
};

const EDITING = 'Board. Arrow keys move, Enter picks up and puts down, Delete takes off, letters put men.';

const CELLS = [0, 1, 2, 3, 4, 5, 6, 7] as const;

/** The grid over a plate's board. */
export function InteractiveBoard(props: BoardProps) {
  const { place, figure, labels, picked } = props;
  const [focus, setFocus] = useState({ column: 0, row: 7 });
  const squareIn = (column: number, row: number): Square =>
    (place.flipped ? row * 8 + (7 - column) : (7 - row) * 8 + column) as Square;
  const { grid, ghost, held, pointer } = useHand(props, squareIn);

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
      aria-label={props.label ?? EDITING}
      className="absolute grid cursor-grab touch-none grid-rows-8 select-none active:cursor-grabbing"
      style={style}
      {...pointer}
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
      <BoardGhost place={ghost} man={held} />
    </div>
  );
}
