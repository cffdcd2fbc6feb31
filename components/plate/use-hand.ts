/** The pointer on the board as a hand: a short touch taps a square, a longer way drags the man that stands there. */
import { type PointerEvent, useRef, useState } from 'react';
import { manOf } from '@/engine/board';
import type { Man, Square } from '@/engine/types';

/** What the hand is told and what it does. */
export interface HandActs {
  readonly board: Readonly<Uint8Array>;
  readonly onTouch: (square: Square) => void;
  /** The man on `from` is over a square now, null off the board. */
  readonly onDrag: (from: Square, over: Square | null) => void;
  readonly onDrop: () => void;
  readonly onCancel: () => void;
  readonly onPoint: (square: Square | null) => void;
}

interface Grip {
  readonly from: Square;
  readonly x: number;
  readonly y: number;
  /** The board's place, measured once a drag: asking again would lay the page out at every move. */
  readonly box: DOMRect;
  over: Square | null;
  moving: boolean;
}

/** From so many pixels on a touch is a drag. */
const DRAG_FROM = 5;

/** `squareIn` says which square is at a column and row, counted from the upper left as the board is shown. */
export function useHand(acts: HandActs, squareIn: (column: number, row: number) => Square) {
  const grid = useRef<HTMLDivElement>(null);
  const ghost = useRef<HTMLDivElement>(null);
  const grip = useRef<Grip | null>(null);
  const [held, setHeld] = useState<Man | null>(null);

  const squareUnder = (event: PointerEvent): Square | null => {
    const box = grip.current?.box ?? grid.current?.getBoundingClientRect();
    if (!box) return null;
    const column = Math.floor(((event.clientX - box.left) / box.width) * 8);
    const row = Math.floor(((event.clientY - box.top) / box.height) * 8);
    return column < 0 || column > 7 || row < 0 || row > 7 ? null : squareIn(column, row);
  };

  /** Lets go and says what was held. */
  const release = (): Grip | null => {
    const last = grip.current;
    grip.current = null;
    setHeld(null);
    return last;
  };

  const pointer = {
    onPointerDown: (event: PointerEvent) => {
      const from = squareUnder(event);
      const box = grid.current?.getBoundingClientRect();
      if (from === null || !box || event.button !== 0) return;
      grip.current = { from, x: event.clientX, y: event.clientY, over: from, moving: false, box };
      event.currentTarget.setPointerCapture(event.pointerId);
    },
    onPointerMove: (event: PointerEvent) => {
      const over = squareUnder(event);
      const now = grip.current;
      if (!now) {
        acts.onPoint(over);
        return;
      }
      if (!now.moving) {
        const way = Math.hypot(event.clientX - now.x, event.clientY - now.y);
        if (way < DRAG_FROM || acts.board[now.from] === 0) return;
        now.moving = true;
        setHeld(manOf(acts.board[now.from] ?? 0));
        acts.onDrag(now.from, now.over);
      }
      const { left, top } = now.box;
      if (ghost.current) {
        ghost.current.style.transform = `translate(${event.clientX - left}px, ${event.clientY - top}px) translate(-50%, -50%)`;
      }
      if (over === now.over) return;
      now.over = over;
      acts.onDrag(now.from, over);
    },
    onPointerUp: () => {
      const last = release();
      if (last?.moving) acts.onDrop();
      else if (last) acts.onTouch(last.from);
    },
    onPointerCancel: () => {
      release();
      acts.onCancel();
    },
    onPointerLeave: () => acts.onPoint(null),
  };
  return { grid, ghost, held, pointer };
}
