/** A game held against the board: every move of it and of its variations is legal, or the first that is not is named. */
import { type Fault, parseFen, type Position } from '../board';
import { fail, ok, type Result } from '../result';
import { type Step, type StepRefusal, Walk } from '../rules';
import { type PgnGame, type PgnMove } from './pgn';

const FIRST_POSITION = parseFen('rnbqkbnr/pppppppp/8/8/8/8/PPPPPPPP/RNBQKBNR w KQkq - 0 1');

/** Why a game was not kept, and where. */
export interface GameFault {
  /** Number of the game in the text, from 1. */
  readonly game: number;
  /** Line of the text, from 1. */
  readonly line: number;
  /** The move at fault as '12... Nf6'; null where no move is. */
  readonly move: string | null;
  readonly code: string;
  readonly message: string;
}

/** A game whose moves are all legal. */
export interface ReplayedGame {
  readonly game: PgnGame;
  readonly start: Position;
  /** The main line. */
  readonly steps: readonly Step[];
}

/** Most half-moves of a main line that are read. */
export const GAME_PLIES_MAX = 1000;

/** Replays a game, variations too. */
export function replayGame(game: PgnGame): Result<ReplayedGame, GameFault> {
  const { number, fault } = game;
  if (fault) return fail({ game: number, line: fault.line, move: null, code: fault.code, message: fault.message });
  const start = game.tags.FEN === undefined ? FIRST_POSITION : parseFen(game.tags.FEN);
  if (!start.ok) return fail(badStart(game, start.fault[0]));
  if (game.moves.length > GAME_PLIES_MAX) {
    const message = `The game has ${game.moves.length} half-moves; up to ${GAME_PLIES_MAX} are read.`;
    return fail({ game: number, line: game.line, move: null, code: 'game-too-long', message });
  }
  const steps: Step[] = [];
  const bad = walked(new Walk(start.value.position), game.moves, number, steps);
  return bad ? fail(bad) : ok({ game, start: start.value.position, steps });
}

function badStart({ number, line }: PgnGame, fault: Fault): GameFault {
  return { game: number, line, move: null, code: fault.code, message: `The FEN tag cannot be read: ${fault.message}` };
}

/**
 * Walks a line; the first move that cannot be made is the fault. Steps are kept of the main line only; variations may
 * hold moves that pass.
 */
function walked(walk: Walk, moves: readonly PgnMove[], game: number, steps?: Step[]): GameFault | null {
  for (const move of moves) {
    for (const variation of move.variations) {
      const bad = walked(walk.fork(), variation, game);
      if (bad) return bad;
    }
    const { fullmove, side } = walk.turn;
    const step = walk.step(move.text);
    if (typeof step !== 'string') {
      steps?.push(step);
    } else if (steps || !walk.pass(move.text)) {
      const name = `${fullmove}${side === 'white' ? '.' : '...'} ${move.text.slice(0, 20)}`;
      return { game, line: move.line, move: name, code: step, message: REFUSALS[step](name) };
    }
  }
  return null;
}

const REFUSALS: Readonly<Record<StepRefusal, (move: string) => string>> = {
  'unreadable-move': (move) => `"${move}" is not how a move is written.`,
  'illegal-move': (move) => `"${move}" is no legal move there.`,
  'ambiguous-move': (move) => `"${move}" can mean several moves there.`,
  'null-move': (move) => `"${move}" passes, which no move may.`,
};
