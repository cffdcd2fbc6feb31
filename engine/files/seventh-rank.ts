/** The seventh rank: which heavy men stand on it and which can come. */
import { type AttackMap } from '../attacks';
import { QUEEN, relativeRank, ROOK, viewOrder } from '../board';
import type { Reach } from '../reach';
import type { Side, Square } from '../types';

export interface SeventhRank {
  /** Rooks and queens of the side on its seventh rank. */
  readonly there: readonly Square[];
  /** Those that can come safely, soonest first: the man, the square and the moves. */
  readonly comers: readonly { readonly from: Square; readonly to: Square; readonly moves: number }[];
}

/** The seventh rank of a side. */
export function seventhRank(map: AttackMap, { moves }: Reach, side: Side): SeventhRank {
  const row = side === 'white' ? 0 : 32;
  const first = side === 'white' ? 48 : 8;
  const there: Square[] = [];
  const comers: { from: Square; to: Square; moves: number }[] = [];
  for (let number = 0; number < map.counts[row >> 5]!; number++) {
    const from = map.squares[row | number]! as Square;
    const kind = map.board[from]! & 7;
    if (kind !== ROOK && kind !== QUEEN) continue;
    if (relativeRank(from, side) === 7) {
      there.push(from);
      continue;
    }
    let nearest: { from: Square; to: Square; moves: number } | undefined;
    for (let to = first; to < first + 8; to++) {
      const needed = moves[((row | number) << 6) | to]!;
      if (needed > 0 && (!nearest || needed < nearest.moves)) nearest = { from, to: to as Square, moves: needed };
    }
    if (nearest) comers.push(nearest);
  }
  return {
    there,
    comers: comers.sort((a, b) => a.moves - b.moves || viewOrder(a.from, side) - viewOrder(b.from, side)),
  };
}
