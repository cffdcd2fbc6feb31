/** How squares are held against pawns: rows are boards with a reason. */
import { describe, expect, it } from 'vitest';
import { sq, squareName } from '@/engine/board';
import { pawnMap, pawnReach } from '@/engine/pawns';
import type { Side, SquareName } from '@/engine/types';
import { diagram } from '../../../support/pawn-boards';

type Row = readonly [fen: string, side: Side, square: SquareName, answer: string, reason: string];

const ROWS: readonly Row[] = [
  ['8/8/3p4/4p3/4P3/8/8/8', 'black', 'd5', 'permanent', 'no c-pawn, and e5 is past it'],
  ['8/2p5/3p4/4p3/4P3/8/8/8', 'black', 'd5', 'open c7 in 1', 'c7-c6 attacks it'],
  ['8/8/8/8/8/8/2P5/8', 'white', 'd5', 'open c2 in 1', 'the double step is one move'],
  ['8/8/8/8/8/8/2P5/8', 'white', 'd6', 'open c2 in 2', 'c4, then c5'],
  ['8/8/8/8/8/2P5/8/8', 'white', 'd5', 'open c3 in 1', 'one step'],
  ['8/8/8/8/8/8/2P1P3/8', 'white', 'd3', 'attacked c2 e2 now', 'both pawns attack; the outer one is named'],
  ['8/8/8/2p5/8/8/2P5/8', 'white', 'd6', 'fixed c2 by ram on c5', 'the enemy pawn stands on its road'],
  ['8/8/8/8/8/2p5/2P5/8', 'white', 'd5', 'fixed c2 by ram on c3', 'Capablanca, game 6: c2 cannot get past c3'],
  ['8/8/2p5/1P6/8/8/8/8', 'black', 'd5', 'attacked c6 now', 'attacked is attacked, whatever threatens the pawn'],
  ['8/2p5/8/1P6/8/8/8/8', 'black', 'd5', 'fixed c7 by controlled on c6', 'b5 controls c6 and no black pawn guards it'],
  ['8/1pp5/8/1P6/8/8/8/8', 'black', 'd5', 'open c7 in 1', 'b7 guards c6'],
  ['8/8/8/8/1p6/8/2P5/8', 'white', 'd5', 'fixed c2 by controlled on c3', 'the double step is captured in passing'],
  ['8/2n5/8/8/8/8/2P5/8', 'white', 'd5', 'open c2 in 1', 'men are not looked at'],
  ['8/8/8/8/8/8/8/2P5', 'white', 'd4', 'open c1 in 2', 'from the first rank, in diagrams, no double step'],
  ['8/8/8/8/8/8/2P5/8', 'white', 'd2', 'permanent', 'a pawn does not attack beside itself'],
];

function answer(fen: string, side: Side, square: SquareName): string {
  const { hold, attackedNow, soonest, stopped } = pawnReach(pawnMap(diagram(fen)), side, sq(square));
  if (hold === 'open' && soonest) return `open ${squareName(soonest.from)} in ${soonest.moves}`;
  if (hold === 'attacked' && soonest) {
    const rest = attackedNow.filter((pawn) => pawn !== soonest.from).map(squareName);
    return [hold, squareName(soonest.from), ...rest, soonest.moves === 0 ? 'now' : 'late'].join(' ');
  }
  return [
    hold,
    ...stopped.map(({ from, by, stoppedOn }) => `${squareName(from)} by ${by} on ${squareName(stoppedOn)}`),
  ].join(' ');
}

describe('a square against pawns', () => {
  it.each(ROWS)('%s: %s pawns and %s: %s: %s', (fen, side, square, expected) => {
    expect(answer(fen, side, square)).toBe(expected);
  });
});
