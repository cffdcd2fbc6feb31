import { describe, expect, it } from 'vitest';
import { readRoutesAddress, routesHref } from '@/components/views/routes/address';
import { openedFirst } from '@/components/views/routes/first-position';
import { askOf, type RoutesAct, routesActed, routesAddressOf, routesStateOf } from '@/components/views/routes/state';
import type { SquareName } from '@/engine/types';

const CARLSBAD = 'r3r1k1/pp1nqpp1/2p2n1p/3p4/3P2b1/2NBPN2/PPQ2PPP/1R2R1K1 w - - 0 15';

/** The state after acts, from an address. */
function after(query: Record<string, string>, ...acts: readonly RoutesAct[]) {
  const start = routesStateOf(readRoutesAddress(query, { fen: CARLSBAD }), openedFirst());
  return acts.reduce(routesActed, start);
}

const touch = (square: SquareName): RoutesAct => ({ type: 'touch', square, drawn: null });

describe('the address of the routes page', () => {
  it('holds the whole state and comes back the same', () => {
    const query = { fen: CARLSBAD, of: 'white', man: 'f3', post: 'f3-g3', route: 'd2,b3', side: 'black' };
    const address = routesAddressOf(after(query));
    const [, search = ''] = routesHref(address).split('?');
    expect(readRoutesAddress(Object.fromEntries(new URLSearchParams(search)), { fen: '' })).toEqual(address);
    expect(Object.fromEntries(new URLSearchParams(search))).toEqual(query);
  });

  it.each([
    [
      { man: 'z9', of: 'red', post: 'f3' },
      { man: null, of: null, post: null },
    ],
    [{ man: 'e3' }, { man: null }],
    [{ man: 'e5' }, { man: null }],
  ] as const)('with %j takes defaults', (query, expected) => {
    expect(after(query)).toMatchObject(expected);
  });

  it('keeps what was typed where the position cannot be read', () => {
    const state = after({ fen: 'no position' });
    expect(state).toMatchObject({ text: 'no position', refused: true });
    expect(state.faults.length).toBeGreaterThan(0);
  });
});

describe('taps on the board', () => {
  it('choose a man, then draw its stops', () => {
    const state = after({}, touch('f3'), touch('d2'), touch('b3'));
    expect(state).toMatchObject({ man: 'f3', of: 'white', route: 'd2,b3' });
    expect(askOf(state).route).toEqual(['f3', 'd2', 'b3']);
  });

  it('take the last stop back, then clear the route, then let the man go', () => {
    expect(after({}, touch('f3'), touch('d2'), touch('b3'), touch('b3')).route).toBe('d2');
    expect(after({}, touch('f3'), touch('d2'), touch('f3'))).toMatchObject({ man: 'f3', route: '' });
    expect(after({}, touch('f3'), touch('f3')).man).toBeNull();
  });

  it('change to another man, of either side', () => {
    expect(after({}, touch('f3'), touch('d2'), touch('d7'))).toMatchObject({ man: 'd7', of: 'black', route: '' });
  });

  it('do nothing on an empty square while no man is chosen', () => {
    expect(after({}, touch('e5'))).toEqual(after({}));
  });

  it('go on with a route that was typed in SAN', () => {
    const drawn = { man: 'f3', stops: ['d2'] } as const;
    const state = after({ route: 'Nd2' }, { type: 'touch', square: 'b3', drawn });
    expect(state).toMatchObject({ man: 'f3', route: 'd2,b3' });
  });

  it('by dragging begin a route with its first stop', () => {
    expect(after({}, { type: 'carry', from: 'f3', to: 'd2' })).toMatchObject({ man: 'f3', route: 'd2' });
    expect(after({}, { type: 'carry', from: 'e3', to: 'e4' })).toEqual(after({}));
  });
});

describe('other acts', () => {
  it('a refused position leaves the one before, with the text kept', () => {
    const state = after({}, { type: 'read', text: 'what?' });
    expect(state).toMatchObject({ text: 'what?', refused: true });
    expect(routesAddressOf(state).fen).toBe(CARLSBAD);
  });

  it('a typed route counts only once it is sent', () => {
    const typed = after({ man: 'f3' }, { type: 'route-typed', text: 'd2 b3' });
    expect(typed.route).toBe('');
    expect(routesActed(typed, { type: 'route-read' }).route).toBe('d2 b3');
  });

  it('the other side’s men are asked without a man', () => {
    expect(after({ man: 'f3', route: 'd2' }, { type: 'of', side: 'black' })).toMatchObject({
      of: 'black',
      man: null,
      route: '',
    });
  });
});
