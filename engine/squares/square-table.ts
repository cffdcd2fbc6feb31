/** Every square at once: who commands it, what captures there would bring, and who stands behind. */
import { type AttackMap, fillBehind, menOfMask, type SideIndex } from '../attacks';
import { exchangeOn, isSafeHere, type Safety } from '../exchange';
import type { Side, Square } from '../types';

/**
 * Command of a square, tested with a knight of each side: only one side's would be safe (that side commands
 * it), both (open), neither (disputed). A bishop gives the same, being worth the same.
 */
export const COMMANDS = ['white', 'black', 'open', 'disputed'] as const;
export type Command = (typeof COMMANDS)[number];

/** Stands for 'cannot capture there' in `exchanges`. */
export const NO_EXCHANGE = -128;

/** Flat tables over the board, a1 first; rows of a side by (side << 6 | square), White 0, Black 1. */
export interface SquareTable {
  /** Place in COMMANDS. */
  readonly commands: Uint8Array;
  /** Pawns gained by the side that begins to capture there, NO_EXCHANGE where it cannot. */
  readonly exchanges: Int8Array;
  /** Masks of the men that stand behind an attacker. */
  readonly behind: Int32Array;
}

/** Empty tables, to be filled by `squareTable` again and again. */
export function newSquareTable(): SquareTable {
  return { commands: new Uint8Array(64), exchanges: new Int8Array(128), behind: new Int32Array(128) };
}

const KNIGHT_PLACE = 2;

/** Fills the tables for one position. */
export function squareTable(safety: Safety, into: SquareTable = newSquareTable()): SquareTable {
  const { map } = safety;
  fillBehind(map, into.behind);
  for (let square = 0; square < 64; square++) {
    into.commands[square] = commandIndex(safety, square);
    fillSide(map, into, 0, square);
    fillSide(map, into, 1, square);
  }
  return into;
}

function commandIndex(safety: Safety, square: number): number {
  const white = isSafeHere(safety, 0, KNIGHT_PLACE, square);
  const black = isSafeHere(safety, 1, KNIGHT_PLACE, square);
  return white ? (black ? 2 : 0) : black ? 1 : 3;
}

function fillSide(map: AttackMap, into: SquareTable, side: SideIndex, square: number): void {
  const entry = (side << 6) | square;
  const gain = map.board[square] === 0 ? null : exchangeOn(map, side, square);
  into.exchanges[entry] = gain === null ? NO_EXCHANGE : gain;
}

/** Who commands the square. */
export function commandOf(table: SquareTable, square: Square): Command {
  return COMMANDS[table.commands[square]!]!;
}

/** Men of the side that stand behind an attacker of the square, cheapest first. */
export function behind(map: AttackMap, table: SquareTable, side: Side, square: Square): Square[] {
  return menOfMask(map, side, table.behind[side === 'white' ? square : 64 | square]!);
}

/** What the side gains, in pawns, if it begins to capture on the square; null where it cannot. */
export function exchangeGain(table: SquareTable, side: Side, square: Square): number | null {
  const gain = table.exchanges[side === 'white' ? square : 64 | square]!;
  return gain === NO_EXCHANGE ? null : gain;
}
