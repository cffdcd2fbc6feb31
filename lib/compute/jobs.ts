/** What can be computed apart from the web server's own thread: plain data in, plain data out. */
import type { Fault } from '@/engine/reading/schema';
import { env } from '@/lib/env';
import { replyText } from '@/lib/api/reply';
import { writtenCheck } from '@/lib/api/written-check';
import { engineVersion, writeReading } from '@/lib/services/readings/engine';
import { contracts } from '@/openapi/contracts';
import { type CallJob, type CallOutcome, doCall } from './calls';
import type { Mode, ReadingPart } from '@/openapi/schemas/ids';

interface Choices {
  readonly mode: Mode;
  readonly include?: readonly ReadingPart[] | undefined;
}

/** One position to the JSON of its reading. */
export interface ReadingJob extends Choices {
  readonly kind: 'reading';
  readonly fen: string;
}

/** Several positions to lines of JSON, each with its end; `firstLine` is the number of the first. */
export interface LinesJob extends Choices {
  readonly kind: 'lines';
  readonly fens: readonly string[];
  readonly firstLine: number;
}

export type Job = ReadingJob | LinesJob | CallJob;

/** The JSON in UTF-8, and what its ETag depends on; or the faults of the FEN. */
export type ReadingOutcome =
  | { readonly ok: true; readonly json: Uint8Array; readonly identity: string }
  | { readonly ok: false; readonly faults: readonly [Fault, ...Fault[]] };

/** The lines in UTF-8, and the numbers of those that failed by our own mistake, with the reason for the log. */
export interface LinesOutcome {
  readonly ndjson: Uint8Array;
  readonly mistakes: readonly { readonly line: number; readonly reason: string }[];
}

export type Outcome<J extends Job> = J extends ReadingJob
  ? ReadingOutcome
  : J extends LinesJob
    ? LinesOutcome
    : CallOutcome;

/** Does a job, on whatever thread this is called. */
export function doJob<J extends Job>(job: J): Outcome<J>;
export function doJob(job: Job): ReadingOutcome | LinesOutcome | CallOutcome {
  switch (job.kind) {
    case 'reading':
      return doReading(job);
    case 'lines':
      return doLines(job);
    case 'call':
      return doCall(job);
  }
}

const encoder = new TextEncoder();
const checkedReading = writtenCheck(contracts.createReading.reply, env.isProduction);
const checkedLine = writtenCheck(contracts.createReadings.reply, env.isProduction);
const badLine = replyText(contracts.createReadings.reply, env.isProduction);

function doReading({ fen, mode, include }: ReadingJob): ReadingOutcome {
  const result = writeReading(fen, mode, include);
  if (!result.ok) return { ok: false, faults: result.fault };
  const { fen: normalised, warnings, json } = result.value;
  // The warnings take part: a diagram's say what its FEN claimed before it was normalised.
  const identity = JSON.stringify([engineVersion, mode, normalised, warnings, include]);
  return { ok: true, json: checkedReading(json), identity };
}

function doLines({ fens, firstLine, mode, include }: LinesJob): LinesOutcome {
  const mistakes: { line: number; reason: string }[] = [];
  const lines = fens.map((fen, index) => {
    const line = firstLine + index;
    try {
      const result = writeReading(fen, mode, include);
      return result.ok ? checkedLine(result.value.json) : encoder.encode(badLine({ error: result.fault[0], line }));
    } catch (error) {
      mistakes.push({ line, reason: error instanceof Error ? (error.stack ?? error.message) : String(error) });
      return encoder.encode(badLine({ error: OUR_MISTAKE, line }));
    }
  });
  return { ndjson: joined(lines), mistakes };
}

/** Lines one after the other, each with its end. */
function joined(lines: readonly Uint8Array[]): Uint8Array {
  const all = new Uint8Array(lines.reduce((sum, line) => sum + line.length + 1, 0));
  let at = 0;
  for (const line of lines) {
    all.set(line, at);
    at += line.length + 1;
    all[at - 1] = LINE_END;
  }
  return all;
}

const LINE_END = 0x0a;

const OUR_MISTAKE: Fault = {
  code: 'internal',
  field: 'text',
  message: 'This position could not be read, by our mistake.',
};
