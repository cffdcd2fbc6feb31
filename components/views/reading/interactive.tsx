'use client';

/** The live reading: every act changes the position, and plate, statements and address follow. */
import { useCallback, useDeferredValue, useMemo, useReducer, useState } from 'react';
import { InteractiveBoard } from '@/components/plate/interactive-board';
import { plateOf } from '@/components/plate/layout';
import { squareName } from '@/engine/board';
import { heatMapIn, newDesk, readPosition } from '@/engine/reading';
import type { SquareName } from '@/engine/types';
import { type Address, addressHref } from './address';
import { Actions } from './actions';
import { FenField } from './fen-field';
import { InteractiveKeys } from './interactive-keys';
import { LayerBar } from './layer-bar';
import { ManBox } from './man-box';
import { PlateCaption } from './plate-caption';
import { PlateFigure } from './plate-figure';
import { squareLabels } from './square-label';
import { Statements } from './statements';
import { acted, addressOf, shownPosition, stateOf } from './state';
import { openPosition } from './open-position';
import { readTyped } from './read-typed';
import { useAddress, useWidth } from './use-page';
import { FIRST_POSITION } from './examples';

/** One set of tables serves every reading of this page. */
const desk = newDesk();

function firstPosition() {
  const { position } = openPosition(FIRST_POSITION);
  if (!position) throw new Error('the first position must be readable');
  return position;
}

/** The page's live part. `address` is what the server was asked for; it renders the same without scripts. */
export function InteractiveReading({ address }: { readonly address: Address }) {
  const [state, act] = useReducer(acted, address, (from) => stateOf(from, firstPosition()));
  const [pointed, setPointed] = useState<string | null>(null);
  const [square, setSquare] = useState<SquareName | null>(null);
  const { frame, width } = useWidth();

  const position = shownPosition(state);
  const reading = useMemo(() => readPosition(position, [], desk), [position]);
  // The plate and its notes follow at once, the long list below a moment later.
  const listed = useDeferredValue(reading);
  const drag = state.drag;
  const asked = drag && drag.from === state.man && drag.over !== null ? drag.over : state.man;
  const man = asked === null ? null : squareName(asked);
  const heat = useMemo(
    () => (state.layer === 'mobility' && man !== null ? (heatMapIn(position, man) ?? null) : null),
    [position, state.layer, man],
  );
  const shown = pointed ?? state.statement;
  const lit = useMemo(() => reading.statements.find(({ key }) => key === shown), [reading, shown]);
  const noted = useMemo(() => {
    const chosen = reading.statements.find(({ key }) => key === state.statement);
    return chosen && !reading.lead.includes(chosen.key) ? [...reading.lead.slice(0, 4), chosen.key] : reading.lead;
  }, [reading, state.statement]);
  const request = {
    reading,
    layer: state.layer === 'mobility' && heat === null ? ('position' as const) : state.layer,
    flipped: state.flipped,
    below: 'none' as const,
    chosen: shown,
    noted,
    man,
    heat,
    lit: lit ? [...new Set([...lit.squares, ...lit.men])] : [],
  };
  const plates =
    width === null
      ? [plateOf({ ...request, width: 1312, id: 'w' }), plateOf({ ...request, width: 720, id: 'n' })]
      : [plateOf({ ...request, width, id: 'p' })];
  const [plate] = plates;
  const labels = useMemo(
    () => (state.drag ? null : squareLabels(reading, state.layer)),
    [reading, state.layer, state.drag],
  );

  const noteKeys = plate?.notes.map(({ statement }) => statement.key).join(' ') ?? '';
  const numbers = useMemo(() => new Map(noteKeys.split(' ').map((key, index) => [key, index + 1])), [noteKeys]);
  const choose = useCallback((key: string) => act({ type: 'statement', key }), []);
  const href = addressHref(addressOf(state));
  const hrefOf = useCallback(
    (key: string) => `${href.replace(/&statement=.*$/, '')}&statement=${encodeURIComponent(key)}`,
    [href],
  );
  useAddress(href);

  if (!plate) return null;
  return (
    <>
      <FenField
        text={state.text}
        faults={state.faults}
        refused={state.refused}
        layer={state.layer}
        act={act}
        onRead={(text) => void readTyped(text, act)}
      />
      <div className="mt-6 flex flex-wrap items-end justify-between gap-x-8 gap-y-2">
        <LayerBar layer={state.layer} address={addressOf(state)} act={act} />
        <Actions state={state} act={act} />
      </div>
      <div ref={frame} className="mt-4">
        {plates.map((each, index) => (
          <PlateFigure
            key={index}
            plate={each}
            only={plates.length === 1 ? 'any' : index === 0 ? 'wide' : 'narrow'}
            onChoose={(key) => act({ type: 'statement', key })}
          >
            {width === null ? null : (
              <InteractiveBoard
                place={each.board}
                figure={each}
                board={position.board}
                labels={labels}
                picked={typeof state.picked === 'number' ? state.picked : null}
                onTouch={(at) => act({ type: 'touch', square: at })}
                onDrag={(from, over) => act({ type: 'drag', from, over })}
                onDrop={() => act({ type: 'drop' })}
                onCancel={() => act({ type: 'cancel' })}
                onPut={(at, put) => act({ type: 'put', square: at, man: put })}
                onPoint={(at) => setSquare(at === null ? null : squareName(at))}
              />
            )}
          </PlateFigure>
        ))}
      </div>
      <PlateCaption plate={plate} />
      <ManBox picked={state.picked} act={act} />
      <div className="double-rule-top mt-8 pt-6">
        <Statements
          reading={listed}
          numbers={numbers}
          chosen={state.statement}
          square={square}
          hrefOf={hrefOf}
          onPoint={setPointed}
          onChoose={choose}
        />
      </div>
      <InteractiveKeys act={act} />
      <span className="sr-only" aria-live="polite">
        {typeof state.picked === 'number' ? `${squareName(state.picked)} picked up. Choose where it goes.` : ''}
      </span>
    </>
  );
}
