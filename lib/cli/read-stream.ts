/** `read -`: FENs from standard input, one a line, to one JSON object a line, in the same order. */
import type { Readable } from 'node:stream';
import { computeReading } from '@/lib/services/readings/engine';
import { FEN_LENGTH_MAX } from '@/engine/board';
import type { Mode } from '@/openapi/schemas/ids';
import type { BatchLine } from '@/openapi/schemas/readings';
import { jsonLine } from './json';
import { EXIT, type ExitCode, type Terminal, written } from './terminal';

/** Answers every line, waiting for whoever reads. The exit code tells whether a line was refused. */
export async function readStream({ input, output, errors }: Terminal, mode: Mode): Promise<ExitCode> {
  let line = 0;
  let refused = 0;
  for await (const text of textLines(input)) {
    line += 1;
    const answer = lineAnswer(text, mode, line);
    if ('error' in answer) refused += 1;
    if (!(await written(output, jsonLine(answer)))) return EXIT.good;
  }
  if (refused === 0) return EXIT.good;
  errors.write(`${refused} of ${line} lines could not be read; each is answered in its place.\n`);
  return EXIT.fault;
}

function lineAnswer(text: string, mode: Mode, line: number): BatchLine {
  if (text.length > FEN_LENGTH_MAX) {
    return {
      error: { code: 'too-long', field: 'text', message: `A line has at most ${FEN_LENGTH_MAX} characters.` },
      line,
    };
  }
  const result = computeReading(text, mode);
  return result.ok ? result.value : { error: result.fault[0], line };
}

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
