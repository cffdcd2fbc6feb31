/**
 * What handbooks say of pawns, holes and posts in their own diagrams, and what engine/pawns says.
 *
 * Lasker: Edward Lasker, Chess Strategy (1915), Project Gutenberg 5614. Capablanca: J. R. Capablanca, Chess
 * Fundamentals (1921), Project Gutenberg 33870. Diagram, example or game numbers per row. A `hole` is held against
 * its side's pawns for good or by a stop; a `post` of a side likewise against the enemy's pawns.
 */
import { describe, expect, it } from 'vitest';
import { sq } from '@/engine/board';
import { pawnMap, pawnOn, type PawnReading, pawnReach, pawnValues } from '@/engine/pawns';
import { opponent, type Side, type SquareName } from '@/engine/types';
import { diagram } from '../support/pawn-boards';

type Row = readonly [source: string, board: string, claims: readonly string[]];

const ROWS: readonly Row[] = [
  ['Lasker, diagram 13', '8/6k1/1p3p2/p1p1pPp1/P1PnP3/1P1R2PK/8/8', ['post d4 black']],
  ['Lasker, diagram 29', '8/pp3ppp/4p3/2ppPP2/3P4/8/PPP3PP/8', ['chain d4 e5', 'chain e6 d5']],
  ['Lasker, diagram 31', '8/pp4pp/4pp2/2ppP3/3P1P2/2P5/PP4PP/8', ['chain c3 d4 e5']],
  ['Lasker, diagram 64', '8/p1pk4/2p5/8/3K4/3P4/1PP5/8', ['doubled c6', 'isolated c6', 'isolated a7']],
  ['Lasker, diagram 65', '8/2p5/2pk4/p7/P3K3/1P6/2P5/8', ['doubled c6', 'doubled c7']],
  ['Lasker, diagram 70', '8/8/p2k2bp/Pp1p1p2/1P1K1P2/3BP2P/8/8', ['isolated d5', 'isolated f5']],
  ['Lasker, diagram 91', 'r1bqkbnr/pp1p1ppp/8/2p5/3QP3/8/PPP2PPP/RNB1KB1R', ['backward d7', 'hole d5 black']],
  [
    'Lasker, diagram 95',
    'r2q1rk1/pbppnpbp/1pn1p1p1/4P3/3P4/2NBBN2/PPP2PPP/R2Q1RK1',
    ['hole f6 black', 'hole h6 black'],
  ],
  ['Lasker, diagram 98', 'r2q1rk1/p1pbbppp/2pp1n2/8/3NP3/2NQ4/PPP2PPP/R1B2RK1', ['isolated a7', 'doubled c6']],
  [
    'Lasker, diagram 99',
    'r1b2rk1/p1p2ppp/2p5/8/8/5B2/P1P2PPP/R4RK1',
    ['isolated a7', 'isolated c6', 'isolated a2', 'isolated c2'],
  ],
  [
    'Lasker, diagram 104',
    '2br1rk1/ppq2ppp/2p5/PnNB4/3P4/Q4NP1/1P3P1P/3RR1K1',
    ['hole f3 white', 'hole h3 white', 'isolated d4'],
  ],
  ['Lasker, diagram 106', 'r4rk1/2p1q2p/p1ppn1p1/4p3/PPP1P3/3PNNPb/1Q3R1P/R5K1', ['hole f3 white', 'hole h3 white']],
  ['Lasker, diagram 113', '5rk1/p3Q1p1/1pbN1p1p/3q1P2/2p5/2P4P/PP2R1P1/6K1', ['hole g6 black', 'hole g3 white']],
  [
    'Lasker, diagram 117',
    'r4rk1/1bq1bp1p/p1np1np1/1pp1p3/P3P3/2PP1NN1/1PB2PPP/R1BQR1K1',
    ['hole f6 black', 'hole h6 black'],
  ],
  ['Lasker, diagram 126', 'r1b1r1k1/1pp1n1pp/p1pb1p2/5P2/4P3/1NN5/PPP3PP/R1B2RK1', ['post e6 white']],
  ['Lasker, diagram 130', 'r4rk1/ppp5/3ppp1p/8/3PP3/8/P1P2PPP/R4RK1', ['isolated a2']],
  [
    'Lasker, diagram 139',
    'r3k2r/1p1bbppp/1qn1p3/p2pPn2/3P4/1P3NP1/PB2BP1P/RN1Q1K1R',
    ['post b5 white', 'hole b5 black'],
  ],
  ['Lasker, diagram 163', 'r1bqk2r/pp2npb1/3p1np1/2pP3p/2P2P1P/2NB2N1/PP4P1/R1BQK2R', ['post g4 black']],
  ['Lasker, diagram 166', '5k2/1b2bp1p/2p1p1pP/2ppB1P1/2P2P2/qP1PPN2/1Q6/5K2', ['post f6 white']],
  ['Lasker, diagram 167', '4rb1k/3q3p/2n1bpp1/2p1pNP1/1pP1P3/3PBQ2/rP1R1N1P/5RK1', ['backward d3', 'hole d4 white']],
  ['Capablanca, Example 64', '8/ppp2ppp/4p3/3pP3/3P4/8/PPP2PPP/8', ['chain d4 e5', 'chain e6 d5']],
  ['Capablanca, Example 65', 'r3r1k1/2pq1p1p/p5p1/1p1pP3/3P4/3Q4/PP3PPP/2R1R1K1', ['backward c7', 'post c5 white']],
  ['Capablanca, Example 66', '2r3k1/1q5p/p1p1r1p1/1pRpPp2/3P1PP1/Q6P/PP6/2R4K', ['backward c6', 'passed e5']],
  [
    'Capablanca, Example 67',
    'r3brk1/pp2q1pp/1np1p3/2NnNp2/3P4/3BP3/PP3PPP/2RQ1RK1',
    ['hole e5 black', 'post e5 white'],
  ],
  ['Capablanca, Example 52', 'r1bqnrk1/pp2b1pp/2p1p3/4NpB1/3P4/2PB3Q/PP3PPP/R3K2R', ['backward e6', 'post e5 white']],
  [
    'Capablanca, Example 53',
    '2b1qrk1/p1p2p1p/2pb2pB/2n1p3/1rP1P2N/8/PP1RQPPP/R2N2K1',
    ['hole d4 white', 'post d4 black'],
  ],
  [
    'Capablanca, Game 4, note to move 19',
    '1k1r2r1/pbpn1pqp/1p2pp2/8/2PP1P1N/3RQ1P1/P1P1B2P/2KR4',
    ['hole a6 black', 'hole c6 black'],
  ],
  [
    'Kasparov/Karpov WCh 1985 game 16, from memory',
    'r2qr1k1/5ppp/p4n2/1pbP1bB1/8/N1Nn1B2/PP1Q1PPP/3R1RK1',
    ['post d3 black', 'hole d3 white'],
  ],
  [
    'Nimzowitsch, My System, Chess Praxis, from memory',
    'r1bq1rk1/p4ppp/1pnp1n2/2p5/2PPpP2/1NP1P3/P3B1PP/R1BQ1RK1',
    ['doubled c3'],
  ],
  ['Nimzowitsch, My System, from memory', '2r2rk1/ppqb2pp/3bpn2/3pN3/1P1B4/2PB4/P3QPPP/R4RK1', ['hole e5 black']],
  ['Alekhine, New York 1924, from memory', '5k2/p1p4R/1pr5/3p1pP1/P2P1P2/2P2K2/8/8', ['passed g5']],
  ['Kasparov, from memory', '1r3bk1/5pp1/b4q1p/2nP4/2p3N1/N2nR2P/1P3PP1/1BBQ2K1', ['post d3 black']],
  // Game 6, note: c2 stands before c3 and can never drive the knight from d5.
  ['Capablanca, Game 6', 'r1b4r/pp3pk1/4p1pp/q2nP3/4QP2/2p5/P1P1NBPP/R2R2K1', ['stopped d5 white c2']],
  // Game 13: a strong post, no hole, since ...c7-c6 can challenge it.
  ['Capablanca, Game 13', 'r2q2k1/1pp2bb1/p2p1n2/3Nr1p1/4Pp2/2PB4/PP1Q1PPB/1K1R3R', ['challenged d5 black c7']],
  // Diagrams 29 and 31: the levers that break a chain.
  ['Lasker, diagram 29', '8/pp3ppp/4p3/2ppPP2/3P4/8/PPP3PP/8', ['lever f5 e6', 'lever c5 d4']],
  ['Lasker, diagram 31', '8/pp4pp/4pp2/2ppP3/3P1P2/2P5/PP4PP/8', ['lever f6 e5']],
];

