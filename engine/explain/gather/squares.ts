/** Facts about squares that hold in a position. */
import { attackerMask } from '../../attacks';
import { bitCount, fileOf, relativeRank, squareName } from '../../board';
import { commandOf, type WeakSquareValue } from '../../squares';
import { opponent, type Side, SIDES, type Square } from '../../types';
import type { SquaresFact } from '../facts/squares';
import type { ReadingValues } from '../values';
import { comers, countOf, manAt, namesInView } from './names';

const CENTRE = [27, 28, 35, 36] as Square[];

/** Own pawns below which every square is weak, and none says anything. */
const OWN_PAWNS_LEAST = 3;

/** Everything worth saying about squares. */
export function squaresFacts(values: ReadingValues): SquaresFact[] {
  const facts: SquaresFact[] = [];
  for (const weak of values.weakSquares) {
    if (weak.matters && hasPawnsToGuard(values, weak.side)) facts.push(weakSquare(values, weak));
  }
  complexes(values, facts);
  for (const side of SIDES) {
    centre(values, side, facts);
    closed(values, side, facts);
  }
  disputed(values, facts);
  return facts;
}

function hasPawnsToGuard({ pawns }: ReadingValues, side: Side): boolean {
  return pawns[side].pawns.length >= OWN_PAWNS_LEAST;
}

function weakSquare(values: ReadingValues, weak: WeakSquareValue): SquaresFact {
  const { square, side, hold, users } = weak;
  const enemy = opponent(side);
  const at = squareName(square);
  const occupant = users.find(({ from }) => from === square);
  const coming = comers(values, users, enemy);
  const stopped = [...weak.stopped].sort((a, b) => fileOf(a.from) - fileOf(b.from));
  return {
    id: hold === 'permanent' ? 'weak-for-good' : 'weak-while-fixed',
    side,
    square: at,
    commandedByEnemy: weak.commandedByEnemy,
    occupant: occupant ? manAt(values, square) : null,
    comers: coming,
    enemyKnights: countOf(values, enemy, 'knight'),
    stopped: stopped.map(({ from, stoppedOn, by }) => ({ pawn: squareName(from), on: squareName(stoppedOn), by })),
    squares: [at],
    men: occupant ? [at] : coming.filter(({ moves }) => moves === coming[0]?.moves).map((comer) => comer.square),
  };
}

function complexes(values: ReadingValues, facts: SquaresFact[]): void {
  for (const { side, colour, squares, ownBishop, enemyBishop } of values.complexes) {
    const mattering = squares.filter((square) =>
      values.weakSquares.some(
        (weak) => weak.square === square && weak.side === side && weak.matters && weak.hold === 'permanent',
      ),
    );
    if (ownBishop || mattering.length < 3 || !hasPawnsToGuard(values, side)) continue;
    const weak = namesInView(mattering, side);
    facts.push({ id: 'weak-complex', side, colour, weak, enemyBishop, squares: weak, men: [] });
  }
}

function centre(values: ReadingValues, side: Side, facts: SquaresFact[]): void {
  const held = CENTRE.filter((square) => commandOf(values.table, square) === side);
  if (held.length < 3) return;
  const commanded = namesInView(held, side);
  facts.push({ id: 'centre-command', side, commanded, squares: commanded, men: [] });
}

/** Squares of the enemy half, fifth and sixth rank on the files c to f, that the side commands: two at most. */
function closed(values: ReadingValues, side: Side, facts: SquaresFact[]): void {
  const enemy = opponent(side);
  const found: { square: Square; own: number; enemies: number }[] = [];
  for (let square = 16; square < 48; square++) {
    const at = square as Square;
    const file = square & 7;
    const rank = relativeRank(at, side);
    if (file < 2 || file > 5 || rank < 5 || rank > 6 || values.map.board[square] !== 0) continue;
    if (commandOf(values.table, at) !== side) continue;
    if (values.weakSquares.some((weak) => weak.square === at && weak.side === enemy && weak.matters)) continue;
    if (values.outposts.some((post) => post.square === at && post.side === side && post.rank === 'outpost')) continue;
    found.push({
      square: at,
      own: bitCount(attackerMask(values.map, side, at)),
      enemies: bitCount(attackerMask(values.map, enemy, at)),
    });
  }
  found.sort(
    (a, b) =>
      b.own - a.own || (a.square & 7) - (b.square & 7) || relativeRank(b.square, side) - relativeRank(a.square, side),
  );
  for (const { square, own, enemies } of found.slice(0, 2)) {
    const name = squareName(square);
    facts.push({ id: 'square-closed', side, square: name, own, enemy: enemies, squares: [name], men: [] });
  }
}

function disputed(values: ReadingValues, facts: SquaresFact[]): void {
  const first = values.position.sideToMove;
  const second = opponent(first);
  for (const square of CENTRE) {
    if (commandOf(values.table, square) !== 'disputed') continue;
    const name = squareName(square);
    facts.push({
      id: 'disputed-square',
      side: null,
      square: name,
      first,
      firstCount: bitCount(attackerMask(values.map, first, square)),
      secondCount: bitCount(attackerMask(values.map, second, square)),
      squares: [name],
      men: [],
    });
  }
}
