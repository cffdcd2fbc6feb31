/**
 * Preparations: an own move first, so that a man's route becomes possible or two or more moves shorter.
 *
 * Tried are moves of own men that stand in the man's way, and pawn moves that make safe a square on which it was
 * not (by guarding it, or by shutting or leaving a line). The move itself must lose nothing by exchange.
 */
import { attackMap, kindOn } from '../attacks';
import { KING, manOn, PAWN, type Position, withMen } from '../board';
import { isSafeMove, safetyOf } from '../exchange';
import type { Square } from '../types';
import { isKingAttacked, moved } from './boards';
import type { Field } from './placements';
import { menOf } from './describe';
import type { PreparationValue } from './values';
import { type Ways, waysOf } from './ways';

/** A preparation and the ways of the man after it. */
export interface Prepared {
  readonly from: Square;
  readonly to: Square;
  readonly ways: Ways;
  readonly position: Position;
}

/** Moves of one man in the way that are tried: the rest would only be longer detours of the same idea. */
const TRIED_MAX = 24;

/** All preparations of a man that change its ways for the better anywhere, with the ways after them. */
export function preparationsFor(field: Field, ways: Ways, movesMax: number): Prepared[] {
  const { position, map, safety } = field;
  if (isKingAttacked(map, field.ground.index)) return [];
  const found: Prepared[] = [];
  let tried = 0;
  for (const man of menOf(field)) {
    const place = map.board[man]! & 7;
    if (man === ways.from || place === KING || tried >= TRIED_MAX) continue;
    const isInWay = ways.blockers[man] === 1;
    if (!isInWay && place !== PAWN) continue;
    for (const to of place === PAWN ? pawnSteps(field, man) : firstMoves(field, man)) {
      if (!isInWay && !strikesUnsafe(field, ways, to)) continue;
      if (!isSafeMove(safety, man, to)) continue;
      tried++;
      const board = moved(map.board, man, to);
      const after = attackMap({ board });
      if (isKingAttacked(after, field.ground.index) || isKingAttacked(after, field.ground.index ^ 1)) continue;
      const newWays = waysOf(safetyOf(after), ways.from, movesMax);
      if (!isBetter(ways, newWays)) continue;
      found.push({ from: man, to, ways: newWays, position: preparedPosition(position, man, to) });
    }
  }
  return found;
}

/** What a preparation is for one post; null where it does not bring it two or more moves nearer. */
export function preparationOn(field: Field, ways: Ways, prepared: Prepared, post: Square): PreparationValue | null {
  const before = ways.moves[post]!;
  const after = prepared.ways.moves[post]!;
  if (after <= 0 || (before >= 0 && after > before - 2)) return null;
  return { from: prepared.from, to: prepared.to, kind: kindOn(field.map, prepared.from), moves: after + 1 };
}

function isBetter(before: Ways, after: Ways): boolean {
  for (let square = 0; square < 64; square++) {
    const moves = after.moves[square]!;
    if (moves > 0 && (before.moves[square]! < 0 || moves <= before.moves[square]! - 2)) return true;
  }
  return false;
}

/** Squares to which a pawn can step, one or two ahead. */
function pawnSteps({ map: { board }, ground: { index } }: Field, from: Square): Square[] {
  const ahead = index === 0 ? 8 : -8;
  const next = from + ahead;
  if (next < 8 || next > 55 || board[next] !== 0) return [];
  const second = next + ahead;
  const isHome = from >> 3 === (index === 0 ? 1 : 6);
  return (isHome && board[second] === 0 ? [next, second] : [next]) as Square[];
}

/** Safe quiet moves of a piece, from its own side on. */
function firstMoves({ safety, ground: { index } }: Field, from: Square): Square[] {
  const { moves } = waysOf(safety, from, 1);
  const flip = index === 0 ? 0 : 56;
  const squares: Square[] = [];
  for (let at = 0; at < 64; at++) if (moves[at ^ flip] === 1) squares.push((at ^ flip) as Square);
  return squares;
}

/** Whether a pawn on the square would guard a square on which the man is not safe. */
function strikesUnsafe({ ground: { index } }: Field, { unsafe }: Ways, to: Square): boolean {
  const ahead = index === 0 ? to + 8 : to - 8;
  const file = to & 7;
  return (file > 0 && unsafe[ahead - 1] === 1) || (file < 7 && unsafe[ahead + 1] === 1);
}

/** The position after a preparation, the enemy standing still. */
function preparedPosition(position: Position, from: Square, to: Square): Position {
  const after = withMen(position, [
    { square: from, man: null },
    { square: to, man: manOn(position, from) },
  ]);
  return { ...after, mode: position.mode, castling: position.castling };
}
