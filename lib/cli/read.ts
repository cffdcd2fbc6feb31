/** `waypost read`: a FEN to a page of text or to JSON. */
import { parseArgs } from 'node:util';
import type { Fault } from '@/engine/reading/schema';
import { computeReading } from '@/lib/services/readings/engine';
import { MODES, type Mode } from '@/openapi/schemas/ids';
import { inkFor } from './ink';
import { jsonLine } from './json';
import { readStream } from './read-stream';
import { readingText } from './read-text';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';
import { UsageError } from './usage-error';
import { item } from './wrap';

export const READ_HELP = `waypost read "<FEN>" [--json] [--mode strict|diagram]
waypost read -         FENs from standard input, one a line

Reads a chess position: who controls what, weak squares, outposts, pawns,
files, kings, in sentences that can be counted on the board.

  --json            the whole reading as JSON, on one line
  --mode strict     legal positions only (the default)
  --mode diagram    also what teachers draw: no kings, pawns only
  --help            this text

With "-" every line is answered by one JSON object on a line, in the same
order; a line that cannot be read is answered {"error": ..., "line": n}.

Exit codes: 0 read; 1 the FEN, or a line of the stream, was refused, and why
is on standard error; 2 the command was not understood.
`;

/** Runs the command on its arguments, without the word "read". */
export async function runRead(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  const { positionals, values } = readArgs(args);
  if (values.help) {
    await written(terminal.output, READ_HELP);
    return EXIT.good;
  }
  const mode = modeOf(values.mode);
  const fen = positionals.join(' ');
  if (fen === '')
    throw new UsageError('A FEN is missing. Put it in quotes, or give "-" to read FENs from standard input.');
  if (fen === '-') return readStream(terminal, mode);
  const result = computeReading(fen, mode);
  if (!result.ok) {
    await written(terminal.errors, refusalText(result.fault, mode === 'strict' && computeReading(fen, 'diagram').ok));
    return EXIT.fault;
  }
  const text = values.json ? jsonLine(result.value) : readingText(result.value, inkFor(terminal.colour));
  await written(terminal.output, text);
  return EXIT.good;
}

/** Every fault by its FEN field, and a way out where there is one. */
function refusalText(faults: readonly Fault[], readsAsDiagram: boolean): string {
  const lines = ['This FEN cannot be read.', ...faults.flatMap((fault) => item(`  ${fault.field}: `, fault.message))];
  return `${[...lines, ...(readsAsDiagram ? ['As a diagram it can: add --mode diagram.'] : [])].join('\n')}\n`;
}

/** Words that are not options make the FEN, so that quotes may be forgotten. */
function readArgs(args: readonly string[]) {
  try {
    return parseArgs({
      args: [...args],
      allowPositionals: true,
      options: { json: { type: 'boolean' }, mode: { type: 'string' }, help: { type: 'boolean', short: 'h' } },
    });
  } catch (error) {
    throw new UsageError(argumentFault(error));
  }
}

function argumentFault(error: unknown): string {
  const { code, message } = error as { readonly code?: string; readonly message: string };
  const option = /'(-[^' ]*)/.exec(message)?.[1] ?? '';
  if (code === 'ERR_PARSE_ARGS_UNKNOWN_OPTION') return `There is no option "${option}".`;
  return message.includes('argument missing')
    ? `The option "${option}" needs a value.`
    : `The option "${option}" takes no value.`;
}

function modeOf(given: string | undefined): Mode {
  if (given === undefined) return 'strict';
  const mode = MODES.find((known) => known === given);
  if (!mode) throw new UsageError(`There is no mode "${given}"; the modes are ${MODES.join(' and ')}.`);
  return mode;
}
