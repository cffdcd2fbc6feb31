/** Posts and routes of one man or of a whole side. */
import { encodeRoutes, type Position, routes, type Side, type Square, squareNamed } from '@/engine';
import { manOn } from '@/engine/board';
import type { RoutesAnswer } from '@/engine/reading/schema/routes';
import { AppError } from '@/lib/errors';
import { positionOf } from '@/lib/services/readings/position';
import type { Mode } from '@/openapi/schemas/ids';
import type { RoutesRequest } from '@/openapi/schemas/routes';

/**
 * Computes the answer in place, of a diagram where `mode` admits one. Throws `fen-refused`, or `invalid-request` where
 * the named square holds no such piece.
 */
export function findRoutes({ fen, man, side, movesMax, choicesMax }: RoutesRequest, mode?: Mode): RoutesAnswer {
  const position = positionOf(fen, '/fen', mode);
  const from = man === undefined ? undefined : pieceOn(position, man, side);
  const found = routes(position, {
    movesMax,
    choicesMax,
    ...(from !== undefined && { from }),
    ...(side && { side }),
  });
  return encodeRoutes(position, found);
}

/** The square of a knight, bishop, rook or queen; of this side, if one is said. */
function pieceOn(position: Position, name: string, side: Side | undefined): Square {
  const square = squareNamed(name);
  const man = square === undefined ? null : manOn(position, square);
  if (square === undefined || !man || man.kind === 'pawn' || man.kind === 'king' || (side && man.side !== side)) {
    const found = man ? `the ${man.side} ${man.kind}` : 'no man';
    const message = `Posts are looked for of a ${side ? `${side} ` : ''}knight, bishop, rook or queen; on ${name} stands ${found}.`;
    throw new AppError('invalid-request', message, { faults: [{ path: '/man', code: 'no-piece', message }] });
  }
  return square;
}
