/**
 * What handbooks claim of their own diagrams: Edward Lasker, Chess Strategy (1915), and J. R. Capablanca, Chess
 * Fundamentals (1921), both in the public domain; the 'classic' rows from memory of the book named. Sources stand with each row.
 * One claim is left out: Example 53 was noted both as supported and as unsupported on d4, and a pawn on e5 supports it.
 */
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { type Reading, readFen } from '@/engine';

interface Claim {
  readonly k: string;
  readonly sq?: string;
  readonly side?: 'w' | 'b';
  readonly file?: string;
  readonly white?: number;
  readonly black?: number;
  readonly max?: number;
  readonly better?: string;
  readonly worse?: string;
}

interface Row {
  readonly id: string;
  readonly fen: string;
  readonly source: string;
  readonly claims: readonly Claim[];
}

const rows = JSON.parse(readFileSync('tests/support/positions/handbook.json', 'utf8')) as Row[];

const sideOf = ({ side }: Claim) => (side === 'w' ? 'white' : 'black');
const safeMovesOf = ({ men }: Reading, square: string | undefined) =>
  men.find((man) => man.square === square)?.safeMoves.length ?? Number.NaN;

/** Each kind of claim as a check of the reading. */
const CHECKS: Readonly<Record<string, (reading: Reading, claim: Claim) => void>> = {
  // The books count batteries as attackers.
  count: ({ squares }, { sq, white, black }) => {
    const square = squares.find((each) => each.square === sq);
    expect(square && square.attackers.white.length + square.behind.white.length).toBe(white);
    expect(square && square.attackers.black.length + square.behind.black.length).toBe(black);
  },
  noEntry: ({ files }, claim) => {
    for (const { entries } of files) expect(entries[sideOf(claim)]).toEqual([]);
  },
  badBishop: ({ men }, { sq }) => {
    const notes = men.find(({ square }) => square === sq)?.notes ?? [];
    expect(notes.some((note) => note === 'bad-bishop' || note === 'bad-but-active')).toBe(true);
  },
  halfOpen: ({ files }, claim) => {
    expect(files.find(({ file }) => file === claim.file)?.halfOpenFor).toBe(sideOf(claim));
  },
  openFile: ({ files }, claim) => {
    expect(files.find(({ file }) => file === claim.file)?.status).toBe('open');
  },
  lowMobility: (reading, { sq, max }) => {
    expect(safeMovesOf(reading, sq)).toBeLessThanOrEqual(max ?? 0);
  },
  // The book counts what the bishops see; by safe moves these two are level.
  moreMobile: ({ men }, { better, worse }) => {
    const sees = (square: string | undefined) => men.find((man) => man.square === square)?.sees ?? Number.NaN;
    expect(sees(better)).toBeGreaterThan(sees(worse));
  },
  sideMoreMobile: ({ totals }, claim) => {
    const side = sideOf(claim);
    expect(totals[side].safeMoves).toBeGreaterThan(totals[side === 'white' ? 'black' : 'white'].safeMoves);
  },
  outpost: ({ outposts }, claim) => {
    const post = outposts.find(({ square, side }) => square === claim.sq && side === sideOf(claim));
    expect(post?.rank).toBe('outpost');
  },
  outpostUnsupported: ({ outposts }, claim) => {
    const post = outposts.find(({ square, side }) => square === claim.sq && side === sideOf(claim));
    expect(post?.hold).not.toBe('open');
    expect(post?.support?.moves).not.toBe(0);
  },
};

describe('handbook positions', () => {
  for (const { id, fen, source, claims } of rows) {
    for (const claim of claims) {
      it(`${id}: ${claim.k} ${claim.sq ?? claim.file ?? claim.side ?? ''} (${source})`, () => {
        const reading = readFen(fen, 'diagram');
        if (!reading.ok) throw new Error(reading.fault[0].message);
        CHECKS[claim.k]?.(reading.value, claim);
        expect(CHECKS).toHaveProperty(claim.k);
      });
    }
  }
});