type PawnClaim = 'isolated' | 'doubled' | 'backward' | 'passed';

const CASES = ROWS.flatMap(([source, board, claims]) => claims.map((claim) => [source, claim, board] as const));

describe('the handbooks', () => {
  it.each(CASES)('%s: %s', (_, claim, board) => {
    const position = diagram(board);
    const values = pawnValues(position);
    const [kind, ...names] = claim.split(' ');
    const square = sq(names[0] as SquareName);
    if (kind === 'hole' || kind === 'post') {
      const side = names[1] as Side;
      const { hold } = pawnReach(pawnMap(position), kind === 'hole' ? side : opponent(side), square);
      expect(hold).toMatch(/permanent|fixed/);
    } else if (kind === 'stopped' || kind === 'challenged') {
      const { hold, soonest, stopped } = pawnReach(pawnMap(position), names[1] as Side, square);
      expect(hold).toBe(kind === 'stopped' ? 'fixed' : 'open');
      expect(kind === 'stopped' ? stopped[0]?.from : soonest?.from).toBe(sq(names[2] as SquareName));
    } else if (kind === 'lever') {
      const now = values.levers.filter(({ from, moves }) => from === square && moves === 0);
      expect(now.map(({ against }) => against)).toContain(sq(names[1] as SquareName));
    } else if (kind === 'chain') {
      const chain = names.map((name) => pawnOn(values, sq(name as SquareName)));
      expect(chain.map(whetherInChain)).toEqual(names.map(() => true));
      expect(chain.slice(1).every((pawn) => pawn?.guarded)).toBe(true);
    } else {
      expect(pawnOn(values, square)?.[kind as PawnClaim]).toBe(true);
    }
  });
});

function whetherInChain(pawn: PawnReading | undefined): boolean {
  return pawn !== undefined && pawn.chain !== null;
}
