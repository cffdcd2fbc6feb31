/** What sheets say to hold in positions of real games, found again by plain code on a board of letters; and named positions. */
import { describe, expect, it } from 'vitest';
import { encodeSheet, sheetOf } from '@/engine';
import { sheetAnswerSchema, type SheetAnswer } from '@/engine/reading/schema/sheets';
import { flipped, positionOf } from '../support/random';
import { realPositions } from '../support/real-positions';
import { attacks, lettersOf, slowLoss } from '../support/slow/exchange';
import { slowReach } from '../support/slow/reach';

type Sheet = NonNullable<SheetAnswer['sheet']>;
type SideOf = Sheet['white'];

const LETTER = { pawn: 'p', knight: 'n', bishop: 'b', rook: 'r', queen: 'q', king: 'k' } as const;
const SIDES = ['white', 'black'] as const;
type Side = (typeof SIDES)[number];

const at = (name: string) => name.charCodeAt(0) - 97 + 8 * (Number(name[1]) - 1);
const nameOf = (square: number) => 'abcdefgh'.charAt(square % 8) + String(Math.floor(square / 8) + 1);
const letterOf = (side: Side, kind: keyof typeof LETTER) =>
  side === 'white' ? LETTER[kind].toUpperCase() : LETTER[kind];
const isOf = (side: Side, letter: string) => letter !== '' && (letter === letter.toUpperCase()) === (side === 'white');
const other = (side: Side): Side => (side === 'white' ? 'black' : 'white');
const held = (fen: string) => encodeSheet(positionOf(fen), sheetOf(positionOf(fen))).sheet;

/** What is wrong with one side's part, by letters alone. */
function faults(board: readonly string[], side: Side, part: SideOf): string[] {
  const wrong: string[] = [];
  const says = (claim: string, ok: boolean) => {
    if (!ok) wrong.push(claim);
  };
  const safe = (letter: string, square: number) => slowLoss(board, letter, square, -1) === 0;
  for (const { square, attackers, controller } of part.keySquares) {
    const on = at(square);
    const safeFor = SIDES.filter((each) => safe(letterOf(each, 'knight'), on));
    says(`${square} controller`, controller === (safeFor.length === 1 ? safeFor[0] : null));
    for (const each of SIDES) {
      const plain = [...board.keys()].filter((from) => isOf(each, board[from] ?? '') && attacks(board, from, on));
      says(`${square} attackers`, [...attackers[each]].sort().join() === plain.map(nameOf).sort().join());
    }
  }
  for (const { kind, square, state, users, safe: isSafe } of part.posts) {
    const [letter, there] = [letterOf(side, kind), board[at(square)] ?? ''];
    const plain = there === '' ? 'free' : there === letter ? 'held' : isOf(side, there) ? 'own-man' : 'enemy-man';
    says(`${kind} ${square} state`, state === plain);
    says(`${kind} ${square} safe`, isSafe === safe(letter, at(square)));
    for (const { from, moves } of users) {
      says(`${kind} ${from}-${square} kind`, board[at(from)] === letter && moves >= 1 && moves <= 3);
      if (moves === 1) says(`${from}-${square} in one`, attacks(board, at(from), at(square)));
      says(`${from}-${square} safe`, slowLoss(board, letter, at(square), at(from)) === 0);
    }
  }
  for (const lever of part.levers) says(`lever ${lever.on}x${lever.against}`, isLever(board, side, lever));
  for (const { own, enemy, state, ownMen, enemyMen } of [...part.wanted, ...part.unwanted]) {
    const like = (whose: Side, { kind, colour }: typeof own) =>
      [...board.keys()].filter((square) => {
        const light = (Math.floor(square / 8) + square) % 2 === 1;
        return board[square] === letterOf(whose, kind) && (colour === null || light === (colour === 'light'));
      });
    const [mine, theirs] = [like(side, own), like(other(side), enemy)];
    says('trade men', `${ownMen}/${enemyMen}` === `${mine.map(nameOf)}/${theirs.map(nameOf)}`);
    const both = mine.length > 0 && theirs.length > 0;
    says('trade state', state === (both ? 'available' : mine.length + theirs.length > 0 ? 'one-left' : 'done'));
  }
  return wrong;
}

