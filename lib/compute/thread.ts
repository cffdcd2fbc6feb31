/** The computing thread: one job after the other; the bytes it makes are handed over, not copied. */
import { parentPort } from 'node:worker_threads';
import { doJob, type Job, type Outcome } from './jobs';
import type { Answered, Asked } from './messages';

parentPort?.on('message', ({ id, job }: Asked) => {
  const answered = answer(id, job);
  parentPort?.postMessage(answered, 'outcome' in answered ? buffersOf(answered.outcome) : []);
});

function answer(id: number, job: Job): Answered {
  try {
    return { id, outcome: doJob(job) };
  } catch (error) {
    return { id, mistake: error instanceof Error ? (error.stack ?? error.message) : String(error) };
  }
}

function buffersOf(outcome: Outcome<Job>): ArrayBuffer[] {
  if ('ndjson' in outcome) return [outcome.ndjson.buffer as ArrayBuffer];
  return outcome.ok ? [outcome.json.buffer as ArrayBuffer] : [];
}
