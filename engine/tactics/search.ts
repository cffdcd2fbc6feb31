/**
 * The small exact search: captures, promotions, checks and the answers to them, counting material alone.
 *
 * A side not in check may stop at any ply and keep what it has; in check it must find an answer. Quiet checks are
 * tried only by the side that began and only on its first plies (`checkPlies`). On the first `quietPlies` plies
 * every move is tried, so that a threat made by a quiet move is seen; there a side that would lose nothing by
 * passing is not asked for more than that. Within these bounds the answer is exact; when the nodes run out it
 * says so. Figures are pawns by the trade's common table.
 */
import { DIRECTION_TO, KNIGHT } from '../board';
import { worthOf } from '../exchange';
import { IN_PASSING, isInCheck, isStruck, kings, lastTaken, men, play, type PlayedMove, setUp, takeBack } from './desk';
import { listMoves, stack } from './moves';

/** Stands for mate in figures of material; more than all men of a side are worth. */
export const MATE = 200;

/** Plies looked at, at the most. */
const PLIES_MAX = 40;
const ROW = 256;

/** A search's bounds. */
export interface Bounds {
  /** Positions looked at, at the most. */
  readonly nodesMax: number;
  /** Plies of the side that begins on which it may give quiet checks. */
  readonly checkPlies: number;
  /** Plies on which all moves are tried; none unless said. */
  readonly quietPlies?: number;
  /** Gains and losses beyond this are not told apart; MATE unless said. */
  readonly gainsMax?: number;
}

/** What a search found. */
export interface Found {
  /** Pawns that the side to move gains; negative where it loses whatever it does (in check, or with all moves tried). */
  readonly gains: number;
  /** The moves by which it does. */
  readonly line: readonly PlayedMove[];
  /** False where the nodes ran out: then the figure is only what was seen. */
  readonly complete: boolean;
  readonly nodes: number;
}

const lines = new Int32Array(PLIES_MAX * PLIES_MAX);
const lineEnds = new Uint8Array(PLIES_MAX);
/** The last two quiet moves that refuted something on a ply: tried early, for they often do so again. */
const refuters = new Int32Array(PLIES_MAX * 2);
const run = { nodes: 0, nodesMax: 0, checkPlies: 0, gaveUp: false };

/**
 * Searches a board with the side (0 White, 1 Black) to move; `passedOver` is the en-passant square, -1 for none. With
 * Black to move the board is turned first, so that nothing, not even where the nodes run out, hangs on the colour.
 */
export function searchGain(board: Readonly<Uint8Array>, side: number, bounds: Bounds, passedOver = -1): Found {
  const flip = side === 0 ? 0 : 56;
  setUp(side === 0 ? board : turned(board), passedOver < 0 ? -1 : passedOver ^ flip);
  run.nodes = 0;
  run.nodesMax = bounds.nodesMax;
  run.checkPlies = bounds.checkPlies;
  run.gaveUp = false;
  refuters.fill(0);
  const window = bounds.gainsMax ?? MATE;
  const value = best(0, isInCheck(0), -window, window, bounds.quietPlies ?? 0, 0);
  const gains = Math.max(-window, Math.min(window, value));
  const line = Array.from(lines.subarray(0, lineEnds[0]), (move) => move ^ (flip | (flip << 6)));
  return { gains, line, complete: !run.gaveUp, nodes: run.nodes };
}

const turnedBoard = new Uint8Array(64);

/** The board with colours swapped and turned over its middle; holds until the next call. */
function turned(board: Readonly<Uint8Array>): Uint8Array {
  for (let square = 0; square < 64; square++) {
    const code = board[square ^ 56]!;
    turnedBoard[square] = code === 0 ? 0 : code ^ 8;
  }
  return turnedBoard;
}