/** Walks the pawn up its file, a square or from its first rank two at a time, and looks at what it meets. */
function isLever(board: readonly string[], side: Side, lever: SideOf['levers'][number]): boolean {
  const step = side === 'white' ? 8 : -8;
  const pawn = letterOf(side, 'pawn');
  const enemyPawn = letterOf(other(side), 'pawn');
  let from = at(lever.on);
  while (from >= 0 && from < 64 && board[from] !== pawn) from -= step;
  if (board[from] !== pawn) return lever.state === 'impossible' && lever.fault === 'no-pawn' && lever.from === null;
  if (lever.from !== nameOf(from)) return false;
  if (board[at(lever.against)] !== enemyPawn) return lever.fault === 'no-target' && lever.moves === null;
  const met: number[] = [];
  for (let square = from; square !== at(lever.on); ) {
    square += step;
    if (board[square] !== '') met.push(square);
  }
  if (met.some((square) => board[square] === enemyPawn)) return lever.fault === 'rammed' && lever.moves === null;
  const squares = Math.abs(at(lever.on) - from) / 8;
  const isHome = Math.floor(from / 8) === (side === 'white' ? 1 : 6);
  const moves = isHome && squares >= 2 ? squares - 1 : squares;
  const state = met.length > 0 ? 'blocked' : moves === 0 ? 'ready' : 'needs-moves';
  return (
    lever.state === state && lever.moves === moves && lever.blockers.join() === met.map(nameOf).join() && !lever.fault
  );
}

describe('on positions of real games', () => {
  it('nothing that a sheet says is false', () => {
    const wrong: string[] = [];
    let sheets = 0;
    for (const fen of realPositions(4000)) {
      const sheet = held(fen);
      if (!sheet) continue;
      sheets++;
      const board = lettersOf(fen);
      for (const side of SIDES)
        wrong.push(...faults(board, side, sheet[side]).map((each) => `${fen} ${sheet.id} ${each}`));
    }
    expect(wrong.slice(0, 10)).toEqual([]);
    expect(sheets).toBeGreaterThan(200);
  }, 120_000);

  it('every man that can come within three moves is named, with its moves', () => {
    const wrong: string[] = [];
    let asked = 0;
    for (const fen of realPositions(700)) {
      const sheet = held(fen);
      if (!sheet) continue;
      const board = lettersOf(fen);
      for (const side of SIDES) {
        for (const { kind, square, state, users } of sheet[side].posts) {
          if (state === 'held' || state === 'own-man') continue;
          const men = [...board.keys()].filter((from) => board[from] === letterOf(side, kind));
          const plain = men.flatMap((from) => {
            const moves = slowReach(board, from, 3).get(at(square));
            return moves === undefined ? [] : [`${nameOf(from)} ${moves}`];
          });
          asked++;
          const said = users.map(({ from, moves }) => `${from} ${moves}`);
          if (said.sort().join() !== plain.sort().join()) wrong.push(`${fen} ${kind} ${square}: ${said} for ${plain}`);
        }
      }
    }
    expect(wrong.slice(0, 5)).toEqual([]);
    expect(asked).toBeGreaterThan(300);
  }, 120_000);

  it('turning colours and board turns the sheet and nothing else', () => {
    const turn = (text: string) =>
      text
        .replace(/\b([a-h])([1-8])\b/g, (_, file: string, rank: string) => file + String(9 - Number(rank)))
        .replace(/white|black|light|dark|White|Black/g, (word) => TURNED[word] ?? word);
    let sheets = 0;
    for (const fen of realPositions(1500)) {
      const sheet = held(fen);
      if (!sheet) continue;
      sheets++;
      const over = encodeSheet(positionOf(fen), sheetOf(flipped(positionOf(fen)))).sheet;
      expect(over && canonical(over), fen).toEqual(canonical(JSON.parse(turn(JSON.stringify(sheet))) as Sheet));
    }
    expect(sheets).toBeGreaterThan(50);
  }, 60_000);
});

