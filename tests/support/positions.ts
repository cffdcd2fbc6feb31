/** Positions with names, for tests that want a known one. */

export const NAMED = {
  /** The first position of a game. */
  start: 'rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1',
  /** Our own, from opening theory: the Carlsbad structure before the minority attack. */
  carlsbad: 'r3r1k1/pp1nqpp1/2p2n1p/3p4/3P2b1/2NBPN2/PPQ2PPP/1R2R1K1 w - - 0 15',
  // The usual positions for node counts (public-domain EPD collections), each hard in its own way.
  castlingBothWays: 'r3k2r/p1ppqpb1/bn2pnp1/3PN3/1p2P3/2N2Q1p/PPPBBPPP/R3K2R w KQkq - 0 1',
  passingInPin: '8/2p5/3p4/KP5r/1R3p1k/8/4P1P1/8 w - - 0 1',
  promotionsInCheck: 'r2q1rk1/pP1p2pp/Q4n2/bbp1p3/Np6/1B3NBn/pPPP1PPP/R3K2R b KQ - 0 1',
  promotionByCapture: 'rnbq1k1r/pp1Pbppp/2p5/8/2B5/8/PPP1NnPP/RNBQK2R w KQ - 0 1',
  middlegame: 'r4rk1/1pp1qppp/p1np1n2/2b1p1B1/2B1P1b1/P1NP1N2/1PP1QPPP/R4RK1 w - - 0 1',
} as const;
