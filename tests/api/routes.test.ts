/** Posts, routes and checks over HTTP: what is refused says where and why, what is answered can be walked. */
import { describe, expect, it } from 'vitest';
import type { RouteCheck, RoutesAnswer } from '@/engine/reading/schema/routes';
import { contracts } from '@/openapi/contracts';
import { EXAMPLE_FEN } from '@/openapi/schemas/examples';
import type { Problem } from '@/openapi/schemas/problem';
import { call, promisedJson } from './caller';

const { createRoutes, createRouteCheck } = contracts;

describe('POST /routes', () => {
  it('answers the posts of one man, best first, with parts and weights', async () => {
    const response = await call(createRoutes, { body: { fen: EXAMPLE_FEN, man: 'a1' } });
    const answer = await promisedJson<RoutesAnswer>(createRoutes, response);
    expect(answer.choices.length).toBeGreaterThan(1);
    for (const { man, kind, gain, parts } of answer.choices) {
      expect([man, kind]).toEqual(['a1', 'rook']);
      const names = Object.keys(parts);
      expect(names.every((name) => name in answer.weights)).toBe(true);
      expect(Number.isFinite(gain)).toBe(true);
    }
    // Common practice: the rook belongs on the half-open file.
    expect(answer.choices[0]?.post).toBe('c1');
  });

  it('answers a side that is not to move', async () => {
    const response = await call(createRoutes, { body: { fen: EXAMPLE_FEN, side: 'black', choicesMax: 2 } });
    const answer = await promisedJson<RoutesAnswer>(createRoutes, response);
    expect(answer.side).toBe('black');
    expect(answer.choices).toHaveLength(2);
  });

  it.each([
    ['an empty square', { man: 'e4' }, /on e4 stands no man/],
    ['a pawn', { man: 'd4' }, /on d4 stands the white pawn/],
    ['a man of the other side', { man: 'f6', side: 'white' }, /on f6 stands the black knight/],
  ])('refuses %s with its place', async (_, wrong, message) => {
    const response = await call(createRoutes, { body: { fen: EXAMPLE_FEN, ...wrong } });
    expect(response.status).toBe(422);
    const problem = await promisedJson<Problem>(createRoutes, response);
    expect(problem.path).toBe('/man');
    expect(problem.detail).toMatch(message);
  });
});

describe('POST /routes/check', () => {
  it.each([[['f3', 'd2', 'b3']], [['Nd2', 'Nb3']]])('reads %j', async (route) => {
    const check = await promisedJson<RouteCheck>(
      createRouteCheck,
      await call(createRouteCheck, { body: { fen: EXAMPLE_FEN, route } }),
    );
    expect(check).toMatchObject({ man: 'f3', kind: 'knight', holds: true, firstFault: null });
    expect(check.steps.map(({ to, reason }) => [to, reason])).toEqual([
      ['d2', 'd2 is safe: no black man attacks it.'],
      ['b3', 'b3 is safe: no black man attacks it.'],
    ]);
  });

  it.each([
    [['f3'], '/route/0', /at least one move/],
    [['f3', 'x9'], '/route/1', /"x9" is no square/],
    [['e4', 'e5'], '/route/0', /on "e4" stands none/],
    [['Nb6'], '/route/0', /no move of such a man/],
    [['Rc1'], '/route/0', /can mean two men/],
  ])('refuses %j', async (route, path, message) => {
    const response = await call(createRouteCheck, { body: { fen: EXAMPLE_FEN, route } });
    expect(response.status).toBe(422);
    const problem = await promisedJson<Problem>(createRouteCheck, response);
    expect(problem.path).toBe(path);
    expect(problem.detail).toMatch(message);
  });
});
