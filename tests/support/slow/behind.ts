/** Men that stand behind, found by taking the men in front off a board of letters one after the other. */
import { attacks } from './exchange';

const isWhite = (letter: string): boolean => letter === letter.toUpperCase();

/** Squares of the side's sliders that would attack the square once friendly sliders or a pawn in front have captured there. */
export function slowBehind(board: readonly string[], white: boolean, square: number): Set<number> {
  const own = (at: number): boolean => board[at] !== '' && isWhite(board[at] ?? '') === white;
  const behind = new Set<number>();
  for (const first of board.keys()) {
    if (!own(first) || 'NnKk'.includes(board[first] ?? '') || !attacks(board, first, square)) continue;
    const thinned = [...board];
    for (let front = first; ; ) {
      const withFront = [...thinned];
      thinned[front] = '';
      const next = [...board.keys()].find(
        (at) =>
          own(at) &&
          'BbRrQq'.includes(thinned[at] || '-') &&
          attacks(thinned, at, square) &&
          !attacks(withFront, at, square),
      );
      if (next === undefined) break;
      behind.add(next);
      front = next;
    }
  }
  return behind;
}
