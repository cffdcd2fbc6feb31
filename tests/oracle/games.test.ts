/** PGN read and replayed by our own reader and generator, against two rules libraries on serious games: chess.js 1.4.0 and kokopu. */
import { Chess } from 'chess.js';
import { pgnRead } from 'kokopu';
import { expect, it } from 'vitest';
import { formatFen, type Position, squareName } from '@/engine/board';
import { type PgnGame, pgnGames, readGame, replayGame, type ReplayedGame, writePgn } from '@/engine/games';
import { Walk } from '@/engine/rules';
import { REAL_GAMES_PGN, realGames } from '../support/real-games';

function replayed(game: PgnGame): ReplayedGame {
  const answer = replayGame(game);
  if (!answer.ok) throw new Error(`${answer.fault.game}: ${answer.fault.message}`);
  return answer.value;
}

function lastPosition({ start, game }: ReplayedGame): Position {
  const walk = new Walk(start);
  for (const { text } of game.moves) walk.step(text);
  return walk.position();
}

/** Without the square passed over, which the libraries write only where a capture is legal, and by the fifth field on. */
function boardFields(fen: string): string {
  return fen.split(' ').slice(0, 3).join(' ');
}

it('the last positions of 1,000 games are those of kokopu, and their results', { timeout: 60_000 }, () => {
  // The library knows no escaped lines; the file's first is one.
  const theirs = pgnRead(REAL_GAMES_PGN.slice(REAL_GAMES_PGN.indexOf('\n')));
  let count = 0;
  for (const game of pgnGames(REAL_GAMES_PGN)) {
    const other = theirs.game(game.number - 1);
    expect(boardFields(formatFen(lastPosition(replayed(game))))).toBe(boardFields(other.finalPosition().fen()));
    expect(game.result).toBe({ '1-0': '1-0', '0-1': '0-1', '1/2-1/2': '1/2-1/2' }[String(other.result())] ?? '*');
    count++;
  }
  console.info(`${count} games replayed, 0 last positions differ from kokopu`);
  expect(count).toBe(1000);
  expect(theirs.gameCount()).toBe(1000);
});

it('every SAN and the last FEN of 120 games are those of chess.js', { timeout: 60_000 }, () => {
  let moves = 0;
  for (const pgn of realGames(120)) {
    const [game] = [...pgnGames(pgn)];
    const ours = replayed(game!);
    const chess = new Chess();
    for (const { text } of game!.moves) chess.move(text);
    expect(ours.steps.map(({ san }) => san)).toEqual(chess.history());
    expect(boardFields(formatFen(lastPosition(ours)))).toBe(boardFields(chess.fen()));
    expect(formatFen(lastPosition(ours)).split(' ').slice(4)).toEqual(chess.fen().split(' ').slice(4));
    moves += ours.steps.length;
  }
  console.info(`${moves} moves written as chess.js writes them`);
  expect(moves).toBeGreaterThan(5000);
});

it('games written by us are read by chess.js to the same moves, tags and last position', { timeout: 60_000 }, () => {
  for (const pgn of realGames(40)) {
    const [game] = [...pgnGames(pgn)];
    const tags = { ...game!.tags, White: 'A "quoted" \\ name', Annotator: 'none' };
    const moves = game!.moves.map((move, place) =>
      place % 7 === 3 ? { ...move, nags: [3], comments: ['a remark; (in brackets) [and] more'] } : move,
    );
    const first = { fullmove: 1, side: 'white' } as const;
    const text = writePgn({ ...game!, tags, moves, first });
    const chess = new Chess();
    // The library reads no escapes in tags.
    chess.loadPgn(writePgn({ ...game!, moves, first }));
    expect(chess.history()).toEqual(replayed(game!).steps.map(({ san }) => san));
    const [again] = [...pgnGames(text)];
    expect(again!.tags.White).toBe(tags.White);
    expect(again!.moves.map(({ text: san, nags, comments }) => [san, nags, comments])).toEqual(
      moves.map(({ text: san, nags, comments }) => [san, nags, comments]),
    );
  }
});

it('journeys of 40 games: every stay is where chess.js has that man, the half-moves of a man sum to its life', {
  timeout: 60_000,
}, () => {
  const letters = { pawn: 'p', knight: 'n', bishop: 'b', rook: 'r', queen: 'q', king: 'k' } as const;
  let stays = 0;
  for (const pgn of realGames(40)) {
    const [game] = [...pgnGames(pgn)];
    const { journeys, timeline } = readGame(replayed(game!));
    const plies = timeline.length - 1;
    const boards = timeline.map(({ fen }) => new Chess(fen));
    for (const { side, kind, stays: list, takenAt, promoted } of journeys) {
      expect(list.reduce((sum, stay) => sum + stay.plies, 0)).toBe(takenAt ?? plies);
      for (const { square, from, plies: stood } of list) {
        for (const ply of [from, from + stood - 1]) {
          if (stood === 0 && ply < from) continue;
          const now = promoted && ply >= promoted.at ? promoted.kind : kind;
          expect(boards[ply]!.get(square)).toEqual({ type: letters[now], color: side === 'white' ? 'w' : 'b' });
        }
        stays++;
      }
    }
    const standing = journeys.filter(({ takenAt }) => takenAt === null).length;
    const last = timeline[plies]!.fen.split(' ')[0]!;
    expect(standing).toBe(last.replace(/[^a-z]/gi, '').length);
  }
  expect(stays).toBeGreaterThan(2000);
});

it('the squares of a step are those chess.js moves from and to, castling, captures in passing and promotions too', () => {
  const [game] = [...pgnGames('1. e4 a6 2. e5 d5 3. exd6 Nf6 4. dxc7 g6 5. cxb8=N Bg7 6. Nf3 0-0 7. Be2 h6 8. O-O *')];
  const { steps, game: written } = replayed(game!);
  const chess = new Chess();
  for (const { text } of written.moves) chess.move(text.replaceAll('0', 'O'));
  const theirs = chess.history({ verbose: true });
  expect(steps.map(({ from, to }) => squareName(from) + squareName(to))).toEqual(
    theirs.map(({ from, to }) => from + to),
  );
  expect(steps.map(({ castling }) => castling).filter(Boolean)).toEqual(['king', 'king']);
  expect(squareName(steps[4]!.capturedOn)).toBe('d5');
  expect(steps[8]!.promoted).toBe(2);
});
