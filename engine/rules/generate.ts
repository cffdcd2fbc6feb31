/** Pseudo-legal moves of a scratch board, packed; legality is asked by making the move. */
import {
  BISHOP,
  DIRECTION_TO,
  EDGES,
  KING,
  KING_STEPS,
  KNIGHT,
  KNIGHT_LEAPS,
  LEAP_ROW,
  PAWN,
  PAWN_STRIKES,
  QUEEN,
  ROOK,
  STRIDES,
  STRIKE_ROW,
} from '../board';
import {
  attacks,
  CASTLE_KING,
  CASTLE_QUEEN,
  DOUBLE,
  inCheck,
  make,
  MOVES_MAX,
  newUndo,
  PASSING,
  type ScratchBoard,
  type Undo,
  unmake,
} from './scratch-board';

/** Writes the pseudo-legal moves of the side to move from `start` on; returns the end. */
export function pseudoMoves(board: ScratchBoard, into: Int32Array, start: number): number {
  const { men, side } = board;
  let end = start;
  for (let from = 0; from < 64; from++) {
    const man = men[from]!;
    if (man === 0 || man >> 3 !== side) continue;
    const kind = man & 7;
    if (kind === PAWN) end = pawnMoves(board, from, into, end);
    else if (kind === KNIGHT || kind === KING) {
      const table = kind === KNIGHT ? KNIGHT_LEAPS : KING_STEPS;
      for (let at = from * LEAP_ROW, to = table[at]!; to >= 0; to = table[++at]!) {
        if (men[to] === 0 || men[to]! >> 3 !== side) into[end++] = from | (to << 6);
      }
      if (kind === KING) end = castling(board, from, into, end);
    } else {
      for (let direction = kind === BISHOP ? 4 : 0; direction < (kind === ROOK ? 4 : 8); direction++) {
        const edge = EDGES[(from << 3) | direction]!;
        for (let to = from; to !== edge; ) {
          to += STRIDES[direction]!;
          if (men[to] !== 0 && men[to]! >> 3 === side) break;
          into[end++] = from | (to << 6);
          if (men[to] !== 0) break;
        }
      }
    }
  }
  return end;
}

function pawnMoves({ men, side, passing }: ScratchBoard, from: number, into: Int32Array, start: number): number {
  let end = start;
  const stride = side === 0 ? 8 : -8;
  const rank = from >> 3;
  const lastBut = side === 0 ? 6 : 1;
  const home = side === 0 ? 1 : 6;
  const next = from + stride;
  if (next < 0 || next > 63) return end;
  if (men[next] === 0) {
    end = advance(from, next, rank === lastBut, into, end);
    if (rank === home && men[next + stride] === 0) into[end++] = from | ((next + stride) << 6) | (DOUBLE << 16);
  }
  const row = ((side << 6) | from) * STRIKE_ROW;
  for (let at = row, to = PAWN_STRIKES[at]!; to >= 0; to = PAWN_STRIKES[++at]!) {
    if (men[to] !== 0 && men[to]! >> 3 !== side) end = advance(from, to, rank === lastBut, into, end);
    else if (to === passing && men[to] === 0) into[end++] = from | (to << 6) | (PASSING << 16);
  }
  return end;
}

function advance(from: number, to: number, promotes: boolean, into: Int32Array, start: number): number {
  let end = start;
  if (!promotes) {
    into[end++] = from | (to << 6);
    return end;
  }
  for (let place = QUEEN; place >= KNIGHT; place--) into[end++] = from | (to << 6) | (place << 12);
  return end;
}

function castling(board: ScratchBoard, from: number, into: Int32Array, start: number): number {
  const { men, side, rights } = board;
  let end = start;
  const home = side === 0 ? 4 : 60;
  if (from !== home || (rights & (side === 0 ? 3 : 12)) === 0 || attacks(board, side ^ 1, from)) return end;
  if (
    rights & (side === 0 ? 1 : 4) &&
    men[from + 1] === 0 &&
    men[from + 2] === 0 &&
    !attacks(board, side ^ 1, from + 1)
  ) {
    into[end++] = from | ((from + 2) << 6) | (CASTLE_KING << 16);
  }
  if (
    rights & (side === 0 ? 2 : 8) &&
    men[from - 1] === 0 &&
    men[from - 2] === 0 &&
    men[from - 3] === 0 &&
    !attacks(board, side ^ 1, from - 1)
  ) {
    into[end++] = from | ((from - 2) << 6) | (CASTLE_QUEEN << 16);
  }
  return end;
}

/**
 * Whether a pseudo-legal move is legal. A man that does not stand in one line with its king uncovers nothing, so that
 * out of check only moves of the king, of men in line with it and captures in passing have to be tried out.
 */
export function isLegal(board: ScratchBoard, move: number, checked: boolean, undo: Undo): boolean {
  const { side, men } = board;
  const from = move & 63;
  if ((men[(move >> 6) & 63]! & 7) === KING) return false;
  const king = board.kings[side]!;
  if (king < 0) return true;
  const special = (move >> 16) & 7;
  if (!checked && from !== king && special !== PASSING && DIRECTION_TO[(king << 6) | from]! < 0) return true;
  make(board, move, undo);
  const legal = !inCheck(board, side);
  unmake(board, move, undo);
  return legal;
}

/** Deepest count of `countMoves`, in plies. */
const DEPTH_MAX = 16;

/** Room for the moves of one depth after another, so that counting needs no lists of its own. */
class MoveStack {
  readonly moves = new Int32Array(MOVES_MAX * DEPTH_MAX);
  readonly undo = Array.from({ length: DEPTH_MAX }, newUndo);
}

/** Number of legal move sequences of that depth (perft, the usual check of move generators), 16 plies at most. */
export function countMoves(board: ScratchBoard, depth: number, stack = new MoveStack(), start = 0): number {
  if (depth <= 0) return 1;
  const end = pseudoMoves(board, stack.moves, start);
  const undo = stack.undo[depth - 1]!;
  const checked = inCheck(board, board.side);
  let count = 0;
  for (let at = start; at < end; at++) {
    const move = stack.moves[at]!;
    if (!isLegal(board, move, checked, undo)) continue;
    if (depth === 1) {
      count++;
      continue;
    }
    make(board, move, undo);
    count += countMoves(board, depth - 1, stack, end);
    unmake(board, move, undo);
  }
  return count;
}
