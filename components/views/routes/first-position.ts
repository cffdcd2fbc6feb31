/** The position that the page falls back on, opened. */
import type { Position } from '@/engine/board';
import { FIRST_POSITION } from '../reading/examples';
import { openPosition } from '../reading/open-position';

/** The first visit's position. */
export function openedFirst(): Position {
  const { position } = openPosition(FIRST_POSITION);
  if (!position) throw new Error('The first position must be readable.');
  return position;
}
