'use client';

/** The live routes page: the engine answers in a worker, and plate, ranking, way and address follow. */
import { useMemo, useReducer } from 'react';
import { PositionField } from '@/components/forms/position-field';
import { useWorker } from '@/components/ui/use-worker';
import { readTyped } from '../reading/read-typed';
import { useAddress, useWidth } from '../reading/use-page';
import { useChosenInView } from '@/components/ui/use-chosen-in-view';
import { type RoutesAddress, routesHref } from './address';
import type { Answer, Ask, RankedChoice } from './ask';
import { openedFirst } from './first-position';
import { MenList } from './men-list';
import { OwnRoute } from './own-route';
import { routeLabels, routesPlate } from './plate';
import { PlateColumn } from './plate-column';
import { RankingFigure } from './ranking-figure';
import { RoutesActions } from './routes-actions';
import { RoutesBoard } from './routes-board';
import { RoutesExamples } from './routes-examples';
import { askOf, routesActed, routesAddressOf, routesStateOf } from './state';
import { Way } from './way';

const DOOR = {
  open: () => new Worker(new URL('./routes.worker.ts', import.meta.url)),
  here: async () => (await import('./answer')).answerRoutes,
};

/** Width of the plate while the page does not know its own, px. */
const UNKNOWN_WIDTH = 640;

/** The page's live part. `address` is what the server was asked for and `first` its answer: it renders the same without scripts. */
export function InteractiveRoutes({ address, first }: { readonly address: RoutesAddress; readonly first: Answer }) {
  const [state, act] = useReducer(routesActed, address, (from) => routesStateOf(from, openedFirst()));
  const { answer, isLate } = useWorker<Ask, Answer>(DOOR, askOf(state), first);
  const { frame: plateFrame, width: plateWidth } = useWidth();
  const { frame: chartFrame, width: chartWidth } = useWidth();

  const { check, side } = answer;
  const chosen = Math.max(
    0,
    answer.choices.findIndex((choice) => keyOf(choice) === state.post),
  );
  const choice = answer.choices[chosen];
  const drawn = check && { man: check.man, stops: check.steps.map(({ to }) => to) };
  const { man, flipped } = state;
  const plate = useMemo(() => {
    const width = plateWidth ?? UNKNOWN_WIDTH;
    return routesPlate({ answer, choice, man, flipped, width, below: 'none', id: 'p' });
  }, [answer, choice, man, flipped, plateWidth]);
  const labels = useMemo(() => routeLabels(answer, choice), [answer, choice]);
  const here = routesAddressOf(state);
  useAddress(routesHref(here));
  const men = useChosenInView(man);
  return (
    <>
      <div className="lg:-mt-[86px] lg:ml-auto lg:w-[50%]">
        <PositionField
          action="/routes"
          hidden={{}}
          text={state.text}
          faults={state.faults}
          refused={state.refused}
          verb="Find"
          onTyped={(text) => act({ type: 'typed', text })}
          onRead={(text) => void readTyped(text, act)}
        >
          <RoutesExamples onRead={(text) => act({ type: 'read', text })} />
        </PositionField>
      </div>
      <MenList
        side={side}
        frame={men}
        men={answer.men}
        chosen={man}
        hrefOf={(next) => routesHref(here, { man: next, of: side, post: null, route: '' })}
        onChoose={(next) => act({ type: 'man', man: next })}
      />
      <div
        aria-busy={isLate}
        className="mt-5 grid grid-cols-[minmax(0,1fr)] gap-x-12 gap-y-8 lg:grid-cols-[minmax(0,11fr)_minmax(0,10fr)] print:block"
      >
        <div>
          <div ref={plateFrame}>
            <PlateColumn plate={plate}>
              {plateWidth === null ? null : (
                <RoutesBoard
                  plate={plate}
                  position={state.position}
                  labels={labels}
                  picked={check?.man ?? man}
                  drawn={drawn}
                  act={act}
                />
              )}
            </PlateColumn>
          </div>
          <RoutesActions
            address={here}
            side={side}
            act={act}
            way={check === null && choice ? { man: choice.man, post: choice.post } : null}
            drawing={() => routesPlate({ answer, choice, man, flipped, width: 720, below: 'drawn', id: 'f' })}
          />
          <OwnRoute
            typed={state.routeTyped}
            man={man}
            check={check}
            fault={answer.fault}
            hidden={hiddenOf(here)}
            act={act}
            onBack={() => act({ type: 'back', drawn })}
          />
        </div>
        <div ref={chartFrame}>
          <RankingFigure
            answer={answer}
            man={man}
            chosen={chosen}
            width={chartWidth}
            hrefOf={(each) => routesHref(here, { post: keyOf(each) })}
            onChoose={(each) => act({ type: 'post', post: keyOf(each) })}
          />
        </div>
      </div>
      {choice ? <Way choice={choice} side={side} /> : null}
      <span className="sr-only" aria-live="polite">
        {isLate ? '' : `${answer.choices.length} posts found.`}
      </span>
    </>
  );
}

/** The name of a row in the address. */
function keyOf({ man, post }: RankedChoice): string {
  return `${man}-${post}`;
}

/** What the form of a route carries along without scripts. */
function hiddenOf({ fen, of, man, flipped }: RoutesAddress): Record<string, string> {
  return {
    fen,
    ...(of === null ? {} : { of }),
    ...(man === null ? {} : { man }),
    ...(flipped ? { side: 'black' } : {}),
  };
}
