/**
 * Slow twins of engine/pawns: the same definitions once more, in plain loops over square names and steps, with no masks
 * and no table of the engine's.
 */
import type { Position } from '@/engine/board';
import { SQUARES, squareName, step } from '@/engine/board';
import type { Side, Square } from '@/engine/types';

/** The pawns of a side, from the mailbox. */
export function slowPawns(position: Position, side: Side): Square[] {
  return SQUARES.filter((square) => position.board[square] === (side === 'white' ? 1 : 9));
}

const other = (side: Side): Side => (side === 'white' ? 'black' : 'white');
const fileOf = (square: Square) => squareName(square).charCodeAt(0);
/** Rank as the side counts it, 1 to 8. */
const rankFor = (side: Side, square: Square) =>
  side === 'white' ? Number(squareName(square)[1]) : 9 - Number(squareName(square)[1]);
const beside = (a: Square, b: Square) => Math.abs(fileOf(a) - fileOf(b)) === 1;
const sameFile = (a: Square, b: Square) => fileOf(a) === fileOf(b);
const forward = (side: Side, square: Square, files: number, ranks: number) =>
  step(square, files, side === 'white' ? ranks : -ranks);

/** Whether a pawn of the side attacks the square now. */
export function slowAttacked(position: Position, side: Side, square: Square): boolean {
  return slowPawns(position, side).some(
    (pawn) => forward(side, pawn, -1, 1) === square || forward(side, pawn, 1, 1) === square,
  );
}

/** The claims about one pawn, by the definitions of the handbooks as engine/pawns states them. */
export function slowPawn(position: Position, side: Side, pawn: Square) {
  const own = slowPawns(position, side).filter((one) => one !== pawn);
  const enemy = slowPawns(position, other(side));
  const rank = rankFor(side, pawn);
  const ahead = (one: Square) => rankFor(side, one) > rank;
  const neighbours = own.filter((one) => beside(one, pawn));
  const stop = forward(side, pawn, 0, 1) ?? null;

  const passed = !enemy.some((one) => ahead(one) && (sameFile(one, pawn) || beside(one, pawn)));
  const guarded = slowAttacked(position, side, pawn);
  const guards = own.some((one) => forward(side, pawn, 1, 1) === one || forward(side, pawn, -1, 1) === one);
  const helpers = neighbours.filter((one) => !ahead(one)).length;
  const sentries = enemy.filter((one) => beside(one, pawn) && ahead(one)).length;
  const freeAhead = ![...own, ...enemy].some((one) => sameFile(one, pawn) && ahead(one));
  return {
    square: pawn,
    side,
    isolated: neighbours.length === 0,
    doubled: own.some((one) => sameFile(one, pawn)),
    backward: neighbours.length > 0 && neighbours.every(ahead) && wayAttacked(position, side, pawn, neighbours),
    stopAttacked: stop !== null && slowAttacked(position, other(side), stop),
    halfOpen: !enemy.some((one) => sameFile(one, pawn)),
    passed,
    protectedPassed: passed && guarded,
    candidate: !passed && freeAhead && helpers >= sentries,
    rammed: stop !== null && enemy.includes(stop),
    stop,
    blockedBy: stop !== null && position.board[stop] !== 0 ? stop : null,
    guarded,
    fixed: (stop === null || position.board[stop] !== 0) && !slowCaptures(position, side, pawn),
    chain: guarded && guards ? 'link' : guarded ? 'head' : guards ? 'base' : null,
  };
}

function wayAttacked(position: Position, side: Side, pawn: Square, neighbours: Square[]): boolean {
  const level = Math.min(...neighbours.map((one) => rankFor(side, one)));
  return SQUARES.some((square) => {
    const onTheWay =
      sameFile(square, pawn) && rankFor(side, square) > rankFor(side, pawn) && rankFor(side, square) <= level;
    return onTheWay && slowAttacked(position, other(side), square);
  });
}

function slowCaptures(position: Position, side: Side, pawn: Square): boolean {
  return [-1, 1].some((files) => {
    const target = forward(side, pawn, files, 1);
    if (target === undefined) return false;
    if (target === position.enPassant) return side === position.sideToMove;
    const code = position.board[target] ?? 0;
    const isEnemy = code !== 0 && code > 8 !== (side === 'black');
    return isEnemy && code !== 6 && code !== 14;
  });
}

/** The levers of one pawn within three moves: it is walked forward move by move. */
export function slowLevers(position: Position, side: Side, pawn: Square) {
  const all = [...slowPawns(position, 'white'), ...slowPawns(position, 'black')];
  const enemy = slowPawns(position, other(side));
  const found: { from: Square; on: Square; against: Square; moves: number; supported: boolean; side: Side }[] = [];
  const lookFrom = (on: Square, moves: number) => {
    for (const files of [-1, 1]) {
      const against = forward(side, on, files, 1);
      if (against === undefined || !enemy.includes(against)) continue;
      found.push({ side, from: pawn, on, against, moves, supported: slowAttacked(position, side, on) });
    }
  };
  lookFrom(pawn, 0);
  for (let steps = 1; steps <= 7; steps++) {
    const on = forward(side, pawn, 0, steps);
    if (on === undefined || all.includes(on)) break;
    const moves = rankFor(side, pawn) === 2 && steps > 1 ? steps - 1 : steps;
    if (moves <= 3) lookFrom(on, moves);
  }
  return found;
}

/** How a square is held against the pawns of a side, and the fewest pawn moves until one attacks it. */
export function slowReach(position: Position, side: Side, square: Square) {
  const own = slowPawns(position, side);
  const enemy = slowPawns(position, other(side));
  const landing = rankFor(side, square) - 1;
  const candidates = own.filter((pawn) => beside(pawn, square) && rankFor(side, pawn) <= landing);
  const attackedNow = candidates.filter((pawn) => rankFor(side, pawn) === landing);
  const free = candidates.filter((pawn) => {
    for (let rank = rankFor(side, pawn) + 1; rank <= landing; rank++) {
      const on = forward(side, pawn, 0, rank - rankFor(side, pawn));
      if (on === undefined || enemy.includes(on)) return false;
      if (slowAttacked(position, other(side), on) && !slowAttacked(position, side, on)) return false;
    }
    return true;
  });
  const moves = free.map((pawn) => {
    const steps = landing - rankFor(side, pawn);
    return rankFor(side, pawn) === 2 && steps > 1 ? steps - 1 : steps;
  });
  const hold =
    attackedNow.length > 0 ? 'attacked' : candidates.length === 0 ? 'permanent' : free.length === 0 ? 'fixed' : 'open';
  return { hold, attackedNow, moves: moves.length > 0 ? Math.min(...moves) : null };
}
