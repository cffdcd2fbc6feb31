/** Study: the isolated queen's pawn. Lines of the Queen's Gambit Accepted and the Tarrasch Defence, as the opening books have them. */
import type { DemoStudy } from './types';

export const isolatedPawn: DemoStudy = {
  title: 'The isolated pawn: with it and against it',
  summary:
    'A pawn without neighbours gives squares and takes squares. Five positions: what its owner plays for, where the other side stops it, and how the structure ends.',
  shared: true,
  positions: [
    {
      title: 'What the pawn gives',
      line: 'd4 d5 c4 dxc4 Nf3 Nf6 e3 e6 Bxc4 c5 O-O a6 Nc3 Nc6 a3 cxd4 exd4 Be7 Ba2 O-O Re1 b5 h3 Bb7',
      fen: 'r2q1rk1/1b2bppp/p1n1pn2/1p6/3P4/P1N2N1P/BP3PP1/R1BQR1K1 w - - 1 13',
      note: `No white pawn stands on the c- or the e-file, so only pieces can guard **d4**: here the queen and the knight on f3. Both are tied to it.

In return the pawn holds c5 and e5, and White's men are free: 33 safe moves in all, against 27. The rook already stands on the half-open e-file, and the bishop on a2 looks along its diagonal as far as e6.

Black's answer is the square in front of the pawn. No white pawn can ever challenge a man on **d5**, and the pawn on e6 supports it. Who will stand there first?`,
      layer: 'control',
      marks: [{ square: 'd5', text: 'the square in front' }],
    },
    {
      title: 'The square in front',
      line: 'd4 d5 c4 dxc4 Nf3 Nf6 e3 e6 Bxc4 c5 O-O cxd4 exd4 Be7 Nc3 O-O Qe2 Nbd7 Bb3 Nb6 Re1 Nbd5 Ne5 b6',
      fen: 'r1bq1rk1/p3bppp/1p2pn2/3nN3/3P4/1BN5/PP2QPPP/R1B1R1K1 w - - 0 13',
      note: `Black's knight came by d7 and b6 and has reached **d5**. No white pawn can ever drive it away, the pawn on e6 supports it, and the pawn on d4 cannot move while it stands there.

White's knight on **e5** is another kind of guest. It is there on loan: the f-pawn can challenge it from f6, only not yet, because Black's own knight is in the way.

Count before judging. White has 38 safe moves, Black 19: the blockade holds the pawn, but it has not yet freed the men behind it. And b7-b6 has a price: no black pawn can guard **c6** or **a6** any more.`,
      layer: 'outposts',
      man: 'd5',
      marks: [{ square: 'c6', text: 'nobody’s pawn guards it' }],
    },
    {
      title: 'The pawn goes through',
      line: 'd4 d5 c4 dxc4 Nf3 Nf6 e3 e6 Bxc4 c5 O-O a6 Nc3 Nc6 a3 cxd4 exd4 Be7 Ba2 O-O Re1 b5 d5',
      fen: 'r1bq1rk1/4bppp/p1n1pn2/1p1P4/8/P1N2N2/BP3PPP/R1BQR1K1 b - - 0 12',
      note: `White does not wait for the blockade: **d4-d5**. The pawn attacks the knight on c6 and the pawn on e6 at once.

Count the men that bear on d5. White has three: the knight on c3, the bishop on a2 and the queen. Black has three as well: the pawn on e6, the knight on f6 and the queen. The push works when the count holds, and one tempo changes it: in the first position of this study Black has had time for the bishop on b7.

What is left afterwards is an open board. Then it matters that White's rook stands on e1, while Black's bishop has not left c8.`,
      layer: 'command',
      marks: [
        { square: 'd4', to: 'd5' },
        { square: 'c6', text: 'attacked' },
      ],
    },
    {
      title: 'Two isolated pawns, and nobody weak',
      line: 'd4 d5 c4 dxc4 Nf3 Nf6 e3 e6 Bxc4 c5 O-O cxd4 exd4 Be7 Nc3 O-O Re1 Nbd7 Bb3 Nb6 Bg5 Nbd5 Nxd5 exd5',
      fen: 'r1bq1rk1/pp2bppp/5n2/3p2B1/3P4/1B3N2/PP3PPP/R2QR1K1 w - - 0 13',
      note: `White exchanged the blockader, and Black took back with the pawn. Now d4 and d5 stand head to head, each isolated, each shielded by the other from the front.

The squares beside them have changed hands: **e5** and **c5** are commanded by White, **e4** and **c4** by Black. The bishop on b3 pays for it: its way forward ends at d5.

What counts is the e-file. The rook on e1 stands there alone, though with no safe way in yet. If you are Black, how will you contest it, and what does that ask of the bishop on c8?`,
      layer: 'files',
    },
    {
      title: 'The same pawn on the other side',
      line: 'd4 d5 c4 e6 Nc3 c5 cxd5 exd5 Nf3 Nc6 g3 Nf6 Bg2 Be7 O-O O-O dxc5 Bxc5 Na4 Be7 Be3',
      fen: 'r1bq1rk1/pp2bppp/2n2n2/3p4/N7/4BNP1/PP2PPBP/R2Q1RK1 b - - 3 11',
      note: `Here Black has the isolated pawn, and White does not hurry to win it. White takes the square: no black pawn can ever challenge **d4**, and the knight on f3 and the bishop on e3 both come there in one move.

The knight on a4 helps with the other dark square, **c5**, on which two white men bear. That costs something too: on the rim it has two safe moves and is three moves from the centre.

Black's own squares are c4 and e4, and the e-file, where e2 has no pawn to guard it. Compare with the first position: the same pawn, but the side against it is further with the blockade.`,
      layer: 'outposts',
      marks: [
        { square: 'f3', to: 'd4' },
        { square: 'e3', to: 'd4' },
      ],
    },
  ],
};
