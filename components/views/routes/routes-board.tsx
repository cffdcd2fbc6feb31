/** The board over the plate: taps, keys and dragging draw a route of one's own. */
import { useRef } from 'react';
import { InteractiveBoard } from '@/components/plate/interactive-board';
import type { Plate } from '@/components/plate/types';
import { type Position, squareName, squareNamed } from '@/engine/board';
import type { Square, SquareName } from '@/engine/types';
import type { DrawnRoute, RoutesAct } from './state';

const LABEL =
  'Board. Arrow keys move, Enter chooses a man or adds a stop, Delete takes the last stop back, Escape clears the route.';

export interface RoutesBoardProps {
  readonly plate: Plate;
  readonly position: Position;
  readonly labels: ReadonlyMap<SquareName, string>;
  readonly picked: SquareName | null;
  readonly drawn: DrawnRoute | null;
  readonly act: (act: RoutesAct) => void;
}

export function RoutesBoard({ plate, position, labels, picked, drawn, act }: RoutesBoardProps) {
  // A man under way shows nothing new before it is put down.
  const carried = useRef<{ from: Square; over: Square | null } | null>(null);
  return (
    <InteractiveBoard
      place={plate.board}
      figure={plate}
      board={position.board}
      labels={labels}
      label={LABEL}
      picked={picked === null ? null : (squareNamed(picked) ?? null)}
      onTouch={(at) => act({ type: 'touch', square: squareName(at), drawn })}
      onDrag={(from, over) => {
        carried.current = { from, over };
      }}
      onDrop={() => {
        const { from, over } = carried.current ?? { from: null, over: null };
        carried.current = null;
        if (from !== null && over !== null && over !== from)
          act({ type: 'carry', from: squareName(from), to: squareName(over) });
      }}
      onCancel={() => act({ type: 'clear' })}
      onPut={(_, man) => {
        if (man === null) act({ type: 'back', drawn });
      }}
      onPoint={() => undefined}
    />
  );
}
