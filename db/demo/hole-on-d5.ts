/** Study: the hole on d5. Lines of the Sicilian Defence (Najdorf, Sveshnikov), as the opening books have them. */
import type { DemoStudy } from './types';

export const holeOnD5: DemoStudy = {
  title: 'A hole on d5: the bargain of e7-e5',
  summary:
    'With the pawn on e5 Black has a share of the centre and never again a pawn that guards d5. Five positions: before the bargain, after it, and three ways to go on.',
  shared: false,
  positions: [
    {
      title: 'No hole yet',
      line: 'e4 c5 Nf3 d6 d4 cxd4 Nxd4 Nf6 Nc3 a6 Bg5 e6 f4 Be7',
      fen: 'rnbqk2r/1p2bppp/p2ppn2/6B1/3NPP2/2N5/PPP3PP/R2QKB1R w KQkq - 1 8',
      note: `The small centre: the pawn on e6 guards d5, the pawn on d6 guards e5. White's pieces have more room, 32 safe moves against 23, and no outpost in the centre.

On **d5** the count is even: knight and pawn against knight and pawn. A minor piece of either side would be lost there.

Four levers are ready: e4-e5 and f4-f5 for White, d6-d5 and e6-e5 for Black. The weak squares of this position are not there yet. The next lever makes them.`,
      layer: 'command',
      marks: [{ square: 'd5' }, { square: 'e5' }],
    },
    {
      title: 'The hole',
      line: 'e4 c5 Nf3 d6 d4 cxd4 Nxd4 Nf6 Nc3 a6 Be2 e5 Nb3 Be7 O-O O-O Be3 Be6',
      fen: 'rn1q1rk1/1p2bppp/p2pbn2/4p3/4P3/1NN1B3/PPP1BPPP/R2Q1RK1 w - - 6 10',
      note: `Black has played e7-e5. No black pawn can ever guard **d5** again; the pawn on e4 supports a man there, and the knight on c3 is one move away. Behind the square stands **d6**, backward, on a file half-open for White.

What did Black get? The pawn on e5 keeps White's knights from **d4** and **f4**: on f4 Black commands, on d4 a minor piece of either side would be lost. The c-file is half-open for Black, and no pawn guards c2.

A hole is not yet an outpost that one holds. The knight on f6 and the bishop on e6 both guard d5. The rest of this study is about those two.`,
      layer: 'weak',
      man: 'c3',
      marks: [{ square: 'd5', text: 'never again a pawn' }],
    },
    {
      title: 'The guard is exchanged',
      line: 'e4 c5 Nf3 Nc6 d4 cxd4 Nxd4 Nf6 Nc3 e5 Ndb5 d6 Bg5 a6 Na3 b5 Bxf6 gxf6 Nd5',
      fen: 'r1bqkb1r/5p1p/p1np1p2/1p1Np3/4P3/N7/PPP2PPP/R2QKB1R b KQkq - 1 10',
      note: `White gave the bishop for the knight that guarded d5, and put a knight there. No black pawn can challenge it, the pawn on e4 supports it, and **f5** is an outpost of the same kind.

Black was paid for it: the bishop pair, the half-open g-file, and two f-pawns. **f6-f5** strikes at e4, the pawn on which White's knight rests.

So the question is not whether the knight stands well. It is whether the square under it can be dug away. Meanwhile White's other knight is on a3, and b5 is closed to it.`,
      layer: 'outposts',
      man: 'd5',
      marks: [{ square: 'f6', to: 'f5' }],
    },
    {
      title: 'Who can challenge the knight?',
      line: 'e4 c5 Nf3 Nc6 d4 cxd4 Nxd4 Nf6 Nc3 e5 Ndb5 d6 Bg5 a6 Na3 b5 Nd5 Be7 Bxf6 Bxf6 c3 O-O Nc2 Bg5',
      fen: 'r1bq1rk1/5ppp/p1np4/1p1Np1b1/4P3/2P5/PPN2PPP/R2QKB1R w KQ - 3 13',
      note: `The same hole without doubled pawns. Black took back on f6 with the bishop, and then brought it out before the pawns, to **g5**.

No pawn can ever challenge the knight on d5. Pieces can: the knight on c6 from e7, the bishop on c8 from e6 or b7. White's second knight is ready to take the place: from c2 it guards d5 after one move to b4 or e3, and on e3 the bishop on g5 can take it.

Black has the bishop pair and a small attack of two pawns against three: **b5-b4** strikes at c3. If c3 goes, is d4 still White's?`,
      layer: 'control',
      man: 'd5',
      marks: [
        { square: 'c2', to: 'b4' },
        { square: 'c2', to: 'e3' },
      ],
    },
    {
      title: 'The hole is filled',
      line: 'e4 c5 Nf3 d6 d4 cxd4 Nxd4 Nf6 Nc3 a6 Be2 e5 Nb3 Be7 O-O O-O Be3 Be6 Nd5 Nxd5 exd5 Bf5',
      fen: 'rn1q1rk1/1p2bppp/p2p4/3Ppb2/8/1N2B3/PPP1BPPP/R2Q1RK1 w - - 1 12',
      note: `The knight went to d5 at once, Black took, and White had to take back with the pawn. The hole is gone: a pawn stands on it, and the pawn on d6 no longer stands on an open road.

Now it is a matter of majorities. White has three pawns against two on the queenside, and in two moves the lever **c5** against d6. Black has two against one in the centre, and no pawn stands before the one on **e5**.

An outpost is worth what stands on it. When the last piece there is exchanged, ask before the exchange which pawns it will leave.`,
      layer: 'control',
      marks: [{ square: 'c2', to: 'c5' }],
    },
  ],
};
