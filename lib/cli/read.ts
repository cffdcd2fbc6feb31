/** `waypost read`: a FEN to a page of text or to JSON. */
import type { ReadingBytes } from '@/engine';
import type { Fault } from '@/engine/reading/schema';
import { computeReading, writeReading } from '@/lib/services/readings/engine';
import { MODES, type Mode } from '@/openapi/schemas/ids';
import { choiceOf, commandArguments, fenOf } from './arguments';
import { inkFor } from './ink';
import { jsonLine } from './json';
import { answerLines, type Answer } from './lines';
import { readingText } from './read-text';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';
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

const OPTIONS = {
  json: { type: 'boolean' },
  mode: { type: 'string' },
  help: { type: 'boolean', short: 'h' },
} as const;

/** Runs the command on its arguments, without the word "read". */
export async function runRead(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  const { positionals, values } = commandArguments(args, OPTIONS);
  if (values.help) {
    await written(terminal.output, READ_HELP);
    return EXIT.good;
  }
  const mode = choiceOf('mode', values.mode, MODES) ?? 'strict';
  const fen = fenOf(positionals);
  if (fen === '-') return answerLines(terminal, (text) => readingOf(text, mode), jsonLine);
  const result = computeReading(fen, mode);
  if (!result.ok) {
    await written(terminal.errors, refusalText(result.fault, mode === 'strict' && computeReading(fen, 'diagram').ok));
    return EXIT.fault;
  }
  const json = values.json ? writeReading(fen, mode) : null;
  const text = json?.ok ? jsonLine(json.value) : readingText(result.value, inkFor(terminal.colour));
  await written(terminal.output, text);
  return EXIT.good;
}

function readingOf(text: string, mode: Mode): Answer<ReadingBytes, Fault> {
  const result = writeReading(text, mode);
  return result.ok ? { ok: true, value: result.value } : { ok: false, fault: result.fault[0] };
}

/** Every fault by its FEN field, and a way out where there is one. */
function refusalText(faults: readonly Fault[], readsAsDiagram: boolean): string {
  const lines = ['This FEN cannot be read.', ...faults.flatMap((fault) => item(`  ${fault.field}: `, fault.message))];
  return `${[...lines, ...(readsAsDiagram ? ['As a diagram it can: add --mode diagram.'] : [])].join('\n')}\n`;
}
