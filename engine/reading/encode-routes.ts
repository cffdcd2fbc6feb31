/** Routes as JSON. */
import { type RouteFacts, routeText, stepReason } from '../explain';
import { formatFen, type Position, squareName } from '../board';
import {
  type CheckedRoute,
  nameLine,
  nameOfStep,
  type PreparationValue,
  type RoutesValue,
  type RouteValue,
  type StepValue,
} from '../routes';
import { PARTS } from '../posts';
import type { GuardValue } from '../tactics';
import type { Side, Square } from '../types';
import { names } from './encode-squares';
import type { RouteCheck, RouteChoice, RouteGuard, RouteStep, RoutesAnswer } from './schema/routes';
import { ENGINE_VERSION } from './version';

const WEIGHTS: Readonly<Record<string, number>> = Object.fromEntries(PARTS.map(({ name, weight }) => [name, weight]));

/** The answer of `routes` as JSON. */
export function encodeRoutes(position: Position, { side, choices }: RoutesValue): RoutesAnswer {
  return {
    engine: ENGINE_VERSION,
    fen: formatFen(position),
    side,
    weights: WEIGHTS,
    choices: choices.map((choice) => encodeChoice(position, side, choice)),
  };
}

function encodeChoice(position: Position, side: Side, choice: RouteValue): RouteChoice {
  const move = ({ from, to }: PreparationValue) => nameOfStep(position, side, from, to);
  const facts: RouteFacts = {
    man: squareName(choice.man),
    kind: choice.kind,
    post: squareName(choice.post),
    moves: choice.moves,
    stops: names(choice.stops),
    shortest: choice.shortest,
    steps: choice.steps.map(encodeStep),
    parts: { ...choice.parts },
    gain: Math.round(choice.gain * 100) / 100 + 0,
    challenge: choice.challenge && { ...choice.challenge, by: squareName(choice.challenge.by) },
    drops: choice.drops.map(({ square, loses }) => ({ square: squareName(square), loses })),
    preparations: choice.preparations.map((each) => ({ move: move(each), moves: each.moves })),
    needs: choice.needs && move(choice.needs),
    guard: encodeGuard(position, choice.man, choice.guardStop, choice.guard),
  };
  return { ...facts, text: routeText(facts, side) };
}

function encodeStep({ to, safe, attackedBy, guardedBy, pawnHit }: StepValue): RouteStep {
  return {
    to: squareName(to),
    safe,
    attackedBy: names(attackedBy),
    guardedBy: names(guardedBy),
    pawnHit: pawnHit && { from: squareName(pawnHit.from), moves: pawnHit.moves },
  };
}

function encodeGuard(position: Position, man: Square, stop: Square, { verdict, line, loses }: GuardValue): RouteGuard {
  return { verdict, line: nameLine(position, man, stop, line), loses };
}

/** The answer of `checkRoute` as JSON. */
export function encodeCheck(position: Position, { man, kind, side, steps, firstFault }: CheckedRoute): RouteCheck {
  return {
    engine: ENGINE_VERSION,
    fen: formatFen(position),
    side,
    man: squareName(man),
    kind,
    steps: steps.map(({ to, code, loses, step, guard }, place) => {
      const facts = {
        to: squareName(to),
        code,
        loses,
        step: step && encodeStep(step),
        guard: guard && encodeGuard(position, man, to, guard),
      };
      return { ...facts, reason: stepReason(facts, squareName(steps[place - 1]?.to ?? man), kind, side) };
    }),
    firstFault,
    holds: firstFault === null,
  };
}
