/** SAN of moves on 'what if' boards, from our own legal moves: small enough for the first page. */
import { type Position, squareName, withMen, manOn } from '../board';
import { isInCheck, legalMoves, type Move, play } from '../rules';
import type { LineMove } from '../tactics';
import { KINDS, type Kind, opponent, type Side, type Square } from '../types';

const LETTERS: Readonly<Record<Kind, string>> = {
  pawn: '',
  knight: 'N',
  bishop: 'B',
  rook: 'R',
  queen: 'Q',
  king: 'K',
};

/** SAN of a legal move (castling apart: no route, preparation or line of the guard castles). */
export function nameOfMove(position: Position, move: Move): string {
  const after = play(position, move);
  const enemy = opponent(position.sideToMove);
  const check = isInCheck(after, enemy) ? (legalMoves(after).length === 0 ? '#' : '+') : '';
  const takes = move.captured === null ? '' : 'x';
  const promoted = move.promotion === null ? '' : `=${LETTERS[move.promotion]}`;
  const start = move.kind === 'pawn' ? (takes ? squareName(move.from).charAt(0) : '') : pieceStart(position, move);
  return `${start}${takes}${squareName(move.to)}${promoted}${check}`;
}

/** The letter, with file, rank or both where another man of the kind could go there, too. */
function pieceStart(position: Position, { kind, from, to }: Move): string {
  const others = legalMoves(position).filter((each) => each.kind === kind && each.to === to && each.from !== from);
  const name = squareName(from);
  if (others.length === 0) return LETTERS[kind];
  if (others.every((each) => (each.from & 7) !== (from & 7))) return LETTERS[kind] + name.charAt(0);
  if (others.every((each) => each.from >> 3 !== from >> 3)) return LETTERS[kind] + name.charAt(1);
  return LETTERS[kind] + name;
}

/** SAN of a quiet move of the side's man, whosever move it is; its squares where the rules know no such move. */
export function nameOfStep(position: Position, side: Side, from: Square, to: Square): string {
  const asked = withTurn(position, side);
  const move = legalMoves(asked).find((each) => each.from === from && each.to === to);
  return move ? nameOfMove(asked, move) : squareName(from) + squareName(to);
}

/** SAN of a line played from a position in which the man of `from` stands on `stop` and the enemy is to move. */
export function nameLine(position: Position, from: Square, stop: Square, line: readonly LineMove[]): string[] {
  const man = manOn(position, from);
  if (!man) return [];
  const start = withMen(position, [
    { square: from, man: null },
    { square: stop, man },
  ]);
  let at = withTurn(start, opponent(man.side));
  const names: string[] = [];
  for (const { from: begin, to, promoted } of line) {
    const promotion = promoted === 0 ? null : (KINDS[promoted - 1] ?? null);
    const move = legalMoves(at).find((each) => each.from === begin && each.to === to && each.promotion === promotion);
    if (!move) break;
    names.push(nameOfMove(at, move));
    at = play(at, move);
  }
  return names;
}

/** The same board with the side to move; the en-passant square goes where the turn changes. */
function withTurn(position: Position, side: Side): Position {
  return position.sideToMove === side ? position : { ...position, sideToMove: side, enPassant: null };
}
