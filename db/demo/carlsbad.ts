/** Study: the Carlsbad structure. Lines of the Queen's Gambit Declined, exchange variation, as the opening books have them. */
import type { DemoStudy } from './types';

export const carlsbad: DemoStudy = {
  title: 'Carlsbad: the same pawns, four plans',
  summary:
    'White has d4 and e3 against d5 and c6; the c-file is half-open for White, the e-file for Black. Where the pieces stand decides which of the plans it is.',
  shared: true,
  positions: [
    {
      title: 'One pawn attacks two',
      line: 'd4 d5 c4 e6 Nc3 Nf6 cxd5 exd5 Bg5 Be7 e3 c6 Bd3 Nbd7 Qc2 O-O Nf3 Re8 O-O Nf8 Rab1 a5 a3 Ng6 b4 axb4 axb4 Bd6',
      fen: 'r1bqr1k1/1p3ppp/2pb1nn1/3p2B1/1P1P4/2NBPN2/2Q2PPP/1R3RK1 w - - 1 15',
      note: `On the queenside White has one pawn and Black two, and yet White attacks there. **b4-b5**, one move away, strikes at c6.

It is no matter of winning the pawn at once. If Black lets White take on c6 and takes back with the b-pawn, then c6 has no neighbour left. If Black takes on b5, then d5 is the isolated one. The attack asks which weakness Black prefers.

Black has not been idle: the a-file is open and only the rook on a8 stands on it, and no white pawn can ever challenge a man on **c4**, where the pawn on d5 supports it. The knight on f6 is three moves away from there.`,
      layer: 'files',
      marks: [{ square: 'b4', to: 'b5' }, { square: 'c4' }],
    },
    {
      title: 'What it was for',
      line: 'd4 d5 c4 e6 Nc3 Nf6 cxd5 exd5 Bg5 Be7 e3 c6 Bd3 Nbd7 Qc2 O-O Nf3 Re8 O-O Nf8 Rab1 a5 a3 Ng6 b4 axb4 axb4 Bd6 b5 Bd7 bxc6 bxc6',
      fen: 'r2qr1k1/3b1ppp/2pb1nn1/3p2B1/3P4/2NBPN2/2Q2PPP/1R3RK1 w - - 0 17',
      note: `Two moves later. The pawn on **c6** is backward: no pawn can come to guard it, the white pawn on d4 holds the square in front of it, and the file is half-open for White, with the queen already on it.

**c5** has become an outpost, two moves away for the knight on c3. The rook on b1 owns the b-file and can enter on b7.

Look at the bishop on d7: four of Black's five pawns stand on its colour. Black must not sit and defend. The bishop on d6 looks at h2, two knights stand near, and e5 is a square where either side would lose a minor piece.`,
      layer: 'outposts',
      man: 'c3',
      marks: [{ square: 'c6', text: 'backward' }, { square: 'c5' }],
    },
    {
      title: 'The centre instead',
      line: 'd4 d5 c4 e6 Nc3 Nf6 cxd5 exd5 Bg5 Be7 e3 c6 Bd3 Nbd7 Qc2 O-O Nge2 Re8 O-O Nf8 f3 Be6 Rad1 Rc8',
      fen: '2rqrnk1/pp2bppp/2p1bn2/3p2B1/3P4/2NBPP2/PPQ1N1PP/3R1RK1 w - - 3 13',
      note: `The same pawns, but the king's knight went to e2 and the pawn to f3. Now **e3-e4** is ready: it strikes at d5, with a pawn to support it.

Count e4: three white attackers (knight, bishop, pawn), two black (knight, pawn). A minor piece of either side would be lost there, but a pawn may go.

The price is **e3**. No pawn guards it any more, and the rook on e8 stands on that file, though with two bishops of its own in the way. The bishop on e6 is Black's problem piece: five of seven pawns stand on its colour. The lever that would help it is c6-c5.`,
      layer: 'control',
      marks: [{ square: 'e3', to: 'e4' }],
    },
    {
      title: 'Kings on the same wing, pawns on the other',
      line: 'd4 d5 c4 e6 Nc3 Nf6 cxd5 exd5 Bg5 Be7 e3 c6 Bd3 Nbd7 Qc2 Nh5 Bxe7 Qxe7 O-O-O Nb6 h3 g6 Nf3 Be6 Kb1 Ng7 g4 O-O-O',
      fen: '2kr3r/pp2qpnp/1np1b1p1/3p4/3P2P1/2NBPN1P/PPQ2P2/1K1R3R w - - 1 15',
      note: `Black exchanged the dark-squared bishops early, and both kings went to the queenside. There the minority attack would open lines in front of one's own king.

Black's levers are on the other wing: **f7-f5** and **h7-h5** both strike at g4, each with a pawn to support it.

White has a square: on **e5** two white men bear and no black one. White's bishop looks at g6, Black's on e6 looks at its own pawns: six of seven stand on its colour. Who gains when the light-squared bishops are exchanged?`,
      layer: 'command',
      marks: [{ square: 'e5' }],
    },
  ],
};
