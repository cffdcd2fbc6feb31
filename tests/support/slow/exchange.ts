/**
 * The exchange by plain search on a board of letters: a slow twin that shares no code with the engine.
 * Squares are 0 (a1) to 63 (h8); the board is an array of FEN letters, '' for an empty square.
 */
type Letters = readonly string[];

const worth: Record<string, number> = { p: 1, n: 3, b: 3, r: 5, q: 9, k: 0 };
const isWhite = (letter: string): boolean => letter === letter.toUpperCase();

function onBoard(file: number, rank: number): boolean {
  return file >= 0 && file < 8 && rank >= 0 && rank < 8;
}

/** First man met from a square in a direction: its square, or -1. */
function meet(board: Letters, from: number, files: number, ranks: number): number {
  let file = (from % 8) + files;
  let rank = Math.floor(from / 8) + ranks;
  while (onBoard(file, rank)) {
    if (board[rank * 8 + file]) return rank * 8 + file;
    file += files;
    rank += ranks;
  }
  return -1;
}

/** Whether the man on `from` attacks `to` (Laws of Chess, article 3). */
export function attacks(board: Letters, from: number, to: number): boolean {
  const letter = board[from] ?? '';
  if (!letter || from === to) return false;
  const files = (to % 8) - (from % 8);
  const ranks = Math.floor(to / 8) - Math.floor(from / 8);
  const kind = letter.toLowerCase();
  if (kind === 'n') return Math.abs(files * ranks) === 2;
  if (kind === 'k') return Math.max(Math.abs(files), Math.abs(ranks)) === 1;
  if (kind === 'p') return Math.abs(files) === 1 && ranks === (isWhite(letter) ? 1 : -1);
  const straight = files === 0 || ranks === 0;
  const slanting = Math.abs(files) === Math.abs(ranks);
  if (!(straight && kind !== 'b') && !(slanting && kind !== 'r')) return false;
  const stepFile = Math.sign(files);
  const stepRank = Math.sign(ranks);
  for (let i = 1; i < Math.max(Math.abs(files), Math.abs(ranks)); i++) {
    if (board[from + i * (stepFile + 8 * stepRank)]) return false;
  }
  return true;
}

function attackersBy(board: Letters, white: boolean, to: number): number[] {
  return [...board.keys()].filter((from) => board[from] && isWhite(board[from]) === white && attacks(board, from, to));
}

function moved(board: Letters, from: number, to: number): string[] {
  const next = [...board];
  next[to] = next[from] ?? '';
  next[from] = '';
  return next;
}

/** Whether leaving `from` for `to` lays the mover's king open to a slider along the line through `from`. */
function exposes(board: Letters, from: number, to: number): boolean {
  const white = isWhite(board[from] ?? '');
  const king = board.indexOf(white ? 'K' : 'k');
  if (king < 0 || king === from || king === to) return false;
  const files = (from % 8) - (king % 8);
  const ranks = Math.floor(from / 8) - Math.floor(king / 8);
  if (files !== 0 && ranks !== 0 && Math.abs(files) !== Math.abs(ranks)) return false;
  if (meet(board, king, Math.sign(files), Math.sign(ranks)) !== from) return false;
  const after = moved(board, from, to);
  const met = meet(after, king, Math.sign(files), Math.sign(ranks));
  if (met < 0 || met === to || !after[met] || isWhite(after[met]) === white) return false;
  const kind = after[met].toLowerCase();
  return kind === 'q' || kind === (files === 0 || ranks === 0 ? 'r' : 'b');
}

/** Best gain of the side when it must capture on the square once; null where it cannot. */
export function slowExchange(board: Letters, white: boolean, to: number): number | null {
  const prize = board[to] ?? '';
  if (!prize || isWhite(prize) === white || prize.toLowerCase() === 'k') return null;
  const able = attackersBy(board, white, to).filter((from) => {
    if (board[from]?.toLowerCase() === 'k') return attackersBy(moved(board, from, to), !white, to).length === 0;
    return !exposes(board, from, to);
  });
  const men = able.filter((from) => board[from]?.toLowerCase() !== 'k');
  const pool = men.length > 0 ? men : able;
  if (pool.length === 0) return null;
  const price = Math.min(...pool.map((from) => worth[board[from]?.toLowerCase() ?? ''] ?? 0));
  const gains = pool
    .filter((from) => worth[board[from]?.toLowerCase() ?? ''] === price)
    .map((from) => {
      const gain = worth[prize.toLowerCase()] ?? 0;
      if (board[from]?.toLowerCase() === 'k') return gain;
      return gain - Math.max(0, slowExchange(moved(board, from, to), !white, to) ?? 0);
    });
  return Math.max(...gains);
}

/** Loss when a man (a FEN letter) is put on the square, taken off `origin` unless that is -1. */
export function slowLoss(board: Letters, letter: string, to: number, origin: number): number {
  const after = [...board];
  if (origin >= 0) after[origin] = '';
  after[to] = letter;
  const enemy = !isWhite(letter);
  if (letter.toLowerCase() === 'k') return attackersBy(after, enemy, to).length > 0 ? Number.POSITIVE_INFINITY : 0;
  return Math.max(0, slowExchange(after, enemy, to) ?? 0);
}

/** The board of a FEN as 64 letters, a1 first. */
export function lettersOf(fen: string): string[] {
  const ranks = (fen.split(' ')[0] ?? '').split('/').reverse();
  return ranks.flatMap((rank) => [...rank].flatMap((c) => (/\d/.test(c) ? Array<string>(Number(c)).fill('') : [c])));
}

/** The engine's mailbox of letters, by the codes that `engine/board/position.ts` describes. */
export function codesOf(letters: readonly string[]): Uint8Array {
  return Uint8Array.from(letters, (letter) => Math.max(0, ' PNBRQK  pnbrqk'.indexOf(letter || ' ')));
}
