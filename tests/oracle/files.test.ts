/** Files, the seventh rank and diagonals against plain counting on a board of letters, over positions of real games. */
import { describe, expect, it } from 'vitest';
import { squareName } from '@/engine/board';
import { readValues } from '@/engine/reading';
import { SIDES, type Square } from '@/engine/types';
import { filesMirrored, positionOf } from '../support/random';
import { realPositions } from '../support/real-positions';
import { lettersOf } from '../support/slow/exchange';
import { slowEntries, slowHeavy, slowHold, slowLine, slowTarget, slowUsable } from '../support/slow/files';
import { slowPawn } from '../support/slow/pawns';
import { slowReach } from '../support/slow/reach';

const named = (squares: readonly number[]): string => squares.map((square) => squareName(square as Square)).join(' ');

const isHeavy = (letter: string, white: boolean): boolean => (white ? 'RQ' : 'rq').includes(letter) && letter !== '';

describe('files', () => {
  it('are open for whom, held by whom, and lead in where plain counting says, on 600 positions', () => {
    const wrong: string[] = [];
    const seen: Record<string, number> = {};
    for (const fen of realPositions(600)) {
      const letters = lettersOf(fen);
      for (const value of readValues(positionOf(fen)).files) {
        const { file, status, halfOpenFor, heavy, control, entries } = value;
        const usable = { white: slowUsable(letters, true, file), black: slowUsable(letters, false, file) };
        const open = usable.white && usable.black ? 'open' : usable.white || usable.black ? 'half-open' : 'closed';
        const half = open === 'half-open' ? (usable.white ? 'white' : 'black') : null;
        const holds = SIDES.filter((side) => open !== 'closed' && slowHold(letters, side === 'white', file) > 0);
        const held = holds.length === 2 ? 'shared' : (holds[0] ?? 'none');
        seen[held] = (seen[held] ?? 0) + 1;
        const ours: (string | null)[] = [status, halfOpenFor, control];
        const slow: (string | null)[] = [open, half, held];
        for (const side of SIDES) {
          ours.push(named(heavy[side]), named(entries[side]));
          slow.push(named(slowHeavy(letters, side === 'white', file)));
          slow.push(named(slowEntries(letters, side === 'white', file)));
        }
        if (ours.join('/') !== slow.join('/'))
          wrong.push(`${fen} file ${file}: ${ours.join('/')} for ${slow.join('/')}`);
      }
    }
    expect(wrong).toEqual([]);
    // Shared files are rare: about one in four hundred.
    for (const control of ['white', 'black', 'shared', 'none']) expect(seen[control]).toBeGreaterThan(5);
  });

  it('aim at the first enemy pawn where it is isolated, backward or without a pawn to guard it', () => {
    const wrong: string[] = [];
    let targets = 0;
    for (const fen of realPositions(600)) {
      const letters = lettersOf(fen);
      const position = positionOf(fen);
      for (const { file, halfOpenFor, targets: ours } of readValues(position).files) {
        const slow = halfOpenFor === null ? null : slowTarget(letters, halfOpenFor === 'white', file);
        const enemy = halfOpenFor === 'white' ? 'black' : 'white';
        const backward = slow !== null && slowPawn(position, enemy, slow.square as Square).backward;
        const expected =
          slow !== null && (slow.isolated || backward || !slow.guarded)
            ? [{ square: slow.square, side: enemy, isolated: slow.isolated, backward, guardedByPawn: slow.guarded }]
            : [];
        targets += expected.length;
        if (JSON.stringify(ours) !== JSON.stringify(expected)) wrong.push(`${fen} file ${file}`);
      }
    }
    expect(targets).toBeGreaterThan(200);
    expect(wrong).toEqual([]);
  });

  it('are taken soonest by the rook that plain search brings there, and the seventh rank likewise, on 60 positions', () => {
    const wrong: string[] = [];
    let found = 0;
    for (const fen of realPositions(60)) {
      const letters = lettersOf(fen);
      const { files, sevenths } = readValues(positionOf(fen));
      for (const side of SIDES) {
        const white = side === 'white';
        const heavy = [...letters.keys()].filter((at) => isHeavy(letters[at] ?? '', white));
        const reach = new Map(heavy.map((from) => [from, slowReach(letters, from, 3)]));
        const rooks = heavy.filter((from) => letters[from]?.toLowerCase() === 'r');
        for (const { file, takers } of files) {
          const ways = rooks
            .filter((from) => from % 8 !== file)
            .flatMap((from) => [...(reach.get(from) ?? [])])
            .filter(([to, moves]) => to % 8 === file && moves > 0 && !letters[to])
            .map(([, moves]) => moves);
          const slow = slowUsable(letters, white, file) && ways.length > 0 ? Math.min(...ways) : null;
          const taker = takers[side];
          if (taker) found++;
          if ((taker?.moves ?? null) !== slow) wrong.push(`${fen} ${side} file ${file}: ${taker?.moves} for ${slow}`);
          if (taker && reach.get(taker.rook)?.get(taker.to) !== taker.moves) wrong.push(`${fen} ${side} taker ${file}`);
        }
        const seventh = white ? 6 : 1;
        const there = heavy.filter((at) => Math.floor(at / 8) === seventh);
        const comers = heavy
          .filter((at) => !there.includes(at))
          .flatMap((from) => {
            const moves = [...(reach.get(from) ?? [])].filter(([to]) => Math.floor(to / 8) === seventh);
            return moves.length > 0 ? [`${from}:${Math.min(...moves.map(([, needed]) => needed))}`] : [];
          });
        const ours = sevenths[side].comers.map(({ from, moves }) => `${from}:${moves}`);
        if (named([...sevenths[side].there].sort((a, b) => a - b)) !== named(there)) wrong.push(`${fen} ${side} there`);
        if (ours.sort().join() !== comers.sort().join()) wrong.push(`${fen} ${side} comers ${ours} for ${comers}`);
      }
    }
    expect(found).toBeGreaterThan(60);
    expect(wrong).toEqual([]);
  });

  it('mirror from the a- to the h-file', () => {
    for (const fen of realPositions(200)) {
      const straight = readValues(positionOf(fen)).files;
      const other = readValues(filesMirrored(positionOf(fen))).files;
      const mirror = (squares: readonly number[]) => squares.map((square) => square ^ 7);
      const shown = straight.map(({ status, halfOpenFor, control, heavy, entries, targets, takers }) => ({
        parts: [status, halfOpenFor, control, targets.map(({ square }) => square ^ 7)],
        squares: SIDES.map((side) => [mirror(heavy[side]), mirror(entries[side]), takers[side]?.moves]),
      }));
      const turned = [...other].reverse().map(({ status, halfOpenFor, control, heavy, entries, targets, takers }) => ({
        parts: [status, halfOpenFor, control, targets.map(({ square }) => square)],
        squares: SIDES.map((side) => [heavy[side], entries[side], takers[side]?.moves]),
      }));
      expect(turned, fen).toEqual(shown);
    }
  });
});

