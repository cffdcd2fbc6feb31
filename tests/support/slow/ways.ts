/** Ways by plain search on a board of letters: quiet moves, every stop safe, no check given before the last. */
import { attacks, slowLoss } from './exchange';

const isWhite = (letter: string): boolean => letter === letter.toUpperCase();

function isStruck(board: readonly string[], square: number, byWhite: boolean): boolean {
  return (
    square >= 0 &&
    board.some((letter, at) => letter !== '' && isWhite(letter) === byWhite && attacks(board, at, square))
  );
}

/** Length and number of the shortest routes of the man on `from` to each empty square within the bound. */
export function slowWays(
  board: readonly string[],
  from: number,
  movesMax: number,
): Map<number, { moves: number; count: number }> {
  const letter = board[from] ?? '';
  const white = isWhite(letter);
  const ownKing = board.indexOf(white ? 'K' : 'k');
  const enemyKing = board.indexOf(white ? 'k' : 'K');
  const bound = isStruck(board, ownKing, !white) ? 1 : movesMax;
  const put = (to: number) => board.map((man, at) => (at === to ? letter : at === from ? '' : man));
  const found = new Map<number, { moves: number; count: number }>();
  let routes = new Map<number, number>([[from, 1]]);
  for (let moves = 1; moves <= bound; moves++) {
    const next = new Map<number, number>();
    for (const [at, count] of routes) {
      if (at !== from && isStruck(put(at), enemyKing, white)) continue;
      for (const to of board.keys()) {
        if (board[to] !== '' || found.has(to) || !attacks(put(at), at, to)) continue;
        if (isStruck(put(to), ownKing, !white) || slowLoss(board, letter, to, from) > 0) continue;
        next.set(to, (next.get(to) ?? 0) + count);
      }
    }
    for (const [to, count] of next) found.set(to, { moves, count });
    routes = next;
  }
  return found;
}
