/** Counts of one side over the whole board. */
import type { AttackMap } from '../attacks';
import type { Side } from '../types';
import type { SquareTable } from './square-table';

export interface SquareTotals {
  /** Squares that at least one man of the side attacks. */
  readonly controlled: number;
  /** Squares that the side commands. */
  readonly commanded: number;
  /** Controlled squares of the enemy half (the side's ranks 5 to 8). */
  readonly enemyHalf: number;
  /** Controlled squares among d4, e4, d5, e5. */
  readonly centre: number;
  /** Controlled squares among c3 to f6. */
  readonly extendedCentre: number;
  /** Safe moves of all men of the side. */
  readonly safeMoves: number;
}

/** One bit a square: 2 for the extended centre, 1 as well for the centre. */
const CENTRES: Readonly<Uint8Array> = Uint8Array.from({ length: 64 }, (_, square) => {
  const file = square & 7;
  const rank = square >> 3;
  const inner = file >= 3 && file <= 4 && rank >= 3 && rank <= 4;
  return file >= 2 && file <= 5 && rank >= 2 && rank <= 5 ? (inner ? 3 : 2) : 0;
});

/** The counts of one side; `safeMoves` is counted with the men and handed in. */
export function squareTotals(map: AttackMap, table: SquareTable, side: Side, safeMoves: number): SquareTotals {
  const index = side === 'white' ? 0 : 1;
  let controlled = 0;
  let commanded = 0;
  let enemyHalf = 0;
  let centre = 0;
  let extendedCentre = 0;
  for (let square = 0; square < 64; square++) {
    if (table.commands[square] === index) commanded++;
    if (map.attackers[(index << 6) | square] === 0) continue;
    controlled++;
    if (square >> 5 !== index) enemyHalf++;
    const place = CENTRES[square]!;
    if (place & 1) centre++;
    if (place & 2) extendedCentre++;
  }
  return { controlled, commanded, enemyHalf, centre, extendedCentre, safeMoves };
}
