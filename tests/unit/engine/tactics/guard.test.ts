/** What the guard sees, and that it says when it gave up. Positions of our own. */
import { describe, expect, it } from 'vitest';
import { sq } from '@/engine/board';
import { GUARD_BOUNDS, guardOf, MATE, SECOND_LOOK, searchGain } from '@/engine/tactics';
import { positionOf } from '../../../support/random';

const board = (fen: string) => positionOf(fen).board;
const WHITE = 0;
const BLACK = 1;

describe('guardOf', () => {
  it.each([
    ['nothing to take', '4k3/8/8/3p4/3P4/8/8/4K3 w - - 0 1', WHITE, 'holds', 0],
    ['a guarded pawn is left alone by a rook', '4k3/8/4p3/3p4/8/8/8/3RK3 w - - 0 1', WHITE, 'holds', 0],
    ['a loose knight falls', '4k3/8/8/3n4/8/8/8/3RK3 w - - 0 1', WHITE, 'loses', 3],
    ['a check along the back rank mates', '6k1/5ppp/8/8/8/8/8/R3K3 w - - 0 1', WHITE, 'loses', MATE],
    ['a pawn that promotes while taking', '1r5k/2P5/8/8/8/8/8/4K3 w - - 0 1', WHITE, 'loses', 13],
    ['a knight check forks king and rook', '4k2r/8/8/3N4/8/8/8/4K3 w - - 0 1', WHITE, 'holds', 0],
    ['the same seen from Black', '3rk3/8/8/8/3N4/8/8/4K3 b - - 0 1', BLACK, 'loses', 3],
  ] as const)('%s', (_reason, fen, enemy, verdict, loses) => {
    const guard = guardOf(board(fen), enemy);
    expect(guard).toMatchObject({ verdict, loses });
    expect(guard.line.length > 0).toBe(verdict === 'loses');
  });

  it('says unknown when its nodes run out before anything is proved', () => {
    const busy = board('r3k2r/pp1n1ppp/2pbpn2/3p4/2PP4/2NBPN2/PP3PPP/R3K2R w KQkq - 0 9');
    expect(guardOf(busy, WHITE, { nodesMax: 1, checkPlies: 1 }).verdict).toBe('unknown');
    expect(guardOf(busy, WHITE, GUARD_BOUNDS).verdict).toBe('holds');
  });

  it('captures in passing where that is allowed now, and not otherwise', () => {
    const passing = board('4k3/8/8/3pP3/8/8/8/4K3 w - d6 0 1');
    expect(guardOf(passing, WHITE, GUARD_BOUNDS, sq('d6')).loses).toBe(1);
    expect(guardOf(passing, WHITE).loses).toBe(0);
  });
});

describe('the second look', () => {
  it('sees a fork by a quiet move, which captures alone do not show', () => {
    // The guarded pawn steps to e4 and hits both knights; only one can go, the other is taken for the pawn.
    const forked = board('6k1/8/5p2/4p3/8/3N1N2/6PP/6K1 b - - 0 1');
    expect(searchGain(forked, BLACK, GUARD_BOUNDS).gains).toBe(0);
    expect(searchGain(forked, BLACK, SECOND_LOOK)).toMatchObject({ gains: 2, complete: true });
  });

  it('is the same for both colours', () => {
    const white = board('6k1/8/5p2/4p3/8/3N1N2/6PP/6K1 b - - 0 1');
    const black = board('6k1/6pp/3n1n2/8/4P3/5P2/8/6K1 w - - 0 1');
    expect(searchGain(black, WHITE, SECOND_LOOK).gains).toBe(searchGain(white, BLACK, SECOND_LOOK).gains);
  });
});
