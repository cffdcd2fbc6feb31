/** The pawns of a side together, and of the position: rows are boards with a reason. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { squareName } from '@/engine/board';
import { pawnValues, type Wing } from '@/engine/pawns';
import { SIDES, type Side, type Square, type SquareName } from '@/engine/types';
import { diagram, pawnBoards } from '../../../support/pawn-boards';
import { slowPawns } from '../../../support/slow/pawns';

const names = (squares: readonly Square[]): SquareName[] => squares.map(squareName);
const START = 'rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR';

describe('islands', () => {
  it('end where a file has no own pawn; doubled pawns make none longer', () => {
    const { white } = pawnValues(diagram('8/8/8/8/3P4/P1PP4/P4PP1/7P'));
    expect(white.islands.map(names)).toEqual([
      ['a2', 'a3'],
      ['c3', 'd3', 'd4'],
      ['h1', 'f2', 'g2'],
    ]);
    expect(pawnValues(diagram(START)).white.islands).toHaveLength(1);
    expect(pawnValues(diagram('8/8/8/8/8/8/8/8')).white.islands).toEqual([]);
  });

  it('are as many as runs of letters in the row of files', () => {
    fc.assert(
      fc.property(pawnBoards, (position) => {
        for (const side of SIDES) {
          const files = new Set(slowPawns(position, side).map((square) => squareName(square).charAt(0)));
          const row = [...'abcdefgh'].map((file) => (files.has(file) ? 'x' : ' ')).join('');
          const value = pawnValues(position)[side];
          expect(value.islands.length).toBe(row.split(' ').filter((run) => run !== '').length);
          expect(value.islands.flat().sort((a, b) => a - b)).toEqual(value.pawns);
          expect(value.onLight + value.onDark).toBe(value.pawns.length);
        }
      }),
      { numRuns: 200 },
    );
  });
});

type MajorityRow = readonly [
  fen: string,
  side: Side,
  majorities: readonly Wing[],
  crippled: readonly Wing[],
  reason: string,
];
const MAJORITIES: readonly MajorityRow[] = [
  [START, 'white', [], [], 'eight against eight'],
  ['8/pp3ppp/8/8/8/8/PPP2PP1/8', 'white', ['queenside'], [], 'three against two'],
  ['8/pp3ppp/8/8/8/8/PPP2PP1/8', 'black', ['kingside'], [], 'three against two'],
  // Edward Lasker, Chess Strategy (1915), notes to game 18: the doubled c-pawn cripples the queenside.
  ['8/1pp2ppp/p1p5/8/4P3/8/PPP2PPP/8', 'black', ['queenside'], ['queenside'], 'four on three files against three'],
  ['8/1pp2ppp/p1p5/8/4P3/8/PPP2PPP/8', 'white', ['centre'], [], 'e4 against none'],
  ['8/8/2p5/p1p5/8/1P6/1P6/8', 'black', ['queenside'], [], 'doubled, but two files against one'],
];

describe('majorities', () => {
  it.each(MAJORITIES)('%s for %s: %s, crippled %s: %s', (fen, side, majorities, crippled) => {
    const value = pawnValues(diagram(fen))[side];
    expect([value.majorities, value.crippledMajorities]).toEqual([majorities, crippled]);
  });
});

const HANGING: readonly (readonly [fen: string, pair: readonly SquareName[] | null, reason: string])[] = [
  ['8/pp2pppp/8/8/2PP4/8/P4PPP/8', ['c4', 'd4'], 'abreast, neighbours gone, files half-open'],
  ['8/pp3ppp/8/8/2PP4/8/PP3PPP/8', null, 'b2 is a neighbour'],
  ['8/pp3ppp/8/8/3P4/2P5/P4PPP/8', null, 'not abreast: the isolated pawn couple'],
  ['8/ppp3pp/8/8/2PP4/8/P4PPP/8', null, 'c7 closes the file'],
  ['8/pp3ppp/8/2PP4/8/8/P4PPP/8', null, 'on the fifth rank they hang no more'],
];

describe('hanging pawns', () => {
  it.each(HANGING)('%s: %s: %s', (fen, pair) => {
    const { hangingPawns } = pawnValues(diagram(fen)).white;
    expect(hangingPawns && names(hangingPawns)).toEqual(pair);
  });
});

const MINORITY: readonly (readonly [fen: string, attack: string | null, reason: string])[] = [
  ['8/pp3ppp/2p5/3p4/3P4/4P3/PP3PPP/8', 'queenside b2 b5 c6 2', 'the Carlsbad: b2-b4-b5 against c6'],
  ['8/1p3ppp/p1p5/3p4/1P1P4/4P3/P4PPP/8', 'queenside b4 b5 c6 1', 'one move gone already'],
  ['8/ppp2ppp/8/3p4/3P4/4P3/PP3PPP/8', null, 'c7 would be attacked from b6 only'],
  ['8/p4ppp/2p5/3p4/3P4/4P3/PP3PPP/8', null, 'two against two is no minority'],
  ['8/pp3ppp/2p5/1p1p4/3P4/4P3/PP3PPP/8', null, 'b5 is taken'],
  ['8/pp3ppp/2p5/3p4/3P4/2P1P3/PP3PPP/8', null, 'the c-file is not half-open'],
];

describe('the minority attack', () => {
  it.each(MINORITY)('%s: %s: %s', (fen, attack) => {
    const words = pawnValues(diagram(fen)).white.minorityAttacks.map(
      ({ wing, lever }) =>
        `${wing} ${squareName(lever.from)} ${squareName(lever.on)} ${squareName(lever.against)} ${lever.moves}`,
    );
    expect(words).toEqual(attack === null ? [] : [attack]);
  });
});

describe('rams and fixedness', () => {
  it('count the pawns that can neither move nor capture', () => {
    const { rams, fixedness } = pawnValues(diagram('8/8/4p3/3pP3/3P4/8/P7/8'));
    expect(rams.map((ram) => `${squareName(ram.white)}-${squareName(ram.black)}`)).toEqual(['d4-d5', 'e5-e6']);
    expect(fixedness).toEqual({ all: 4 / 5, centre: 1 });
  });

  it('are null where there are no such pawns', () => {
    expect(pawnValues(diagram('8/8/8/8/8/8/8/8')).fixedness).toEqual({ all: null, centre: null });
    expect(pawnValues(diagram('8/8/8/8/8/8/P7/8')).fixedness).toEqual({ all: 0, centre: null });
  });
});
