/** Positions that the document's examples use: made for this purpose. */

/** A middlegame of the Carlsbad structure, White to move. */
export const EXAMPLE_FEN = 'r1bqr1k1/pp1nbppp/2p2n2/3p2B1/3P4/2NBPN2/PPQ2PPP/R4RK1 w - - 0 11';

/** A pawn ending, as teachers draw it. */
export const EXAMPLE_ENDING = '8/5ppp/4k3/3p4/3P1K2/4P3/5PPP/8 w - - 0 1';
