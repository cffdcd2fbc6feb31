/** The compact reading of a ply: counts of a whole position, few enough to be drawn along a game. */
import type { ReadingValues } from '../explain';
import { bySide, type BySide, type Side } from '../types';

/** Parts of the board in which command is counted, from White's side of the board. */
export const REGIONS = ['centre', 'queenside', 'kingside', 'whiteCamp', 'blackCamp'] as const;
export type Region = (typeof REGIONS)[number];

/** What is counted for a side. */
export interface CompactSide {
  /** Weak squares of the side itself, permanent and fixed. */
  readonly weakSquares: number;
  readonly outposts: number;
  readonly files: number;
  readonly safeMoves: number;
  readonly flights: number;
  /** Own pawns before its king, one a file at most: on the king's file and its neighbours, 0 to 3. */
  readonly shelter: number;
  /** Enemy men that attack the zone of its king. */
  readonly kingAttackers: number;
  /** Worth of its men, the king left out, in pawns. */
  readonly material: number;
}

export interface CompactReading {
  readonly structure: { readonly id: string; readonly name: string; readonly side: Side } | null;
  /** Squares commanded in each part of the board. */
  readonly command: Readonly<Record<Region, BySide<number>>>;
  readonly white: CompactSide;
  readonly black: CompactSide;
}

/** Masks of the regions a square is in: one bit a region, in the order of REGIONS. */
const IN_REGION: Readonly<Uint8Array> = Uint8Array.from({ length: 64 }, (_, square) => {
  const [file, rank] = [square & 7, square >> 3];
  const centre = file >= 2 && file <= 5 && rank >= 2 && rank <= 5 ? 1 : 0;
  return centre | (file <= 2 ? 2 : 0) | (file >= 5 ? 4 : 0) | (rank <= 2 ? 8 : 0) | (rank >= 5 ? 16 : 0);
});

const WORTHS = [0, 1, 3, 3, 5, 9, 0] as const;

/** The counts of a position. */
export function compactOf(values: ReadingValues): CompactReading {
  const { structure, table, weakSquares, outposts, files, kings, totals, map } = values;
  const command = REGIONS.map(() => ({ white: 0, black: 0 }));
  const material = [0, 0];
  for (let square = 0; square < 64; square++) {
    const man = map.board[square]!;
    if (man !== 0) material[man >> 3] = material[man >> 3]! + WORTHS[man & 7]!;
    const owner = table.commands[square];
    if (owner !== 0 && owner !== 1) continue;
    for (let region = 0; region < REGIONS.length; region++)
      if (IN_REGION[square]! & (1 << region)) command[region]![owner === 0 ? 'white' : 'black']++;
  }
  const sides = bySide(
    (side): CompactSide => ({
      weakSquares: weakSquares.filter((weak) => weak.side === side).length,
      outposts: outposts.filter((post) => post.side === side && post.rank === 'outpost').length,
      files: files.filter(({ control }) => control === side).length,
      safeMoves: totals[side].safeMoves,
      flights: kings[side]?.flights.length ?? 0,
      shelter: kings[side]?.shelter.filter(({ pawn }) => pawn !== null).length ?? 0,
      kingAttackers: kings[side]?.reachedBy.length ?? 0,
      material: material[side === 'white' ? 0 : 1]!,
    }),
  );
  return {
    structure: structure && { id: structure.id, name: structure.name, side: structure.side },
    command: Object.fromEntries(REGIONS.map((region, place) => [region, command[place]!])) as CompactReading['command'],
    ...sides,
  };
}
