/** Facts about counts over the whole board that hold in a position. */
import { fileOf, relativeRank } from '../../board';
import { bySide, type Side } from '../../types';
import type { ControlFact } from '../facts/control';
import type { ReadingValues } from '../values';

/** Differences below which a count is not worth a sentence. Picked by eye on positions of real games. */
const LEAST = { reach: 4, 'safe-moves': 8, space: 3, command: 6 } as const;

/** Everything worth saying about totals. */
export function controlFacts(values: ReadingValues): ControlFact[] {
  const { totals } = values;
  const counts = {
    reach: bySide((side) => totals[side].enemyHalf),
    'safe-moves': bySide((side) => totals[side].safeMoves),
    space: bySide((side) => roomBehindPawns(values, side)),
    command: bySide((side) => totals[side].commanded),
  } as const;
  return (Object.keys(LEAST) as (keyof typeof LEAST)[]).flatMap((id) => {
    const { white, black } = counts[id];
    if (Math.abs(white - black) < LEAST[id]) return [];
    const side: Side = white > black ? 'white' : 'black';
    return [{ id, side, more: Math.max(white, black), fewer: Math.min(white, black), squares: [], men: [] }];
  });
}

/**
 * Room: on each file c to f, the squares behind the side's foremost pawn. Books count space in several ways; this
 * is the simplest that a finger can check.
 */
export function roomBehindPawns({ pawns }: ReadingValues, side: Side): number {
  let room = 0;
  for (let file = 2; file <= 5; file++) {
    const ranks = pawns[side].pawns
      .filter((square) => fileOf(square) === file)
      .map((square) => relativeRank(square, side));
    if (ranks.length > 0) room += Math.max(...ranks) - 1;
  }
  return room;
}
