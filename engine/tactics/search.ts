/**
 * The small exact search: captures, promotions, checks and the answers to them, counting material alone.
 *
 * A side not in check may stop at any ply and keep what it has; in check it must find an answer. Quiet checks are
 * tried only by the side that began and only on its first plies (`checkPlies`). Within that the answer is
 * exact; when the nodes run out it says so. Figures are pawns by the trade's common table.
 */
import { worthOf } from '../exchange';
import { isInCheck, isStruck, kings, lastTaken, men, play, type PlayedMove, setUp, takeBack } from './desk';
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
}

/** What a search found. */
export interface Found {
  /** Pawns that the side to move gains, 0 where it does best to leave everything alone; negative only when in check. */
  readonly gains: number;
  /** The moves by which it does. */
  readonly line: readonly PlayedMove[];
  /** False where the nodes ran out: then the figure is only what was seen. */
  readonly complete: boolean;
  readonly nodes: number;
}

const lines = new Int32Array(PLIES_MAX * PLIES_MAX);
const lineEnds = new Uint8Array(PLIES_MAX);
const run = { nodes: 0, nodesMax: 0, checkPlies: 0, gaveUp: false };

/** Searches a board with the side (0 White, 1 Black) to move; `passedOver` is the en-passant square, -1 for none. */
export function searchGain(
  board: Readonly<Uint8Array>,
  side: number,
  { nodesMax, checkPlies }: Bounds,
  passedOver = -1,
): Found {
  setUp(board, passedOver);
  run.nodes = 0;
  run.nodesMax = nodesMax;
  run.checkPlies = checkPlies;
  run.gaveUp = false;
  const gains = best(side, -MATE - 1, MATE + 1, 0);
  return { gains, line: Array.from(lines.subarray(0, lineEnds[0])), complete: !run.gaveUp, nodes: run.nodes };
}

/** Gain of the side to move within the window, in pawns beyond what stands. */
function best(side: number, alphaGiven: number, beta: number, ply: number): number {
  let alpha = alphaGiven;
  lineEnds[ply] = 0;
  run.nodes++;
  const checked = isInCheck(side);
  let found = checked ? -MATE : 0;
  if (found >= beta) return found;
  if (run.nodes > run.nodesMax || ply >= PLIES_MAX - 1) {
    run.gaveUp = true;
    return checked ? alpha : 0;
  }
  if (found > alpha) alpha = found;
  const withChecks = !checked && (ply & 1) === 0 && ply >> 1 < run.checkPlies;
  const begin = ply * ROW;
  const end = listMoves(side, begin, checked || withChecks);
  order(begin, end);
  for (let at = begin; at < end; at++) {
    const move = stack[at]! & 0xffff;
    play(move);
    const prize = prizeOf(move);
    if (isLeftInCheck(side)) {
      takeBack(move);
      continue;
    }
    const gives = isInCheck(side ^ 1);
    // A quiet move that gives no check is looked at only as an answer to one. A capture that gives no check can
    // bring no more than what it takes, for the other side may stop there.
    if (!gives && ((prize === 0 && !checked) || prize <= alpha)) {
      takeBack(move);
      if (checked && prize > found) found = Math.min(prize, alpha);
      continue;
    }
    const value = prize - best(side ^ 1, prize - beta, prize - alpha, ply + 1);
    takeBack(move);
    if (value > found) found = value;
    if (value > alpha) {
      alpha = value;
      keepLine(move, ply);
      if (alpha >= beta) break;
    }
  }
  return found;
}

/** What the move just played has won: the man taken, and what a promotion adds. */
function prizeOf(move: PlayedMove): number {
  const promoted = (move >> 12) & 7;
  return worthOf(lastTaken()) + (promoted === 0 ? 0 : worthOf(promoted) - 1);
}

function isLeftInCheck(side: number): boolean {
  const king = kings[side]!;
  return king >= 0 && isStruck(king, side ^ 1);
}

function keepLine(move: PlayedMove, ply: number): void {
  const row = ply * PLIES_MAX;
  lines[row] = move;
  const rest = lineEnds[ply + 1]!;
  for (let at = 0; at < rest; at++) lines[row + 1 + at] = lines[row + PLIES_MAX + at]!;
  lineEnds[ply] = rest + 1;
}

/** Puts the dearest prizes first, of equal ones the cheapest taker; the rank stands above the move's sixteen bits. */
function order(begin: number, end: number): void {
  for (let at = begin; at < end; at++) {
    const move = stack[at]!;
    const prize = worthOf(men[(move >> 6) & 63]!) + ((move >> 12) & 7 ? worthOf((move >> 12) & 7) : 0);
    const rank = prize === 0 ? 0 : prize * 8 + 7 - (men[move & 63]! & 7);
    stack[at] = move | (rank << 16);
  }
  for (let at = begin + 1; at < end; at++) {
    const move = stack[at]!;
    let to = at;
    for (; to > begin && stack[to - 1]! >> 16 < move >> 16; to--) stack[to] = stack[to - 1]!;
    stack[to] = move;
  }
}
