/** Facts about files, the seventh rank and diagonals that hold in a position. */
import { attackersOf, kindOn, sideOn } from '../../attacks';
import { ahead, fileName, fileOf, relativeRank, squareName } from '../../board';
import type { DiagonalValue, FileValue } from '../../files';
import { bySide, opponent, type Side, SIDES, type Square } from '../../types';
import type { FilesFact } from '../facts/files';
import type { ReadingValues } from '../values';
import { countOf, manAt, namesInView } from './names';

/** Everything worth saying about files, the seventh rank and diagonals. */
export function filesFacts(values: ReadingValues): FilesFact[] {
  const facts: FilesFact[] = [];
  // Files are spoken of for sides that have a rook or a queen to use them.
  const hasHeavy = bySide((side) => countOf(values, side, 'rook') + countOf(values, side, 'queen') > 0);
  for (const file of values.files) {
    if (file.status === 'closed' || (!hasHeavy.white && !hasHeavy.black)) continue;
    ownership(values, file, facts);
    for (const side of SIDES) {
      if (hasHeavy[side]) halfOpen(values, file, side, facts);
      doubled(values, file, side, facts);
    }
  }
  for (const side of SIDES) {
    takers(values, side, facts);
    seventh(values, side, facts);
    diagonals(values, side, facts);
  }
  return facts;
}

function ownership(values: ReadingValues, file: FileValue, facts: FilesFact[]): void {
  const name = fileName(file.file);
  const { control, status, heavy, entries } = file;
  if (status === 'closed') return;
  if (control === 'white' || control === 'black') {
    if (heavy[opponent(control)].length > 0) return;
    // On a half-open file the enemy pawn is the point: its sentence says it.
    if (status === 'half-open') return;
    const men = heavy[control].map((square) => manAt(values, square));
    const inTo = waysIn(values, control, heavy[control]).map(squareName);
    facts.push({
      id: 'file-owned',
      side: control,
      file: name,
      status,
      heavy: men,
      entries: inTo,
      squares: [...men.map(({ square }) => square), ...inTo],
      men: men.map(({ square }) => square),
    });
    return;
  }
  if (status !== 'open') return;
  const mine = values.position.sideToMove;
  if (heavy.white.length > 0 && heavy.black.length > 0) {
    const men = [...heavy[mine], ...heavy[opponent(mine)]].map((square) => manAt(values, square));
    const squares = men.map(({ square }) => square);
    facts.push({ id: 'file-contested', side: null, file: name, heavy: men, squares, men: squares });
  } else if (entries.white.length === 0 && entries.black.length === 0) {
    const ends = namesInView([file.file as Square, (56 + file.file) as Square], mine);
    facts.push({ id: 'file-open-no-entry', side: null, file: name, squares: ends, men: [] });
  }
}

/**
 * Squares of the last two ranks of their file to which one of the heavy men can go now and be safe: a queen may be lost where
 * a rook would not.
 */
function waysIn({ men }: ReadingValues, side: Side, heavy: readonly Square[]): Square[] {
  const [first] = heavy;
  if (first === undefined) return [];
  return [7, 8]
    .map((rank) => ((side === 'white' ? rank - 1 : 8 - rank) * 8 + fileOf(first)) as Square)
    .filter((to) => men.some((man) => heavy.includes(man.square) && man.safeMoves.includes(to)));
}

function halfOpen(
  values: ReadingValues,
  { file, halfOpenFor, targets, heavy, entries }: FileValue,
  side: Side,
  facts: FilesFact[],
): void {
  if (halfOpenFor !== side) return;
  const [target] = targets;
  const enemy = opponent(side);
  const men = heavy[side].map((square) => manAt(values, square));
  const on = men.map(({ square }) => square);
  if (target) {
    const square = squareName(target.square);
    const why = target.backward ? 'backward' : target.isolated ? 'isolated' : 'unguarded';
    facts.push({
      id: 'half-open-target',
      side,
      file: fileName(file),
      target: square,
      why,
      heavy: men,
      squares: [square, ...on],
      men: on,
    });
    return;
  }
  const pawns = values.pawns[enemy].pawns.filter((square) => fileOf(square) === file);
  pawns.sort((a, b) => relativeRank(a, side) - relativeRank(b, side));
  const [first] = pawns;
  if (first === undefined || entries[side].length > 0 || men.length === 0) return;
  const guards = namesInView(
    attackersOf(values.map, enemy, first).filter((square) => kindOn(values.map, square) === 'pawn'),
    enemy,
  );
  const pawn = squareName(first);
  facts.push({
    id: 'half-open-nothing',
    side,
    file: fileName(file),
    pawn,
    guards,
    squares: [pawn, ...guards],
    men: on,
  });
}

function doubled(values: ReadingValues, value: FileValue, side: Side, facts: FilesFact[]): void {
  const { file, heavy } = value;
  const squares = heavy[side];
  if (squares.length < 2) return;
  const between = (a: Square, b: Square) => {
    for (let at = Math.min(a, b) + 8; at < Math.max(a, b); at += 8) if (values.map.board[at] !== 0) return false;
    return true;
  };
  for (let index = 1; index < squares.length; index++) {
    const [rear, front] = [squares[index - 1], squares[index]];
    if (rear === undefined || front === undefined || !between(rear, front)) return;
  }
  const men = squares.map((square) => manAt(values, square));
  const on = men.map(({ square }) => square);
  facts.push({ id: 'heavy-doubled', side, file: fileName(file), heavy: men, squares: on, men: on });
  const front = squares[squares.length - 1];
  if (front === undefined || (value.status === 'half-open' && value.halfOpenFor !== side)) return;
  const square = manAhead(values, front, side);
  if (square === undefined || !isMinorWithoutPawn(values, opponent(side), square)) return;
  const target = manAt(values, square);
  const all = [target.square, ...on];
  facts.push({ id: 'file-man-target', side, file: fileName(file), target, heavy: men, squares: all, men: all });
}

