/** Mobility heat map: a man asked on every square. */
import { KINDS, type Man, type Side, type Square } from '../types';
import { type SideIndex } from '../attacks';
import { BISHOP, KNIGHT, manCode, manOf, PAWN, SQUARES } from '../board';
import { isSafeOn, type Safety } from '../exchange';
import { fillReach } from '../reach';
import { fillMoves, newWords, squaresOfWords } from './moves';

/** One square of a heat map. */
export interface HeatCell {
  readonly square: Square;
  /** Moves the man would have from there: pseudo-legal, pins of other men left as they are. */
  readonly moves: number;
  /** Of these, moves on which it would not be lost by exchange. */
  readonly safeMoves: number;
  /** It would be safe on the square itself. */
  readonly safe: boolean;
  /** Another man stands there (or no pawn ever can), so that it is not asked. */
  readonly taken: boolean;
  /** Safe moves that the given man needs to get there, null where it cannot within six, or no man was given. */
  readonly reached: number | null;
}

/** Moves up to which a given man's reach is looked for. */
const REACH_MOVES_MAX = 6;

/**
 * The heat map of a given man (its own square vacated), or of a man of that side and kind from nowhere.
 * 64 cells, a1 first. Undefined where the square given is empty.
 */
export function heatMap(safety: Safety, asked: { readonly square: Square } | Man): HeatCell[] | undefined {
  const { map } = safety;
  const origin = 'square' in asked ? asked.square : -1;
  const man = 'square' in asked ? manOf(map.board[asked.square]!) : asked;
  if (!man) return undefined;
  const code = manCode(man.side, man.kind);
  const side = (code >> 3) as SideIndex;
  const place = KINDS.indexOf(man.kind) + 1;
  const reached = new Int8Array(64).fill(-1);
  if (origin >= 0 && place >= KNIGHT && place <= BISHOP + 2) fillReach(safety, origin, REACH_MOVES_MAX, reached, 0);
  const words = newWords();
  return SQUARES.map((square) => {
    const occupant = square === origin ? 0 : map.board[square]!;
    if (occupant !== 0 || (place === PAWN && (square < 8 || square > 55))) {
      return { square, moves: 0, safeMoves: 0, safe: false, taken: true, reached: null };
    }
    fillMoves(map.board, code, square, origin, -1, words);
    const moves = squaresOfWords(words);
    const safeMoves = moves.filter((to) => isSafeOn(map, side, place, to, origin)).length;
    return {
      square,
      moves: moves.length,
      safeMoves,
      safe: isSafeOn(map, side, place, square, origin),
      taken: false,
      reached: reached[square]! >= 0 ? reached[square]! : null,
    };
  });
}

/** Safe moves of all men of a side together. */
export function safeMovesOf(
  men: readonly { readonly side: Side; readonly safeMoves: readonly Square[] }[],
  side: Side,
): number {
  return men.reduce((sum, man) => sum + (man.side === side ? man.safeMoves.length : 0), 0);
}
