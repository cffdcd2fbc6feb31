/** Short words of the routes page. */
import type { RouteChoice } from '@/engine/reading/schema/routes';
import type { Side } from '@/engine/types';
import type { ManRow } from './ask';

/** A figure with its sign and a real minus; 0 has none. */
export function signed(value: number, places: number): string {
  const text = Math.abs(value).toFixed(places);
  if (Number(text) === 0) return '0';
  return `${value > 0 ? '+' : '−'}${text}`;
}

/** '1 move', '3 moves'. */
export function movesText(moves: number): string {
  return moves === 1 ? '1 move' : `${moves} moves`;
}

/** 'e5', or 'knight f3 to e5' where the man must be named. */
export function choiceName({ man, kind, post }: Pick<RouteChoice, 'man' | 'kind' | 'post'>, named: boolean): string {
  return named ? `${kind} ${man} to ${post}` : post;
}

/** '3 moves by d2, f1', with the preparation that must come first. */
export function wayText({ moves, stops, needs }: Pick<RouteChoice, 'moves' | 'stops' | 'needs'>): string {
  const via = stops.slice(0, -1).join(', ');
  return `${movesText(moves)}${via ? ` by ${via}` : ''}${needs === null ? '' : `, after ${needs}`}`;
}

/** What helps a man most, in its row of the list. */
export function manText({ best }: Pick<ManRow, 'best'>): string {
  if (!best) return 'no safe way anywhere';
  if (best.merit <= 0) return 'gains nothing by moving';
  return `${best.post} in ${movesText(best.moves)}`;
}

export const SIDE_NAMES: Readonly<Record<Side, string>> = { white: 'White', black: 'Black' };
