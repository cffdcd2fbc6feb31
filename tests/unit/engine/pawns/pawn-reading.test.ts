/** What single pawns are called: rows are boards with a reason. */
import { describe, expect, it } from 'vitest';
import { sq, squareName } from '@/engine/board';
import { pawnOn, type PawnReading, pawnValues } from '@/engine/pawns';
import type { SquareName } from '@/engine/types';
import { diagram } from '../../../support/pawn-boards';

function pawnAt(fen: string, name: SquareName): PawnReading {
  const pawn = pawnOn(pawnValues(diagram(fen)), sq(name));
  if (!pawn) throw new Error(`no pawn on ${name} in ${fen}`);
  return pawn;
}

type Claim =
  | 'isolated'
  | 'doubled'
  | 'backward'
  | 'passed'
  | 'protectedPassed'
  | 'candidate'
  | 'rammed'
  | 'fixed'
  | 'guarded';

const CLAIMS: readonly (readonly [fen: string, pawn: SquareName, claim: Claim, holds: boolean, reason: string])[] = [
  ['8/8/8/8/3P4/8/PP3PPP/8', 'd4', 'isolated', true, 'no pawn on the c- and e-files'],
  ['8/8/8/8/3P4/2P5/8/8', 'd4', 'isolated', false, 'c3 is a neighbour'],
  ['8/8/8/8/8/2P5/2P5/8', 'c2', 'doubled', true, 'c3 stands before it'],
  ['8/8/8/8/8/2P5/2P5/8', 'c3', 'doubled', true, 'both pawns of the pair are listed'],
  ['8/8/8/2p5/4P3/3P4/8/8', 'd3', 'backward', true, 'c5 attacks its stop square and e4 is past'],
  ['8/8/8/8/4P3/3P4/8/8', 'd3', 'backward', false, 'nothing attacks the way to e4'],
  ['8/8/8/2p5/4P3/3P4/2P5/8', 'd3', 'backward', false, 'c2 is behind it and can come to guard'],
  ['8/8/8/2p5/8/3P4/8/8', 'd3', 'backward', false, 'an isolated pawn is called isolated'],
  ['8/8/8/4p3/2P5/8/3P4/8', 'd2', 'backward', true, 'd3 is free but d4, level with c4, is attacked by e5'],
  ['8/8/4p3/8/2P5/8/3P4/8', 'd2', 'backward', false, 'only d5 is attacked, beyond the neighbour on c4'],
  ['8/3p4/8/8/8/8/4P3/8', 'e2', 'passed', false, 'd7 could stop it'],
  ['8/3p4/4P3/8/8/8/8/8', 'e6', 'passed', false, 'd7 is ahead of it on the next file'],
  ['8/8/3pP3/8/8/8/8/8', 'e6', 'passed', true, 'd6 is level and cannot stop it any more'],
  ['8/8/4P3/8/8/4P3/8/8', 'e3', 'passed', true, 'an own pawn ahead does not count against it'],
  ['8/8/4P3/3P4/8/8/8/8', 'e6', 'protectedPassed', true, 'd5 guards it'],
  ['8/8/4P3/4P3/8/8/8/8', 'e6', 'protectedPassed', false, 'a pawn on its own file guards nothing ahead'],
  ['8/1p6/8/8/8/8/PP6/8', 'a2', 'candidate', true, 'one helper, one sentry'],
  ['8/1p6/8/8/8/8/PP6/8', 'b2', 'candidate', false, 'b7 stands on its file'],
  ['8/1p6/8/1P6/P7/8/8/8', 'a4', 'candidate', false, 'b5 is no helper: it is ahead of it already'],
  ['8/8/8/4p3/4P3/8/8/8', 'e4', 'rammed', true, 'head to head'],
  ['8/8/8/4n3/4P3/8/8/8', 'e4', 'rammed', false, 'a knight blocks, it does not ram'],
  ['8/8/8/4n3/4P3/8/8/8', 'e4', 'fixed', true, 'it can neither step nor capture'],
  ['8/8/8/3nn3/4P3/8/8/8', 'e4', 'fixed', false, 'it can take on d5'],
  ['8/8/8/3kn3/4P3/8/8/8', 'e4', 'fixed', true, 'a king is not captured'],
  ['8/8/3pp3/3pP3/8/8/8/8 w - d6', 'e5', 'fixed', false, 'd6 is taken'],
  ['8/8/4p3/3pP3/8/8/8/8 w - d6', 'e5', 'fixed', false, 'en passant on d6'],
  ['8/8/4p3/3pP3/8/8/8/8 b - d6', 'e5', 'fixed', true, 'no en passant when the other side is to move'],
];

