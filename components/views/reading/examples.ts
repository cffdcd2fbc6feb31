/** Positions to start from: invented by us from opening theory, one structure each. */
export const EXAMPLES = [
  { name: 'Carlsbad', fen: 'r3r1k1/pp1nqpp1/2p2n1p/3p4/3P2b1/2NBPN2/PPQ2PPP/1R2R1K1 w - - 0 15' },
  { name: 'Stonewall', fen: 'r1bq1rk1/pp1nb1pp/2p1pn2/3p1p2/2PP4/1P3NP1/P1QNPPBP/R1B2RK1 w - - 0 10' },
  { name: 'Isolated queen’s pawn', fen: 'r2q1rk1/pb1nbppp/1p2pn2/8/3P4/P1NB1N2/1P3PPP/R1BQR1K1 w - - 0 13' },
  { name: 'Hedgehog', fen: 'r2q1rk1/1b1nbppp/pp1ppn2/8/2PQP3/1PN2NP1/P4PBP/R1B2RK1 w - - 0 12' },
  { name: 'French, closed centre', fen: 'r1b2rk1/pp1nbppp/1qn1p3/2ppP3/3P1P2/2P2N2/PP1NB1PP/R1BQ1RK1 b - - 0 11' },
] as const;

/** The position of the first visit. */
export const FIRST_POSITION = EXAMPLES[0].fen;