describe('diagonals', () => {
  it('run as far as walking them, and end on a rammed pawn where two pawns stand head to head', () => {
    const wrong: string[] = [];
    let stopped = 0;
    for (const fen of realPositions(600)) {
      const letters = lettersOf(fen);
      const slow = [...letters.keys()].flatMap((from) => {
        if (!'BbQq'.includes(letters[from] || '-')) return [];
        return [1, -1].flatMap((files) =>
          [1, -1].flatMap((ranks) => {
            const line = slowLine(letters, from, files, ranks);
            const last = line[line.length - 1];
            if (last === undefined) return [];
            const stopper = letters[last] ?? '';
            const ahead = letters[last + (stopper === 'P' ? 8 : -8)] ?? '';
            const fixed = (stopper === 'P' && ahead === 'p') || (stopper === 'p' && ahead === 'P');
            if (fixed) stopped++;
            return [`${files === ranks ? 'a1h8' : 'h1a8'} ${named([from])}: ${named(line)} ${stopper !== ''} ${fixed}`];
          }),
        );
      });
      const ours = readValues(positionOf(fen)).diagonals.map(
        ({ from, direction, squares, stoppedBy, stopperFixed }) =>
          `${direction} ${named([from])}: ${named(squares)} ${stoppedBy !== null} ${stopperFixed}`,
      );
      if (ours.sort().join() !== slow.sort().join()) wrong.push(fen);
    }
    expect(stopped).toBeGreaterThan(100);
    expect(wrong).toEqual([]);
  });
});
