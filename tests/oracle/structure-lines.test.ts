/**
 * Opening lines and the structure that the books say they lead to. Names of books from memory: A. Soltis, Pawn
 * Structure Chess; M. Flores Rios, Chess Structures; H. Kmoch, Pawn Power in Chess; A. Nimzowitsch, My System.
 * Every line is replayed with chess.js here, so that the position is the line's own.
 */
import { Chess } from 'chess.js';
import { describe, expect, it } from 'vitest';
import { nameStructure } from '@/engine/structures';
import type { Side } from '@/engine/types';
import { diagram } from '../support/pawn-boards';

type Row = readonly [line: string, id: string, side: Side, differs: number];

const LINES: readonly Row[] = [
  ['1.d4 d5 2.c4 e6 3.Nc3 Nf6 4.cxd5 exd5 5.Bg5 c6 6.e3', 'carlsbad', 'white', 0],
  ['1.d4 d5 2.c4 e6 3.Nc3 Be7 4.cxd5 exd5 5.Bf4 c6 6.e3', 'carlsbad', 'white', 0],
  ['1.e4 c6 2.d4 d5 3.exd5 cxd5 4.Bd3 Nc6 5.c3', 'carlsbad', 'black', 0],
  ['1.d4 d5 2.c4 dxc4 3.Nf3 Nf6 4.e3 e6 5.Bxc4 c5 6.O-O a6 7.Bb3 cxd4 8.exd4', 'isolated-queens-pawn', 'white', 0],
  ['1.e4 c6 2.d4 d5 3.exd5 cxd5 4.c4 Nf6 5.Nc3 e6 6.Nf3 Be7 7.cxd5 Nxd5', 'isolated-queens-pawn', 'white', 0],
  [
    '1.d4 d5 2.c4 e6 3.Nc3 c5 4.cxd5 exd5 5.Nf3 Nc6 6.g3 Nf6 7.Bg2 Be7 8.O-O O-O 9.dxc5 Bxc5',
    'isolated-queens-pawn',
    'black',
    0,
  ],
  ['1.e4 e6 2.d4 d5 3.Nd2 c5 4.exd5 exd5 5.Ngf3 Nc6 6.Bb5 Bd6 7.dxc5 Bxc5', 'isolated-queens-pawn', 'black', 1],
  [
    '1.d4 d5 2.c4 e6 3.Nc3 Nf6 4.Bg5 Be7 5.e3 O-O 6.Nf3 h6 7.Bh4 b6 8.cxd5 Nxd5 9.Bxe7 Qxe7 10.Nxd5 exd5 11.Rc1 Be6 12.Qa4 c5 13.Qa3 Rc8 14.Bb5 a6 15.dxc5 bxc5',
    'hanging-pawns',
    'black',
    0,
  ],
  [
    '1.d4 Nf6 2.c4 e6 3.Nc3 Bb4 4.e3 O-O 5.Bd3 d5 6.Nf3 c5 7.O-O dxc4 8.Bxc4 cxd4 9.exd4 b6 10.Bg5 Bb7 11.Re1 Bxc3 12.bxc3',
    'isolated-pawn-couple',
    'white',
    0,
  ],
  ['1.e4 c5 2.Nf3 Nc6 3.d4 cxd4 4.Nxd4 g6 5.c4', 'maroczy-bind', 'white', 0],
  ['1.c4 c5 2.Nf3 g6 3.d4 cxd4 4.Nxd4 Nc6 5.e4', 'maroczy-bind', 'white', 0],
  ['1.c4 c5 2.Nf3 Nf6 3.Nc3 e6 4.g3 b6 5.Bg2 Bb7 6.O-O Be7 7.d4 cxd4 8.Qxd4 d6 9.e4 a6', 'hedgehog', 'black', 0],
  ['1.e4 c5 2.Nf3 e6 3.d4 cxd4 4.Nxd4 a6 5.c4 Nf6 6.Nc3 Qc7 7.a3 b6 8.Be3 Bb7 9.f3 d6', 'hedgehog', 'black', 0],
  ['1.d4 f5 2.c4 Nf6 3.g3 e6 4.Bg2 d5 5.Nf3 c6', 'stonewall', 'black', 0],
  ['1.d4 d5 2.e3 Nf6 3.Bd3 c5 4.c3 Nc6 5.f4', 'stonewall', 'white', 0],
  ['1.e4 e6 2.d4 d5 3.e5 c5 4.c3 Nc6 5.Nf3', 'french-chain', 'white', 0],
  ['1.e4 c6 2.d4 d5 3.e5 Bf5 4.Nf3 e6', 'french-chain', 'white', 0],
  ['1.e4 e6 2.d4 d5 3.Nc3 Bb4 4.e5 c5 5.a3 Bxc3+ 6.bxc3 Ne7', 'winawer-doubled', 'white', 0],
  ['1.d4 Nf6 2.c4 c5 3.d5 e6 4.Nc3 exd5 5.cxd5 d6 6.e4 g6', 'modern-benoni', 'black', 0],
  ['1.d4 Nf6 2.c4 c5 3.d5 e5 4.Nc3 d6 5.e4', 'closed-benoni', 'white', 0],
  [
    '1.d4 Nf6 2.c4 g6 3.Nc3 Bg7 4.e4 d6 5.Bd3 O-O 6.Nge2 c5 7.d5 e6 8.O-O exd5 9.exd5',
    'symmetrical-benoni',
    'white',
    0,
  ],
  ['1.d4 Nf6 2.c4 g6 3.Nc3 Bg7 4.e4 d6 5.Nf3 O-O 6.Be2 e5 7.O-O Nc6 8.d5 Ne7', 'kings-indian-closed', 'white', 0],
  ['1.d4 Nf6 2.c4 g6 3.Nc3 Bg7 4.e4 d6 5.Nf3 O-O 6.Be2 e5 7.O-O exd4 8.Nxd4', 'kings-indian-open', 'white', 0],
  ['1.e4 c5 2.Nf3 d6 3.d4 cxd4 4.Nxd4 Nf6 5.Nc3 e6', 'scheveningen', 'black', 0],
  ['1.e4 c5 2.Nf3 d6 3.d4 cxd4 4.Nxd4 Nf6 5.Nc3 a6 6.Be2 e6', 'scheveningen', 'black', 0],
  ['1.e4 c5 2.Nf3 d6 3.d4 cxd4 4.Nxd4 Nf6 5.Nc3 a6 6.Be2 e5', 'boleslavsky-hole', 'black', 0],
  ['1.e4 c5 2.Nf3 d6 3.d4 cxd4 4.Nxd4 Nf6 5.Nc3 Nc6 6.Be2 e5', 'boleslavsky-hole', 'black', 0],
  [
    '1.e4 c5 2.Nf3 Nc6 3.d4 cxd4 4.Nxd4 Nf6 5.Nc3 e5 6.Ndb5 d6 7.Bg5 a6 8.Na3 b5 9.Bxf6 gxf6',
    'sveshnikov-doubled',
    'black',
    0,
  ],
  ['1.e4 c5 2.Nf3 d6 3.d4 cxd4 4.Nxd4 Nf6 5.Nc3 g6', 'dragon', 'black', 0],
  ['1.e4 c6 2.d4 d5 3.Nc3 dxe4 4.Nxe4 Bf5 5.Ng3 Bg6 6.Nf3 Nd7 7.Bd3 e6', 'caro-kann', 'black', 0],
  ['1.d4 d5 2.c4 c6 3.Nf3 Nf6 4.Nc3 dxc4 5.a4 Bf5 6.e3 e6 7.Bxc4', 'slav', 'black', 0],
  ['1.e4 e6 2.d4 d5 3.Nc3 dxe4 4.Nxe4', 'rubinstein-french', 'black', 0],
  ['1.e4 c6 2.d4 d5 3.exd5 cxd5 4.c4 Nf6 5.Nc3 e6 6.Nf3 Be7 7.c5', 'panov-majority', 'white', 0],
  ['1.c4 e5 2.Nc3 Nc6 3.g3 g6 4.Bg2 Bg7 5.e4 d6 6.d3', 'botvinnik-triangle', 'white', 0],
  ['1.d4 Nf6 2.c4 g6 3.Nc3 d5 4.cxd5 Nxd5 5.e4 Nxc3 6.bxc3 Bg7 7.Bc4 c5', 'gruenfeld-centre', 'white', 0],
  [
    '1.e4 e5 2.Nf3 Nc6 3.Bb5 a6 4.Ba4 Nf6 5.O-O Be7 6.Re1 b5 7.Bb3 d6 8.c3 O-O 9.h3 Na5 10.Bc2 c5 11.d4 Qc7',
    'spanish-tension',
    'white',
    0,
  ],
  ['1.e4 e5 2.Nf3 Nc6 3.Bb5 a6 4.Bxc6 dxc6 5.O-O f6 6.d4 exd4 7.Nxd4', 'spanish-exchange-majority', 'white', 0],
  [
    '1.e4 e5 2.Nf3 Nc6 3.Bb5 Nf6 4.O-O Nxe4 5.d4 Nd6 6.Bxc6 dxc6 7.dxe5 Nf5 8.Qxd8+ Kxd8',
    'berlin-majority',
    'white',
    0,
  ],
  ['1.e4 e6 2.d4 d5 3.exd5 exd5', 'exchange-french', 'white', 0],
  ['1.d4 Nf6 2.c4 c5 3.d5 b5 4.cxb5 a6 5.bxa6 g6 6.Nc3 Bxa6 7.e4 Bxf1 8.Kxf1 d6', 'benko', 'black', 0],
  ['1.d4 Nf6 2.c4 e6 3.Nc3 Bb4 4.e3 c5 5.Bd3 Nc6 6.Nf3 Bxc3+ 7.bxc3 d6 8.O-O e5', 'huebner-complex', 'white', 0],
  ['1.e4 c5 2.Nc3 Nc6 3.g3 g6 4.Bg2 Bg7 5.d3 d6', 'closed-sicilian', 'white', 0],
  ['1.e4 e5 2.Nf3 d6 3.d4 exd4 4.Nxd4', 'surrendered-centre', 'white', 0],
];

