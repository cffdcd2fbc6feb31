/** `waypost compare` and `waypost exchanges`: positions, placements and trades held against each other. */
import {
  type Comparison,
  comparisonSchema,
  type ExchangeTestAnswer,
  exchangeTestSchema,
} from '@/engine/reading/schema/compare';
import { jsonWriter } from '@/lib/api/writer';
import { compareSubjects } from '@/lib/services/compare/compare-subjects';
import { testExchanges } from '@/lib/services/compare/test-exchanges';
import { comparisonRequestSchema, SUBJECTS_MAX } from '@/openapi/schemas/compare';
import { commandArguments, fenOf } from './arguments';
import { inkFor, type Ink } from './ink';
import { answerLines } from './lines';
import { answered, refused } from './refused';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';
import { UsageError } from './usage-error';
import { COLUMNS, item, wrap } from './wrap';

export const COMPARE_HELP = `waypost compare "<FEN>" "<FEN>" [more, up to ${SUBJECTS_MAX}]
waypost compare "<FEN>" --place "f3 e5" [--place "f3 d2"]

What differs from the first position to each other, or from a position to
itself with one man put elsewhere: in sentences, then theme by theme.

  --place "FROM TO"  the first position with that man put there; may be repeated
  --json             the whole comparison as JSON, on one line

waypost exchanges "<FEN>"
waypost exchanges -    FENs from standard input, one a line

What changes when two men of like worth leave the board, for every such pair,
and when the trade could be offered.

  --json             the whole matrix as JSON, on one line
`;

const comparisonJson = jsonWriter(comparisonSchema);
const exchangesJson = jsonWriter(exchangeTestSchema);

/** Runs "compare" on its arguments. Each FEN is one argument, in quotes. */
export async function runCompare(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  const { positionals, values } = commandArguments(args, {
    place: { type: 'string', multiple: true },
    json: { type: 'boolean' },
    help: { type: 'boolean', short: 'h' },
  } as const);
  if (values.help) return help(terminal);
  const [first] = positionals;
  if (first === undefined) throw new UsageError('A FEN is missing. Put each FEN in quotes.');
  const placements = (values.place ?? []).map((text) => {
    const [from, to, ...rest] = text.trim().split(/[\s-]+/);
    if (!from || !to || rest.length > 0)
      throw new UsageError(`--place takes two squares, as in "f3 e5", not "${text}".`);
    return { fen: first, place: { from, to } };
  });
  const parsed = comparisonRequestSchema.safeParse({
    subjects: [...positionals.map((fen) => ({ fen })), ...placements],
  });
  if (!parsed.success) {
    const message = parsed.error.issues[0]?.message ?? '';
    throw new UsageError(`Give two to ${SUBJECTS_MAX} positions or placements. ${message}`);
  }
  return refused(terminal, async () => {
    const comparison = compareSubjects(parsed.data);
    const text = values.json ? `${comparisonJson(comparison)}\n` : comparisonText(comparison, inkFor(terminal.colour));
    await written(terminal.output, text);
    return EXIT.good;
  });
}

/** Runs "exchanges" on its arguments. */
export async function runExchanges(args: readonly string[], terminal: Terminal): Promise<ExitCode> {
  const { positionals, values } = commandArguments(args, {
    json: { type: 'boolean' },
    help: { type: 'boolean', short: 'h' },
  } as const);
  if (values.help) return help(terminal);
  const fen = fenOf(positionals);
  if (fen === '-') {
    return answerLines(
      terminal,
      (text) => answered(() => testExchanges({ fen: text, mode: 'diagram' })),
      (value) => `${'error' in value ? JSON.stringify(value) : exchangesJson(value)}\n`,
    );
  }
  return refused(terminal, async () => {
    const test = testExchanges({ fen, mode: 'diagram' });
    await written(
      terminal.output,
      values.json ? `${exchangesJson(test)}\n` : exchangesText(test, inkFor(terminal.colour)),
    );
    return EXIT.good;
  });
}

async function help(terminal: Terminal): Promise<ExitCode> {
  await written(terminal.output, COMPARE_HELP);
  return EXIT.good;
}

function comparisonText({ subjects, differences }: Comparison, ink: Ink): string {
  const [first, ...others] = subjects;
  const lines = others.flatMap(({ label, fen }, index) => {
    const { sentences, balance } = differences[index]!;
    return [
      '',
      ink.bold(`${label}, held against ${first?.label ?? 'A'}`),
      ...wrap(fen, COLUMNS),
      ...(sentences.length === 0 ? ['  Nothing that has a sentence of its own differs.'] : []),
      ...sentences.flatMap(({ text, good }) => item(good ? '  + ' : '  - ', text)),
      '',
      `  ${''.padEnd(42)}${'White'.padStart(13)}${'Black'.padStart(13)}`,
      ...balance.map(
        ({ counts, white, black }) =>
          `  ${counts.padEnd(42)}${`${white.a} to ${white.b}`.padStart(13)}${`${black.a} to ${black.b}`.padStart(13)}`,
      ),
    ];
  });
  return `${[...wrap(first?.fen ?? '', COLUMNS), ...lines].join('\n')}\n`;
}

const LETTERS: Readonly<Record<string, string>> = { knight: 'N', bishop: 'B', rook: 'R', queen: 'Q' };

function exchangesText({ fen, exchanges }: ExchangeTestAnswer, ink: Ink): string {
  const lines = exchanges.flatMap(({ white, black, offers, helps, sentences }) => {
    const pair = `${LETTERS[white.kind]}${white.square} for ${LETTERS[black.kind]}${black.square}`;
    const whom = helps === null ? 'helps neither' : `helps ${helps === 'white' ? 'White' : 'Black'}`;
    return [
      '',
      `${ink.bold(pair)}  ${whom}; ${offerText('White', offers.white)}, ${offerText('Black', offers.black)}`,
      ...sentences.slice(0, 3).flatMap(({ text }) => item('  - ', text)),
    ];
  });
  const none = exchanges.length === 0 ? ['', 'No two men of like worth stand on this board.'] : [];
  return `${[...wrap(fen, COLUMNS), ...none, ...lines].join('\n')}\n`;
}

function offerText(who: string, moves: number | null): string {
  if (moves === null) return `${who} cannot offer it within three moves`;
  return moves === 0 ? `${who} offers it now` : `${who} offers it in ${moves}`;
}
