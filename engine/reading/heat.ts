/** The heat map of a man in a position given as FEN: what figures and pages ask for. */
import { attackMap } from '../attacks';
import { parseFen, type Position, squareNamed } from '../board';
import { safetyOf } from '../exchange';
import { type HeatCell, heatMap } from '../men';

/** The heat map of the man on a square of an admitted position; undefined where none stands. */
export function heatMapIn(position: Position, square: string): HeatCell[] | undefined {
  const at = squareNamed(square);
  return at === undefined ? undefined : heatMap(safetyOf(attackMap(position)), { square: at });
}

/** The same for a FEN, read as a diagram; undefined where it is refused or no man stands there. */
export function heatMapOf(fen: string, square: string): HeatCell[] | undefined {
  const admitted = parseFen(fen, 'diagram');
  return admitted.ok ? heatMapIn(admitted.value.position, square) : undefined;
}