/** The next man straight ahead of a square, as the side sees it. */
function manAhead({ map }: ReadingValues, from: Square, side: Side): Square | undefined {
  let at = ahead(from, side);
  while (at !== undefined && map.board[at] === 0) at = ahead(at, side);
  return at;
}

/** Whether on the square stands a knight or bishop of the side that no pawn of its side guards. */
function isMinorWithoutPawn({ map }: ReadingValues, side: Side, square: Square): boolean {
  const kind = kindOn(map, square);
  if (sideOn(map, square) !== side || (kind !== 'knight' && kind !== 'bishop')) return false;
  return attackersOf(map, side, square).every((from) => kindOn(map, from) !== 'pawn');
}

/** Whether the side's rooks have something to do on the file: a way in, or a pawn to bite on. */
function isOfUse({ status, halfOpenFor, entries, targets }: FileValue, side: Side): boolean {
  if (status === 'half-open' && halfOpenFor !== side) return false;
  return status !== 'closed' && (entries[side].length > 0 || targets.length > 0);
}

/**
 * The rook that gets soonest to a file of use on which its side has no heavy man yet: one a side. A rook that has such
 * a file already stays out of it.
 */
function takers(values: ReadingValues, side: Side, facts: FilesFact[]): void {
  const found = values.files.flatMap((value) => {
    const { file, status, heavy, takers: rooks } = value;
    const taker = rooks[side];
    if (!taker || status === 'closed' || heavy[side].length > 0 || !isOfUse(value, side)) return [];
    const now = values.files[fileOf(taker.rook)];
    return now && isOfUse(now, side) ? [] : [{ file, status, taker }];
  });
  found.sort(
    (a, b) => a.taker.moves - b.taker.moves || (a.status === b.status ? a.file - b.file : a.status === 'open' ? -1 : 1),
  );
  const [best] = found;
  if (!best || best.taker.moves > 2) return;
  const [rook, to] = [squareName(best.taker.rook), squareName(best.taker.to)];
  facts.push({
    id: 'rook-to-file',
    side,
    rook,
    to,
    moves: best.taker.moves,
    file: fileName(best.file),
    status: best.status,
    squares: [to],
    men: [rook],
  });
}

function seventh(values: ReadingValues, side: Side, facts: FilesFact[]): void {
  const { there, comers } = values.sevenths[side];
  if (there.length > 0) {
    const men = namesInView(there, side);
    const heavy = men.map((square) => manAt(values, there[there.map(squareName).indexOf(square)] ?? (0 as Square)));
    const pawns = namesInView(
      values.pawns[opponent(side)].pawns.filter((square) => relativeRank(square, side) === 7),
      side,
    );
    facts.push({ id: 'on-seventh', side, men, heavy, pawns, squares: [...men, ...pawns] });
    return;
  }
  // A queen's raid is another matter: the seventh rank is the rooks'.
  const first = comers.find(({ from }) => kindOn(values.map, from) === 'rook');
  if (!first || first.moves > 2) return;
  const man = manAt(values, first.from);
  const to = squareName(first.to);
  facts.push({ id: 'to-seventh', side, man, to, moves: first.moves, squares: [to], men: [man.square] });
}

function isForward({ from, squares }: DiagonalValue, side: Side): boolean {
  const [next] = squares;
  return next !== undefined && relativeRank(next, side) > relativeRank(from, side);
}

function diagonals(values: ReadingValues, side: Side, facts: FilesFact[]): void {
  for (const diagonal of values.diagonals) {
    if (diagonal.side !== side || kindOn(values.map, diagonal.from) !== 'bishop') continue;
    const last = diagonal.squares[diagonal.squares.length - 1];
    if (last === undefined) continue;
    const man = manAt(values, diagonal.from);
    const forward = isForward(diagonal, side);
    const isLong =
      diagonal.direction === 'a1h8'
        ? (diagonal.from & 7) === diagonal.from >> 3
        : (diagonal.from & 7) + (diagonal.from >> 3) === 7;
    if (forward && isLong && relativeRank(diagonal.from, side) <= 3 && diagonal.squares.length >= 5) {
      facts.push({
        id: 'long-diagonal-open',
        side,
        man,
        last: squareName(last),
        seen: diagonal.squares.length,
        squares: diagonal.squares.map(squareName),
        men: [man.square],
      });
    }
    const stopper = diagonal.stoppedBy;
    const shutElsewhere = values.diagonals.every(
      (other) => other.from !== diagonal.from || other.squares.length <= 2 || !isForward(other, side),
    );
    if (forward && stopper !== null && diagonal.stopperFixed && shutElsewhere) {
      facts.push({
        id: 'diagonal-shut',
        side,
        man,
        stopper: squareName(stopper),
        stopperSide: sideOn(values.map, stopper) ?? side,
        squares: [squareName(stopper)],
        men: [man.square],
      });
    }
  }
}
