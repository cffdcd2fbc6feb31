/** PGN to games read, and the faults of those that could not be. */
import { ENGINE_VERSION } from '@/engine';
import { type GameFault, pgnGames, readGame, replayGame } from '@/engine/games';
import type { GameReadingAnswer, GamesAnswer } from '@/engine/reading/schema/games';
import { AppError } from '@/lib/errors';
import { GAMES_CALL_MAX, type GamesRequest } from '@/openapi/schemas/games';

/** Reads games in place. Throws `pgn-refused` where no game can be read, `invalid-request` where there are too many. */
export function readGames({ pgn }: GamesRequest): GamesAnswer {
  const games: GameReadingAnswer[] = [];
  const faults: GameFault[] = [];
  for (const game of pgnGames(pgn)) {
    if (game.number > GAMES_CALL_MAX) throw tooMany();
    const replayed = replayGame(game);
    if (!replayed.ok) {
      faults.push(replayed.fault);
      continue;
    }
    const { tags, result, moves, number } = game;
    const read = readGame(replayed.value);
    games.push({ game: number, tags, result, plies: moves.length, ...read } as GameReadingAnswer);
  }
  if (games.length === 0) throw noGame(faults);
  return { engine: ENGINE_VERSION, games, faults };
}

function tooMany(): AppError {
  const message = `One call reads up to ${GAMES_CALL_MAX} games; import a longer file into a study.`;
  return new AppError('invalid-request', message, {
    faults: [{ path: '/pgn', code: 'too-many', message }],
    bound: { name: 'games', max: GAMES_CALL_MAX },
  });
}

function noGame(faults: readonly GameFault[]): AppError {
  if (faults.length === 0) {
    const message = 'There is no game in this text.';
    return new AppError('pgn-refused', message, { faults: [{ path: '/pgn', code: 'no-game', message }] });
  }
  return new AppError('pgn-refused', gameFaultText(faults[0]!), {
    faults: faults.map((fault) => ({ path: '/pgn', code: fault.code, message: gameFaultText(fault) })),
  });
}

/** A fault with its place in a sentence. */
function gameFaultText({ game, line, message }: GameFault): string {
  return `Game ${game}, line ${line}: ${message}`;
}