describe('the structure after', () => {
  it.each(LINES)('%s is %s for %s', (line, id, side, differs) => {
    const game = new Chess();
    for (const move of line.replace(/\d+\./g, '').split(' ')) game.move(move);
    expect(nameStructure(diagram(game.fen()))).toMatchObject({ id, side, differs });
  });
});

/** Pawns that no book gives a name: middlegames without a fixed centre, endings, bare boards. */
const NAMELESS: readonly (readonly [fen: string, reason: string])[] = [
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w', 'nothing has moved'],
  ['8/8/8/8/8/8/8/8 w', 'no pawns'],
  ['8/8/2k5/p7/P1K5/8/8/8 w', 'one pawn each'],
  ['6k1/5ppp/8/8/8/8/5PPP/6K1 w', 'three against three on one wing'],
  ['8/pp3k2/2p2p2/3p4/8/4P3/P4K2/8 w', 'too few pawns are left of it'],
  ['rnbqkbnr/pp1ppppp/8/2p5/4P3/8/PPPP1PPP/RNBQKBNR w', 'the first moves of a Sicilian can still become anything'],
];

describe('no name is given where', () => {
  it.each(NAMELESS)('%s: %s', (fen) => {
    expect(nameStructure(diagram(fen))).toBeNull();
  });
});
