/** Jobs of readings: each position is read once and kept for everyone. */
import { keepReadings, type KeptReading, readingsOf } from '@/db/queries/readings';
import type { DoneItem } from '@/db/queries/jobs';
import type { Reading } from '@/engine/reading/schema';
import { AppError } from '@/lib/errors';
import { engineVersion } from '@/lib/services/readings/engine';
import { keyed } from '@/lib/services/studies/keyed';
import type { JobKind } from './worker';

interface Keyed {
  readonly number: number;
  readonly fen: string;
  readonly positionKey: string;
}

/** Reads the FENs of a lot that are not kept yet. A bad one fails with its fault, in its place. */
export const readingsJob: JobKind = {
  compute: async ({ db, compute }, _job, items) => {
    const failed: DoneItem[] = [];
    const good: Keyed[] = [];
    for (const { number, input } of items) {
      try {
        good.push({ number, ...keyed(String(input)) });
      } catch (error) {
        if (!(error instanceof AppError)) throw error;
        failed.push({ number, state: 'failed', output: { error: error.faults[0] ?? { message: error.message } } });
      }
    }
    const known = await readingsOf(
      db,
      good.map(({ positionKey }) => positionKey),
      engineVersion,
    );
    const made = new Map<string, KeptReading>();
    for (const { fen, positionKey } of good) {
      if (known.has(positionKey) || made.has(positionKey)) continue;
      const outcome = await compute.run({ kind: 'reading', fen, mode: 'diagram' });
      if (!outcome.ok) throw new Error(`${fen} was read before and is refused now.`);
      const reading = JSON.parse(new TextDecoder().decode(outcome.json)) as Reading;
      made.set(positionKey, { positionKey, engineVersion, reading });
    }
    const done = good.map(
      ({ number, fen, positionKey }): DoneItem => ({
        number,
        state: 'done',
        output: { fen, positionKey, engine: engineVersion },
      }),
    );
    return { items: [...failed, ...done], store: (tx) => keepReadings(tx, [...made.values()]) };
  },
};
