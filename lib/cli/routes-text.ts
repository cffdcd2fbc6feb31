/** Routes and checks as pages of text, 80 columns wide. */
import type { RouteCheck, RouteChoice, RoutesAnswer } from '@/engine/reading/schema/routes';
import type { Ink } from './ink';
import { COLUMNS, item, wrap } from './wrap';

/** The choices, best first, each with its way and what it says; ends with a line break. */
export function routesText({ fen, side, choices }: RoutesAnswer, ink: Ink): string {
  const sideInk = side === 'white' ? ink.white : ink.black;
  const whose = `Where ${side === 'white' ? 'White’s' : 'Black’s'} men belong`;
  const lines =
    choices.length === 0
      ? ['No safe post is better than where they stand.']
      : choices.flatMap((choice, place) => choiceLines(choice, place, sideInk));
  return `${[...wrap(fen, COLUMNS), '', ink.bold(whose), ...lines, '', ...wrap(MODEST, COLUMNS)].join('\n')}\n`;
}

/** What a ranking is and is not (product: modest). */
const MODEST = 'Ranked by weighted counts (--json has them): an aid to judgement, no verdict.';

function choiceLines({ man, kind, stops, text }: RouteChoice, place: number, sideInk: Ink['white']): string[] {
  const way = [man, ...stops].join(' - ');
  return ['', `${String(place + 1).padStart(2)}. ${sideInk(`${kind} ${way}`)}`, ...item('    ', text)];
}

/** The verdict of each step; ends with a line break. */
export function checkText({ fen, kind, man, steps, holds, firstFault }: RouteCheck, ink: Ink): string {
  const verdict = holds ? 'The route holds.' : `The route fails at step ${(firstFault ?? 0) + 1}.`;
  const lines = steps.flatMap(({ to, code, reason }, place) => {
    const mark = code === 'fine' ? 'good' : 'fails';
    return item(`  ${place + 1}. ${to}  ${mark.padEnd(6)}`, reason);
  });
  return `${[...wrap(fen, COLUMNS), '', ink.bold(`The ${kind} on ${man}: ${verdict}`), ...lines].join('\n')}\n`;
}
