/**
 * Sets of ranks on one file as 8-bit masks, in the view of a side: bit 0 is its own back rank, bit 7 the
 * last. Questions about pawns are mostly about 'ahead', 'level' and 'behind', and these are one table each.
 */
const MASKS = Array.from({ length: 256 }, (_, mask) => mask);
const RANKS_OF_FILE = [0, 1, 2, 3, 4, 5, 6, 7];

/** The same ranks as the other side counts them. */
export const REVERSED: Readonly<Uint8Array> = Uint8Array.from(MASKS, (mask) =>
  RANKS_OF_FILE.reduce((turned, rank) => turned | (((mask >> rank) & 1) << (7 - rank)), 0),
);

/** Number of ranks in a mask. */
export const COUNT: Readonly<Uint8Array> = Uint8Array.from(MASKS, (mask) =>
  RANKS_OF_FILE.reduce((count, rank) => count + ((mask >> rank) & 1), 0),
);

/** The rank of a mask nearest to the side's own back rank; 8 for the empty mask. */
export const REARMOST: Readonly<Uint8Array> = Uint8Array.from(MASKS, (mask) =>
  mask === 0 ? 8 : 31 - Math.clz32(mask & -mask),
);

/** The rank of a mask furthest from the side's own back rank; -1 for the empty mask. */
export const FOREMOST: Readonly<Int8Array> = Int8Array.from(MASKS, (mask) => 31 - Math.clz32(mask));

/** The ranks in front of a rank, by rank 0 to 7. */
export const AHEAD: Readonly<Uint8Array> = Uint8Array.from(RANKS_OF_FILE, (rank) => 0xff << (rank + 1));

/** The ranks level with a rank or behind it, by rank 0 to 7. */
export const UP_TO: Readonly<Uint8Array> = Uint8Array.from(RANKS_OF_FILE, (rank) => (1 << (rank + 1)) - 1);

/** Entry of a table whose index is known to be inside it. */
export function at(table: Readonly<Uint8Array> | Readonly<Int8Array>, index: number): number {
  return table[index] as number;
}
