/** The FEN door: what it admits, what it refuses and how, and that nothing gets it to throw. */
import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Fault, formatFen, parseFen } from '@/engine/board';
import { diagrams, playedPositions } from '../../../support/random';
import { realPositions } from '../../../support/real-positions';

const START = 'rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1';

function codes(text: string, mode: 'strict' | 'diagram' = 'strict'): string[] {
  const result = parseFen(text, mode);
  return result.ok ? [] : result.fault.map(({ code }: Fault) => code);
}

const REFUSED = [
  ['', 'empty', 'nothing typed'],
  ['x'.repeat(201), 'text-too-long', 'longer than any position'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR', 'field-count', 'one field'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0', 'field-count', 'five fields'],
  ['8/8/8/8/8/8/8 w - - 0 1', 'rank-count', 'seven ranks'],
  ['rnbqkbnr/ppppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1', 'rank-length', 'nine squares'],
  ['rnbqkbnr/pppppppp/44/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1', 'digits-together', 'two figures'],
  ['rnbqkbnr/ppppxppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1', 'unknown-letter', 'no such man'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR x KQkq - 0 1', 'side-form', 'no such side'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KK - 0 1', 'castling-form', 'a letter twice'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w HAha - 0 1', 'castling-form', 'rook files'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq e9 0 1', 'en-passant-form', 'no square'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq e3 0 1', 'en-passant-rank', 'the wrong rank'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq e6 0 1', 'en-passant-pawn', 'no pawn has passed'],
  [
    'rnbqkbnr/pppppppp/8/4p3/8/8/PPPP1PPP/RNBQKBNR w KQkq e6 0 2',
    'en-passant-blocked',
    'the pawn still on its first square',
  ],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - x 1', 'halfmove-form', 'no number'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 0', 'fullmove-range', 'games start with move 1'],
  ['rnbq1bnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQ - 0 1', 'no-king', 'Black has none'],
  ['rnbkkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQ - 0 1', 'many-kings', 'Black has two'],
  ['Pnbqkbnr/pppppppp/8/8/8/8/1PPPPPPP/RNBQKBNR w KQk - 0 1', 'pawn-on-edge', 'a pawn on a8'],
  ['4k3/8/8/8/8/P7/PPPPPPPP/4K3 w - - 0 1', 'too-many-pawns', 'nine pawns'],
  ['rnbqkbnr/pppppppp/8/8/8/N7/PPPPPPPP/RNBQKBNR w KQkq - 0 1', 'men-count', 'seventeen men'],
  ['4k3/8/8/8/8/8/PPPPPPPP/QQ2K3 w - - 0 1', 'promoted-count', 'two queens and all pawns'],
  ['4k3/8/8/8/8/8/4R3/4K3 w - - 0 1', 'opponent-in-check', 'the king could be taken'],
  ['4k3/8/8/4r3/1b6/3n4/8/4K3 w - - 0 1', 'too-many-checks', 'three at once'],
  ['4k3/8/8/8/8/8/8/4K3 w K - 0 1', 'castling-squares', 'no rook'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq – 0 1', 'odd-character', 'a printer’s dash'],
  ['4k3/8/8/8/8/8/8/4K3 w - - 0\u00001', 'odd-character', 'a control character'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 99999999999999999999', 'fullmove-range', 'a huge number'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - -1 1', 'halfmove-form', 'less than nothing'],
  ['4k3/8/8/8/8/8/PPPPPPPP/B1B1K3 w - - 0 1', 'promoted-count', 'two bishops on dark squares and all pawns'],
  ['4k3/8/8/8/8/8/PPPPPPPP/1B1BK3 w - - 0 1', 'promoted-count', 'two bishops on light squares and all pawns'],
  ['8/8/8/3kK3/8/8/8/8 w - - 0 1', 'opponent-in-check', 'kings side by side'],
  ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1 2', 'field-count', 'seven fields'],
] as const;

