/**
 * What men can do, by plain search on a board of FEN letters, 0 (a1) to 63 (h8): a slow twin that shares no code with
 * the engine.
 */
import { attacks, slowExchange, slowLoss } from './exchange';

type Letters = readonly string[];

const isWhite = (letter: string): boolean => letter === letter.toUpperCase();
const rankOf = (square: number): number => Math.floor(square / 8);

function squaresOf(board: Letters, white: boolean): number[] {
  return [...board.keys()].filter((at) => board[at] && isWhite(board[at]) === white);
}

/** The board with the man gone from one square to another. */
export function moved(board: Letters, from: number, to: number): string[] {
  return board.map((letter, square) => (square === to ? (board[from] ?? '') : square === from ? '' : letter));
}

/** Enemy men that attack the king of the side; none where it has no king. */
function checkers(board: Letters, white: boolean): number[] {
  const king = board.indexOf(white ? 'K' : 'k');
  return king < 0 ? [] : squaresOf(board, !white).filter((enemy) => attacks(board, enemy, king));
}

/** The man that pins the one on `from` to its king, or undefined. */
export function slowPinner(board: Letters, from: number): number | undefined {
  const letter = board[from] ?? '';
  if (!letter || letter.toLowerCase() === 'k') return undefined;
  const without = board.map((man, square) => (square === from ? '' : man));
  const now = checkers(board, isWhite(letter));
  return checkers(without, isWhite(letter)).find((enemy) => !now.includes(enemy));
}

function pawnMoves(board: Letters, from: number, passing: number): number[] {
  const white = isWhite(board[from] ?? '');
  const forward = white ? 8 : -8;
  const strikes = [...board.keys()]
    .filter((to) => attacks(board, from, to))
    .filter((to) => {
      const prize = board[to];
      return to === passing || (prize && isWhite(prize) !== white && prize.toLowerCase() !== 'k');
    });
  const steps: number[] = [];
  if (board[from + forward] === '') {
    steps.push(from + forward);
    if (rankOf(from) === (white ? 1 : 6) && board[from + 2 * forward] === '') steps.push(from + 2 * forward);
  }
  return [...strikes, ...steps];
}

/** Where the man could go if there were no pins. */
function goalsOf(board: Letters, from: number, passing: number): number[] {
  const letter = board[from] ?? '';
  if (letter.toLowerCase() === 'p') return pawnMoves(board, from, passing);
  return [...board.keys()].filter((to) => {
    const prize = board[to];
    if (prize && (isWhite(prize) === isWhite(letter) || prize.toLowerCase() === 'k')) return false;
    return attacks(board, from, to);
  });
}

/**
 * Pseudo-legal moves, castling left out: a pinned man may block the pinner or capture it, and nothing else. `passing` is
 * the square on which the man may capture in passing if it is a pawn, -1 for none.
 */
export function slowMoves(board: Letters, from: number, passing: number): number[] {
  const white = isWhite(board[from] ?? '');
  const pinner = slowPinner(board, from);
  return goalsOf(board, from, passing)
    .filter((to) => pinner === undefined || to === pinner || !checkers(moved(board, from, to), white).includes(pinner))
    .sort((a, b) => a - b);
}

/** Of the moves those after which capturing the man where it went gains nothing. */
export function slowSafeMoves(board: Letters, from: number, passing: number): number[] {
  return slowMoves(board, from, passing).filter((to) => slowLoss(board, board[from] ?? '', to, from) === 0);
}

/** Moves and safe moves of a man that has left `origin` and is asked on a square; pins are not looked at. */
export function slowHeat(board: Letters, letter: string, square: number, origin: number): [number, number] {
  const asked = board.map((man, at) => (at === square ? letter : at === origin ? '' : man));
  const goals = goalsOf(asked, square, -1);
  return [goals.length, goals.filter((to) => slowLoss(board, letter, to, origin) === 0).length];
}

/** What the enemy gains more on each own man, kings apart, with the man on `from` off the board: pawns by square. */
export function slowDuties(board: Letters, from: number): Map<number, number> {
  const white = isWhite(board[from] ?? '');
  const duties = new Map<number, number>();
  for (const square of squaresOf(board, white)) {
    const letter = board[square] ?? '';
    if (square === from || letter.toLowerCase() === 'k') continue;
    const now = Math.max(0, slowExchange(board, !white, square) ?? 0);
    const loses = slowLoss(board, letter, square, from) - now;
    if (loses > 0) duties.set(square, loses);
  }
  return duties;
}

/** Squares to which the king of the side can step: no own man, no enemy king, and no enemy attack once it has gone there. */
export function slowFlights(board: Letters, white: boolean): number[] {
  const king = board.indexOf(white ? 'K' : 'k');
  return [...board.keys()].filter((to) => {
    const occupant = board[to] ?? '';
    if (king < 0 || !attacks(board, king, to)) return false;
    if (occupant && (isWhite(occupant) === white || occupant.toLowerCase() === 'k')) return false;
    return checkers(moved(board, king, to), white).length === 0;
  });
}

/** Flights off the back rank of a king that stands on it. */
export function slowLuft(board: Letters, white: boolean): number[] {
  const king = board.indexOf(white ? 'K' : 'k');
  if (rankOf(king) !== (white ? 0 : 7)) return [];
  return slowFlights(board, white).filter((to) => rankOf(to) !== rankOf(king));
}
