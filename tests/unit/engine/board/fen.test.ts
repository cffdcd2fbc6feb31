/** The FEN door: what it admits, what it refuses and how, and that nothing gets it to throw. */
import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Fault, formatFen, parseFen } from '@/engine/board';
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

/** Where we differ from the collection's suggestion, and why. */
const DIFFER: Readonly<Record<string, string>> = {
  'rnbnkbnn/bbbbnnnn/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1': 'ten promoted men from eight pawns is no legal position',
};

it('105 odd texts (public-domain EPD collection) are decided as suggested, or with a reason', () => {
  const { cases } = JSON.parse(
    readFileSync(new URL('../../../support/positions/fen-cases.json', import.meta.url), 'utf8'),
  ) as { cases: { text: string; suggested: string }[] };
  const against = cases.filter(({ text, suggested }) => {
    const verdict = parseFen(text).ok ? 'accept' : 'refuse';
    return suggested !== 'judge' && verdict !== suggested && !(text in DIFFER);
  });
  expect(cases).toHaveLength(105);
  expect(against).toEqual([]);
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
    fc.assert(fc.property(fc.oneof(fc.string(), fc.string({ unit: 'binary' })), check), { numRuns: 2000, seed: 7 });
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
