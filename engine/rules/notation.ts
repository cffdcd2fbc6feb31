/**
 * The one door to the library that knows SAN (chess.js), and the replay of games through it. Imported by itself and
 * late, because of its weight in the browser; what comes out is our own moves and positions.
 */
import { Chess, type PieceSymbol } from 'chess.js';
import { type Fault, fault, formatFen, parseFen, type Position, squareName } from '../board';
import { fail, ok, type Result } from '../result';
import type { Kind } from '../types';
import { legalMoves, play } from './legal';
import { mainLine } from './main-line';
import type { Move } from './move';

/** Longest PGN text that is read here, in characters: one annotated game, not a database. */
export const PGN_LENGTH_MAX = 200_000;

const START = 'rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1';

const LETTERS: Readonly<Record<Kind, PieceSymbol>> = {
  pawn: 'p',
  knight: 'n',
  bishop: 'b',
  rook: 'r',
  queen: 'q',
  king: 'k',
};

/** A game's main line, replayed by legal moves. */
export interface ReplayedGame {
  readonly start: Position;
  readonly moves: readonly Move[];
  /** SAN of each move, as the standard writes it, however the text did. */
  readonly sans: readonly string[];
  /** The position after each move. */
  readonly positions: readonly Position[];
}

/** SAN of a legal move of a legal position. Throws on others: the caller took the move from `legalMoves`. */
export function toSan(position: Position, { from, to, promotion }: Move): string {
  const asked = { from: squareName(from), to: squareName(to) };
  const chess = new Chess(formatFen(position));
  return chess.move(promotion === null ? asked : { ...asked, promotion: LETTERS[promotion] }).san;
}

/**
 * The legal move that a text names in a legal position; refused where it names none. Forgiven: a missing or needless
 * check sign, too exact a start, castling with zeros, squares alone as in "e2e4".
 */
export function fromSan(position: Position, text: string): Result<Move, Fault> {
  const found = findMove(new Chess(formatFen(position)), position, text);
  return found ? ok(found.move) : fail(fault('text', 'illegal-move', `${quoted(text)} is no legal move here.`));
}

/** Replays the main line of the first game of a PGN text. The first move that is not legal is named in the fault. */
export function replayPgn(text: string): Result<ReplayedGame, Fault> {
  if (text.length > PGN_LENGTH_MAX) {
    return fail(
      fault('text', 'text-too-long', `The game has ${text.length} characters; up to ${PGN_LENGTH_MAX} are read.`),
    );
  }
  if (text.trim() === '') return fail(fault('text', 'empty', 'There is no game in an empty text.'));
  const line = mainLine(text);
  const admitted = parseFen(line.fen ?? START);
  if (!admitted.ok) return fail(admitted.fault[0]);
  const start = admitted.value.position;

  const chess = new Chess(formatFen(start));
  const moves: Move[] = [];
  const sans: string[] = [];
  const positions: Position[] = [];
  let at = start;
  for (const written of line.moves) {
    const found = findMove(chess, at, written);
    if (!found) {
      const who = at.sideToMove === 'white' ? 'White' : 'Black';
      const message = `${quoted(written)} is no legal move for ${who} at move ${at.fullmove}.`;
      return fail(fault('text', 'illegal-move', message));
    }
    at = play(at, found.move);
    moves.push(found.move);
    sans.push(found.san);
    positions.push(at);
  }
  return ok({ start, moves, sans, positions });
}

/** Plays a text on the library's board, which stands in the same position, and finds our move for it. */
function findMove(chess: Chess, position: Position, text: string): { move: Move; san: string } | undefined {
  try {
    const made = chess.move(text);
    const move = legalMoves(position).find(
      ({ from, to, promotion }) =>
        squareName(from) === made.from &&
        squareName(to) === made.to &&
        (promotion === null ? undefined : LETTERS[promotion]) === made.promotion,
    );
    return move && { move, san: made.san };
  } catch {
    // The library throws on what it cannot read or play: the caller says so in a sentence of ours.
    return undefined;
  }
}

function quoted(text: string): string {
  return `"${text.length > 20 ? `${text.slice(0, 20)}…` : text}"`;
}
