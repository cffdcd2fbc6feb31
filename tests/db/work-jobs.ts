/** A process with a worker of jobs, until it is killed. Arguments: the database's URL. Says `kept` for each lot that it has kept. */
import { writeSync } from 'node:fs';
import { openDatabase } from '@/db/client';
import { inPlace } from '@/lib/compute/computing';
import { JOB_KINDS } from '@/lib/jobs/kinds';
import { startWorker } from '@/lib/jobs/worker';

const [url = ''] = process.argv.slice(2);

async function work(): Promise<void> {
  const { db } = await openDatabase({ url });
  const readings = JOB_KINDS.readings!;
  startWorker({
    world: { db, compute: inPlace, now: () => new Date() },
    kinds: {
      readings: {
        compute: async (world, job, items) => {
          const lot = await readings.compute(world, job, items);
          return {
            ...lot,
            store: async (tx) => {
              await lot.store?.(tx);
              writeSync(1, `kept ${items.length}\n`);
            },
          };
        },
      },
    },
    pauseMs: 50,
    staleMs: 1500,
  });
}

void work();