describe('refusals have a code, a field and a sentence', () => {
  it.each(REFUSED)('%s: %s (%s)', (text, code) => {
    const result = parseFen(text, 'strict');
    expect(result.ok).toBe(false);
    if (result.ok) return;
    expect(result.fault.map((each) => each.code)).toContain(code);
    for (const each of result.fault) expect(each.message).toMatch(/^[A-Z"].*[.]$/);
  });

  it('all faults are told, not the first alone', () => {
    expect(codes('rnbq1bnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQ1BNR w KQkq e6 0 1')).toEqual(
      expect.arrayContaining(['no-king', 'castling-squares', 'en-passant-pawn']),
    );
  });

  it('a field that cannot be read hides no fault of the others, and the most basic come first', () => {
    expect(codes('rnbq1bnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQ - x 0')).toEqual([
      'halfmove-form',
      'fullmove-range',
      'no-king',
    ]);
    expect(codes('8/8/8/8/8/8/8/7 x - - 0 1')).toEqual(['rank-length', 'side-form']);
  });

  it.each([
    [
      'rnbqkbnr/ppppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w - - 0 1',
      'The seventh rank adds up to nine squares; it needs eight.',
    ],
    ['4k3/8/8/8/8/8/PPPPPPPP/QQ2K3 w - - 0 1', 'White must have one man from promotion, but no pawn is gone.'],
    ['4k3/8/8/8/8/8/1PPPPPPP/QQQ1K3 w - - 0 1', 'White must have two men from promotion, but only one pawn is gone.'],
    ['4k3/8/8/8/8/8/8/4K3 w -', 'A position has six fields, or four without the counters; here are three.'],
    [
      '4k3/8/8/8/8/8/8/4K3 w – - 0 1',
      'A position has plain letters, figures, "/" and "-" only; here stands "–" (U+2013).',
    ],
    [
      'r3k2r/8/8/8/8/8/8/R3K2R w HAha - 0 1',
      'Castling is "-" or some of the letters K, Q, k, q, each once; "HAha" names files of rooks, as games with shuffled back ranks do, and those are not read.',
    ],
  ])('%s says: %s', (text, message) => {
    const result = parseFen(text);
    expect(result.ok ? [] : result.fault.map((each) => each.message)).toEqual([message]);
  });
});

describe('what is admitted', () => {
  it.each([
    ['  rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR  w  KQkq - 0 1 ', 'white space round and between fields'],
    ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq -', 'four fields, as in EPD (section 16.2)'],
    ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - bm e4;', 'EPD operations'],
    ['rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w qkQK - 0 1', 'castling letters in any order'],
  ])('%j (%s)', (text) => {
    const result = parseFen(text);
    expect(result.ok && formatFen(result.value.position)).toBe(START);
  });

  it('the examples of the standard (PGN specification of 1994, section 16.1.4)', () => {
    for (const fen of [
      START,
      'rnbqkbnr/pppppppp/8/8/4P3/8/PPPP1PPP/RNBQKBNR b KQkq e3 0 1',
      'rnbqkbnr/pp1ppppp/8/2p5/4P3/8/PPPP1PPP/RNBQKBNR w KQkq c6 0 2',
      'rnbqkbnr/pp1ppppp/8/2p5/4P3/5N2/PPPP1PPP/RNBQKB1R b KQkq - 1 2',
      '4k3/8/8/8/8/8/4P3/4K3 w - - 5 39',
    ]) {
      const result = parseFen(fen);
      expect(result.ok && formatFen(result.value.position)).toBe(fen);
    }
  });

  it('real positions come back as they went in', () => {
    for (const fen of realPositions(5000)) {
      const result = parseFen(fen);
      expect(result.ok && formatFen(result.value.position)).toBe(fen);
    }
  });
});

describe('diagrams', () => {
  it('lack kings, with the fault as a warning', () => {
    const result = parseFen('8/pp3ppp/2p5/3p4/3P4/4P3/PP3PPP/8 w - - 0 1', 'diagram');
    expect(result.ok && result.value.warnings.map(({ code }) => code)).toEqual(['no-king', 'no-king']);
  });

  it('keep the rights that can be', () => {
    const result = parseFen('4k2r/8/8/8/8/8/8/R3K3 w KQkq - 0 1', 'diagram');
    expect(result.ok && formatFen(result.value.position)).toBe('4k2r/8/8/8/8/8/8/R3K3 w Qk - 0 1');
    expect(result.ok && result.value.warnings.map(({ square }) => square)).toEqual(['h1', 'a8']);
  });

  it.each([
    ['4k3/8/8/8/8/8/8/4K3 w HAha e9 0 1', ['castling-form', 'en-passant-form'], 'rights that cannot be read'],
    ['k1k5/8/8/8/8/8/8/K1K5 w - - 0 1', ['many-kings', 'many-kings'], 'two kings a side'],
    ['P3k3/8/8/8/8/8/8/4K2p w - - 0 1', ['pawn-on-edge', 'pawn-on-edge'], 'pawns on edge ranks'],
    ['4k3/8/8/8/8/8/4R3/4K3 w - - 0 1', ['opponent-in-check'], 'the king could be taken'],
    ['4k3/8/8/8/8/P7/PPPPPPPP/4K3 w - - 0 1', ['too-many-pawns'], 'nine pawns'],
  ])('%s warns of %j (%s)', (text, warned) => {
    const result = parseFen(text, 'diagram');
    expect(result.ok && result.value.warnings.map(({ code }) => code)).toEqual(warned);
    expect(codes(text)).toEqual(warned);
  });

  it('need a side to move and counters that can be read', () => {
    expect(codes('8/8/8/8/8/8/8/8 x - - 0 1', 'diagram')).toEqual(['side-form']);
    expect(codes('8/8/8/8/8/8/8/8 w - - 0 0', 'diagram')).toEqual(['fullmove-range']);
  });

  it('lose rights that cannot be', () => {
    const result = parseFen('4k3/8/8/8/8/8/8/4K3 w KQkq e6 0 1', 'diagram');
    expect(result.ok && formatFen(result.value.position)).toBe('4k3/8/8/8/8/8/8/4K3 w - - 0 1');
  });

  it('hold at most 32 men of one side, and syntax is syntax', () => {
    expect(codes('QQQQQQQQ/QQQQQQQQ/QQQQQQQQ/QQQQQQQQ/Q7/8/8/8 w - - 0 1', 'diagram')).toEqual(['too-many-men']);
    expect(codes('QQQQQQQQ/QQQQQQQQ/QQQQQQQQ/QQQQQQQQ/8/8/8/8 w - - 0 1', 'diagram')).toEqual([]);
    expect(codes('8/8/8/8/8/8/8/9 w - - 0 1', 'diagram')).toContain('unknown-letter');
  });
});

/** Our verdict where the collection leaves it open or suggests the other, and why. */
const DECIDED: Readonly<Record<string, readonly ['accept' | 'refuse', string]>> = {
  'rnbnkbnn/bbbbnnnn/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1': ['refuse', 'ten promoted men from eight pawns'],
  'nrbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1': ['refuse', 'no rook on a8 to castle with'],
  'krr5/8/8/8/8/8/8/4K3 w kq - 0 1': ['refuse', 'the king is not on e8'],
  'rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 400 500': ['accept', 'counters count what came before'],
  'rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 10 5': ['accept', 'counters are never held against the board'],
};

it('105 odd texts (public-domain EPD collection) are decided as suggested, or with a reason', () => {
  const { cases } = JSON.parse(
    readFileSync(new URL('../../../support/positions/fen-cases.json', import.meta.url), 'utf8'),
  ) as { cases: { text: string; suggested: string }[] };
  const against = cases.filter(({ text, suggested }) => {
    const [verdict] = DECIDED[text] ?? [suggested];
    return verdict !== (parseFen(text).ok ? 'accept' : 'refuse');
  });
  expect(cases).toHaveLength(105);
  expect(cases.filter(({ text }) => text in DECIDED)).toHaveLength(Object.keys(DECIDED).length);
  expect(against).toEqual([]);
});

describe('what is written is read again', () => {
  it('as the same position, after any legal moves', () => {
    fc.assert(
      fc.property(playedPositions, (position) => {
        expect(parseFen(formatFen(position))).toEqual({ ok: true, value: { position, warnings: [] } });
      }),
      { numRuns: 300, seed: 3 },
    );
  });

  it('as the same diagram, whatever stands on it', () => {
    fc.assert(
      fc.property(diagrams, (position) => {
        const again = parseFen(formatFen(position), 'diagram');
        expect(again.ok && again.value.position).toEqual(position);
      }),
      { numRuns: 1000, seed: 5 },
    );
  });
});

describe('nothing makes it throw', () => {
  const check = (text: string) => {
    for (const mode of ['strict', 'diagram'] as const) {
      const result = parseFen(text, mode);
      if (!result.ok) {
        expect(result.fault.length).toBeGreaterThan(0);
        continue;
      }
      const written = formatFen(result.value.position);
      const again = parseFen(written, mode);
      expect(again.ok && formatFen(again.value.position)).toBe(written);
    }
  };

  it('any text', () => {
    fc.assert(
      fc.property(
        fc.oneof(fc.string(), fc.string({ unit: 'binary' }), fc.string({ unit: 'binary', maxLength: 400 })),
        check,
      ),
      { numRuns: 2000, seed: 7 },
    );
  });

  it('real FENs with letters changed, lost and added', () => {
    const fens = realPositions(200);
    const mutation = fc.record({
      fen: fc.constantFrom(...fens),
      at: fc.nat({ max: 80 }),
      cut: fc.nat({ max: 3 }),
      put: fc.string({ unit: fc.constantFrom(...'pnbrqkPNBRQK12345678/ wb-KQkqe360'), maxLength: 4 }),
    });
    fc.assert(
      fc.property(mutation, ({ fen, at, cut, put }) => check(fen.slice(0, at) + put + fen.slice(at + cut))),
      { numRuns: 4000, seed: 11 },
    );
  });
});
