/** Files and diagonals by plain counting on a board of FEN letters, 0 (a1) to 63 (h8): shares no code with the engine. */
import { attacks, slowLoss } from './exchange';

type Letters = readonly string[];

const isWhite = (letter: string): boolean => letter === letter.toUpperCase();
const letterOf = (letter: string, white: boolean): string => (white ? letter.toUpperCase() : letter.toLowerCase());

/** Squares of a file from the side's first rank to its eighth. */
function along(white: boolean, file: number): number[] {
  const ranks = [0, 1, 2, 3, 4, 5, 6, 7];
  return (white ? ranks : ranks.reverse()).map((rank) => rank * 8 + file);
}

const pawnsOn = (board: Letters, white: boolean, file: number): number[] =>
  along(white, file).filter((at) => board[at] === letterOf('p', white));

/** Whether a file is of use to a side: none of its own pawns stands on it. */
export function slowUsable(board: Letters, white: boolean, file: number): boolean {
  return pawnsOn(board, white, file).length === 0;
}

/** Rooks and queens of the side on the file, its first rank first. */
export function slowHeavy(board: Letters, white: boolean, file: number): number[] {
  return along(white, file).filter((at) => [letterOf('r', white), letterOf('q', white)].includes(board[at] ?? ''));
}

/** Squares of the enemy half where a rook would be safe, held by a heavy man of the file. */
export function slowHold(board: Letters, white: boolean, file: number): number {
  const heavy = slowHeavy(board, white, file);
  return along(white, file)
    .slice(4)
    .filter((to) => heavy.some((from) => from === to || attacks(board, from, to)))
    .filter((to) => slowLoss(board, letterOf('r', white), to, -1) === 0).length;
}

/** Entry squares: safe for a rook on the 7th and 8th rank, with nothing on the file before them that stops one. */
export function slowEntries(board: Letters, white: boolean, file: number): number[] {
  if (!slowUsable(board, white, file)) return [];
  const found: number[] = [];
  for (const [rank, square] of along(white, file).entries()) {
    const letter = board[square] ?? '';
    if (letter.toLowerCase() === 'p') break;
    const isEnemy = letter !== '' && isWhite(letter) !== white;
    const isKing = isEnemy && letter.toLowerCase() === 'k';
    const safe = !isKing && slowLoss(board, letterOf('r', white), square, -1) === 0;
    if (safe && rank >= 6) found.push(square);
    if (isEnemy && !safe) break;
  }
  return found;
}

/** The first enemy pawn on a file that is half-open for the side, and whether it is isolated or a pawn guards it. */
export function slowTarget(
  board: Letters,
  white: boolean,
  file: number,
): { square: number; isolated: boolean; guarded: boolean } | null {
  const [square] = pawnsOn(board, !white, file).sort((a, b) => (white ? a - b : b - a));
  if (square === undefined || !slowUsable(board, white, file)) return null;
  const isolated = [file - 1, file + 1].every(
    (next) => next < 0 || next > 7 || pawnsOn(board, !white, next).length === 0,
  );
  const pawn = letterOf('p', !white);
  const guarded = [...board.keys()].some((at) => board[at] === pawn && attacks(board, at, square));
  return { square, isolated, guarded };
}

/** Squares from a man along a step until the edge or the first man, that one included. */
export function slowLine(board: Letters, from: number, files: number, ranks: number): number[] {
  const line: number[] = [];
  let file = (from % 8) + files;
  let rank = Math.floor(from / 8) + ranks;
  while (file >= 0 && file < 8 && rank >= 0 && rank < 8) {
    line.push(rank * 8 + file);
    if (board[rank * 8 + file]) break;
    file += files;
    rank += ranks;
  }
  return line;
}
