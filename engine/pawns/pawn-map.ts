/**
 * The pawns of a position as each side sees them: one mask of ranks a file, made once and handed down.
 *
 * Only pawns are looked at. Tables have ten lanes, an empty one beyond each edge: the a-file is lane 1,
 * the h-file lane 8, so that neighbours need no care. Masks are those of `rank-masks.ts`.
 */
import type { Position } from '../board';
import type { BySide, Side, Square } from '../types';
import { at, REVERSED } from './rank-masks';

/** One side's view. All masks count ranks as that side does. */
export interface PawnView {
  readonly side: Side;
  /** Turns a square of this view into one of the board and back, by exclusive or. */
  readonly flip: 0 | 56;
  readonly own: Uint8Array;
  readonly enemy: Uint8Array;
  /** Squares that own pawns attack now. */
  readonly attacks: Uint8Array;
  /** Squares that enemy pawns attack now. */
  readonly enemyAttacks: Uint8Array;
  /** Squares that own pawns attack or could ever attack by advancing straight on, whatever stands in their way. */
  readonly span: Uint8Array;
  /** Those of the span that some pawn can come to attack without being stopped on its way. */
  readonly freeSpan: Uint8Array;
  /**
   * Squares that stop an own pawn: an enemy pawn stands there, or an enemy pawn controls it and no own
   * pawn does. A double step does not slip past: the square passed over can be captured on, too.
   */
  readonly stops: Uint8Array;
}

/** Both views of the pawns of one position. */
export type PawnMap = BySide<PawnView>;

function newView(side: Side): PawnView {
  const lanes = () => new Uint8Array(10);
  return {
    side,
    flip: side === 'white' ? 0 : 56,
    own: lanes(),
    enemy: lanes(),
    attacks: lanes(),
    enemyAttacks: lanes(),
    span: lanes(),
    freeSpan: lanes(),
    stops: lanes(),
  };
}

/** Empty tables, to be filled by `pawnMap` again and again. */
export function newPawnMap(): PawnMap {
  return { white: newView('white'), black: newView('black') };
}

/** Codes of a white and a black pawn differ in bit 3 alone. */
const PAWN = 1;
const BLACK = 8;

/** The pawn map of a position; `into` gives the tables to fill, so that bulk work allocates nothing. */
export function pawnMap(position: Pick<Position, 'board'>, into: PawnMap = newPawnMap()): PawnMap {
  const white = into.white.own;
  const black = into.black.own;
  white.fill(0);
  black.fill(0);
  const { board } = position;
  for (let square = 0; square < 64; square++) {
    const code = at(board, square);
    if ((code & 7) !== PAWN) continue;
    const lane = (square & 7) + 1;
    if (code & BLACK) black[lane] = at(black, lane) | (128 >> (square >> 3));
    else white[lane] = at(white, lane) | (1 << (square >> 3));
  }
  for (let lane = 1; lane <= 8; lane++) {
    into.white.enemy[lane] = at(REVERSED, at(black, lane));
    into.black.enemy[lane] = at(REVERSED, at(white, lane));
  }
  fillView(into.white);
  fillView(into.black);
  return into;
}

/** Where the pawns of each lane stand or can come: on a free road, and on one without stops. Scratch of `fillView`. */
const anywhere = new Uint8Array(10);
const unstopped = new Uint8Array(10);

function fillView(view: PawnView): void {
  const { own, enemy, attacks, enemyAttacks, span, freeSpan, stops } = view;
  for (let lane = 1; lane <= 8; lane++) {
    const attacked = ((at(own, lane - 1) | at(own, lane + 1)) << 1) & 0xff;
    const struck = (at(enemy, lane - 1) | at(enemy, lane + 1)) >> 1;
    const stop = at(enemy, lane) | (struck & ~attacked);
    attacks[lane] = attacked;
    enemyAttacks[lane] = struck;
    stops[lane] = stop;
    anywhere[lane] = advance(at(own, lane), 0xff);
    unstopped[lane] = advance(at(own, lane), ~stop);
  }
  for (let lane = 1; lane <= 8; lane++) {
    span[lane] = (at(anywhere, lane - 1) | at(anywhere, lane + 1)) << 1;
    freeSpan[lane] = (at(unstopped, lane - 1) | at(unstopped, lane + 1)) << 1;
  }
}

/** The ranks given and all that lie straight ahead of them over free ranks: one, two, then four steps at once. */
function advance(from: number, free: number): number {
  let reached = from;
  let open = free;
  reached |= (reached << 1) & open;
  open &= open << 1;
  reached |= (reached << 2) & open;
  open &= open << 2;
  reached |= (reached << 4) & open;
  return reached & 0xff;
}

/** The square on a lane (1 to 8) and rank (0 to 7) of a side's view. */
export function squareIn(view: PawnView, lane: number, rank: number): Square {
  return (((rank << 3) | (lane - 1)) ^ view.flip) as Square;
}

/** Own pawn moves from one rank of a view to another on the same file: the double step from the home rank is one. */
export function pawnMoves(from: number, to: number): number {
  return from === 1 && to >= 3 ? to - from - 1 : to - from;
}