/** Gain of the side to move within the window, in pawns beyond what stands; `quiet` plies from here try every move. */
function best(side: number, checked: boolean, alphaGiven: number, beta: number, quiet: number, ply: number): number {
  let alpha = alphaGiven;
  lineEnds[ply] = 0;
  run.nodes++;
  // With one quiet ply left, a quiet move can only parry; a side that is not behind has nothing to parry.
  const every = checked || quiet > 1 || (quiet === 1 && alpha < 0);
  let found = every ? -MATE : 0;
  if (found >= beta) return found;
  if (run.nodes > run.nodesMax || ply >= PLIES_MAX - 1) {
    run.gaveUp = true;
    return every ? alpha : 0;
  }
  if (found > alpha) alpha = found;
  if (quiet > 0 && !checked && ply > 0 && beta <= 0 && isFineWithPassing(side, beta, quiet, ply)) return beta;
  const begin = ply * ROW;
  const withChecks = !every && (ply & 1) === 0 && ply >> 1 < run.checkPlies;
  const end = listMoves(side, begin, every || withChecks);
  order(begin, end, ply);
  let legal = false;
  for (let at = begin; at < end; at++) {
    const move = stack[at]! & 0xffff;
    play(move);
    const prize = prizeOf(move);
    if (isLeftInCheck(side, move, checked)) {
      takeBack(move);
      continue;
    }
    legal = true;
    const gives = givesCheck(side ^ 1, move);
    // A move that leaves the other side free to stop brings no more than what it takes; a quiet one that gives
    // no check is otherwise looked at only where every move is.
    if (quiet <= 1 && ((prize === 0 && !every) || prize <= alpha) && !gives) {
      takeBack(move);
      if (every && prize > found) found = Math.min(prize, alpha);
      continue;
    }
    const value = prize - best(side ^ 1, gives, prize - beta, prize - alpha, quiet > 0 ? quiet - 1 : 0, ply + 1);
    takeBack(move);
    if (value > found) found = value;
    if (value > alpha) {
      alpha = value;
      keepLine(move, ply);
      if (alpha >= beta) {
        if (prize === 0) keepRefuter(move, ply);
        break;
      }
    }
  }
  // No legal move and no check: a stalemate ends the line with what stands.
  return every && !checked && !legal ? 0 : found;
}

/** Whether the other side, moving again, still leaves this side at `beta` or better. */
function isFineWithPassing(side: number, beta: number, quiet: number, ply: number): boolean {
  return -best(side ^ 1, isInCheck(side ^ 1), -beta, 1 - beta, quiet > 2 ? quiet - 2 : 0, ply + 1) >= beta;
}

/** What the move just played has won: the man taken, and what a promotion adds. */
function prizeOf(move: PlayedMove): number {
  const promoted = (move >> 12) & 7;
  return worthOf(lastTaken()) + (promoted === 0 ? 0 : worthOf(promoted) - 1);
}

/** Whether the move just played leaves its own king in check: only a king, or a man that stood on a line with it, can. */
function isLeftInCheck(side: number, move: PlayedMove, checked: boolean): boolean {
  const king = kings[side]!;
  if (king < 0) return false;
  const mayLay = checked || move & IN_PASSING || king === ((move >> 6) & 63) || isOnLine(king, move & 63);
  return mayLay ? isStruck(king, side ^ 1) : false;
}

/** Whether the move just played gives check to the side: from its new square, or by leaving a line. */
function givesCheck(side: number, move: PlayedMove): boolean {
  const king = kings[side]!;
  if (king < 0) return false;
  const to = (move >> 6) & 63;
  const mayGive = isOnLine(king, to) || isOnLine(king, move & 63) || move & IN_PASSING || (men[to]! & 7) === KNIGHT;
  return mayGive ? isStruck(king, side ^ 1) : false;
}

function isOnLine(king: number, square: number): boolean {
  return DIRECTION_TO[(king << 6) | square]! >= 0;
}

function keepLine(move: PlayedMove, ply: number): void {
  const row = ply * PLIES_MAX;
  lines[row] = move;
  const rest = Math.min(lineEnds[ply + 1]!, PLIES_MAX - 1);
  for (let at = 0; at < rest; at++) lines[row + 1 + at] = lines[row + PLIES_MAX + at]!;
  lineEnds[ply] = rest + 1;
}

function keepRefuter(move: PlayedMove, ply: number): void {
  if (refuters[ply * 2] === move) return;
  refuters[ply * 2 + 1] = refuters[ply * 2]!;
  refuters[ply * 2] = move;
}

/**
 * Puts the dearest prizes first, of equal ones the cheapest taker, then the refuters of the ply; the rank stands above
 * the move's sixteen bits.
 */
function order(begin: number, end: number, ply: number): void {
  const first = refuters[ply * 2]!;
  const second = refuters[ply * 2 + 1]!;
  for (let at = begin; at < end; at++) {
    const move = stack[at]! & 0xffff;
    const prize = worthOf(men[(move >> 6) & 63]!) + ((move >> 12) & 7 ? worthOf((move >> 12) & 7) : 0);
    const rank = prize === 0 ? (move === first ? 2 : move === second ? 1 : 0) : prize * 8 + 7 - (men[move & 63]! & 7);
    stack[at] = move | (rank << 16);
  }
  for (let at = begin + 1; at < end; at++) {
    const move = stack[at]!;
    let to = at;
    for (; to > begin && stack[to - 1]! >> 16 < move >> 16; to--) stack[to] = stack[to - 1]!;
    stack[to] = move;
  }
}
