/** Facts about how well pieces stand: best and worst placed of a side, and out of play. */
import { firstMen } from '../../attacks';
import { fileOf, relativeRank } from '../../board';
import { fillAttacked, type ManValue, newWords, squaresOfWords } from '../../men';
import type { Kind, Side, Square } from '../../types';
import type { MenFact, PlacedMan } from '../facts/men';
import type { ReadingValues } from '../values';
import { manAt } from './names';

/** Most moves of each kind on an empty board: the handbooks' table. */
const MOST: Partial<Record<Kind, number>> = { knight: 8, bishop: 13, rook: 14, queen: 27 };

/** A best placed man attacks as many squares of the enemy half. Picked by eye: a knight on f3 attacks two. */
const BEST_FROM = 3;

/**
 * Best and worst placed piece of a side by its share of safe moves. Worst is said only of a piece that clearly has
 * fewest, attacks no enemy man and next to nothing in the enemy half, and does not merely wait (see `waits`); never of
 * the queen.
 */
export function placementFacts(values: ReadingValues, side: Side): MenFact[] {
  const ranked = values.men
    .filter((man) => man.side === side && MOST[man.kind] !== undefined && man.enPrise === 0)
    .map((man) => ({ man, share: man.safeMoves.length / (MOST[man.kind] ?? 1) }))
    .sort((a, b) => b.share - a.share);
  const [best, second] = ranked;
  const worst = ranked[ranked.length - 1];
  const nextWorst = ranked[ranked.length - 2];
  if (!best || !second || !worst || !nextWorst) return [];
  const facts: MenFact[] = [];
  if (best.share > second.share && best.share >= 0.5) {
    const enemyHalf = enemyHalfSeen(values, best.man.square);
    if (enemyHalf >= BEST_FROM) facts.push(placement(values, 'best-placed', best.man, enemyHalf));
  }
  if (worst.man.kind !== 'queen' && worst.share < nextWorst.share && worst.share <= 0.25) {
    const enemyHalf = enemyHalfSeen(values, worst.man.square);
    if (enemyHalf <= 1 && !waits(values, worst.man) && !attacksEnemy(values, worst.man.square)) {
      facts.push(placement(values, 'worst-placed', worst.man, enemyHalf));
    }
  }
  return facts;
}

/** Whether a man with the note is out of play in earnest: it attacks nobody and no own piece merely masks it. */
export function isOutOfPlay(values: ReadingValues, man: ManValue): boolean {
  return man.notes.includes('out-of-play') && !isMasked(values, man) && !attacksEnemy(values, man.square);
}

const words = newWords();

/** Squares that the man attacks. */
function seen({ map }: ReadingValues, square: Square): Square[] {
  fillAttacked(map.board, map.board[square]!, square, square, words);
  return squaresOfWords(words);
}

function enemyHalfSeen(values: ReadingValues, square: Square): number {
  const side = values.map.board[square]! >> 3 ? 'black' : 'white';
  return seen(values, square).filter((to) => relativeRank(to, side) >= 5).length;
}

function attacksEnemy(values: ReadingValues, square: Square): boolean {
  const { board } = values.map;
  return seen(values, square).some((to) => board[to] !== 0 && board[to]! >> 3 !== board[square]! >> 3);
}

/** A bishop on whose forward diagonals the first man is an own piece that can step aside. */
function isMasked(values: ReadingValues, { square, side, kind }: ManValue): boolean {
  if (kind !== 'bishop') return false;
  const lines = firstMen(values.map);
  return (side === 'white' ? [4, 7] : [5, 6]).some((direction) => {
    const first = values.men.find((man) => man.square === lines[(square << 3) | direction]!);
    return first !== undefined && first.side === side && first.kind !== 'pawn' && first.safeMoves.length > 0;
  });
}

/**
 * Whether a piece with few moves merely waits: a masked bishop; a rook that has a move, stands behind an own pawn with a
 * lever within two moves, or whose side has a minor piece on the first rank still.
 */
function waits(values: ReadingValues, man: ManValue): boolean {
  if (man.kind !== 'rook') return isMasked(values, man);
  const { side, square, safeMoves } = man;
  return (
    safeMoves.length > 0 ||
    values.pawns.levers.some(
      (lever) => lever.side === side && lever.moves <= 2 && fileOf(lever.from) === fileOf(square),
    ) ||
    values.men.some(
      (other) =>
        other.side === side &&
        (other.kind === 'knight' || other.kind === 'bishop') &&
        relativeRank(other.square, side) === 1,
    )
  );
}

function placement(
  values: ReadingValues,
  id: PlacedMan['id'],
  { square, side, kind, safeMoves, movesToCentre }: ManValue,
  enemyHalf: number,
): MenFact {
  const man = manAt(values, square);
  return {
    id,
    side,
    man,
    safeMoves: safeMoves.length,
    most: MOST[kind] ?? 0,
    enemyHalf,
    toCentre: movesToCentre,
    squares: [man.square],
    men: [man.square],
  };
}
