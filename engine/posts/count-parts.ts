/**
 * Counts the parts of a post on one board: the position with the man where it would stand. Hot: run for every
 * placement of every man; the plain twin is in the tests.
 */
import { type AttackMap } from '../attacks';
import { BISHOP, bitCount, EDGES, KING, kingDistance, KNIGHT, PAWN, QUEEN, ROOK, STRIDES } from '../board';
import { exchangeOn } from '../exchange';
import type { Square } from '../types';
import { type Ground, NEVER } from './ground';
import { PLACE } from './weights';

/** Masks of one side's men by kind's place; 0 holds all pieces, king and pawns apart. */
const own = new Int32Array(7);
const enemy = new Int32Array(7);

function fillKinds({ board, counts, squares }: AttackMap, side: number, into: Int32Array): void {
  into.fill(0);
  for (let number = 0; number < counts[side]!; number++) {
    into[board[squares[(side << 5) | number]!]! & 7]! |= 1 << number;
  }
  into[0] = into[KNIGHT]! | into[BISHOP]! | into[ROOK]! | into[QUEEN]!;
}

/**
 * Fills a row with the counts for the man on `at`; `map` is the attack map of that board. The parts that a search
 * gives (lost, wins, threatens) are left at 0.
 */
export function countParts(ground: Ground, map: AttackMap, at: number, row: Float64Array): void {
  row.fill(0);
  fillKinds(map, ground.index, own);
  fillKinds(map, ground.index ^ 1, enemy);
  countSquares(ground, map, at, row);
  countMen(ground, map, row);
  countMan(ground, map, at, row);
  countPawnDuties(ground, map, row);
  countCastling(ground, map.board, row);
}

/** Centre squares d4, e4, d5, e5 as 1. */
const CENTRE = Uint8Array.from({ length: 64 }, (_, square) => ([27, 28, 35, 36].includes(square) ? 1 : 0));

function countSquares({ index, weak }: Ground, map: AttackMap, at: number, row: Float64Array): void {
  const { attackers, board } = map;
  const ownRow = index << 6;
  const enemyRow = (index ^ 1) << 6;
  const man = 1 << map.numbers[at]!;
  const minors = enemy[KNIGHT]! | enemy[BISHOP]!;
  const beyondRooks = enemy[PAWN]! | minors;
  const kind = board[at]! & 7;
  const cheaper = kind <= BISHOP ? enemy[PAWN]! : kind === ROOK ? beyondRooks : beyondRooks | enemy[ROOK]!;
  let safeMoves = 0;
  let rookMoves = 0;
  let centre = 0;
  let weakSquares = 0;
  let outnumbers = 0;
  let half = 0;
  for (let square = 0; square < 64; square++) {
    const mine = attackers[ownRow | square]!;
    const theirs = attackers[enemyRow | square]!;
    if (mine === 0 && theirs === 0) continue;
    const pieces = mine & own[0]!;
    if (pieces !== 0) {
      const occupant = board[square]!;
      if (occupant === 0 || occupant >> 3 !== index) {
        if ((pieces & man) !== 0 && (theirs & cheaper) === 0) safeMoves++;
        if ((pieces & own[ROOK]!) !== 0 && (theirs & beyondRooks) === 0) rookMoves += bitCount(pieces & own[ROOK]!);
      }
      if (CENTRE[square] === 1) centre += bitCount(pieces);
      if (weak[square] === 1) weakSquares++;
      if (index === 0 ? square >= 32 : square < 32) half++;
    }
    if ((mine & own[PAWN]!) === 0 && (theirs & enemy[PAWN]!) === 0) {
      const more = bitCount(mine) - bitCount(theirs);
      outnumbers += more > 0 ? 1 : more < 0 ? -1 : 0;
    }
  }
  row[PLACE.safeMoves] = Math.min(safeMoves, 8);
  row[PLACE.rookMoves] = rookMoves;
  row[PLACE.centre] = centre;
  row[PLACE.weakSquares] = weakSquares;
  row[PLACE.outnumbers] = outnumbers;
  row[PLACE.enemyHalf] = half;
}

const heavyOnFile = new Uint8Array(8);

/** What each own man adds where it stands. */
function countMen(ground: Ground, map: AttackMap, row: Float64Array): void {
  const { index, ownOnFile, enemyOnFile, targets, weak, pawnsWay } = ground;
  const { board, attackers } = map;
  const minors = enemy[KNIGHT]! | enemy[BISHOP]!;
  heavyOnFile.fill(0);
  for (let number = 0; number < map.counts[index]!; number++) {
    const square = map.squares[(index << 5) | number]!;
    const kind = board[square]! & 7;
    if (kind !== KING && attackers[((index ^ 1) << 6) | square] !== 0) {
      row[PLACE.hanging]! += Math.max(0, exchangeOn(map, (index ^ 1) as 0 | 1, square) ?? 0);
    }
    if (kind === PAWN || kind === KING) continue;
    const file = square & 7;
    const rank = index === 0 ? square >> 3 : 7 - (square >> 3);
    const equals = kind <= BISHOP ? minors : enemy[kind]!;
    const cheaper = kind <= BISHOP ? enemy[PAWN]! : enemy[PAWN]! | minors | (kind === QUEEN ? enemy[ROOK]! : 0);
    const attackedBy = attackers[((index ^ 1) << 6) | square]!;
    if ((attackedBy & equals) !== 0) row[PLACE.facesEqual]!++;
    if ((attackedBy & cheaper) !== 0) row[PLACE.underCheaper]!++;
    if (weak[square] === 1) row[PLACE.weakSquares]!++;
    if (pawnsWay[square] === 1) row[PLACE.inPawnsWay]!++;
    if (kind === BISHOP) row[PLACE.diagonal]! += diagonalOf(board, index, square);
    if (kind <= BISHOP && rank === 0) row[PLACE.atHome]!++;
    if (kind !== KNIGHT) row[PLACE.eyes]! += eyesOf(board, index, square, kind);
    if (kind < ROOK) continue;
    if (heavyOnFile[file]!++ > 0) row[PLACE.doubled]!++;
    if (rank === 6) row[PLACE.seventh]!++;
    if (kind !== ROOK) continue;
    if ((attackers[(index << 6) | square]! & own[ROOK]!) !== 0) row[PLACE.joined]!++;
    if (ownOnFile[file] === 1) continue;
    row[enemyOnFile[file] === 1 ? PLACE.halfOpenFile : PLACE.openFile]!++;
    for (const target of targets) if ((target & 7) === file) row[PLACE.fileTarget]!++;
  }
}

