/** Verdicts of given routes, step by step. Positions of our own. */
import { describe, expect, it } from 'vitest';
import { encodeCheck } from '@/engine/reading/encode-routes';
import { routeCheckSchema, routesAnswerSchema } from '@/engine/reading/schema/routes';
import { encodeRoutes } from '@/engine/reading/encode-routes';
import { checkRoute, routes } from '@/engine/routes';
import { positionOf } from '../../../support/random';
import { realPositions } from '../../../support/real-positions';

function codes(fen: string, given: readonly string[]): readonly string[] {
  const checked = checkRoute(positionOf(fen), given);
  return checked.ok ? checked.value.steps.map(({ code }) => code) : [`${checked.fault.code} ${checked.fault.place}`];
}

const QUIET = '4k3/pp3ppp/8/8/8/5N2/PPP2PPP/4K2R w K - 0 1';

describe('checkRoute', () => {
  it.each([
    ['squares', QUIET, ['f3', 'd2', 'e4'], ['fine', 'fine']],
    ['SAN', QUIET, ['Nd2', 'Ne4'], ['fine', 'fine']],
    ['no such jump', QUIET, ['f3', 'f4'], ['not-a-move']],
    ['nothing after a step that is no move', QUIET, ['f3', 'f4', 'd2'], ['not-a-move']],
    ['an own man in the way', QUIET, ['h1', 'h2'], ['own-man']],
    ['a rook does not jump', QUIET, ['h1', 'h3'], ['not-a-move']],
    ['a route captures nothing', '4k3/8/8/4p3/8/5N2/8/4K3 w - - 0 1', ['f3', 'e5'], ['captures']],
    ['a pinned man stays', '4r1k1/8/8/8/8/8/4N3/4K3 w - - 0 1', ['e2', 'c3'], ['exposes-king']],
    ['check before the end', '4k3/8/8/3N4/8/8/8/4K3 w - - 0 1', ['d5', 'c7', 'a6'], ['gives-check', 'fine']],
    ['check at the end', '4k3/8/8/3N4/8/8/8/4K3 w - - 0 1', ['d5', 'c7'], ['fine']],
    ['a pawn takes it', '4k3/8/3p4/8/8/5N2/8/4K3 w - - 0 1', ['f3', 'e5'], ['unsafe']],
    ['what it guarded falls', '4k3/8/8/8/3r4/3N4/8/3RK3 w - - 0 1', ['d1', 'a1'], ['loses']],
    ['not a square', QUIET, ['f3', 'x9'], ['not-a-square 1']],
    ['no man there', QUIET, ['d4', 'd5'], ['no-piece 0']],
    ['a pawn', QUIET, ['a2', 'a3'], ['no-piece 0']],
    ['nothing given', QUIET, [], ['empty 0']],
    ['no knight goes there', QUIET, ['Nb5'], ['no-such-move 0']],
    ['two can', '4k3/8/8/8/8/2N3N1/8/4K3 w - - 0 1', ['Ne4'], ['ambiguous 0']],
    ['one of two, told apart', '4k3/8/8/8/8/2N3N1/8/4K3 w - - 0 1', ['Nce4'], ['fine']],
  ])('%s', (_reason, fen, given, expected) => {
    expect(codes(fen, given)).toEqual(expected);
  });

  it('gives the place of the first step that fails', () => {
    const checked = checkRoute(positionOf('4k3/8/3p4/8/8/8/3N4/4K3 w - - 0 1'), ['d2', 'f3', 'e5', 'c4']);
    expect(checked.ok && checked.value.firstFault).toBe(1);
  });
});

describe('the JSON', () => {
  it('is as its schemas say, for routes and checks of 6 positions of real games', () => {
    let checks = 0;
    for (const fen of realPositions(6)) {
      const position = positionOf(fen);
      const answer = encodeRoutes(position, routes(position));
      expect(routesAnswerSchema.parse(JSON.parse(JSON.stringify(answer)))).toEqual(answer);
      for (const { man, stops, needs, guard } of answer.choices) {
        if (needs !== null) continue;
        const checked = checkRoute(position, [man, ...stops]);
        if (!checked.ok) throw new Error(`${fen}: ${man} ${stops.join(' ')}`);
        const check = encodeCheck(position, checked.value);
        expect(routeCheckSchema.parse(JSON.parse(JSON.stringify(check)))).toEqual(check);
        checks++;
        // What the routes recommend holds when it is checked, unless the guard already said that it loses.
        if (guard.verdict === 'holds' && stops.length > 1)
          expect(check.holds, `${fen} ${man} ${stops.join(' ')}`).toBe(true);
      }
    }
    expect(checks).toBeGreaterThan(40);
  }, 60_000);
});
