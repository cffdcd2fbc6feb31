/** Positions whose best or played quiet piece move is known: the two published shapes of file, read to one. */
import { readFileSync } from 'node:fs';
import { parseFen, type Position } from '@/engine';

export interface JudgedPosition {
  readonly position: Position;
  /** The best move, several where they are equal, or the move that was played: from and to, "g1f3". */
  readonly best: readonly string[];
  /** Said of test positions only; for the report, never for the ranking. */
  readonly theme: string | null;
  /** Letter of the man of the best move: n, b, r or q. */
  readonly man: string;
}

interface Row {
  readonly fen: string;
  readonly best?: readonly string[];
  readonly played?: string;
  readonly theme?: string;
}

/** Reads a JSON array (`best`, `theme`) or one object a line (`played`). Throws on a position that is refused. */
export function judgedPositions(file: string): JudgedPosition[] {
  const text = readFileSync(file, 'utf8').trim();
  const rows: Row[] = text.startsWith('[') ? JSON.parse(text) : text.split('\n').map((line) => JSON.parse(line) as Row);
  return rows.map((row) => {
    const admitted = parseFen(row.fen);
    if (!admitted.ok) throw new Error(`${row.fen}: ${admitted.fault[0].message}`);
    const { position } = admitted.value;
    const best = row.best ?? (row.played === undefined ? [] : [row.played]);
    const from = best[0] ?? 'a1';
    const square = from.charCodeAt(0) - 97 + 8 * (Number(from[1]) - 1);
    const man = ' pnbrqk'[(position.board[square] ?? 0) & 7] ?? ' ';
    return { position, best, theme: row.theme ?? null, man };
  });
}
