/** Every square at once: who commands it, what captures there would bring, and who stands behind. */
import { type AttackMap, fillBehind, menOfMask } from '../attacks';
import { KING, KNIGHT } from '../board';
import { NO_PRICE, priceOf, type Safety, worthOf } from '../exchange';
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

/** Worth of a knight, by which command is tested. */
const KNIGHT_WORTH = worthOf(KNIGHT);

/** Fills the tables for one position. */
export function squareTable(safety: Safety, into: SquareTable = newSquareTable()): SquareTable {
  const { map } = safety;
  const { board, attackers } = map;
  const { commands, exchanges } = into;
  fillBehind(map, into.behind);
  for (let square = 0; square < 64; square++) {
    const byWhite = attackers[square] === 0 ? NO_PRICE : priceOf(safety, 0, square);
    const byBlack = attackers[64 | square] === 0 ? NO_PRICE : priceOf(safety, 1, square);
    const whiteSafe = byBlack >= KNIGHT_WORTH;
    const blackSafe = byWhite >= KNIGHT_WORTH;
    commands[square] = whiteSafe ? (blackSafe ? 2 : 0) : blackSafe ? 1 : 3;
    const code = board[square]!;
    const mayTake = code !== 0 && (code & 7) !== KING;
    exchanges[square] = mayTake && code >> 3 === 1 ? gainOf(code, byWhite) : NO_EXCHANGE;
    exchanges[64 | square] = mayTake && code >> 3 === 0 ? gainOf(code, byBlack) : NO_EXCHANGE;
  }
  return into;
}

function gainOf(code: number, price: number): number {
  return price === NO_PRICE ? NO_EXCHANGE : worthOf(code) - price;
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
