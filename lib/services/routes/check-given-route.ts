/** A route that a person gives, checked step by step. */
import { checkRoute, encodeCheck } from '@/engine';
import { routeFaultText } from '@/engine/explain';
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
