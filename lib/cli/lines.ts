/** FENs from standard input, one a line, to one JSON object a line, in the same order. */
import type { Readable } from 'node:stream';
import { FEN_LENGTH_MAX } from '@/engine/board';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';

/** Why a line was refused. */
export interface LineFault {
  readonly code: string;
  readonly message: string;
  readonly field?: string | undefined;
}

/** What a line is answered: a value, or why there is none. */
export type Answer<V, F = LineFault> =
  | { readonly ok: true; readonly value: V }
  | { readonly ok: false; readonly fault: F };

/** A fault in the place of a value. */
export interface BadAnswer<F = LineFault> {
  readonly error: F;
  readonly line: number;
}

/** Answers every line, waiting for whoever reads. The exit code tells whether a line was refused. */
export async function answerLines<V, F>(
  { input, output, errors }: Terminal,
  answer: (fen: string) => Answer<V, F>,
  json: (value: V | BadAnswer<F | typeof TOO_LONG.fault>) => string,
): Promise<ExitCode> {
  let line = 0;
  let refused = 0;
  for await (const text of textLines(input)) {
    line += 1;
    const given = text.length > FEN_LENGTH_MAX ? TOO_LONG : answer(text);
    if (!given.ok) refused += 1;
    if (!(await written(output, json(given.ok ? given.value : { error: given.fault, line })))) return EXIT.good;
  }
  if (refused === 0) return EXIT.good;
  errors.write(`${refused} of ${line} lines could not be read; each is answered in its place.\n`);
  return EXIT.fault;
}

const TOO_LONG = {
  ok: false,
  fault: { code: 'too-long', field: 'text', message: `A line has at most ${FEN_LENGTH_MAX} characters.` },
} as const;

/** The lines of a stream without their ends. Of a line that is too long only so much is kept as shows that it is. */
async function* textLines(input: Readable): AsyncGenerator<string> {
  const decoder = new TextDecoder();
  let rest = '';
  for await (const chunk of input) {
    const parts = (
      rest + (typeof chunk === 'string' ? chunk : decoder.decode(chunk as Uint8Array, { stream: true }))
    ).split('\n');
    rest = (parts.pop() ?? '').slice(0, FEN_LENGTH_MAX + 2);
    for (const part of parts) yield part.replace(/\r$/, '');
  }
  if (rest !== '') yield rest.replace(/\r$/, '');
}
