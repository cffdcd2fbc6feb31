/** What the routes page knows, and what each act of a visitor changes. */
import { type Fault, formatFen, manOn, type Position, squareNamed } from '@/engine/board';
import type { Side, SquareName } from '@/engine/types';
import { openPosition } from '../reading/open-position';
import type { RoutesAddress } from './address';
import type { Ask } from './ask';
import { routeParts, stopsOf, textOfStops } from './given-route';

export interface RoutesState {
  readonly position: Position;
  /** What the field of the position shows. */
  readonly text: string;
  readonly faults: readonly Fault[];
  readonly refused: boolean;
  readonly of: Side | null;
  readonly man: SquareName | null;
  /** The chosen row, 'f3-e5'; the first where null. */
  readonly post: string | null;
  /** The route of one's own that is checked, and what its field shows. */
  readonly route: string;
  readonly routeTyped: string;
  readonly flipped: boolean;
}

/** A route that was read: the man and the squares it stopped on. */
export interface DrawnRoute {
  readonly man: SquareName;
  readonly stops: readonly SquareName[];
}

export type RoutesAct =
  | { readonly type: 'typed'; readonly text: string }
  | { readonly type: 'read'; readonly text: string }
  | { readonly type: 'refused'; readonly text: string; readonly faults: readonly Fault[] }
  | { readonly type: 'of'; readonly side: Side }
  | { readonly type: 'man'; readonly man: SquareName | null }
  | { readonly type: 'post'; readonly post: string }
  | { readonly type: 'touch'; readonly square: SquareName; readonly drawn: DrawnRoute | null }
  | { readonly type: 'carry'; readonly from: SquareName; readonly to: SquareName }
  | { readonly type: 'route-typed'; readonly text: string }
  | { readonly type: 'route-read' }
  | { readonly type: 'back'; readonly drawn: DrawnRoute | null }
  | { readonly type: 'clear' }
  | { readonly type: 'turn' };

/** The state that an address opens, with the position to fall back on. */
export function routesStateOf(address: RoutesAddress, fallback: Position): RoutesState {
  const opened = openPosition(address.fen);
  const position = opened.position ?? fallback;
  const { of, post, route, flipped } = address;
  return {
    position,
    text: opened.text,
    faults: opened.faults,
    refused: opened.position === null,
    of,
    man: address.man !== null && isPiece(position, address.man) ? address.man : null,
    post,
    route,
    routeTyped: route,
    flipped,
  };
}

/** The part of the state that a link carries. */
export function routesAddressOf({ position, of, man, post, route, flipped }: RoutesState): RoutesAddress {
  return { fen: formatFen(position), of, man, post, route, flipped };
}

/** What the engine is asked for a state. */
export function askOf({ position, of, man, route }: RoutesState): Ask {
  return { fen: formatFen(position), of, man, route: routeParts(route, man) };
}

/** Whether a square holds a man that walks routes: a knight, bishop, rook or queen. */
function isPiece(position: Position, square: SquareName): boolean {
  const kind = kindOn(position, square);
  return kind !== undefined && kind !== 'pawn' && kind !== 'king';
}

function kindOn(position: Position, name: SquareName) {
  const square = squareNamed(name);
  return square === undefined ? undefined : manOn(position, square)?.kind;
}

function sideOn(position: Position, name: SquareName): Side | null {
  const square = squareNamed(name);
  return square === undefined ? null : (manOn(position, square)?.side ?? null);
}

/** The state after an act. */
export function routesActed(state: RoutesState, act: RoutesAct): RoutesState {
  switch (act.type) {
    case 'typed':
      return { ...state, text: act.text };
    case 'read':
      return read(state, act.text);
    case 'refused':
      return { ...state, text: act.text, faults: act.faults, refused: true };
    case 'of':
      return { ...state, of: act.side, man: null, post: null, route: '', routeTyped: '' };
    case 'man':
      return withMan(state, act.man);
    case 'post':
      return { ...state, post: act.post };
    case 'touch':
      return touched(state, act.square, act.drawn);
    case 'carry':
      return isPiece(state.position, act.from) ? withStops(withMan(state, act.from), [act.to]) : state;
    case 'route-typed':
      return { ...state, routeTyped: act.text };
    case 'route-read':
      return { ...state, route: state.routeTyped.trim() };
    case 'back':
      return act.drawn ? withStops({ ...state, man: act.drawn.man }, act.drawn.stops.slice(0, -1)) : state;
    case 'clear':
      return withStops(state, []);
    case 'turn':
      return { ...state, flipped: !state.flipped };
  }
}

function read(state: RoutesState, text: string): RoutesState {
  const opened = openPosition(text);
  const { faults, position } = opened;
  if (!position) return { ...state, text, faults, refused: true };
  const keeps = state.man !== null && isPiece(position, state.man);
  return { ...state, position, text, faults, refused: false, man: keeps ? state.man : null, post: null };
}

function withMan(state: RoutesState, man: SquareName | null): RoutesState {
  const of = man === null ? state.of : sideOn(state.position, man);
  return { ...state, of, man, post: null, route: '', routeTyped: '' };
}

function withStops(state: RoutesState, stops: readonly SquareName[]): RoutesState {
  const route = textOfStops(stops);
  return { ...state, route, routeTyped: route };
}

/** A tap or Enter: on a piece it chooses the man, elsewhere it goes on with the route, on the last stop it takes it back. */
function touched(state: RoutesState, square: SquareName, drawn: DrawnRoute | null): RoutesState {
  if (square === state.man) return state.route === '' ? withMan(state, null) : withStops(state, []);
  if (isPiece(state.position, square)) return withMan(state, square);
  const man = drawn?.man ?? state.man;
  if (man === null) return state;
  const stops = drawn?.stops ?? stopsOf(state.route, man);
  const goesBack = stops[stops.length - 1] === square;
  return withStops({ ...state, man }, goesBack ? stops.slice(0, -1) : [...stops, square]);
}
