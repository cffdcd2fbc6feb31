/** What can be computed apart from the web server's own thread: plain data in, plain data out. */
import type { Fault } from '@/engine/reading/schema';
import { env } from '@/lib/env';
import { replyText } from '@/lib/api/reply';
import { computeReading } from '@/lib/services/readings/engine';
import { partsOf } from '@/lib/services/readings/parts';
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
const readingText = replyText(contracts.createReading.reply, env.isProduction);
const lineText = replyText(contracts.createReadings.reply, env.isProduction);

function doReading({ fen, mode, include }: ReadingJob): ReadingOutcome {
  const result = computeReading(fen, mode);
  if (!result.ok) return { ok: false, faults: result.fault };
  const reading = result.value;
  // The warnings take part: a diagram's say what its FEN claimed before it was normalised.
  const identity = JSON.stringify([reading.engine, reading.mode, reading.fen, reading.warnings, include]);
  return { ok: true, json: encoder.encode(readingText(partsOf(reading, include))), identity };
}

function doLines({ fens, firstLine, mode, include }: LinesJob): LinesOutcome {
  const mistakes: { line: number; reason: string }[] = [];
  const lines = fens.map((fen, index) => {
    const line = firstLine + index;
    try {
      const result = computeReading(fen, mode);
      return lineText(result.ok ? partsOf(result.value, include) : { error: result.fault[0], line });
    } catch (error) {
      mistakes.push({ line, reason: error instanceof Error ? (error.stack ?? error.message) : String(error) });
      return lineText({ error: OUR_MISTAKE, line });
    }
  });
  return { ndjson: encoder.encode(lines.map((line) => `${line}\n`).join('')), mistakes };
}

const OUR_MISTAKE: Fault = {
  code: 'internal',
  field: 'text',
  message: 'This position could not be read, by our mistake.',
};
