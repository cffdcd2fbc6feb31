/**
 * The one door to the library that knows SAN and PGN (chess.js). Imported by itself and late, because of its weight
 * in the browser; what comes out is our own positions.
 */
import { Chess } from 'chess.js';
import { type Fault, fault, formatFen, parseFen, type Position, squareNamed } from '../board';
import { fail, ok, type Result } from '../result';
import { KINDS } from '../types';
import { legalMoves } from './legal';
import type { Move } from './move';

/** Longest PGN text that is read here, in characters: one annotated game, not a database. */
export const PGN_LENGTH_MAX = 200_000;

/** A game's main line, replayed. */
export interface ReplayedGame {
  readonly start: Position;
  /** SAN of each move. */
  readonly moves: readonly string[];
  /** The position after each move. */
  readonly positions: readonly Position[];
}

const LETTERS = ['p', 'n', 'b', 'r', 'q', 'k'] as const;

/** SAN of a legal move. Throws where the move is not legal in the position: the caller made it from there. */
export function toSan(position: Position, { from, to, promotion }: Move): string {
  const chess = new Chess(formatFen(position));
  const letters = 'abcdefgh';
  const name = (square: number) => `${letters.charAt(square & 7)}${(square >> 3) + 1}`;
  return chess.move({
    from: name(from),
    to: name(to),
    ...(promotion === null ? {} : { promotion: LETTERS[KINDS.indexOf(promotion)] ?? 'q' }),
  }).san;
}

/** The legal move that a SAN text names; refused where it names none. */
export function fromSan(position: Position, text: string): Result<Move, Fault> {
  try {
    const made = new Chess(formatFen(position)).move(text);
    const promotion = made.promotion === undefined ? null : KINDS[LETTERS.indexOf(made.promotion)];
    const move = legalMoves(position).find(
      (each) =>
        each.from === squareNamed(made.from) && each.to === squareNamed(made.to) && each.promotion === promotion,
    );
    if (move) return ok(move);
  } catch {
    // The library throws on what it cannot read or play; which of the two is said in one sentence below.
  }
  return fail(fault('text', 'illegal-move', `"${text}" is no legal move here.`));
}

/** Replays the main line of the first game of a PGN text. */
export function replayPgn(text: string): Result<ReplayedGame, Fault> {
  if (text.length > PGN_LENGTH_MAX) {
    return fail(
      fault('text', 'text-too-long', `The game has ${text.length} characters; up to ${PGN_LENGTH_MAX} are read.`),
    );
  }
  const chess = new Chess();
  try {
    chess.loadPgn(text.replace(/^\uFEFF/, ''));
  } catch (error) {
    const reason = error instanceof Error ? error.message : 'it cannot be read';
    return fail(fault('text', 'pgn', `This game cannot be replayed: ${reason.replace(/\s+/g, ' ').slice(0, 160)}.`));
  }
  const history = chess.history({ verbose: true });
  const start = parseFen(history[0]?.before ?? chess.fen());
  if (!start.ok) return fail(start.fault[0]);
  const positions: Position[] = [];
  for (const { after } of history) {
    const admitted = parseFen(after);
    if (!admitted.ok) return fail(admitted.fault[0]);
    positions.push(admitted.value.position);
  }
  return ok({ start: start.value.position, moves: history.map(({ san }) => san), positions });
}
