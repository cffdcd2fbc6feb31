/** A route that a person gives, checked step by step. */
import { checkRoute, encodeCheck } from '@/engine';
import type { RouteFault } from '@/engine/routes';
import type { RouteCheck } from '@/engine/reading/schema/routes';
import { AppError } from '@/lib/errors';
import { positionOf } from '@/lib/services/readings/position';
import type { RouteCheckRequest } from '@/openapi/schemas/routes';

/** Computes the verdicts in place. Throws `fen-refused`, or `invalid-request` where the route cannot be read. */
export function checkGivenRoute({ fen, route }: RouteCheckRequest): RouteCheck {
  const position = positionOf(fen);
  const checked = checkRoute(position, route);
  if (checked.ok) return encodeCheck(position, checked.value);
  const { code, place } = checked.fault;
  const message = routeFaultText(checked.fault, route);
  throw new AppError('invalid-request', message, { faults: [{ path: `/route/${place}`, code, message }] });
}

/** A fault of a given route in a sentence. */
function routeFaultText({ code, place }: RouteFault, route: readonly string[]): string {
  const given = route[place] ?? '';
  switch (code) {
    case 'empty':
      return 'A route has at least one move: the square of the man and one stop, or one move in SAN.';
    case 'not-a-square':
      return `"${given}" is no square; squares are named a1 to h8.`;
    case 'no-piece':
      return `A route is walked by a knight, bishop, rook or queen; on "${given}" stands none.`;
    case 'no-such-move':
      return `"${given}" is no move of such a man here.`;
    case 'ambiguous':
      return `"${given}" can mean two men; name the file or rank it comes from.`;
    case 'too-long':
      return 'A route has at most twelve moves.';
  }
}