const TURNED: Readonly<Record<string, string>> = {
  white: 'black',
  black: 'white',
  White: 'Black',
  Black: 'White',
  light: 'dark',
  dark: 'light',
};

/** Lists of men have an order of squares, which turning changes: sorted here. */
function canonical(value: unknown): unknown {
  if (Array.isArray(value))
    return value.map(canonical).sort((a, b) => (JSON.stringify(a) < JSON.stringify(b) ? -1 : 1));
  if (value === null || typeof value !== 'object') return value;
  const entries = Object.entries(value).map(([key, each]): [string, unknown] => [key, canonical(each)]);
  return Object.fromEntries(entries.sort(([a], [b]) => (a < b ? -1 : 1)));
}

describe('named positions from opening theory', () => {
  it('the minority attack: two moves away, then one (common practice)', () => {
    const lever = (fen: string) => held(fen)?.white.levers.find(({ on }) => on === 'b5');
    const board = (b: string) => `r1bqr1k1/pp1nbppp/2p2n2/${b} w - - 0 11`;
    expect(lever(board('3p2B1/3P4/2NBPN2/PPQ2PPP/1R3RK1'))).toMatchObject({ state: 'needs-moves', moves: 2 });
    expect(lever(board('3p2B1/1P1P4/2NBPN2/P1Q2PPP/1R3RK1'))).toMatchObject({ state: 'needs-moves', moves: 1 });
  });

  it('the French chain: the base can be struck at once, the head after a knight has left its road (common practice)', () => {
    const sheet = held('r1bqkb1r/pp3ppp/2n1pn2/2ppP3/3P4/2P2N2/PP3PPP/RNBQKB1R w KQkq - 0 6');
    expect(sheet?.id).toBe('french-chain');
    const lever = (on: string) => sheet?.black.levers.find((each) => each.on === on);
    expect(lever('c5')).toMatchObject({ against: 'd4', state: 'ready' });
    expect(lever('f6')).toMatchObject({ against: 'e5', state: 'blocked', blockers: ['f6'] });
    expect(sheet?.black.wanted[0]).toMatchObject({ state: 'available', ownMen: ['c8'], enemyMen: ['f1'] });
  });

  it('the King’s Indian with the bad bishop gone: one of the two is left', () => {
    const sheet = held('r1bq1rk1/ppp1npp1/3p1n1p/3Pp3/2P1P3/2N2N2/PP2BPPP/R1BQ1RK1 w - - 0 10');
    expect(sheet?.id).toBe('kings-indian-closed');
    expect(sheet?.black.wanted[0]).toMatchObject({ state: 'one-left', ownMen: [], enemyMen: ['c1'] });
    expect(sheet?.white.posts.find(({ square }) => square === 'd3')).toMatchObject({ state: 'free' });
  });

  it('colours exchanged: a Carlsbad of Black’s has its lever on b4 (from 1. e4 c6 2. d4 d5 3. exd5 cxd5 4. Bd3 Nc6 5. c3)', () => {
    const sheet = held('r1bqkbnr/pp2pppp/2n5/3p4/3P4/2PB4/PP3PPP/RNBQK1NR b KQkq - 0 5');
    expect(sheet).toMatchObject({ id: 'carlsbad', side: 'black' });
    expect(sheet?.black.levers[0]).toMatchObject({ on: 'b4', against: 'c3', from: 'b7', moves: 2 });
    expect(sheet?.black.plan).toContain('b4');
  });

  it('a diagram without kings has its sheet too, and all answers keep their schema', () => {
    for (const fen of realPositions(300)) {
      const position = positionOf(fen);
      expect(sheetAnswerSchema.safeParse(encodeSheet(position, sheetOf(position))).success).toBe(true);
    }
  });
});
