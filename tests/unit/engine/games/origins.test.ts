/** Commitments and origins of real games, held by slow scans of whole readings: absent before the move, there ever since. */
import { beforeAll, describe, expect, it } from 'vitest';
import { type Reading, readPosition } from '@/engine';
import { type GameReading, pgnGames, readGame, replayGame } from '@/engine/games';
import { positionOf } from '../../../support/random';
import { realGames } from '../../../support/real-games';

interface Case {
  readonly game: GameReading;
  /** Whole readings of every position, the start first. */
  readonly readings: readonly Reading[];
}

const cases: Case[] = [];

beforeAll(() => {
  for (const pgn of realGames(12)) {
    const [written] = [...pgnGames(pgn)];
    const replayed = replayGame(written!);
    if (!replayed.ok) throw new Error(replayed.fault.message);
    const game = readGame(replayed.value);
    cases.push({ game, readings: game.timeline.map(({ fen }) => readPosition(positionOf(fen))) });
  }
}, 60_000);

/** A change or an origin: what both say of a feature. */
type Said = GameReading['origins'][number] | GameReading['commitments'][number]['changes'][number];

/** Whether a whole reading has the feature. Pawns are looked for where they stand in `square`. */
function has({ kind, side, squares, hold, text }: Said, reading: Reading, square: string | undefined): boolean {
  const at = square ?? squares[0];
  const pawns = side === null ? null : reading.pawns[side];
  const file = reading.files.find((each) => text.includes(`${each.file}-file`));
  switch (kind) {
    case 'weak-square':
      return reading.weakSquares.some((weak) => weak.square === at && weak.side === side && weak.hold === hold);
    case 'outpost':
      return reading.outposts.some(
        (post) =>
          post.square === at &&
          post.side === side &&
          post.hold === hold &&
          post.rank === 'outpost' &&
          post.support?.moves === 0,
      );
    case 'open-file':
      return file?.status === 'open';
    case 'half-open-file':
      return file?.halfOpenFor === side;
    case 'passed-pawn':
      return pawns!.passed.includes(at as never);
    case 'isolated-pawn':
      return pawns!.isolated.includes(at as never);
    case 'backward-pawn':
      return pawns!.backward.includes(at as never);
    case 'doubled-pawn':
      return pawns!.doubled.includes(at as never);
    case 'weak-complex':
      return reading.colourComplexes.some((each) => each.side === side && text.includes(`${each.colour} squares`));
    case 'ram':
      return reading.pawns.rams.some(({ white, black }) => white === squares[0] && black === squares[1]);
    case 'bishop-pair':
      return hasPair(reading, 'white') !== hasPair(reading, 'black') && hasPair(reading, side!);
    case 'castling-lost':
      return !(side === 'white' ? /[KQ]/ : /[kq]/).test(rights(reading));
    case 'structure':
      return reading.pawns.structure !== null && text.includes(reading.pawns.structure.name);
  }
}

function rights({ fen }: Reading): string {
  return fen.split(' ')[2]!;
}

function hasPair({ men, squares }: Reading, side: string): boolean {
  const colours = men
    .filter((man) => man.side === side && man.kind === 'bishop')
    .map(({ square }) => squares.findIndex((each) => each.square === square))
    .map((index) => ((index >> 3) + index) & 1);
  return new Set(colours).size === 2;
}

/** Where the man that stands on a square at a ply stood, or will stand, at another; by its journey. */
function squareOfMan({ journeys }: GameReading, square: string, ply: number, other: number): string | undefined {
  const stayAt = (stays: (typeof journeys)[number]['stays'], at: number) => stays.findLast(({ from }) => from <= at);
  const man = journeys.find(
    ({ stays, takenAt }) => (takenAt === null || takenAt > ply) && stayAt(stays, ply)?.square === square,
  );
  return man && stayAt(man.stays, other)?.square;
}

function standsAt({ game, readings }: Case, said: Said, ply: number, saidAt: number): boolean {
  const isPawn = said.kind.endsWith('-pawn');
  const square = isPawn ? squareOfMan(game, said.squares[0]!, saidAt, ply) : undefined;
  return (!isPawn || square !== undefined) && has(said, readings[ply]!, square);
}

describe('origins', () => {
  it('each feature of the last position is absent before its move and stands in every later position', () => {
    let checked = 0;
    for (const each of cases) {
      const last = each.readings.length - 1;
      for (const origin of each.game.origins) {
        for (let ply = origin.ply; ply <= last; ply++)
          expect(standsAt(each, origin, ply, last), `${origin.text} at ${ply}`).toBe(true);
        if (origin.ply > 0) expect(standsAt(each, origin, origin.ply - 1, last), origin.text).toBe(false);
        checked++;
      }
    }
    expect(checked).toBeGreaterThan(150);
  });

  it('each is among the changes of the commitment that its move is', () => {
    for (const { game } of cases) {
      const last = game.timeline.length - 1;
      for (const { ply, kind, side, squares, hold, move } of game.origins) {
        if (ply === 0) continue;
        const commitment = game.commitments.find((each) => each.ply === ply);
        expect(commitment?.move).toBe(move);
        const isPawn = kind.endsWith('-pawn');
        expect(
          commitment?.changes.some(
            (change) =>
              change.made &&
              change.kind === kind &&
              change.side === side &&
              change.hold === hold &&
              (kind === 'weak-complex' ||
                change.squares[0] === (isPawn ? squareOfMan(game, squares[0]!, last, ply) : squares[0])),
          ),
          `${move} ${kind} ${squares.join()}`,
        ).toBe(true);
      }
    }
  });
});