describe('a pawn', () => {
  it.each(CLAIMS)('%s: %s %s is %s: %s', (fen, name, claim, holds) => {
    expect(pawnAt(fen, name)[claim]).toBe(holds);
  });

  it('knows its stop square and who stands on it', () => {
    expect(pawnAt('8/8/8/4n3/4P3/8/8/8', 'e4')).toMatchObject({ stop: sq('e5'), blockedBy: sq('e5') });
    expect(pawnAt('8/8/8/4p3/8/8/8/8', 'e5')).toMatchObject({ stop: sq('e4'), blockedBy: null });
  });

  it('on its last rank, as diagrams may have it, has no stop square and stays fixed', () => {
    expect(pawnAt('4P3/8/8/8/8/8/8/4p3', 'e8')).toMatchObject({ stop: null, fixed: true, levers: [] });
    expect(pawnAt('4P3/8/8/8/8/8/8/4p3', 'e1')).toMatchObject({ stop: null, fixed: true, levers: [] });
  });

  it('takes its place in the chain', () => {
    const chain = '8/8/8/4P3/3P4/2P5/8/8';
    expect((['c3', 'd4', 'e5'] as const).map((name) => pawnAt(chain, name).chain)).toEqual(['base', 'link', 'head']);
    expect(pawnAt('8/8/8/8/3PP3/8/8/8', 'd4').chain).toBeNull();
  });
});

describe('a change of the board', () => {
  it('a pawn put beside an isolated one ends the isolation', () => {
    expect(pawnAt('8/8/8/8/3P4/8/8/8', 'd4').isolated).toBe(true);
    expect(pawnAt('8/8/8/8/3P4/8/2P5/8', 'd4').isolated).toBe(false);
  });

  it('a guard behind a backward pawn ends the backwardness, and so does taking the attacker away', () => {
    expect(pawnAt('8/8/3p4/4p3/2P1P3/8/8/8', 'd6').backward).toBe(true);
    expect(pawnAt('8/2p5/3p4/4p3/2P1P3/8/8/8', 'd6').backward).toBe(false);
    expect(pawnAt('8/8/3p4/4p3/8/8/8/8', 'd6').backward).toBe(false);
  });

  it('an enemy pawn put ahead on the next file ends a passed pawn', () => {
    expect(pawnAt('8/8/8/3P4/8/8/8/8', 'd5').passed).toBe(true);
    expect(pawnAt('8/4p3/8/3P4/8/8/8/8', 'd5').passed).toBe(false);
  });
});

const LEVERS: readonly (readonly [fen: string, pawn: SquareName, levers: readonly string[], reason: string])[] = [
  ['8/8/8/3p4/2P5/8/8/8', 'c4', ['c4xd5 0'], 'a lever now, unsupported'],
  ['8/8/8/3p4/2P5/1P6/8/8', 'c4', ['c4xd5 0 supported'], 'b3 guards c4'],
  ['8/8/2p5/8/8/8/1P6/8', 'b2', ['b5xc6 2'], 'the double step counts as one'],
  ['8/8/2p5/1p6/8/8/1P6/8', 'b2', [], 'b5 stands in the way'],
  ['8/8/2p5/8/8/1P6/1P6/8', 'b2', [], 'the own pawn on b3 stands in the way'],
  ['8/8/2p5/8/8/1P6/8/8', 'b3', ['b5xc6 2'], 'no double step from the third rank'],
  ['8/2p5/8/8/8/8/1P6/8', 'b2', ['b6xc7 3'], 'three moves is as far as we look'],
  ['8/2p5/8/8/8/1P6/8/8', 'b3', ['b6xc7 3'], 'three single steps'],
  ['2p5/8/8/8/8/1P6/8/8', 'b3', [], 'four moves are too many'],
  ['8/8/8/p1p5/1P6/8/8/8', 'b4', ['b4xa5 0', 'b4xc5 0'], 'against both neighbours'],
];

describe('levers', () => {
  it.each(LEVERS)('%s: %s has %s: %s', (fen, name, expected) => {
    const words = pawnAt(fen, name).levers.map(
      ({ on, against, moves, supported }) =>
        `${squareName(on)}x${squareName(against)} ${moves}${supported ? ' supported' : ''}`,
    );
    expect(words).toEqual(expected);
  });
});
