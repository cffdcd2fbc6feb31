/** Positions that the document's examples use: made for this purpose. */

/** A middlegame of the Carlsbad structure, White to move. */
export const EXAMPLE_FEN = 'r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11';

/** A pawn ending, as teachers draw it. */
export const EXAMPLE_ENDING = '8/5ppp/4k3/3p4/3P1K2/4P3/5PPP/8 w - - 0 1';

/** Ids that the examples of stored things use. */
export const EXAMPLE_IDS = {
  study: '00000000-0000-4000-8000-0000000000a1',
  position: '00000000-0000-4000-8000-0000000000b1',
  key: '00000000-0000-4000-8000-0000000000c1',
  comparison: '00000000-0000-4000-8000-0000000000d1',
  route: '00000000-0000-4000-8000-0000000000d2',
  exchange: '00000000-0000-4000-8000-0000000000d3',
  game: '00000000-0000-4000-8000-0000000000e1',
  job: '00000000-0000-4000-8000-0000000000f1',
} as const;

/** The first moves of an exchange variation, from opening theory. */
export const EXAMPLE_PGN = '1. d4 d5 2. c4 e6 3. Nc3 Nf6 4. cxd5 exd5 5. Bg5 Be7 6. e3 O-O 7. Bd3 Nbd7 8. Qc2 c6 *';
