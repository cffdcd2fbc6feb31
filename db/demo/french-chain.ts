/** Study: the French chain. Lines of the French Defence (advance, Tarrasch, Steinitz), as the opening books have them. */
import type { DemoStudy } from './types';

export const frenchChain: DemoStudy = {
  title: 'The French chain and the bishop behind it',
  summary:
    'd4 against d5 and e5 against e6: the pawns are locked, and the bishop on c8 is behind them. Four positions about the levers, and about what Black does with that bishop.',
  shared: false,
  positions: [
    {
      title: 'First of all: offer the bishop',
      line: 'e4 e6 d4 d5 e5 c5 c3 Qb6 Nf3 Bd7 Be2 Bb5',
      fen: 'rn2kbnr/pp3ppp/1q2p3/1bppP3/3P4/2P2N2/PP2BPPP/RNBQK2R w KQkq - 5 7',
      note: `Black spends two moves to offer the light-squared bishop. Count why: five of Black's eight pawns stand on light squares, and six of White's eight on dark ones. So Black's bishop is the one that its own pawns hinder, and White's on e2 is the one that they do not.

Meanwhile the centre is in tension: d4 and c5 attack each other. Two levers are ready, **b2-b4** against c5 and **f7-f6** against e5.

Would you take on b5, or let Black take on e2? Ask which piece will be drawn where.`,
      layer: 'mobility',
      man: 'b5',
      marks: [{ square: 'b5', to: 'e2' }],
    },
    {
      title: 'Locked',
      line: 'e4 e6 d4 d5 e5 c5 c3 Nc6 Nf3 Bd7 Be2 Nge7 O-O Ng6 Na3 cxd4 cxd4 Be7 Nc2 O-O',
      fen: 'r2q1rk1/pp1bbppp/2n1p1n1/3pP3/3P4/5N2/PPN1BPPP/R1BQ1RK1 w - - 3 11',
      note: `The c-pawns are gone; what is left cannot move: d4 against d5, e5 against e6. The bishop stayed at home and is now on **d7**: five of seven pawns stand on its colour, and its way forward ends at e6.

One lever is ready: **f7-f6** strikes at e5, the pawn that helps to shut the bishop in.

White has a far goal. No black pawn can ever challenge a man on **d6**, and the pawn on e5 supports it. The knight on c2 gets there in three moves. Find the way, and then look what Black can do in three moves.`,
      layer: 'routes',
      man: 'c2',
      marks: [{ square: 'd6', text: 'in three moves' }],
    },
    {
      title: 'After the lever',
      line: 'e4 e6 d4 d5 Nd2 Nf6 e5 Nfd7 Bd3 c5 c3 Nc6 Ne2 cxd4 cxd4 f6 exf6 Nxf6 Nf3 Bd6 O-O O-O',
      fen: 'r1bq1rk1/pp4pp/2nbpn2/3p4/3P4/3B1N2/PP2NPPP/R1BQ1RK1 w - - 4 12',
      note: `Black has played f7-f6, and White took. Both sides have something to show.

Black has the half-open f-file: the rook on f8 stands on it, against **f2**, which no pawn guards.

White has **e5**: no black pawn can ever challenge a man there, and the pawn on d4 supports it. Behind it the pawn on **e6** is backward, on a file half-open for White; the rook is one move from e1.

Everything turns on one move. If **e6-e5** comes, it strikes at d4 and lets the bishop on c8 out. If White's men hold e5, it never comes.`,
      layer: 'outposts',
      marks: [{ square: 'e5' }, { square: 'e6', text: 'backward' }],
    },
    {
      title: 'The centre is let go',
      line: 'e4 e6 d4 d5 Nc3 Nf6 e5 Nfd7 f4 c5 Nf3 Nc6 Be3 a6 Qd2 b5 dxc5 Bxc5 Bxc5 Nxc5',
      fen: 'r1bqk2r/5ppp/p1n1p3/1pnpP3/5P2/2N2N2/PPPQ2PP/R3KB1R w KQkq - 0 11',
      note: `White gave up the pawn on d4 for the square: the knight on f3 comes to **d4** in one move, and the pawn on c2 can support it once the knight on c3 has moved.

Black has a square of the same kind. No white pawn can ever challenge a man on **e4**, the pawn on d5 supports it, and the knight on c5 is one move away.

With the b-pawn on b5 and the c-pawn gone, no black pawn can guard **c5**, **c6** or **d6** any more. And the bishop on c8 is worse than in any other position of this study: six of seven pawns stand on its colour.`,
      layer: 'weak',
      marks: [
        { square: 'f3', to: 'd4' },
        { square: 'c5', to: 'e4' },
      ],
    },
  ],
};
