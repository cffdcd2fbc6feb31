/** A route of one's own between its text and its squares. */
import { squareNamed } from '@/engine/board';
import type { SquareName } from '@/engine/types';

/**
 * The parts of a typed route as the engine reads them: squares with the man's own first, or SAN. A list of squares
 * that does not begin with the chosen man's is taken as its stops. Empty for an empty text.
 */
export function routeParts(text: string, man: SquareName | null): string[] {
  const parts = text
    .replaceAll(/\d+\.+/g, ' ')
    .split(/[\s,;>→–-]+/)
    .filter((part) => part !== '');
  const [first] = parts;
  if (first === undefined || man === null || first === man || squareNamed(first) === undefined) return parts;
  return [man, ...parts];
}

/** The stops of a typed route of the chosen man, where it is all squares; empty otherwise. */
export function stopsOf(text: string, man: SquareName | null): SquareName[] {
  const [, ...stops] = routeParts(text, man);
  return stops.every((stop) => squareNamed(stop) !== undefined) ? (stops as SquareName[]) : [];
}

/** The text of stops, as the field and the address have it. */
export function textOfStops(stops: readonly SquareName[]): string {
  return stops.join(',');
}
