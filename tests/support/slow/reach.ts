/** Reach by plain search on a board of letters: the enemy stands still, each stop is safe, the own king is not laid open. */
import { attacks, slowLoss } from './exchange';

const isWhite = (letter: string): boolean => letter === letter.toUpperCase();

/** Moves that the man on `from` needs to each square within the bound; squares out of reach are missing. */
export function slowReach(board: readonly string[], from: number, movesMax: number): Map<number, number> {
  const letter = board[from] ?? '';
  const white = isWhite(letter);
  const king = board.indexOf(white ? 'K' : 'k');
  const enemies = [...board.keys()].filter((at) => board[at] && isWhite(board[at]) !== white);
  const tried = new Map<number, number>([[from, slowLoss(board, letter, from, from) === 0 ? 0 : -1]]);
  let frontier = [from];
  for (let moves = 1; moves <= movesMax; moves++) {
    const next: number[] = [];
    for (const at of frontier) {
      const here = board.map((man, square) => (square === at ? letter : square === from ? '' : man));
      for (const to of board.keys()) {
        const occupant = board[to] ?? '';
        if (tried.has(to) || !attacks(here, at, to)) continue;
        if (occupant && (isWhite(occupant) === white || occupant.toLowerCase() === 'k')) continue;
        const there = board.map((man, square) => (square === to ? letter : square === from ? '' : man));
        if (king >= 0 && enemies.some((e) => e !== to && attacks(there, e, king) && !attacks(board, e, king))) continue;
        const safe = slowLoss(board, letter, to, from) === 0;
        tried.set(to, safe ? moves : -1);
        if (safe && !occupant) next.push(to);
      }
    }
    frontier = next;
  }
  return new Map([...tried].filter(([, moves]) => moves >= 0));
}
