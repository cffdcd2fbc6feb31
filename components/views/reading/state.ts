/** What the reading page knows, and what each act of a visitor changes. */
import type { Layer } from '@/components/plate/types';
import { type Fault, formatFen, manOn, type Position } from '@/engine/board';
import type { Man, Square } from '@/engine/types';
import type { Address } from './address';
import { edited, withManMoved, withSideChanged } from './edit';
import { openPosition } from './open-position';

/** Positions that undo keeps. */
const UNDO_MAX = 100;

export interface PageState {
  readonly position: Position;
  /** What the field shows. */
  readonly text: string;
  /** Faults of the text that was last read, in place. */
  readonly faults: readonly Fault[];
  /** The text could not be read, so the position is the one before. */
  readonly refused: boolean;
  readonly layer: Layer;
  /** The man whose mobility is asked for. */
  readonly man: Square | null;
  readonly flipped: boolean;
  /** Key of the chosen statement. */
  readonly statement: string | null;
  /** The square picked up from, or the man picked from the box. */
  readonly picked: Square | Man | null;
  /** The man under way and the square it is over. */
  readonly drag: { readonly from: Square; readonly over: Square | null } | null;
  readonly undo: readonly Position[];
}

export type Act =
  | { readonly type: 'typed'; readonly text: string }
  | { readonly type: 'read'; readonly text: string }
  | { readonly type: 'refused'; readonly text: string; readonly faults: readonly Fault[] }
  | { readonly type: 'layer'; readonly layer: Layer }
  | { readonly type: 'turn' }
  | { readonly type: 'side' }
  | { readonly type: 'statement'; readonly key: string }
  | { readonly type: 'touch'; readonly square: Square }
  | { readonly type: 'pick'; readonly man: Man | null }
  | { readonly type: 'put'; readonly square: Square; readonly man: Man | null }
  | { readonly type: 'drag'; readonly from: Square; readonly over: Square | null }
  | { readonly type: 'drop' }
  | { readonly type: 'cancel' }
  | { readonly type: 'undo' };

/** The state that an address opens, with the position to fall back on. */
export function stateOf(address: Address, fallback: Position): PageState {
  const opened = openPosition(address.fen);
  const position = opened.position ?? fallback;
  const stands = address.man !== null && manOn(position, address.man) !== null;
  return {
    position,
    text: opened.text,
    faults: opened.faults,
    refused: opened.position === null,
    layer: address.layer,
    man: stands ? address.man : address.layer === 'mobility' ? firstPiece(position) : null,
    flipped: address.flipped,
    statement: address.statement,
    picked: null,
    drag: null,
    undo: [],
  };
}

/** The part of the state that a link carries. */
export function addressOf({ position, layer, man, flipped, statement }: PageState): Address {
  return { fen: formatFen(position), layer, man, flipped, statement };
}

/** The position that is shown: the one under the moving man while one is dragged. */
export function shownPosition({ position, drag }: PageState): Position {
  if (!drag || drag.over === drag.from) return position;
  if (drag.over === null) return edited(position, [{ square: drag.from, man: null }]) ?? position;
  return withManMoved(position, drag.from, drag.over) ?? position;
}

/** The state after an act. */
export function acted(state: PageState, act: Act): PageState {
  switch (act.type) {
    case 'typed':
      return { ...state, text: act.text };
    case 'read': {
      const opened = openPosition(act.text);
      if (!opened.position) return { ...state, text: act.text, faults: opened.faults, refused: true };
      return { ...moved(state, opened.position), text: act.text, faults: opened.faults };
    }
    case 'refused':
      return { ...state, text: act.text, faults: act.faults, refused: true };
    case 'layer':
      return {
        ...state,
        layer: act.layer,
        man: act.layer === 'mobility' ? (state.man ?? firstPiece(state.position)) : state.man,
      };
    case 'turn':
      return { ...state, flipped: !state.flipped };
    case 'side':
      return moved(state, withSideChanged(state.position));
    case 'statement':
      return { ...state, statement: state.statement === act.key ? null : act.key };
    case 'touch':
      return touched(state, act.square);
    case 'pick':
      return { ...state, picked: act.man };
    case 'put':
      return moved(state, edited(state.position, [act]));
    case 'drag':
      return { ...state, drag: act, picked: null };
    case 'drop': {
      const { drag } = state;
      if (!drag || drag.over === drag.from) return { ...state, drag: null };
      const next = moved(state, shownPosition(state));
      return { ...next, man: state.man === drag.from ? drag.over : state.man };
    }
    case 'cancel':
      return { ...state, drag: null, picked: null };
    case 'undo': {
      const last = state.undo[state.undo.length - 1];
      if (!last) return state;
      return { ...moved(state, last), undo: state.undo.slice(0, -1) };
    }
  }
}

/** The state with another position; what pointed at the old one is let go. */
function moved(state: PageState, position: Position | undefined): PageState {
  if (!position) return { ...state, drag: null, picked: null };
  const keepsMan = state.man !== null && manOn(position, state.man) !== null;
  const text = formatFen(position);
  return {
    ...state,
    position,
    text,
    faults: openPosition(text).faults,
    refused: false,
    man: keepsMan ? state.man : state.layer === 'mobility' ? firstPiece(position) : null,
    statement: null,
    picked: null,
    drag: null,
    undo: [...state.undo, state.position].slice(-UNDO_MAX),
  };
}

/** A tap or Enter on a square: puts what is picked, picks up what stands there, or lets go. */
function touched(state: PageState, square: Square): PageState {
  const { picked, position } = state;
  if (picked !== null && typeof picked === 'object') {
    return { ...moved(state, edited(position, [{ square, man: picked }])), picked };
  }
  if (picked !== null && picked !== square) {
    const next = moved(state, withManMoved(position, picked, square));
    return { ...next, man: state.man === picked ? square : next.man };
  }
  if (picked === square || manOn(position, square) === null) return { ...state, picked: null };
  return { ...state, picked: square, man: square };
}

/** The piece that mobility asks first: a knight of the side to move if there is one, else any man. */
function firstPiece(position: Position): Square | null {
  const own = position.sideToMove === 'white' ? 0 : 8;
  for (const place of [2, 3, 4, 5, 6, 1]) {
    const at = position.board.indexOf(own + place);
    if (at >= 0) return at as Square;
  }
  return null;
}