describe('commitments', () => {
  it('what a move made was absent before it and stands for two half-moves at least; what it ended, the other way round', () => {
    let changes = 0;
    for (const each of cases) {
      for (const { ply, changes: list } of each.game.commitments) {
        for (const change of list) {
          // A pawn's change speaks of the pawn where it stands after the move.
          expect(standsAt(each, change, ply - 1, ply), `${change.text} before ${ply}`).toBe(!change.made);
          for (let at = ply; at <= Math.min(ply + 2, each.readings.length - 1); at++)
            expect(standsAt(each, change, at, ply), `${change.text} at ${at}`).toBe(change.made);
          changes++;
        }
      }
    }
    expect(changes).toBeGreaterThan(400);
  });

  it('are pawn moves, captures, promotions and moves that give up castling, each as it says', () => {
    const kinds = new Set<string>();
    for (const { game, readings } of cases) {
      for (const { ply, act, move, side } of game.commitments) {
        kinds.add(act);
        expect(move.includes('=')).toBe(act === 'promotion');
        if (act !== 'promotion') expect(move.includes('x')).toBe(act === 'capture');
        if (act === 'pawn-move') expect(move).toMatch(/[. ][a-h][1-8][+#]?$/);
        if (act === 'king-move' || act === 'rook-move') {
          expect(move).toMatch(act === 'king-move' ? / K/ : / R/);
          expect(rights(readings[ply]!)).not.toBe(rights(readings[ply - 1]!));
        }
        expect(side).toBe(readings[ply - 1]!.sideToMove);
      }
    }
    expect(kinds).toContain('pawn-move');
    expect(kinds).toContain('capture');
  });

  it('are no others: a move of a piece that takes nothing and keeps castling changes no lasting feature', () => {
    for (const each of cases) {
      const { game, readings } = each;
      for (let ply = 1; ply < readings.length; ply++) {
        const { move } = game.timeline[ply]!;
        if (/x|=|O-O|[. ][a-h]/.test(move!) || rights(readings[ply]!) !== rights(readings[ply - 1]!)) continue;
        expect(lasting(readings[ply]!)).toEqual(lasting(readings[ply - 1]!));
      }
    }
  });
});

/** What of a reading hangs on pawns alone. */
function lasting({ weakSquares, pawns, files, outposts, colourComplexes }: Reading): unknown {
  return {
    weak: weakSquares.map(({ square, side, hold }) => [square, side, hold]),
    white: pawns.white,
    black: pawns.black,
    rams: pawns.rams,
    structure: pawns.structure?.id,
    files: files.map(({ status, halfOpenFor }) => [status, halfOpenFor]),
    outposts: outposts
      .filter(({ rank, support }) => rank === 'outpost' && support?.moves === 0)
      .map(({ square, side, hold }) => [square, side, hold]),
    complexes: colourComplexes.map(({ side, colour, squares }) => [side, colour, squares]),
  };
}

/** A text or FEN board with colours and board turned. */
function turned(text: string): string {
  const swap: Record<string, string> = {
    White: 'Black',
    Black: 'White',
    white: 'black',
    black: 'white',
    light: 'dark',
    dark: 'light',
  };
  return text
    .replace(/White|Black|white|black|light|dark/g, (side) => swap[side]!)
    .replace(/\b([a-h])([1-8])\b/g, (_, file: string, rank: string) => `${file}${9 - Number(rank)}`);
}

it('the same games with colours and board turned are told in the same words, sides swapped', () => {
  let told = 0;
  for (const pgn of realGames(6)) {
    const [written] = [...pgnGames(pgn)];
    const moves = written!.moves.map((move) => ({
      ...move,
      text: move.text.replace(/[1-8]/g, (rank) => String(9 - Number(rank))),
    }));
    const [ours, theirs] = [
      replayGame(written!),
      replayGame({ ...written!, moves, tags: { FEN: 'rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR b KQkq - 0 1' } }),
    ].map((replayed) => {
      if (!replayed.ok) throw new Error(replayed.fault.message);
      return readGame(replayed.value);
    });
    const words = ({ text }: { text: string }): string => text.replace(/^\d+\.+ \S+ /, '');
    expect(theirs!.commitments.map(words)).toEqual(ours!.commitments.map((each) => turned(words(each))));
    expect(theirs!.origins.map(words)).toEqual(ours!.origins.map((each) => turned(words(each))));
    told += ours!.commitments.length;
  }
  expect(told).toBeGreaterThan(60);
});
