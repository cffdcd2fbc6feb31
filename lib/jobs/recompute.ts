/** Jobs that make a study's readings and results anew after the engine has changed. */
import { changeResult, resultById } from '@/db/queries/results';
import type { DoneItem, JobItemRow } from '@/db/queries/jobs';
import { AppError } from '@/lib/errors';
import { engineVersion } from '@/lib/services/readings/engine';
import { computeAgain } from '@/lib/services/results/compute-again';
import { readingsJob } from './readings';
import type { JobKind, JobWorld, Lot } from './worker';

/** An item is a FEN, or names a result. */
interface ResultItem {
  readonly result: string;
}

/** Reads positions and computes results of a lot with the present engine. */
export const recomputeJob: JobKind = {
  compute: async (world, job, items) => {
    const fens = items.filter(({ input }) => typeof input === 'string');
    const lots = [await readingsJob.compute(world, job, fens)];
    for (const item of items) if (typeof item.input !== 'string') lots.push(await resultLot(world, job.input, item));
    return {
      items: lots.flatMap((lot) => lot.items),
      store: async (tx) => {
        for (const lot of lots) await lot.store?.(tx);
      },
    };
  },
};

async function resultLot(
  world: JobWorld,
  input: Readonly<Record<string, unknown>>,
  { number, input: item }: JobItemRow,
): Promise<Lot> {
  const { result: id } = item as ResultItem;
  const before = await resultById(world.db, String(input.study), id);
  const failed = (message: string): Lot => ({ items: [{ number, state: 'failed', output: { error: { message } } }] });
  if (!before || before.deletedAt !== null) return failed('This result is gone.');
  try {
    const result = await computeAgain(world.compute, before);
    const at = world.now();
    const done: DoneItem = {
      number,
      state: 'done',
      output: { result: id, from: before.engineVersion, to: engineVersion },
    };
    return {
      items: [done],
      store: async (tx) => {
        await changeResult(tx, before, { result, engineVersion, computedAt: at, updatedAt: at });
      },
    };
  } catch (error) {
    if (error instanceof AppError) return failed(error.message);
    throw error;
  }
}
