/** Files: open or not, who controls them, where they lead in and what they aim at. */
import { type AttackMap, type SideIndex } from '../attacks';
import { fileOf, KING, manCode, PAWN, QUEEN, relativeRank, ROOK, viewOrder } from '../board';
import { isSafeHere, type Safety } from '../exchange';
import type { PawnReading, PawnValues } from '../pawns';
import type { Reach } from '../reach';
import { type BySide, bySide, opponent, type Side, type Square } from '../types';

export interface FileTaker {
  readonly rook: Square;
  readonly to: Square;
  /** Safe moves needed. */
  readonly moves: number;
}

export interface FileTarget {
  readonly square: Square;
  /** The pawn's side. */
  readonly side: Side;
  readonly isolated: boolean;
  readonly backward: boolean;
  readonly guardedByPawn: boolean;
}

export interface FileValue {
  /** 0 = a … 7 = h. */
  readonly file: number;
  /** Open: no pawn on it. Half-open: pawns of one side only. */
  readonly status: 'open' | 'half-open' | 'closed';
  readonly halfOpenFor: Side | null;
  /** Rooks and queens on it, the side's first rank first. */
  readonly heavy: BySide<readonly Square[]>;
  /**
   * Who controls it. A side's hold is the number of squares in the enemy half on which a rook of it would be safe
   * and which a rook or queen of it, standing on the file, attacks along it or stands on. One side's hold alone
   * makes control, both sides' make it shared. Closed files have none.
   */
  readonly control: Side | 'shared' | 'none';
  /**
   * Entry squares: on the side's 7th and 8th rank, no pawn and no enemy man that a rook could not safely take on the file
   * before them, and a rook of the side would be safe there (Nimzowitsch, My System, from memory: the 7th and 8th rank are the aim of the file).
   */
  readonly entries: BySide<readonly Square[]>;
  /** The first enemy pawn on a half-open file, where it is isolated, backward or guarded by no pawn. */
  readonly targets: readonly FileTarget[];
  /** For an open or half-open file: the rook of each side not on it that gets there soonest, within three safe moves. */
  readonly takers: BySide<FileTaker | null>;
}

/** The eight files, a first. */
export function fileValues(safety: Safety, pawns: PawnValues, reach: Reach): FileValue[] {
  return [0, 1, 2, 3, 4, 5, 6, 7].map((file) => fileValue(safety, pawns, reach, file));
}

function fileValue(safety: Safety, pawns: PawnValues, reach: Reach, file: number): FileValue {
  const { map } = safety;
  const has = bySide((side) => pawns[side].pawns.some((square) => fileOf(square) === file));
  const status = has.white ? (has.black ? 'closed' : 'half-open') : has.black ? 'half-open' : 'open';
  const halfOpenFor = status !== 'half-open' ? null : has.white ? 'black' : 'white';
  const heavy = bySide((side) => heavyOn(map, side, file));
  const holds = bySide((side) => (status === 'closed' ? 0 : hold(safety, side, file, heavy[side])));
  const usable = (side: Side) => status === 'open' || halfOpenFor === side;
  return {
    file,
    status,
    halfOpenFor,
    heavy,
    control: holds.white > 0 ? (holds.black > 0 ? 'shared' : 'white') : holds.black > 0 ? 'black' : 'none',
    entries: bySide((side) => (usable(side) ? entriesOf(safety, side, file) : [])),
    targets: halfOpenFor === null ? [] : targetsOf(pawns, halfOpenFor, file),
    takers: bySide((side) => (usable(side) ? takerOf(map, reach, side, file) : null)),
  };
}

const FILE_SQUARES: BySide<readonly (readonly Square[])[]> = bySide((side) =>
  [0, 1, 2, 3, 4, 5, 6, 7].map((file) =>
    [0, 1, 2, 3, 4, 5, 6, 7].map((rank) => ((side === 'white' ? rank : 7 - rank) * 8 + file) as Square),
  ),
);

/** Squares of a file from the side's first rank to its eighth. */
function squaresAlong(side: Side, file: number): readonly Square[] {
  return FILE_SQUARES[side][file] ?? [];
}

function heavyOn(map: AttackMap, side: Side, file: number): Square[] {
  const rook = manCode(side, 'rook');
  const queen = manCode(side, 'queen');
  return squaresAlong(side, file).filter((square) => map.board[square] === rook || map.board[square] === queen);
}

function hold(safety: Safety, side: Side, file: number, heavy: readonly Square[]): number {
  if (heavy.length === 0) return 0;
  const { map } = safety;
  const index: SideIndex = side === 'white' ? 0 : 1;
  let count = 0;
  for (const square of squaresAlong(side, file)) {
    if (relativeRank(square, side) < 5) continue;
    const bears = heavy.some(
      (from) => from === square || (map.attackers[(index << 6) | square]! >>> map.numbers[from]!) & 1,
    );
    if (bears && isSafeHere(safety, index, ROOK, square)) count++;
  }
  return count;
}

function entriesOf(safety: Safety, side: Side, file: number): Square[] {
  const { board } = safety.map;
  const index: SideIndex = side === 'white' ? 0 : 1;
  const entries: Square[] = [];
  for (const square of squaresAlong(side, file)) {
    const code = board[square]!;
    const isEnemy = code !== 0 && code >> 3 !== index;
    const kind = code & 7;
    const safe = kind !== PAWN && !(isEnemy && kind === KING) && isSafeHere(safety, index, ROOK, square);
    if (safe && relativeRank(square, side) >= 7) entries.push(square);
    // A pawn shuts the file, and so does an enemy man that a rook cannot take without loss.
    if (kind === PAWN || (isEnemy && !safe)) break;
  }
  return entries;
}

function targetsOf(pawns: PawnValues, side: Side, file: number): FileTarget[] {
  const enemy = opponent(side);
  let first: PawnReading | undefined;
  for (const pawn of pawns.pawns) {
    if (pawn.side !== enemy || fileOf(pawn.square) !== file) continue;
    if (!first || relativeRank(pawn.square, side) < relativeRank(first.square, side)) first = pawn;
  }
  if (!first || (first.guarded && !first.isolated && !first.backward)) return [];
  const { square, isolated, backward, guarded } = first;
  return [{ square, side: enemy, isolated, backward, guardedByPawn: guarded }];
}

function takerOf(map: AttackMap, { moves }: Reach, side: Side, file: number): FileTaker | null {
  const row = side === 'white' ? 0 : 32;
  let best: FileTaker | null = null;
  for (let number = 0; number < map.counts[row >> 5]!; number++) {
    const from = map.squares[row | number]! as Square;
    const kind = map.board[from]! & 7;
    if (kind === QUEEN) break;
    if (kind !== ROOK || fileOf(from) === file) continue;
    for (const to of squaresAlong(side, file)) {
      const needed = moves[((row | number) << 6) | to]!;
      if (needed <= 0 || map.board[to] !== 0 || (best !== null && needed > best.moves)) continue;
      const isBetter = best === null || needed < best.moves || viewOrder(from, side) < viewOrder(best.rook, side);
      if (isBetter) best = { rook: from, to, moves: needed };
    }
  }
  return best;
}