/** Squares that a bishop sees up to the first pawn; an own pawn's square is not among them. */
function diagonalOf(board: Readonly<Uint8Array>, side: number, from: number): number {
  let seen = 0;
  for (let direction = 4; direction < 8; direction++) {
    const edge = EDGES[(from << 3) | direction]!;
    for (let to = from; to !== edge; ) {
      to += STRIDES[direction]!;
      const code = board[to]!;
      if (code === ((side << 3) | PAWN)) break;
      seen++;
      if ((code & 7) === PAWN) break;
    }
  }
  return seen;
}

/** Lines of a slider on which the second man is the enemy king, or for rooks and bishops his queen; own pawns shut a line. */
function eyesOf(board: Readonly<Uint8Array>, side: number, from: number, kind: number): number {
  let eyes = 0;
  for (let direction = kind === BISHOP ? 4 : 0; direction < (kind === ROOK ? 4 : 8); direction++) {
    const edge = EDGES[(from << 3) | direction]!;
    let first = 0;
    for (let to = from; to !== edge; ) {
      to += STRIDES[direction]!;
      const code = board[to]!;
      if (code === 0) continue;
      const isPrize = code >> 3 !== side && ((code & 7) === KING || ((code & 7) === QUEEN && kind !== QUEEN));
      if (first !== 0) {
        if (isPrize) eyes++;
        break;
      }
      if (code === ((side << 3) | PAWN) || (code >> 3 !== side && (code & 7) >= QUEEN)) break;
      first = code;
    }
  }
  return eyes;
}

/** What concerns the man itself. */
function countMan(ground: Ground, map: AttackMap, at: number, row: Float64Array): void {
  const kind = map.board[at]! & 7;
  const rank = ground.index === 0 ? at >> 3 : 7 - (at >> 3);
  if (ground.hitBy[at]! <= 1) row[PLACE.pawnHit] = 1;
  const isHome = rank >= 3 && rank <= 5 && ground.hitBy[at] === NEVER && ground.support[at]! <= 1;
  if (kind <= BISHOP && isHome) row[PLACE.outpost] = 1;
  if (ground.blockades[at] === 1) row[PLACE.blockade] = 1;
  if (kind === KNIGHT) row[PLACE.knightCentre] = fromRim(at & 7) + fromRim(at >> 3);
  const ownKing = map.kings[ground.index]!;
  const enemyKing = map.kings[ground.index ^ 1]!;
  if (ownKing >= 0) row[PLACE.fromOwnKing] = kingDistance(at as Square, ownKing as Square);
  if (enemyKing < 0) return;
  if (map.attackers[(ground.index << 6) | enemyKing] !== 0) row[PLACE.check] = 1;
  row[PLACE.fromEnemyKing] = kingDistance(at as Square, enemyKing as Square);
}

function fromRim(line: number): number {
  return Math.min(line, 7 - line);
}

function countPawnDuties({ index, targets, ownWeak }: Ground, { attackers }: AttackMap, row: Float64Array): void {
  const ownRow = index << 6;
  for (const target of targets) row[PLACE.targets]! += bitCount(attackers[ownRow | target]! & own[0]!);
  for (const pawn of ownWeak) {
    if ((attackers[((index ^ 1) << 6) | pawn]! & enemy[0]!) === 0) continue;
    row[PLACE.guardsWeak]! += bitCount(attackers[ownRow | pawn]! & own[0]!);
  }
}

/** Castlings whose right and rook are still there, and the men between king and rook for the nearer one. */
function countCastling({ position, index }: Ground, board: Readonly<Uint8Array>, row: Float64Array): void {
  const { castling } = position;
  const base = index === 0 ? 0 : 56;
  const rook = (index << 3) | ROOK;
  const men = (from: number, to: number) => {
    let count = 0;
    for (let square = base + from; square <= base + to; square++) if (board[square] !== 0) count++;
    return count;
  };
  const short = (index === 0 ? castling.whiteKing : castling.blackKing) && board[base + 7] === rook;
  const long = (index === 0 ? castling.whiteQueen : castling.blackQueen) && board[base] === rook;
  row[PLACE.castlingKept] = (short ? 1 : 0) + (long ? 1 : 0);
  if (short || long) row[PLACE.betweenToCastle] = Math.min(short ? men(5, 6) : NEVER, long ? men(1, 3) : NEVER);
}
