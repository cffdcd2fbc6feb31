/** `waypost game FILE.pgn`: the commitments of games, and where lasting features come from. */
import { readFileSync, statSync } from 'node:fs';
import { pgnText } from '@/engine/games';
import { type GameReadingAnswer, type GamesAnswer, gamesAnswerSchema } from '@/engine/reading/schema/games';
import { jsonWriter } from '@/lib/api/writer';
import { readGames } from '@/lib/services/games/read-games';
import { GAMES_CALL_MAX, PGN_CALL_MAX } from '@/openapi/schemas/games';
import { commandArguments } from './arguments';
import { inkFor, type Ink } from './ink';
import { refused } from './refused';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';
import { UsageError } from './usage-error';
import { COLUMNS, item, wrap } from './wrap';

export const GAME_HELP = `waypost game FILE.pgn [--json]
waypost game -         PGN from standard input

Reads up to ${GAMES_CALL_MAX} games with comments, variations and glyphs: which moves changed
something for good, how long men stood where, and which move each lasting
feature of the last position comes from.

  --json            everything as JSON, on one line

Exit codes: 0 all read; 1 a game was refused, and where and why is on standard
error; 2 the command was not understood.
`;

const gamesJson = jsonWriter(gamesAnswerSchema);

/** Runs the command on its arguments, without the word "game". */
export async function runGame(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  const { positionals, values } = commandArguments(args, {
    json: { type: 'boolean' },
    help: { type: 'boolean', short: 'h' },
  } as const);
  if (values.help) {
    await written(terminal.output, GAME_HELP);
    return EXIT.good;
  }
  const [file, ...others] = positionals;
  if (file === undefined || others.length > 0) throw new UsageError('Name one PGN file, or "-" for standard input.');
  const pgn = file === '-' ? await inputText(terminal) : fileText(file);
  return refused(terminal, async () => {
    const answer = readGames({ pgn });
    await written(terminal.output, values.json ? `${gamesJson(answer)}\n` : gamesText(answer, inkFor(terminal.colour)));
    for (const { game, line, message } of answer.faults)
      await written(terminal.errors, `Game ${game}, line ${line}: ${message}\n`);
    return answer.faults.length === 0 ? EXIT.good : EXIT.fault;
  });
}

function fileText(file: string): string {
  try {
    if (statSync(file).size > PGN_CALL_MAX * 2)
      throw new UsageError(`"${file}" is larger than ${PGN_CALL_MAX * 2} bytes; import it into a study.`);
    return pgnText(readFileSync(file));
  } catch (error) {
    if (error instanceof UsageError) throw error;
    throw new UsageError(`"${file}" cannot be read: ${(error as Error).message}`);
  }
}

async function inputText({ input }: Terminal): Promise<string> {
  const chunks: Buffer[] = [];
  for await (const chunk of input) chunks.push(Buffer.from(chunk as Uint8Array | string));
  return pgnText(Buffer.concat(chunks));
}

function gamesText({ games }: GamesAnswer, ink: Ink): string {
  return `${games.flatMap((game) => gameLines(game, ink)).join('\n')}\n`;
}

function gameLines(
  { game, tags, result, plies, commitments, origins, journeys }: GameReadingAnswer,
  ink: Ink,
): string[] {
  const title = [tags.White ?? '?', tags.Black ?? '?'].join(' - ');
  const long = journeys
    .flatMap(({ side, kind, stays }) =>
      stays.slice(1).map(({ square, plies: stood }) => ({ side, kind, square, stood })),
    )
    .filter(({ kind }) => kind !== 'pawn' && kind !== 'king')
    .sort((a, b) => b.stood - a.stood)
    .slice(0, 5);
  return [
    ink.bold(`Game ${game}: ${title}, ${result}, ${plies} half-moves`),
    '',
    'What was changed for good',
    ...commitments.flatMap(({ text }) => item('  - ', text)),
    '',
    'Where men stood longest after they had moved',
    ...long.map(({ side, kind, square, stood }) => `  ${side} ${kind} on ${square}: ${stood} half-moves`),
    '',
    'Where the last position’s features come from',
    ...origins.flatMap(({ text, move }) =>
      item('  - ', `${text}: ${move === null ? 'from the beginning' : `since ${move}`}.`),
    ),
    '',
  ].flatMap((line) => (line.length > COLUMNS ? wrap(line, COLUMNS) : [line]));
}
